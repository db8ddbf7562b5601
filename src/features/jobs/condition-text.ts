import type { Condition } from '../../../shared/scenario/scenario.ts';

const texts: Record<Condition, string> = {
  guided: 'Guided: hazards are explained as they happen, and you may step back.',
  unaided: 'Unaided: hazards are recorded and shown to you in the debrief.',
  assessed: 'Assessed: a hazard costs marks, and your instructor sees the attempt.',
};

export const conditionText = (condition: Condition): string => texts[condition];
