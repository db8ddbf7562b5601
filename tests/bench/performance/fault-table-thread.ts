import { parentPort } from 'node:worker_threads';
import { wholeFaultTable } from './whole-fault-table.ts';

parentPort?.on('message', (seeds: readonly number[]) =>
  parentPort?.postMessage(wholeFaultTable(seeds)),
);
