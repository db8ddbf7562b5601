/** Median and fastest of `count` runs, ms, after as many again that are not counted. */
export function medianTime(
  count: number,
  run: (turn: number) => void,
): { median: number; fastest: number } {
  for (let turn = 0; turn < count; turn += 1) run(turn);
  const times = Array.from({ length: count }, (_, turn) => {
    const started = performance.now();
    run(turn);
    return performance.now() - started;
  });
  times.sort((p, q) => p - q);
  return { median: times[Math.floor(count / 2)]!, fastest: times[0]! };
}
