import type { z } from 'zod';
import { clipBattery, unclipBattery } from './actions/battery.ts';
import {
  fitDischargeClip,
  liftDischargeTip,
  removeDischargeClip,
  shortWithScrewdriver,
  touchDischargeTip,
} from './actions/discharge-lead.ts';
import { pressSwitch, releaseSwitch } from './actions/door-switches.ts';
import { labelLead, liftLead, refitLead } from './actions/leads.ts';
import {
  captureReading,
  clearRelative,
  setMeter,
  setRelative,
  takeReading,
} from './actions/meter.ts';
import { cleanSpot, inspectPart, replacePart } from './actions/parts.ts';
import { holdProbe, placeProbe, removeProbe } from './actions/probes.ts';
import { repairDoor, repairLead } from './actions/repairs.ts';
import { runOven } from './actions/run.ts';
import { checkInterlocks, surveyLeakage, testFromPlug } from './actions/safety-checks.ts';
import { giveVerdict, handIn, stateCause, writeReport } from './actions/sheet.ts';
import { stepBack } from './actions/step-back.ts';
import {
  closeDoor,
  fitCover,
  openDoor,
  plugCord,
  pullCord,
  removeCover,
} from './actions/supply.ts';
import { wait } from './actions/time.ts';
import type { Action } from './action.ts';
import { attemptBegan, hazardHappened } from './outcomes.ts';
import type { Outcome } from './outcomes.ts';

/** Everything a person can do on the bench: a new action is one definition and one line here. */
const actions = [
  pullCord,
  plugCord,
  removeCover,
  fitCover,
  openDoor,
  closeDoor,
  pressSwitch,
  releaseSwitch,
  liftLead,
  labelLead,
  refitLead,
  placeProbe,
  removeProbe,
  holdProbe,
  setMeter,
  setRelative,
  clearRelative,
  takeReading,
  captureReading,
  fitDischargeClip,
  removeDischargeClip,
  touchDischargeTip,
  liftDischargeTip,
  shortWithScrewdriver,
  clipBattery,
  unclipBattery,
  inspectPart,
  cleanSpot,
  replacePart,
  repairLead,
  repairDoor,
  runOven,
  surveyLeakage,
  checkInterlocks,
  testFromPlug,
  wait,
  stepBack,
  giveVerdict,
  stateCause,
  writeReport,
  handIn,
] as const;

const outcomes = [attemptBegan, hazardHappened] as const;

type Actions = (typeof actions)[number];
type Outcomes = (typeof outcomes)[number];

type CommandOf<A> =
  A extends Action<infer C, string, infer I, z.ZodObject> ? { type: C; data: z.infer<I> } : never;
type EventOf<A> =
  A extends Action<string, infer E, z.ZodObject, infer D>
    ? { type: E; data: z.infer<D> }
    : A extends Outcome<infer E, infer D>
      ? { type: E; data: z.infer<D> }
      : never;

/** What a person asks for: `{ type: 'LiftLead', data: { end: 'W12/a' } }`. */
export type BenchCommand = CommandOf<Actions>;
/** What happened: `{ type: 'LeadLifted', data: … }`. */
export type BenchEvent = EventOf<Actions | Outcomes>;

/** With the tie between type and data forgotten: found by name, parsed before use. */
export type AnyAction = Action<string, string, z.ZodObject, z.ZodObject>;
export type AnyOutcome = Outcome<string, z.ZodObject>;

const allActions = actions as unknown as readonly AnyAction[];
const allOutcomes = outcomes as unknown as readonly AnyOutcome[];

export const actionByCommand = new Map(allActions.map((one) => [one.command, one]));
export const actionByEvent = new Map(allActions.map((one) => [one.event, one]));
/** Everything that can stand in a record, by event type. */
export const evolverByEvent = new Map<string, AnyOutcome>(
  [...allActions, ...allOutcomes].map((one) => [one.event, one]),
);
