import { createStore } from 'zustand/vanilla';
import type { StoreApi } from 'zustand/vanilla';
import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { BenchCommand } from '../../shared/bench/catalogue.ts';
import type { WireEvent } from '../../shared/bench/event.ts';
import { runCommand } from '../../shared/bench/run-command.ts';
import type { Setup } from '../../shared/bench/setup.ts';
import { tapWith } from '../bench/tools/catalogue.ts';
import type { Hand } from '../bench/tools/tool.ts';
import { emptyHand } from '../bench/tools/tool.ts';
import type { BenchClock } from './bench-clock.ts';
import type { SaveState } from './outbox.ts';

/** What is picked out on the bench: the panel beside it says what can be done there. */
export type Selection = { kind: 'target'; ref: string } | { kind: 'part'; ref: string } | null;

/** What the bench has to say: a refusal to act on, or a hazard that happened. */
export type Notice =
  | { kind: 'refusal'; text: string }
  | { kind: 'hazard'; event: WireEvent; stepBack: number }
  | null;

export interface BenchStore {
  setup: Setup;
  state: BenchState;
  /** the whole record so far, sequence 0 first */ events: readonly WireEvent[];
  hand: Hand;
  selection: Selection;
  hovered: string | null;
  focused: string | null;
  notice: Notice;
  save: SaveState;
  clock: BenchClock;
  /** Runs a command now, or at `atMs`; false when the bench refuses. */
  run: (command: BenchCommand, atMs?: number) => boolean;
  /** A tap on bare metal, with what the hand holds. */ tap: (target: string) => void;
  take: (hand: Hand) => void;
  putDown: () => void;
  select: (selection: Selection) => void;
  hover: (target: string | null) => void;
  focus: (target: string | null) => void;
  dismiss: () => void;
  setSave: (save: SaveState) => void;
  /** Passes `ms` of bench time at once. */ wait: (ms: number) => void;
}

export interface BenchStoreOptions {
  setup: Setup;
  state: BenchState;
  events: readonly WireEvent[];
  clock: BenchClock;
  /** the reader may not act: another tab writes, or it is a replay */ isReadOnly: boolean;
  onEvents: (events: readonly WireEvent[]) => void;
}

/** One bench's own state: what the hand is doing, and the fold of the record so far. */
export function benchStore(options: BenchStoreOptions): StoreApi<BenchStore> {
  const { setup, clock, onEvents } = options;
  return createStore<BenchStore>()((set, get) => ({
    setup,
    clock,
    state: options.state,
    events: options.events,
    hand: emptyHand,
    selection: null,
    hovered: null,
    focused: null,
    notice: null,
    save: options.isReadOnly ? { kind: 'read-only', why: 'This bench is only shown.' } : { kind: 'saved' },

    run: (command, atMs) => {
      const { state, events, save } = get();
      if (save.kind === 'read-only' || save.kind === 'refused') {
        set({ notice: { kind: 'refusal', text: save.why } });
        return false;
      }
      const ran = runCommand(setup, state, command, Math.max(atMs ?? clock.now(), state.benchMs));
      if (!ran.ok) {
        set({ notice: { kind: 'refusal', text: ran.refusal.message } });
        return false;
      }
      const hazard = ran.events.find((event) => event.type === 'HazardHappened');
      set({
        state: ran.state,
        events: [...events, ...ran.events],
        notice: hazard ? { kind: 'hazard', event: hazard, stepBack: events.length } : null,
      });
      onEvents(ran.events);
      return true;
    },

    tap: (target) => {
      const { hand, state, run } = get();
      const tapped = tapWith(hand, target, state);
      if (!tapped) {
        set({ selection: { kind: 'target', ref: target } });
        return;
      }
      if (tapped.command === null || run(tapped.command)) set({ hand: tapped.hand });
    },

    take: (hand) => set({ hand, notice: null }),
    putDown: () => {
      const { hand, state, run } = get();
      if (hand.kind === 'discharge-tip' && state.discharge.tip) {
        run({ type: 'LiftDischargeTip', data: {} });
      }
      set({ hand: emptyHand });
    },
    select: (selection) => set({ selection }),
    hover: (hovered) => get().hovered !== hovered && set({ hovered }),
    focus: (focused) => set({ focused }),
    dismiss: () => set({ notice: null }),
    setSave: (save) => set({ save }),

    wait: (ms) => {
      const { run } = get();
      clock.skip(ms);
      if (!run({ type: 'Wait', data: { ms } })) clock.skip(-ms);
    },
  }));
}
