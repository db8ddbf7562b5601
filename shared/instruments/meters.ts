import { auto6000 } from './auto-6000.ts';
import { manual2000 } from './manual-2000.ts';
import type { MeterDefinition, Setting } from './meter.ts';

export const meters: readonly MeterDefinition[] = [manual2000, auto6000];

/** The meter of that id; asking for one that does not exist is a bug and throws (scenarios are parsed before). */
export function meterById(id: string): MeterDefinition {
  const meter = meters.find((candidate) => candidate.id === id);
  if (!meter) throw new Error(`no meter ${id}`);
  return meter;
}

/** A setting by its id (`ohms-200`); null when the meter has none such. */
export function settingOf(meter: MeterDefinition, settingId: string): Setting | null {
  return meter.settings.find(({ id }) => id === settingId) ?? null;
}
