import { openingSeconds, surveySeconds } from './actions/safety-checks.ts';
import { waitLimits } from './actions/time.ts';
import type { WireEvent } from './event.ts';

/** ms of bench time that an event says nobody sat through: a wait, a run ordered at the panel or made for a check. */
export function skippedMs({ type, data }: WireEvent): number {
  if (type === 'TimePassed') return clamped(data['ms'], waitLimits.longest);
  if (type === 'OvenRun') return clamped(data['ordered'], 300) * 1000;
  if (type === 'LeakageSurveyed') return surveySeconds * 1000;
  if (type === 'InterlocksChecked') return openingSeconds * 1000;
  return 0;
}

const clamped = (claimed: unknown, most: number): number =>
  typeof claimed === 'number' ? Math.min(Math.max(claimed, 0), most) : 0;
