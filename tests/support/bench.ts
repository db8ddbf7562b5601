import { readFileSync } from 'node:fs';
import type { BenchCommand } from '../../shared/bench/catalogue.ts';
import { begin } from '../../shared/bench/begin.ts';
import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { RecordedEvent, WireEvent } from '../../shared/bench/event.ts';
import { runCommand } from '../../shared/bench/run-command.ts';
import type { Setup, SetupInput } from '../../shared/bench/setup.ts';
import { makeSetup } from '../../shared/bench/setup.ts';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import { ovenDefinition } from '../../shared/oven/oven.ts';

// From the project's folder, where every test runner starts: jsdom's URLs are none to Node.
const file = readFileSync('scenarios/ovens/larkfield-lc-28.json', 'utf8');
export const lc28 = ovenDefinition.parse(JSON.parse(file));

export const setupWith = (
  faults: readonly AppliedFault[] = [],
  more: Partial<Omit<SetupInput, 'definition' | 'faults'>> = {},
): Setup =>
  makeSetup({
    definition: lc28,
    faults,
    meter: 'manual-2000',
    seed: 417,
    lastRunSecondsAgo: null,
    condition: 'unaided',
    ...more,
  });

/** A bench to do things on; every refusal fails the test unless it is what is asked for. */
export interface Hands {
  setup: Setup;
  state: () => BenchState;
  events: () => readonly WireEvent[];
  /** does it `seconds` later; returns the events */
  does: <T extends BenchCommand['type']>(
    type: T,
    data: Extract<BenchCommand, { type: T }>['data'],
    seconds?: number,
  ) => WireEvent[];
  /** the code of the refusal */
  isRefused: <T extends BenchCommand['type']>(
    type: T,
    data: Extract<BenchCommand, { type: T }>['data'],
  ) => string;
}

/** `started`: where the bench stands when it is not from the beginning. */
export function handsOn(setup: Setup, started = begin(setup)): Hands {
  let state = started.state;
  const events: WireEvent[] = [started.event];
  const at = (seconds: number): number => state.benchMs + Math.round(seconds * 1000);
  return {
    setup,
    state: () => state,
    events: () => events,
    does: (type, data, seconds = 2) => {
      const ran = runCommand(setup, state, { type, data } as BenchCommand, at(seconds));
      if (!ran.ok) throw new Error(`${type} refused: ${ran.refusal.message}`);
      state = ran.state;
      events.push(...ran.events);
      return ran.events;
    },
    isRefused: (type, data) => {
      const ran = runCommand(setup, state, { type, data } as BenchCommand, at(1));
      if (ran.ok) throw new Error(`${type} was not refused`);
      return ran.refusal.code;
    },
  };
}

export const opened = (hands: Hands): Hands => {
  hands.does('PullCord', {});
  hands.does('RemoveCover', {});
  return hands;
};

/** Puts both probes down and reads what the display shows `seconds` later. */
export function reads(hands: Hands, setting: string, red: string, black: string, seconds = 2) {
  if (hands.state().meter.setting !== setting) hands.does('SetMeter', { setting });
  hands.does('PlaceProbe', { probe: 'red', target: red });
  hands.does('PlaceProbe', { probe: 'black', target: black });
  const [event] = hands.does('TakeReading', {}, seconds);
  return event?.data as { display: string; unit: string; value: number | null; isBeeping: boolean };
}

export const recorded = (events: readonly WireEvent[]): RecordedEvent[] =>
  events.map((event, sequence) => ({
    ...event,
    sequence,
    recordedAt: '2026-01-05T08:00:00.000Z',
  }));
