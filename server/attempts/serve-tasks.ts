import type { MessagePort } from 'node:worker_threads';
import type { AttemptRules } from './attempt-rules.ts';
import { doTask, type Answered, type Asked } from './judge-task.ts';

/** The judging thread's own side: does tasks as they come. */
export function serveTasks(port: MessagePort, rules: AttemptRules): void {
  port.on('message', ({ number, task }: Asked) => {
    try {
      port.postMessage({ number, value: doTask(rules, task) } satisfies Answered);
    } catch (error) {
      port.postMessage({ number, error } satisfies Answered);
    }
  });
}
