/**
 * The known name that was likely meant by an unknown one.
 *
 * @param name what the user wrote
 * @param known the names that there are
 * @returns the name with the fewest single-letter changes, swaps of neighbours included, where these are
 * no more than a third of its letters (one for a short name); the first of equals; else `undefined`
 */
export function nearestName(name: string, known: Iterable<string>): string | undefined {
  let best: string | undefined;
  let fewest = Number.POSITIVE_INFINITY;
  for (const candidate of known) {
    const changes = distance(name.toLowerCase(), candidate.toLowerCase());
    const allowed = Math.max(1, Math.floor(Math.max(name.length, candidate.length) / 3));
    if (changes <= allowed && changes < fewest) {
      best = candidate;
      fewest = changes;
    }
  }
  return best;
}

/** Insertions, deletions, substitutions and swaps of neighbours (optimal string alignment). */
function distance(a: string, b: string): number {
  const rows: number[][] = [Array.from({ length: b.length + 1 }, (_, j) => j)];
  for (let i = 1; i <= a.length; i++) {
    const row = [i];
    for (let j = 1; j <= b.length; j++) {
      const same = a[i - 1] === b[j - 1] ? 0 : 1;
      row[j] = Math.min(rows[i - 1][j] + 1, row[j - 1] + 1, rows[i - 1][j - 1] + same);
      const swapped = i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1];
      if (swapped) row[j] = Math.min(row[j], rows[i - 2][j - 2] + 1);
    }
    rows.push(row);
  }
  return rows[a.length][b.length];
}
