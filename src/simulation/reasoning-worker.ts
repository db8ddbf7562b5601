import { meterById } from '../../shared/instruments/meters.ts';
import { stepCurve } from '../../shared/reasoning/step-curve.ts';
import { toldApart } from '../../shared/reasoning/told-apart.ts';
import type { ReasoningAnswers, ReasoningQuestion } from './reasoning-question.ts';

/** One question, one answer: whoever asked ends the thread. */
self.addEventListener('message', ({ data }: MessageEvent<ReasoningQuestion>) => {
  self.postMessage(answer(data));
});

function answer(question: ReasoningQuestion): ReasoningAnswers[ReasoningQuestion['kind']] {
  const meter = meterById(question.meter);
  switch (question.kind) {
    case 'step curve':
      return stepCurve(question.definition, meter, question.events);
    case 'told apart':
      return toldApart(question.definition, meter, question.faults);
  }
}
