import type { RecordedEvent } from '../bench/event.ts';
import { shownReading, type ShownReading } from '../bench/record.ts';
import { withoutUndone } from '../bench/undone.ts';
import type { MeterDefinition } from '../instruments/meter.ts';
import { settingOf } from '../instruments/meters.ts';
import type { OvenDefinition } from '../oven/oven.ts';
import type { Measured } from './fault-table.ts';
import { OVER_RANGE } from './fault-table.ts';

/** A reading somebody wrote on the job sheet, with the position the bench was in. */
export interface Observation {
  readonly sequence: number;
  readonly benchMs: number;
  readonly reading: ShownReading;
  readonly measured: Measured;
  /** counts of the display with what REL took off put back; OVER_RANGE for OL */
  readonly counts: number;
}

interface Hands {
  /** lead ends that are not at home, and where they sit */ readonly moved: Map<
    string,
    string | null
  >;
  readonly cleaned: Set<string>;
  readonly pressed: Set<string>;
  isDoorClosed: boolean;
  /** SI, what REL takes off */ relative: number;
}

/**
 * The captured readings of an attempt that say something about the faults: settled, of resistance or
 * a junction, between terminals, with every lead at home or lifted, and before the first repair.
 */
export function observations(
  definition: OvenDefinition,
  meter: MeterDefinition,
  events: readonly RecordedEvent[],
): Observation[] {
  const hands: Hands = {
    moved: new Map(),
    cleaned: new Set(),
    pressed: new Set(),
    isDoorClosed: true,
    relative: 0,
  };
  const found: Observation[] = [];
  for (const event of withoutUndone(events)) {
    if (event.type === 'PartReplaced' || event.type === 'LeadRepaired') break;
    if (event.type !== 'ReadingCaptured') follow(definition, hands, event);
    else {
      const observation = observe(definition, meter, hands, event);
      if (observation) found.push(observation);
    }
  }
  return found;
}

const text = (value: unknown): string => (typeof value === 'string' ? value : '');

function follow(definition: OvenDefinition, hands: Hands, { type, data }: RecordedEvent): void {
  switch (type) {
    case 'LeadLifted':
      hands.moved.set(text(data['end']), null);
      return;
    case 'LeadRefitted': {
      const end = text(data['end']);
      const lead = definition.leads.find(({ ref }) => end.startsWith(`${ref}/`));
      const home = lead?.ends[end.endsWith('a') ? 0 : 1];
      if (home === data['terminal']) hands.moved.delete(end);
      else hands.moved.set(end, text(data['terminal']));
      return;
    }
    case 'SpotCleaned':
      hands.cleaned.add(text(data['terminal']));
      return;
    case 'SwitchPressed':
      hands.pressed.add(text(data['part']));
      return;
    case 'SwitchReleased':
      hands.pressed.delete(text(data['part']));
      return;
    case 'DoorOpened':
    case 'DoorClosed':
      hands.isDoorClosed = type === 'DoorClosed';
      return;
    case 'RelativeSet':
      hands.relative = typeof data['relative'] === 'number' ? data['relative'] : 0;
      return;
    case 'RelativeCleared':
    case 'MeterSet':
      hands.relative = 0;
      return;
  }
}

function observe(
  { parts }: OvenDefinition,
  meter: MeterDefinition,
  hands: Hands,
  { data, sequence, benchMs }: RecordedEvent,
): Observation | null {
  const parsed = shownReading.safeParse(data);
  if (!parsed.success) return null;
  const reading = parsed.data;
  const { red, black, setting: settingId, display, value, isSettled } = reading;
  const setting = settingOf(meter, settingId);
  if (!setting || !['ohms', 'beep', 'diode'].includes(setting.function) || !isSettled) return null;
  if ('scale' in setting === false || (value === null && display !== 'OL')) return null;
  const isElsewhere = [...hands.moved.values()].some((seat) => seat !== null);
  if (
    isElsewhere ||
    [red, black].some((target) => target.includes('/') || target.startsWith('BAT'))
  )
    return null;
  const switches = parts.filter(({ kind }) => kind === 'door-switch').map(({ ref }) => ref);
  const { scale } = setting;
  const pressed = hands.isDoorClosed ? [...hands.pressed, ...switches] : [...hands.pressed];
  return {
    sequence,
    benchMs,
    reading,
    measured: {
      between: [red, black],
      setting: settingId,
      lift: [...hands.moved.keys()],
      clean: [...hands.cleaned],
      press: [...new Set(pressed)],
    },
    counts:
      value === null
        ? OVER_RANGE
        : Math.round(((value + hands.relative) / scale.size) * Number(`1e${scale.decimals}`)),
  };
}
