import { Worker } from 'node:worker_threads';

/** A judging thread that runs the server's entry, be it a source or built. */
export function startJudge(entry: URL): Worker {
  if (!entry.pathname.endsWith('.ts')) return new Worker(entry);
  return new Worker(new URL('./compile-first.mjs', import.meta.url), { workerData: entry.href });
}
