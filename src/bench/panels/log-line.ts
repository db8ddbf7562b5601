import { describeEvent } from '../../../shared/bench/describe.ts';
import type { WireEvent } from '../../../shared/bench/event.ts';
import type { MeterDefinition } from '../../../shared/instruments/meter.ts';
import { settingOf } from '../../../shared/instruments/meters.ts';

/** One line of the bench log: the meter's settings by name. */
export function logLine(meter: MeterDefinition, event: WireEvent): string {
  if (event.type === 'MeterSet') {
    const setting = settingOf(meter, String(event.data['setting']));
    return `meter to ${setting?.name ?? String(event.data['setting'])}`;
  }
  return describeEvent(event);
}
