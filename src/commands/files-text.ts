/** Tables by name, charts by number. */
export function filesText(files: readonly string[]): string {
  const charts = files.filter((name) => name.endsWith('.png')).length;
  const named = files.filter((name) => !name.endsWith('.png'));
  return [...named, ...(charts === 0 ? [] : [charts === 1 ? '1 chart' : `${charts} charts`])].join(
    ', ',
  );
}
