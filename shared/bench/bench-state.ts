import type { Storage } from '../engine/circuit/circuit.ts';
import type { LeadEndRef, PartRef, TargetRef } from '../oven/oven.ts';
import type { OvenState } from '../oven/oven-state.ts';
import type {
  CapturedReading,
  Cause,
  Hazard,
  ProbeColour,
  ProbeHold,
  RunOutcome,
  Verdict,
} from './record.ts';

/** Magnetrons cooling in still air since a run, and the cut-outs that close again on the way. */
export interface Warmth {
  /** ms of bench time at which the degrees were so */ atMs: number;
  celsius: Readonly<Record<PartRef, number>>;
  closings: readonly { part: PartRef; atMs: number }[];
}

/** Everything that is so on the bench at one moment: the fold of the attempt's events. Times in ms of bench time. */
export interface BenchState {
  benchMs: number;
  /** of it, what nobody sat through: waits, and runs as they were ordered */ skippedMs: number;
  isCordIn: boolean;
  isCoverOn: boolean;
  /** what is seen of the oven while it stands plugged in; null: it has no display */
  isDisplayLit: boolean | null;
  /** plugged in, it runs although nobody has started it */ runsByItself: boolean;
  oven: OvenState;
  labels: Readonly<Record<LeadEndRef, string>>;
  probes: Readonly<Record<ProbeColour, TargetRef | null>>;
  /** how each probe is held, on a target or on its way */
  holds: Readonly<Record<ProbeColour, ProbeHold>>;
  meter: {
    setting: string;
    /** what REL subtracts, in the unit of the setting; null: off */ relative: number | null;
    isDestroyed: boolean;
    /** the meter's own low-pass, V; null: nothing yet */ lag: number | null;
  };
  /** the discharge lead: 20 kOhm between its clip and its tip */
  discharge: { clip: TargetRef | null; tip: TargetRef | null };
  /** the 12.6 V battery's own two leads: one from its negative pole, one behind 1 kOhm */
  battery: { neg: TargetRef | null; oneK: TargetRef | null };
  storage: Storage;
  /** what the last run left warm; absent: everything is at room temperature */ warmth?: Warmth;
  replaced: readonly PartRef[];
  inspected: readonly PartRef[];
  sheet: {
    readings: readonly CapturedReading[];
    verdicts: Readonly<Record<PartRef, Verdict>>;
    causes: readonly Cause[];
    report: { repair: string; customer: string };
  };
  runs: readonly RunOutcome[];
  hazards: readonly Hazard[];
  isHandedIn: boolean;
  /** null: nothing to go back on, or not in this condition */ wayBack: WayBack | null;
}

/**
 * The way back to before the last thing done. It is offered, in guided practice, from the hazard that
 * this thing brought until the next thing is done. What the meter does of itself meanwhile is nobody's
 * doing and leaves the offer standing.
 */
export interface WayBack {
  /** the bench just before, its own way back forgotten */ before: BenchState;
  /** what was done: the type of its event */ done: string;
  /** when, ms of bench time */ atMs: number;
  isOffered: boolean;
}
