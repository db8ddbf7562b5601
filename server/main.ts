import { isMainThread, parentPort } from 'node:worker_threads';

// One entry for two: the server, and the judging threads that it starts from this same file. Each
// loads only what it needs.
if (isMainThread) {
  const { startServer } = await import('./start-server.ts');
  await startServer(process.env, new URL(import.meta.url));
} else if (parentPort) {
  const { serveTasks } = await import('./attempts/serve-tasks.ts');
  const { attemptRules } = await import('./attempts/attempt-rules.ts');
  serveTasks(parentPort, attemptRules);
}
