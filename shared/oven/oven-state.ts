import type { AppliedFault } from './fault.ts';
import type { LeadEndRef, OvenDefinition, PartRef, TargetRef, TerminalRef } from './oven.ts';

/** An oven drawn from a seed: every value of every part, SI units, within its tolerance. */
export interface DrawnOven {
  definition: OvenDefinition;
  seed: number;
  values: Readonly<Record<PartRef, Readonly<Record<string, number>>>>;
}

/** All that decides how the oven's circuit is connected at one moment. */
export interface OvenState {
  faults: readonly AppliedFault[];
  /** where each lead end sits; null: lifted, lying loose */
  leadEnds: Readonly<Record<LeadEndRef, TerminalRef | null>>;
  isDoorClosed: boolean;
  /** parts held by hand: door switches pressed, a timer turned up */ pressed: readonly PartRef[];
  /** fuses blown and cut-outs open */ opened: readonly PartRef[];
  /** parts that what starts the oven holds closed: relays pulled in, a timer turned up */ energised: readonly PartRef[];
  /** varnished spots cleaned to bare metal */ cleaned: readonly TerminalRef[];
  /** magnetrons whose heater is hot enough to emit: in a powered run only */ hot?: readonly PartRef[];
}

/** Something of the bench connected between two targets: meter, discharge lead, battery, a hand. */
export interface BenchBranch {
  name: string;
  from: TargetRef;
  to: TargetRef;
  /** Ohm, in series */ resistance: number;
  /** V, positive at `from`; 0: only a resistor */ volts: number;
}
