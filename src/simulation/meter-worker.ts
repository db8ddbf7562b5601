import { meterAt } from '../../shared/bench/reading.ts';
import type { Setup } from '../../shared/bench/setup.ts';
import type { MeterAnswer, MeterQuestion } from './meter-reader.ts';

let setup: Setup | null = null;

/** The first message is the setup of the attempt, every other one a question. */
self.addEventListener('message', ({ data }: MessageEvent<Setup | MeterQuestion>) => {
  if (!('atMs' in data)) {
    setup = data;
    return;
  }
  if (!setup) throw new Error('a question before the setup');
  const answer: MeterAnswer = { id: data.id, view: meterAt(setup, data.state, data.atMs) };
  self.postMessage(answer);
});
