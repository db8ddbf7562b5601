import { sameThread, type Answer, type BenchThread, type Question } from './bench-thread.ts';

let bench: BenchThread | null = null;

/** The first message brings the attempt's setup, every other one a question. */
self.addEventListener('message', ({ data }: MessageEvent<Question>) => {
  void answer(data);
});

async function answer(question: Question): Promise<void> {
  if (question.kind === 'begin') {
    bench = sameThread(question.setup);
    return;
  }
  if (!bench) throw new Error('a question before the setup');
  const { id, state, atMs } = question;
  const value =
    question.kind === 'read'
      ? await bench.read(state, atMs)
      : await bench.run(state, question.command, atMs);
  self.postMessage({ id, value } satisfies Answer);
}
