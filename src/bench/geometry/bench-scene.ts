import type { ProbeHold } from '../../../shared/bench/record.ts';
import type {
  OvenDefinition,
  OvenLead,
  PartKindName,
  TargetRef,
} from '../../../shared/oven/oven.ts';
import type { BenchBox } from './bench-box.ts';
import type { BenchPoint } from './bench-point.ts';

export type ProbeColour = 'red' | 'black';
export type Insulation = OvenLead['insulation'];

/** Text beside a terminal or a part. `tone` is what it lies on, so that its ink can stand out. */
export interface SceneLabel {
  text: string;
  /** middle of the text */ at: BenchPoint;
  box: BenchBox;
  tone: 'on-light' | 'on-dark';
}

export interface ScenePart {
  ref: string;
  kind: PartKindName;
  variant: string | undefined;
  /** upper left corner before turning */ at: BenchPoint;
  size: BenchPoint;
  /** degrees clockwise about the middle */ angle: number;
  name: string;
  label: SceneLabel | null;
  /** its terminals, by id (`1`, `core`), from the part's upper left corner before turning */
  terminals: Readonly<Record<string, BenchPoint>>;
  /** what is printed on the part, line by line */ stamp: readonly string[];
  /** what a look from close shows: 'burnt', 'swollen', 'cracked', 'blown' … */
  looks: readonly string[];
  /** a switch with its actuator in, a relay pulled in, a plug in the outlet */ isActuated: boolean;
  isLit: boolean;
  isTurning: boolean;
  isReplaced: boolean;
  /** held in by hand */ isPressed: boolean;
}

export type TerminalState = 'bare' | 'varnished' | 'cleaned' | 'loose-end';

/** All that a probe can touch: a terminal, a lifted lead end, a pole of the battery. */
export interface SceneTerminal {
  target: TargetRef;
  at: BenchPoint;
  label: SceneLabel | null;
  state: TerminalState;
  isHovered: boolean;
  isFocused: boolean;
  probes: readonly ProbeColour[];
  isReachable: boolean;
}

export interface SceneLeadEnd {
  /** `W12/a` */ target: TargetRef;
  /** the terminal its connector sits on; null: lifted */ seatedOn: string | null;
  /** where the connector is now */ at: BenchPoint;
  /** where it lies when lifted */ hangsAt: BenchPoint;
  /** text of the yellow tag; null: no tag */ label: string | null;
  /** where that tag lies; null: no tag, or no free place */ tag: SceneLabel | null;
}

export interface SceneLead {
  ref: string;
  /** points the curve runs through, from end a to end b, both included */ path: readonly BenchPoint[];
  insulation: Insulation;
  isHighVoltage: boolean;
  /** one of the three leads inside the cord */ isInCord: boolean;
  ends: readonly [SceneLeadEnd, SceneLeadEnd];
}

/** One of the meter's test leads. `at` null: not on a terminal; in hand it follows `handAt`, else it lies at rest. */
export interface SceneProbe {
  colour: ProbeColour;
  at: BenchPoint | null;
  isInHand: boolean;
  hold: ProbeHold;
}

/** The discharge lead, 20 kOhm between clip and tip. A null end lies at rest on the mat. */
export interface SceneDischarge {
  clipAt: BenchPoint | null;
  tipAt: BenchPoint | null;
  inHand: 'clip' | 'tip' | null;
}

/** The battery's own two leads: one from the negative pole, one behind 1 kOhm. */
export interface SceneBattery {
  negAt: BenchPoint | null;
  oneKAt: BenchPoint | null;
  inHand: 'neg' | 'oneK' | null;
}

/** Everything the canvas draws. A value: the canvas keeps nothing of its own. */
export interface BenchScene {
  chassis: BenchBox;
  ovenType: OvenDefinition['type'];
  isCoverOn: boolean;
  isDoorOpen: boolean;
  isCordIn: boolean;
  /** the cord from its plug to where it enters the oven */ cord: readonly BenchPoint[];
  parts: readonly ScenePart[];
  terminals: readonly SceneTerminal[];
  leads: readonly SceneLead[];
  probes: readonly SceneProbe[];
  discharge: SceneDischarge;
  battery: SceneBattery;
  /** where the hand is, for what it holds; null: nowhere over the bench */ handAt: BenchPoint | null;
  /** a target, lead or part under the hand */ hovered: string | null;
  /** a target, lead or part with the keyboard's focus */ focused: string | null;
  /** target to flash once */ hazardFlash: TargetRef | null;
}
