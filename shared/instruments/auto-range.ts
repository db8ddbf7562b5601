import type { MeterDefinition, Reading } from './meter.ts';
import { settingOf } from './meters.ts';

/** Share of the counts below which an auto-ranging meter goes one range down. Judgement; below a tenth so that it cannot hunt. */
const DOWN = 0.09;

/**
 * The setting an auto-ranging meter is on after this reading: one range up when it is over, one down
 * when it uses few of its counts. A manual meter stays where its dial is.
 */
export function autoRange(meter: MeterDefinition, settingId: string, reading: Reading): string {
  const setting = settingOf(meter, settingId);
  if (!meter.isAutoRanging || !setting || setting.function === 'off') return settingId;
  const ranges = meter.settings.filter(({ dial }) => dial === setting.dial);
  const place = ranges.indexOf(setting);
  if (reading.isOverRange) return ranges[place + 1]?.id ?? settingId;
  const isLow = reading.counts !== null && Math.abs(reading.counts) < DOWN * meter.counts;
  return isLow ? (ranges[place - 1]?.id ?? settingId) : settingId;
}
