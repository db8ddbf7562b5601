import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { CapturedReading } from '../../../shared/bench/record.ts';
import { heldWords } from '../../../shared/bench/test-leads.ts';
import { partOfReading } from './part-of-target.ts';

/** Captured readings under the part they say something about; under `''` those that fit none. */
export function readingsByPart({ sheet, oven }: BenchState): Map<string, CapturedReading[]> {
  const found = new Map<string, CapturedReading[]>();
  for (const reading of sheet.readings) {
    const leadEnds = asThen(oven.leadEnds, reading.lifted);
    const part = partOfReading({ ...oven, leadEnds }, reading.red, reading.black) ?? '';
    found.set(part, [...(found.get(part) ?? []), reading]);
  }
  return found;
}

/** What was lifted when the reading was written is loose, whatever was refitted since. */
const asThen = (
  leadEnds: BenchState['oven']['leadEnds'],
  lifted: readonly string[],
): BenchState['oven']['leadEnds'] => ({
  ...leadEnds,
  ...Object.fromEntries(lifted.map((end) => [end, null])),
});

/** `94.8 Ω on 200 Ω`, `OL on 20 MΩ`, `0.1 Ω on beep, beeps` */
export function readingText(reading: CapturedReading, settingName: string): string {
  const shown = reading.display === 'OL' ? 'OL' : `${reading.display} ${reading.unit}`;
  const more = [
    reading.isBeeping ? 'beeps' : '',
    reading.isRelative ? 'REL' : '',
    heldWords(reading.held),
    reading.isSettled ? '' : 'not settled',
  ].filter(Boolean);
  return [`${shown} on ${settingName}`, ...more].join(', ');
}
