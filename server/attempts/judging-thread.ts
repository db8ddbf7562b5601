import type { Worker } from 'node:worker_threads';
import type { Answered, Asked, JudgeAnswers, JudgeTask } from './judge-task.ts';

interface Waiting {
  resolve: (value: unknown) => void;
  reject: (error: unknown) => void;
}

/** A thread that judges. It is started when first asked, and again after it broke down. */
export class JudgingThread {
  readonly #start: () => Worker;
  #worker: Worker | null = null;
  #count = 0;
  readonly #waiting = new Map<number, Waiting>();

  constructor(start: () => Worker) {
    this.#start = start;
  }

  /** how many tasks are not done yet */
  get load(): number {
    return this.#waiting.size;
  }

  /** @throws what the rules threw, or why the thread ended */
  ask<K extends JudgeTask['kind']>(
    task: Extract<JudgeTask, { kind: K }>,
  ): Promise<JudgeAnswers[K]> {
    const worker = (this.#worker ??= this.#open());
    const number = (this.#count += 1);
    return new Promise<JudgeAnswers[K]>((resolve, reject) => {
      this.#waiting.set(number, { resolve: resolve as Waiting['resolve'], reject });
      worker.postMessage({ number, task } satisfies Asked);
    });
  }

  async stop(): Promise<void> {
    await this.#worker?.terminate();
  }

  #open(): Worker {
    const worker = this.#start();
    worker.unref();
    worker.on('message', (answered: Answered) => {
      const waiting = this.#waiting.get(answered.number);
      this.#waiting.delete(answered.number);
      if ('error' in answered) waiting?.reject(answered.error);
      else waiting?.resolve(answered.value);
    });
    const fail = (error: unknown): void => this.#fail(worker, error);
    worker.on('error', fail);
    worker.on('exit', () => fail(new Error('the judging thread ended')));
    return worker;
  }

  /** After a thread is replaced, what is still heard of it concerns nobody. */
  #fail(worker: Worker, error: unknown): void {
    if (this.#worker !== worker) return;
    this.#worker = null;
    for (const { reject } of this.#waiting.values()) reject(error);
    this.#waiting.clear();
  }
}
