/**
 * Names that may stand in the names of files, one a name given, all different whatever a file system makes of capitals.
 *
 * @param names any texts
 */
export function fileStems(names: readonly string[]): string[] {
  const taken = new Set<string>();
  return names.map((name) => {
    const plain = name.replace(/[^\p{L}\p{N}]+/gu, '-').replace(/^-|-$/g, '') || 'zone';
    let stem = plain;
    for (let k = 2; taken.has(stem.toLowerCase()); k++) stem = `${plain}-${k}`;
    taken.add(stem.toLowerCase());
    return stem;
  });
}
