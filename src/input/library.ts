import { type Findings, report } from './findings.ts';
import { nearestName } from './nearest-name.ts';
import { givenText, placeOf, type SourceMap } from './source.ts';

/** Things that others refer to by their ids. */
export interface Library<T> {
  /** What one of them is called in a message: `member`. */
  readonly noun: string;
  /** Every id that the user wrote, those of faulty rows too. */
  readonly ids: readonly string[];
  /** Those that could be built. */
  readonly items: ReadonlyMap<string, T>;
}

/** The ids of rows in order; an id that stands twice is reported. */
export function uniqueIds(rows: readonly SourceMap[], noun: string, findings: Findings): string[] {
  const ids: string[] = [];
  for (const row of rows) {
    const id = givenText(row, 'id');
    if (id === undefined) continue;
    if (ids.includes(id)) {
      report(findings, placeOf(row, 'id'), { found: id, expected: `each ${noun} once` });
    } else ids.push(id);
  }
  return ids;
}

/**
 * What a key's value refers to: reported where there is no such id, and silently `null` where its own row
 * has a fault, which is reported already.
 */
export function lookUp<T>(
  library: Library<T>,
  map: SourceMap,
  key: string,
  findings: Findings,
): T | null {
  const id = givenText(map, key);
  if (id === undefined) return null;
  if (library.ids.includes(id)) return library.items.get(id) ?? null;
  return reportUnknown(id, library, map, key, findings);
}

function reportUnknown<T>(
  id: string,
  { noun, ids }: Library<T>,
  map: SourceMap,
  key: string,
  findings: Findings,
): null {
  const nearest = nearestName(id, ids);
  const listed = ids.length > 12 ? `${ids.slice(0, 12).join(', ')}, …` : ids.join(', ');
  return report(findings, placeOf(map, key), {
    found: id,
    expected: ids.length === 0 ? `a ${noun}, and there are none` : `a ${noun}: ${listed}`,
    ...(nearest === undefined ? {} : { nearest }),
  });
}
