import { createStore } from 'zustand/vanilla';
import type { StoreApi } from 'zustand/vanilla';
import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { BenchCommand } from '../../shared/bench/catalogue.ts';
import type { WireEvent } from '../../shared/bench/event.ts';
import { lastsSeconds, type LastingCommand } from '../../shared/bench/lasting.ts';
import type { MeterView } from '../../shared/bench/reading.ts';
import { runCommand, type Ran } from '../../shared/bench/run-command.ts';
import type { Setup } from '../../shared/bench/setup.ts';
import { isMetersOwn } from '../../shared/bench/way-back.ts';
import type { Condition } from '../../shared/scenario/scenario.ts';
import { tapWith } from '../bench/tools/catalogue.ts';
import { takenOff } from '../bench/tools/taken-off.ts';
import type { Hand } from '../bench/tools/tool.ts';
import { emptyHand } from '../bench/tools/tool.ts';
import type { BenchClock } from './bench-clock.ts';
import type { BenchThread } from './bench-thread.ts';
import { isClosedTo, type SaveState } from './save-state.ts';

/** What is picked out on the bench: the panel beside it says what can be done there. */
export type Selection =
  { kind: 'target'; ref: string } | { kind: 'part'; ref: string } | { kind: 'lead'; ref: string };

/** What the bench has to say: a refusal to act on, or a hazard that happened. `id` counts up, so that the same words twice are news twice. */
export type Notice =
  { kind: 'refusal'; id: number; text: string } | { kind: 'hazard'; id: number; event: WireEvent };

export interface BenchStore {
  setup: Setup;
  condition: Condition;
  state: BenchState;
  /** the whole record so far, sequence 0 first */ events: readonly WireEvent[];
  hand: Hand;
  selection: Selection | null;
  /** a target, lead or part under the pointer */ hovered: string | null;
  /** the one with the keyboard's focus */ focused: string | null;
  notice: Notice | null;
  /** what the display shows now; null: nothing */ view: MeterView | null;
  save: SaveState;
  /** s ordered, while the run is being worked out */ running: number | null;
  clock: BenchClock;
  /** Runs a command now, or at `atMs`; false when the bench refuses. */
  run: (command: BenchCommand, atMs?: number) => boolean;
  /** A tap on bare metal, with what the hand holds. */ tap: (target: string) => void;
  /** Into the hand; what is connected somewhere comes off first. */ take: (hand: Hand) => void;
  putDown: () => void;
  /** What was dragged is let go over a target, or over nothing. */ drop: (
    target: string | null,
  ) => void;
  select: (selection: Selection | null) => void;
  hover: (ref: string | null) => void;
  focus: (ref: string | null) => void;
  dismiss: () => void;
  show: (view: MeterView | null) => void;
  setSave: (save: SaveState) => void;
  /** Passes `ms` of bench time at once. */ wait: (ms: number) => void;
  /** The oven run, alone or under a check: bench time goes on to the end of the run. */
  operate: (command: LastingCommand) => Promise<void>;
}

export interface BenchStoreOptions {
  setup: Setup;
  condition: Condition;
  state: BenchState;
  events: readonly WireEvent[];
  clock: BenchClock;
  save: SaveState;
  /** where a run of the oven is worked out */ thread: Pick<BenchThread, 'run'>;
  onEvents: (events: readonly WireEvent[]) => void;
}

type Set = StoreApi<BenchStore>['setState'];
type Get = StoreApi<BenchStore>['getState'];

/** One bench's own state: what the hand is doing, and the fold of the record so far. */
export function benchStore(options: BenchStoreOptions): StoreApi<BenchStore> {
  return createStore<BenchStore>()((set, get) => ({
    setup: options.setup,
    condition: options.condition,
    clock: options.clock,
    state: options.state,
    events: options.events,
    hand: emptyHand,
    selection: null,
    hovered: null,
    focused: null,
    notice: null,
    view: null,
    save: options.save,
    running: null,
    ...acting(options, set, get),
    ...handling(set, get),
    select: (selection) => set({ selection }),
    hover: (hovered) => {
      if (get().hovered !== hovered) set({ hovered });
    },
    focus: (focused) => {
      if (get().focused !== focused) set({ focused });
    },
    dismiss: () => set({ notice: null }),
    show: (view) => set({ view }),
    setSave: (save) => set({ save }),
  }));
}

function acting(
  { setup, clock, onEvents, thread }: BenchStoreOptions,
  set: Set,
  get: Get,
): Pick<BenchStore, 'run' | 'wait' | 'operate'> {
  const refuse = (text: string): false => {
    set({ notice: { kind: 'refusal', id: nextId(get().notice), text } });
    return false;
  };
  const run: BenchStore['run'] = (command, atMs) => {
    const { state, save, running } = get();
    if (isClosedTo(save)) return refuse(save.why);
    if (running !== null) return refuse('The oven is running. Wait for the end of the run.');
    return land(
      command,
      runCommand(setup, state, command, Math.max(atMs ?? clock.now(), state.benchMs)),
    );
  };
  const land = (command: BenchCommand, ran: Ran): boolean => {
    const { state, events, notice, hand } = get();
    if (!ran.ok) return refuse(ran.refusal.message);
    const hazard = ran.events.find((event) => event.type === 'HazardHappened');
    const isStillNews =
      notice?.kind === 'hazard' && ran.events.every((event) => isMetersOwn(setup, state, event));
    set({
      state: ran.state,
      events: [...events, ...ran.events],
      notice: hazard
        ? { kind: 'hazard', id: nextId(notice), event: hazard }
        : isStillNews
          ? notice
          : null,
      // What happened comes before what was being looked at.
      ...(hazard ? { selection: null } : {}),
      ...(command.type === 'StepBack' ? { hand: handAfter(hand, ran.state) } : {}),
    });
    onEvents(ran.events);
    return true;
  };
  const pass = (ms: number, command: BenchCommand): void => {
    clock.skip(ms);
    if (!run(command)) clock.skip(-ms);
  };
  return {
    run,
    wait: (ms) => pass(ms, { type: 'Wait', data: { ms } }),
    operate: async (command) => {
      const { state, save, running } = get();
      if (running !== null || isClosedTo(save)) return;
      const seconds = lastsSeconds(command);
      set({ running: seconds });
      clock.skip(seconds * 1000);
      const ran = await thread
        .run(state, command, Math.max(clock.now(), state.benchMs))
        .catch(() => null);
      set({ running: null });
      if (ran ? land(command, ran) : refuse(notWorkedOut)) return;
      clock.skip(-seconds * 1000);
    },
  };
}

const notWorkedOut = 'This machine could not work out the run. Nothing happened: try again.';

/** Stepping back empties the hand, but for a tip that is held where it was. */
const handAfter = (hand: Hand, { discharge }: BenchState): Hand =>
  hand.kind === 'discharge-tip' && discharge.tip ? hand : emptyHand;

const nextId = (notice: Notice | null): number => (notice?.id ?? 0) + 1;

function handling(set: Set, get: Get): Pick<BenchStore, 'tap' | 'take' | 'putDown' | 'drop'> {
  return {
    tap: (target) => {
      const { hand, state, run } = get();
      const tapped = tapWith(hand, target, state);
      if (!tapped) {
        set({ selection: { kind: 'target', ref: target } });
        return;
      }
      if (tapped.command === null || run(tapped.command)) set({ hand: tapped.hand });
    },
    take: (hand) => {
      const { state, run, putDown } = get();
      putDown();
      const off = takenOff(hand, state);
      if (off === null || run(off)) set({ hand, selection: null });
    },
    drop: (target) => {
      const { hand, tap, putDown } = get();
      if (target === null) return putDown();
      tap(target);
      // The next tool comes to the hand only when tools are carried from place to place by tapping.
      if (hand.kind !== 'discharge-tip' || get().hand !== hand) set({ hand: emptyHand });
    },
    putDown: () => {
      const { hand, state, run } = get();
      // The tip of the discharge lead is held by hand: let go, it is off.
      if (hand.kind === 'discharge-tip' && state.discharge.tip)
        run({ type: 'LiftDischargeTip', data: {} });
      if (hand.kind !== 'empty') set({ hand: emptyHand });
    },
  };
}
