import type { RecordedEvent } from '../../shared/bench/event.ts';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import type { OvenDefinition } from '../../shared/oven/oven.ts';
import type { StepCurve } from '../../shared/reasoning/step-curve.ts';
import type { ToldApart } from '../../shared/reasoning/told-apart.ts';

interface Asked {
  definition: OvenDefinition;
  /** id of the meter handed out */ meter: string;
}

/** What can be asked of the reasoning thread. */
export type ReasoningQuestion =
  | (Asked & { kind: 'step curve'; events: readonly RecordedEvent[] })
  | (Asked & { kind: 'told apart'; faults: readonly AppliedFault[] });

export interface ReasoningAnswers {
  'step curve': StepCurve;
  'told apart': ToldApart;
}
