import type { Curve, Fastener, Job, Member, Zone } from '../model.ts';
import { resultUnit, type UnitSystem } from '../units.ts';
import { amount } from './names.ts';
import { shortNumber } from './number-text.ts';
import { DRAWING_LEGEND, runDrawing } from './run-drawing.ts';
import { defaultLines } from './summary/default-lines.ts';
import { derivedLines } from './summary/derived-lines.ts';
import { findingCounts } from './summary/found-lines.ts';
import { sourceLines, spanText } from './summary/record-lines.ts';
import { sunLines } from './summary/sun-lines.ts';
import { bullet, table, wrap } from './summary/text-layout.ts';
import { warmingTitle } from './summary/warming-table.ts';

/**
 * What was understood of a job, in words: record, zones, members, fasteners, curves, runs, limits, extremes, and
 * what was worked out or left at its default.
 *
 * @returns text in the units of the job, with LF line ends
 */
export function understood(job: Job): string {
  const members = distinct(job.runs.map((run) => run.member));
  const fasteners = distinct(job.runs.flatMap((run) => run.fasteners));
  const sections = [
    [job.title, '', ...sourceLines(job), wrap(spanText(job))].join('\n'),
    section('Found in the record', findingCounts(job.recordFindings)),
    section('Zones', [zoneTable(job)]),
    section('Zones reckoned from sun and air', sunLines(job)),
    section(`Runs (${DRAWING_LEGEND})`, [runTable(job)]),
    section(
      'Members',
      members.map((member) => bullet(memberText(member, job))),
    ),
    section(
      'Fasteners, each',
      fasteners.map((fastener) => bullet(fastenerText(fastener, job))),
    ),
    section(
      'Curves',
      job.curves.map((curve) => bullet(curveText(curve, job))),
    ),
    section('Limits', [limitsText(job)]),
    section(
      'Extremes',
      job.extremes.map((extreme) => bullet(extremeText(extreme, job))),
    ),
    section(warmingTitle(job), job.warming === null ? [] : ['  Screened beside the job as it is.']),
    section('Worked out from other values', derivedLines(job)),
    section('Left at their defaults', defaultLines(job.defaults)),
  ];
  return sections.filter((text) => text !== '').join('\n\n');
}

function distinct<T>(items: readonly T[]): T[] {
  return [...new Set(items)];
}

function section(title: string, lines: readonly string[]): string {
  return lines.length === 0 ? '' : [title, ...lines].join('\n');
}

function zoneTable({ zones, units }: Job): string {
  const degrees = (value: number) => amount(value, 'temperature', units);
  const rows = zones.map(({ name, temperature, constant }: Zone) => {
    const sorted = Float64Array.from(temperature).sort();
    const at = (share: number) => degrees(sorted[Math.round(share * (sorted.length - 1))]);
    return constant ? [name, '', at(0), '', 'for all time'] : [name, at(0), at(0.5), at(1), ''];
  });
  return table([['zone', 'coldest', 'median', 'hottest', ''], ...rows], [1, 2, 3]);
}

/** Widest drawing of a run. */
const DRAWN = 41;

function runTable({ runs, units }: Job): string {
  const header = ['run', '', 'fasteners', 'from first to last', 'member', 'zone', 'locked in at'];
  const rows = runs.map((run) => [
    run.id,
    runDrawing(run, DRAWN),
    String(run.positions.length),
    amount(run.positions[run.positions.length - 1] - run.positions[0], 'length', units),
    run.member.id,
    run.structure === null ? run.zone.name : `${run.zone.name} on ${run.structure.zone.name}`,
    amount(run.lockIn, 'temperature', units),
  ]);
  return table([header, ...rows], [2, 3, 6]);
}

function memberText(member: Member, { units }: Job): string {
  const buckling =
    member.buckling === null ? 'buckling not checked' : `buckling by ${member.buckling.rule}`;
  return [
    `${member.id}: E ${amount(member.modulus, 'stress', units)}`,
    `α ${perDegree(member.expansion, units)}`,
    `A ${amount(member.area, 'area', units)}, net ${amount(member.netArea, 'area', units)}`,
    buckling,
    member.curve === null ? 'no curve' : `curve ${member.curve.id}`,
  ].join(', ');
}

/** A coefficient of expansion as it is mostly written, `23e-6 / K`. */
function perDegree(value: number, units: UnitSystem): string {
  const { name, from } = resultUnit('expansion', units);
  return `${shortNumber(from(value) * 1e6)}e-6 / ${name.replace('^-1', '')}`;
}

function fastenerText(fastener: Fastener, { units }: Job): string {
  const { stiffness, freePlay, grip, perConnection } = fastener;
  const limit = (value: number | null, name: string) =>
    value === null ? `no ${name}` : `${name} ${amount(value, 'force', units)}`;
  return [
    `${fastener.id}: ${stiffness === null ? 'rigid' : amount(stiffness, 'stiffness', units)}`,
    ...(perConnection === 1 ? [] : [`${perConnection} a connection`]),
    freePlay === 0
      ? 'tight'
      : `slips ${amount(freePlay, 'length', units)} each way at ${amount(grip, 'force', units)}`,
    limit(fastener.shearResistance, 'shear resistance'),
    limit(fastener.shearRangeLimit, 'limit of the shear range'),
    fastener.curve === null ? 'no curve' : `curve ${fastener.curve.id}`,
  ].join(', ');
}

const BELOW = {
  cutoff: 'no damage below that',
  continue: 'the last slope goes on below',
  threshold: 'no damage where every range stays below that',
} as const;

function curveText({ id, of, line, below, limitRange }: Curve, { units }: Job): string {
  const range = (value: number) => amount(value, of, units);
  const form =
    line.kind === 'formula'
      ? `a formula from ${range(line.from)} to ${range(line.to)}`
      : Array.from(line.ranges, (value, i) => `${range(value)} at ${cycles(line.cycles[i])}`).join(
          ', ',
        );
  const end = below === 'continue' ? BELOW.continue : `${range(limitRange)} and ${BELOW[below]}`;
  return `${id}: range of ${of}, ${form}; ${end}`;
}

function cycles(value: number): string {
  return Number(value.toPrecision(3)).toExponential().replace('e+', 'e');
}

function limitsText({ limits, counting, represents }: Job): string {
  const years = (value: number) => `${shortNumber(value)} ${value === 1 ? 'year' : 'years'}`;
  const stands = represents === null ? 'its covered hours' : years(represents);
  return wrap(
    [
      `Design life ${years(limits.designLife)}`,
      `allowed damage ${shortNumber(limits.damage)}`,
      `factors: load ${limits.loadFactor}, member ${limits.memberFactor}, fastener ${limits.fastenerFactor}, static ${limits.staticFactor}`,
      `residue ${counting.residue}`,
      ...(counting.extremesCycle === 'yes' ? ['a cycle a year between the extremes'] : []),
      `a pass of the record stands for ${stands}`,
    ].join('; '),
    '  ',
  );
}

function extremeText({ name, temperatures }: Job['extremes'][number], { units }: Job): string {
  const parts = [...temperatures].map(
    ([zone, value]) => `${zone} ${amount(value, 'temperature', units)}`,
  );
  return `${name}: ${parts.join(', ')}`;
}
