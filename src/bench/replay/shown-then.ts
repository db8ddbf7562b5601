import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { WireEvent } from '../../../shared/bench/event.ts';
import { shownReading, type ShownReading } from '../../../shared/bench/record.ts';

/**
 * The recorded reading that stood on the display at a moment: the last one taken or written down with
 * the tips and the setting as they are then. Null: the record has none, and none is made up.
 */
export function shownThen(
  events: readonly WireEvent[],
  sequence: number,
  { probes, meter }: BenchState,
): ShownReading | null {
  if (meter.setting === 'off' || meter.isDestroyed) return null;
  for (let i = sequence; i >= 0; i -= 1) {
    const event = events[i];
    if (!event || changesDisplay.has(event.type)) return null;
    if (event.type !== 'ReadingTaken' && event.type !== 'ReadingCaptured') continue;
    const parsed = shownReading.safeParse(event.data);
    if (!parsed.success) return null;
    const { red, black, setting } = parsed.data;
    const isSame = red === probes.red && black === probes.black && setting === meter.setting;
    return isSame ? parsed.data : null;
  }
  return null;
}

/** After these the display shows something new until it is read again. */
const changesDisplay = new Set([
  'ProbePlaced',
  'ProbeRemoved',
  'ProbeHeld',
  'MeterSet',
  'RelativeSet',
  'RelativeCleared',
  'LeadLifted',
  'LeadRefitted',
  'SpotCleaned',
  'PartReplaced',
  'SwitchPressed',
  'SwitchReleased',
  'DoorOpened',
  'DoorClosed',
  'CordPlugged',
  'CordPulled',
  'OvenRun',
  'SteppedBack',
]);
