import { z } from 'zod';
import { leadRef, partRef } from '../oven/oven.ts';

/** `C1.1`, `W12/a`, `BAT.pos`: all that a probe, a clip or a tip can touch. */
export const target = z
  .string()
  .regex(/^([A-Z]{1,3}[0-9]{0,2}\.[A-Za-z0-9]{1,6}|W[0-9]{1,3}\/[ab])$/, 'a terminal or lead end');

export const probeColour = z.enum(['red', 'black']);
export type ProbeColour = z.infer<typeof probeColour>;

/** By its insulated handle, through a clip lead, or with the metal of the tip between the fingers. */
export const probeHold = z.enum(['handle', 'clip', 'fingers']);
export type ProbeHold = z.infer<typeof probeHold>;

/** What the display showed. Judged once, kept for ever: later engines never rewrite it. */
export const shownReading = z.strictObject({
  red: target,
  black: target,
  setting: z.string().max(24),
  /** as on the display: "94.8", "OL" */ display: z.string().max(12),
  unit: z.string().max(4),
  /** SI; null when over range */ value: z.number().nullable(),
  isSettled: z.boolean(),
  isBeeping: z.boolean(),
  isRelative: z.boolean(),
  /** how the tips were held; absent: both by the handle */
  held: z.strictObject({ red: probeHold, black: probeHold }).optional(),
});
export type ShownReading = z.infer<typeof shownReading>;

export interface CapturedReading extends ShownReading {
  benchMs: number;
  /** lead ends that were lifted */ lifted: readonly string[];
}

export const verdict = z.enum(['good', 'faulty', 'not tested']);
export type Verdict = z.infer<typeof verdict>;

/** A cause the trainee states: a part or lead, and what is wrong with it. */
export const cause = z.strictObject({
  on: z.union([partRef, leadRef]),
  fault: z.string().regex(/^[a-z0-9-]+$/),
});
export type Cause = z.infer<typeof cause>;

export const hazardKind = z.enum([
  'shock',
  'mains-exposed',
  'microwave-leakage',
  'live-probing',
  'capacitor-shorted',
  'ohms-on-live',
  'meter-destroyed',
]);

export const hazard = z.strictObject({
  kind: hazardKind,
  at: target.nullable(),
  /** the other side of what was bridged */ to: target.nullable(),
  /** V between the thing touched and chassis */ volts: z.number(),
  /** C */ charge: z.number(),
  /** J */ energy: z.number(),
});
export type Hazard = z.infer<typeof hazard> & { benchMs: number };

/** Against a healthy oven of this definition. */
const hum = z.enum(['none', 'quiet', 'normal', 'loud']);

/** What heat did in a run. */
export const runHeat = z.strictObject({
  /** °C of each magnetron when the run's time is over */ celsius: z.record(z.string(), z.number()),
  /** cut-outs open then, whenever they opened */ open: z.array(partRef),
  /** cut-outs that moved, and s after start */
  moves: z
    .array(z.strictObject({ part: partRef, after: z.number(), isOpen: z.boolean() }))
    .max(200),
});
export type RunHeat = z.infer<typeof runHeat>;

/** What the keys of the hood do, tried during a run. */
export const hoodOutcome = z.strictObject({
  isVentTurningLow: z.boolean(),
  isVentTurningHigh: z.boolean(),
  isLampLit: z.boolean(),
});
export type HoodOutcome = z.infer<typeof hoodOutcome>;

/** What one powered run did, as a person in front of the oven sees and hears it. */
export const runOutcome = z.strictObject({
  /** s asked for at the panel */ ordered: z.number().min(1).max(300),
  /** s until it ended: less when something opened */ seconds: z.number(),
  /** absent: the oven has no display */ isDisplayLit: z.boolean().optional(),
  /** its knob comes down, ticking; absent: the oven has no mechanical timer */
  isTimerRunning: z.boolean().optional(),
  isLampLit: z.boolean(),
  isFanTurning: z.boolean(),
  isTurntableTurning: z.boolean(),
  hum,
  /** what it sounded like until something opened and changed it; absent: the same all the time */
  atFirst: z.strictObject({ hum, /** s */ seconds: z.number() }).optional(),
  /** A rms at the plug */ current: z.number(),
  /** W into the water */ microwavePower: z.number(),
  /** K, of the water */ waterRise: z.number(),
  /** fuses blown and cut-outs opened by the run */ opened: z.array(partRef),
  /** V left on capacitors when power went, by element name */
  charge: z.record(z.string(), z.number()),
  /** absent in the record of runs from before heat was reckoned */ heat: runHeat.optional(),
  /** absent when the oven has no hood over a cooktop */ hood: hoodOutcome.optional(),
});
export type RunOutcome = z.infer<typeof runOutcome>;
