import type { ReasoningAnswers, ReasoningQuestion } from './reasoning-question.ts';

/** Some old or small browsers have no threads: what takes seconds is then left out. */
export const canReason = (): boolean => typeof Worker !== 'undefined';

/** Asks on a thread of its own, which ends with the answer or when nobody waits for it any more. */
export function askReasoning<K extends ReasoningQuestion['kind']>(
  question: Extract<ReasoningQuestion, { kind: K }>,
  signal: AbortSignal,
): Promise<ReasoningAnswers[K]> {
  const worker = new Worker(new URL('./reasoning-worker.ts', import.meta.url), { type: 'module' });
  return new Promise<ReasoningAnswers[K]>((resolve, reject) => {
    signal.addEventListener('abort', () => reject(new Error('nobody waits for it')));
    worker.addEventListener('error', () => reject(new Error('the computation broke off')));
    worker.addEventListener('message', ({ data }: MessageEvent<ReasoningAnswers[K]>) =>
      resolve(data),
    );
    worker.postMessage(question);
  }).finally(() => worker.terminate());
}
