import { createHash } from 'node:crypto';
import type { Job, Result, ZonesJob } from '../model.ts';
import { version } from './version.ts';
import type { OutputFile } from './write-files.ts';

/**
 * manifest.json of a screening: what made the results and from what, settings in force and passes of each run.
 *
 * @param files the files that are written with it
 */
export function manifestJson(result: Result, files: readonly OutputFile[]): string {
  const runs = result.runs.map((run) => ({
    run: run.run.id,
    passes: run.passes,
    settled: !run.walks,
    covered_hours: run.coveredHours,
    years: run.years,
  }));
  return manifestText(result.job, { runs }, files);
}

/**
 * A manifest: version, hash of every input, settings in force, what the command adds, and the files written with
 * their hashes. It names no time and no place, so the same job gives the same bytes.
 *
 * @param made what the command did with the job, by key
 * @param files the files that are written with it
 */
export function manifestText(job: Job, made: object, files: readonly OutputFile[]): string {
  return manifestOf(job, { settings: settings(job), ...made }, files);
}

/** The manifest of a command that looks at the zones alone. */
export function zonesManifest(job: ZonesJob, files: readonly OutputFile[]): string {
  return manifestOf(job, { settings: { ...zoneSettings(job), defaults: job.defaults } }, files);
}

function manifestOf(job: ZonesJob, made: object, files: readonly OutputFile[]): string {
  const manifest = {
    program: 'daystrain',
    version,
    title: job.title,
    units: job.units,
    inputs: job.inputs,
    ...made,
    files: files.map(({ name, content }) => ({ name, sha256: sha256(content) })),
  };
  return `${JSON.stringify(manifest, null, 2)}\n`;
}

function settings(job: Job) {
  const { limits, counting } = job;
  return {
    design_life_years: limits.designLife,
    damage: limits.damage,
    load_factor: limits.loadFactor,
    member_factor: limits.memberFactor,
    fastener_factor: limits.fastenerFactor,
    static_factor: limits.staticFactor,
    residue: counting.residue,
    force_gate_N: counting.forceGate,
    stress_gate_MPa: counting.stressGate,
    extremes_cycle: counting.extremesCycle,
    ...zoneSettings(job),
    warming: job.warming,
    extremes: job.extremes.map(({ name, temperatures }) => ({
      name,
      degC: Object.fromEntries(temperatures),
    })),
    defaults: job.defaults,
  };
}

function zoneSettings({ represents, weather, zones }: ZonesJob) {
  const sunlit = zones.flatMap(({ name, sunlit }) =>
    sunlit === null ? [] : [[name, sunlit.basis]],
  );
  return { represents_years: represents, weather, sunlit_zones: Object.fromEntries(sunlit) };
}

function sha256(content: string | Uint8Array): string {
  return createHash('sha256').update(content).digest('hex');
}
