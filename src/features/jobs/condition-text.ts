import type { Condition } from '../../../shared/scenario/scenario.ts';

const texts: Record<Condition, string> = {
  guided: 'Hazards are explained as they happen, and you may step back.',
  unaided: 'Hazards are recorded and shown in the debrief.',
  assessed: 'A hazard costs marks, and the instructor sees the attempt.',
};

/** What a condition means for whoever works under it. */
export const conditionText = (condition: Condition): string => texts[condition];
