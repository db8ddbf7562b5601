// A thread does not inherit the loader that compiles the sources, so in development and in tests it
// begins here. The build never comes this way.
import { workerData } from 'node:worker_threads';
import { register } from 'tsx/esm/api';

register();
await import(workerData);
