import type { Storage } from '../engine/circuit/circuit.ts';
import type { LeadEndRef, PartRef, TargetRef } from '../oven/oven.ts';
import type { OvenState } from '../oven/oven-state.ts';
import type { CapturedReading, Cause, Hazard, RunOutcome, Verdict } from './record.ts';

export type ProbeColour = 'red' | 'black';

/** Everything that is so on the bench at one moment: the fold of the attempt's events. Times in ms of bench time. */
export interface BenchState {
  benchMs: number;
  isCordIn: boolean;
  isCoverOn: boolean;
  /** what is seen of the oven while it stands plugged in */ isDisplayLit: boolean;
  oven: OvenState;
  labels: Readonly<Record<LeadEndRef, string>>;
  probes: Readonly<Record<ProbeColour, TargetRef | null>>;
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
}
