/** Every number below a value, each under its path; texts and the like are left out. */
export function flatNumbers(value: unknown, path = ''): Map<string, number> {
  if (typeof value === 'number') return new Map([[path, value]]);
  if (typeof value !== 'object' || value === null) return new Map();
  const entries = value instanceof Map ? [...value] : Object.entries(value);
  return new Map(entries.flatMap(([key, below]) => [...flatNumbers(below, `${path}/${key}`)]));
}
