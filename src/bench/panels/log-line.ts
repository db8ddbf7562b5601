import { describeEvent } from '../../../shared/bench/describe.ts';
import type { WireEvent } from '../../../shared/bench/event.ts';
import { runOutcome } from '../../../shared/bench/record.ts';
import type { MeterDefinition } from '../../../shared/instruments/meter.ts';
import { settingOf } from '../../../shared/instruments/meters.ts';
import { runLine } from './run-words.ts';

/**
 * One line of the bench log: the meter's settings by name, and of a run only what can be seen and
 * heard, never which fuse or cut-out opened.
 */
export function logLine(meter: MeterDefinition, event: WireEvent): string {
  if (event.type === 'MeterSet') {
    const setting = settingOf(meter, String(event.data['setting']));
    return `meter to ${setting?.name ?? String(event.data['setting'])}`;
  }
  const run = event.type === 'OvenRun' ? runOutcome.safeParse(event.data) : null;
  return run?.success ? runLine(run.data) : describeEvent(event);
}
