import type { Element, NodeName } from '../engine/circuit/circuit.ts';
import type { AppliedFault, FaultKind } from './fault.ts';
import type { PartKindName } from './oven.ts';

export interface TerminalKind {
  id: string;
  /** in words: "line out", "heater terminal" */ name: string;
  /** metal under varnish: an ohmmeter sees nothing until a spot is cleaned */ isVarnished?: boolean;
  /** the part's body, bolted to the chassis */ isBody?: boolean;
}

export interface ValueKind {
  name: string;
  unit: string;
  nominal: number;
  /** relative, uniform: 0.05 draws nominal x (0.95 to 1.05) */ tolerance: number;
  source: string;
}

/** What a part's circuit is made from. */
export interface PartContext {
  ref: string;
  variant: string | undefined;
  /** drawn values, before faults */ values: Readonly<Record<string, number>>;
  /** one drawn value by name; asking for a value the kind does not declare is a bug and throws */
  value: (name: string) => number;
  /** faults on this part only */ faults: readonly AppliedFault[];
  node: (terminal: string) => NodeName;
  /** an element or inner node name unique to this part: `C1:bleeder` */ inner: (
    name: string,
  ) => string;
  /** a door switch whose lever is in: the door is closed, or a hand holds it */ isActuated: boolean;
  /** held by hand: a lever pressed, a knob turned up */ isPressed: boolean;
  isOpened: boolean;
  isEnergised: boolean;
  /** a magnetron whose heater has run long enough to emit; cold on the bench */ isHot: boolean;
}

/** What a powered run asks of a part of one kind, by the inner names of its elements. */
export interface Running {
  /** what starts the oven holds it closed: a relay pulled in, a timer turned up */ isSwitchedOn?: boolean;
  /** a filament alight, a cathode that emits: hot in a run */ isHot?: boolean;
  /** the element whose current melts it */ melts?: string;
  /** its winding turns something, unless one of these faults stops it */
  turns?: { winding: string; stoppedBy: readonly string[] };
  /** the winding whose current is heard */ hums?: string;
  /** elements whose power is seen or felt */ powers?: readonly string[];
}

/** Sizes a new part can be had in. One that is not the oven's own is a fault of the repair. */
export interface Spares {
  /** the value that is the size */ value: string;
  unit: string;
  sizes: readonly number[];
  wrongSize: { fault: string; parameter: string };
}

/** One kind of part: its terminals, values, faults and circuit. One file each in `parts/`. */
export interface PartKind {
  kind: PartKindName;
  name: string;
  /** variants a definition may name; absent: the kind has none */ variants?: readonly string[];
  /** the variant of a part that names none; absent: a part has to name one */ usual?: string;
  terminals: (variant: string | undefined) => readonly TerminalKind[];
  values: Readonly<Record<string, ValueKind>>;
  faults: readonly FaultKind[];
  /** what a hand can hold or turn on it, and in words how */ actuator?: {
    hold: string;
    letGo: string;
    /** before its reference: "press S1" */ inShort: string;
  };
  running?: Running;
  /** new ones of other sizes lie in the drawer too */ spares?: Spares;
  circuit: (part: PartContext) => Element[];
}
