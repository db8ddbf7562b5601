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

function sharedStart(one: string, other: string): number {
  let length = 0;
  while (length < one.length && one[length] === other[length]) length += 1;
  return length;
}

/** The known name most like a misspelt one, among equals the one that starts alike; null when none is near. */
export function nearestName(wrong: string, known: readonly string[]): string | null {
  const limit = Math.max(2, Math.floor(wrong.length / 3));
  const near = known
    .map((name) => ({
      name,
      off: distance(wrong.toLowerCase(), name.toLowerCase()),
      start: sharedStart(wrong, name),
    }))
    .filter(({ off }) => off <= limit)
    .sort((one, other) => one.off - other.off || other.start - one.start);
  return near[0]?.name ?? null;
}
