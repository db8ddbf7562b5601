import { once } from 'node:events';
import { Worker } from 'node:worker_threads';
import { drawnSeeds } from './whole-fault-table.ts';

// A thread does not inherit the loader of TypeScript (Node 20): it registers its own.
const script = `import('tsx/esm/api').then(({ register }) => {
  register();
  return import(${JSON.stringify(new URL('./fault-table-thread.ts', import.meta.url).href)});
});`;

/** The whole fault table, the drawn ovens shared out between two threads: its readings, and ms of `count` runs after as many that are not counted. */
export async function onTwoThreads(
  count: number,
): Promise<{ readings: number; median: number; fastest: number }> {
  const threads = [0, 1].map(() => new Worker(script, { eval: true }));
  const shares = [0, 1].map((share) => drawnSeeds.filter((_, at) => at % 2 === share));
  const run = async (): Promise<number> => {
    const answers = threads.map((thread) => once(thread, 'message') as Promise<[number]>);
    threads.forEach((thread, at) => thread.postMessage(shares[at]));
    return (await Promise.all(answers)).reduce((sum, [readings]) => sum + readings, 0);
  };
  let readings = 0;
  const times: number[] = [];
  for (let turn = 0; turn < 2 * count; turn += 1) {
    const started = performance.now();
    readings = await run();
    if (turn >= count) times.push(performance.now() - started);
  }
  await Promise.all(threads.map((thread) => thread.terminate()));
  times.sort((p, q) => p - q);
  return { readings, median: times[Math.floor(count / 2)] ?? NaN, fastest: times[0] ?? NaN };
}
