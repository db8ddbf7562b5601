/** Edit distance of Levenshtein (1966): insertions, deletions, substitutions. */
function distance(from: string, to: string): number {
  let row = Array.from({ length: to.length + 1 }, (_, index) => index);
  for (let i = 1; i <= from.length; i += 1) {
    const next = [i];
    for (let j = 1; j <= to.length; j += 1) {
      const substituted = (row[j - 1] ?? 0) + (from[i - 1] === to[j - 1] ? 0 : 1);
      next.push(Math.min(substituted, (row[j] ?? 0) + 1, (next[j - 1] ?? 0) + 1));
    }
    row = next;
  }
  return row[to.length] ?? 0;
}

/** The known name most like a misspelt one; null when none is near. */
export function nearestName(wrong: string, known: readonly string[]): string | null {
  const limit = Math.max(2, Math.floor(wrong.length / 3));
  let best: { name: string; off: number } | null = null;
  for (const name of known) {
    const off = distance(wrong.toLowerCase(), name.toLowerCase());
    if (off <= limit && (best === null || off < best.off)) best = { name, off };
  }
  return best?.name ?? null;
}
