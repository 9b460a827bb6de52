/** Up to three names that a typed one resembles most, closest first. */
export function nearest(typed: string, names: readonly string[]): string[] {
  const wanted = typed.toUpperCase();
  const ranked = names
    .map((name) => ({ name, far: name.includes(wanted) ? 1 : edits(wanted, name) }))
    .sort((a, b) => a.far - b.far);
  return ranked
    .filter(({ far }) => far <= ranked[0].far + 2)
    .slice(0, 3)
    .map(({ name }) => name);
}

/** Letters to insert, delete or replace to turn one text into the other (Levenshtein 1966). */
function edits(a: string, b: string): number {
  let row = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const next = [i];
    for (let j = 1; j <= b.length; j++) {
      next[j] = Math.min(row[j] + 1, next[j - 1] + 1, row[j - 1] + (a[i - 1] === b[j - 1] ? 0 : 1));
    }
    row = next;
  }
  return row[b.length];
}
