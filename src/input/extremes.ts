import type { Extreme, Run, Zone } from '../model.ts';
import { type Findings, report } from './findings.ts';
import { extremeTable } from './keys.ts';
import type { Library } from './library.ts';
import { readKeys } from './read-keys.ts';
import { pathOf, placeOf, type SourceMap } from './source.ts';
import { WARNINGS } from './warnings.ts';

/**
 * The job's extremes. One that names a run's zone must also name the zone of the structure behind the run,
 * unless that is constant; a run whose zone it does not name it does not concern.
 */
export function readExtremes(
  rows: readonly SourceMap[],
  zones: Library<Zone>,
  runs: readonly Run[],
  findings: Findings,
): Extreme[] {
  const names = new Set<string>();
  return rows.flatMap((row) => {
    const extreme = readExtreme(row, zones, findings);
    if (extreme === null) return [];
    if (names.has(extreme.name)) {
      report(findings, placeOf(row, 'name'), { found: extreme.name, expected: 'each name once' });
    }
    names.add(extreme.name);
    checkStructures(extreme, row, runs, findings);
    return [extreme];
  });
}

function readExtreme(row: SourceMap, zones: Library<Zone>, findings: Findings): Extreme | null {
  const table = extremeTable(zones.ids);
  const { complete, values } = readKeys(table, row, '', findings);
  const temperatures = new Map<string, number>();
  for (const id of zones.ids) {
    const temperature = values[id];
    if (typeof temperature === 'number') temperatures.set(id, temperature);
  }
  if (!complete) return null;
  if (temperatures.size > 0) return { name: String(values.name), temperatures };
  const expected = 'the temperature of at least one zone, such as deck: 25 degC';
  return report(findings, row.place, { expected });
}

function checkStructures(
  { name, temperatures }: Extreme,
  row: SourceMap,
  runs: readonly Run[],
  findings: Findings,
): void {
  const concerned = runs.filter(({ zone }) => temperatures.has(zone.name));
  if (concerned.length === 0) findings.warnings.push(WARNINGS.extremeUnused(name));
  const missing = new Map<string, Run>();
  for (const run of concerned) {
    const behind = run.structure?.zone;
    if (behind === undefined || behind.constant || temperatures.has(behind.name)) continue;
    if (!missing.has(behind.name)) missing.set(behind.name, run);
  }
  for (const [zone, run] of missing) {
    const place = { ...row.place, key: pathOf(row.place, zone) };
    const expected = `a temperature, since ${zone} is the structure behind run ${run.id} in ${run.zone.name}`;
    report(findings, place, { expected });
  }
}
