import { z } from 'zod';
import { partRef } from '../../oven/oven.ts';
import type { Bench, Decision } from '../action.ts';
import { accept, action, refuse } from '../action.ts';
import type { BenchState } from '../bench-state.ts';
import { runOutcome } from '../record.ts';
import { checkFromPlug } from '../safety/earth-and-insulation.ts';
import { openSlowly } from '../safety/interlocks.ts';
import { doorPlaces, leakageAround } from '../safety/leakage.ts';
import { runOven } from './run.ts';

const nothing = z.strictObject({});

/** s the oven runs while the door is gone around with the survey meter, and before it is opened */
export const surveySeconds = 30;
export const openingSeconds = 5;

const density = z.number().min(0);
const surveyed = z.strictObject({
  run: runOutcome,
  /** mW/cm² at 5 cm, with 275 ml of water inside */
  readings: z.strictObject({
    'top edge': density,
    'handle side': density,
    'bottom edge': density,
    'hinge side': density,
    window: density,
  }),
});

/** The door gone around with a survey meter at 5 cm, 275 ml of water inside. */
export const surveyLeakage = action({
  command: 'SurveyLeakage',
  event: 'LeakageSurveyed',
  runsMains: true,
  input: nothing,
  data: surveyed,
  decide: (bench) => {
    const ran = runWithDoorShut(bench, surveySeconds);
    if (!ran.ok) return ran;
    const { setup, state } = bench;
    const readings = leakageAround(setup.oven, state.oven, ran.data.microwavePower);
    // Whoever holds the survey meter stands clear, and stops at the first high reading.
    const hazards = ran.hazards.filter(({ kind }) => kind !== 'microwave-leakage');
    return accept({ run: ran.data, readings }, hazards);
  },
  evolve: (state, { run }, setup) => runOven.evolve(state, run, setup),
  describe: ({ readings }) => {
    const [worst = doorPlaces[0]] = [...doorPlaces].sort((a, b) => readings[b] - readings[a]);
    return `leakage surveyed: at most ${readings[worst].toFixed(2)} mW/cm², ${worst}`;
  },
});

const interlocksChecked = z.strictObject({
  run: runOutcome,
  wasRunning: z.boolean(),
  switches: z.int().min(0),
  stoppedAt: z.int().min(1).nullable(),
  opened: z.array(partRef),
});

/** The door of the running oven opened slowly, a hand on the cord. */
export const checkInterlocks = action({
  command: 'CheckInterlocks',
  event: 'InterlocksChecked',
  runsMains: true,
  input: nothing,
  data: interlocksChecked,
  decide: (bench) => {
    const ran = runWithDoorShut(bench, openingSeconds);
    if (!ran.ok) return ran;
    const { setup, state } = bench;
    const opened = [...state.oven.opened, ...ran.data.opened];
    const opening = openSlowly(setup.oven, { ...state.oven, opened });
    return accept({ run: ran.data, ...opening }, ran.hazards);
  },
  evolve: (state, { run, opened }, setup) => {
    const after = runOven.evolve(state, run, setup);
    return {
      ...after,
      isDisplayLit: opened.length > 0 && after.isDisplayLit ? false : after.isDisplayLit,
      oven: {
        ...after.oven,
        isDoorClosed: false,
        opened: [...new Set([...after.oven.opened, ...opened])],
      },
    };
  },
  describe: ({ wasRunning, switches, stoppedAt, opened }) =>
    [
      'door opened slowly while running',
      wasRunning
        ? stoppedAt === null
          ? 'it went on'
          : `stopped at the ${ordinal(stoppedAt)} of ${switches} switches`
        : 'it was not heating',
      ...(opened.length > 0 ? ['then a bang and everything dark'] : []),
    ].join(', '),
});

const ordinal = (count: number): string => ['first', 'second', 'third'][count - 1] ?? `${count}th`;

const plugTested = z.strictObject({
  /** Ohm, earth pin to chassis; null: no path */ earth: z.number().nullable(),
  /** Ohm at 500 V DC, both mains pins to the earth pin; null: over 2 GOhm */
  insulation: z.number().nullable(),
});

/** Earth bond and insulation, measured from the plug with a tester of its own. */
export const testFromPlug = action({
  command: 'TestFromPlug',
  event: 'PlugTested',
  input: nothing,
  data: plugTested,
  decide: ({ setup, state }) => {
    if (state.isCordIn)
      return refuse('cord-is-in', 'The cord is in. Pull it: the tester needs the plug.');
    if (inUse(state))
      return refuse('plug-in-use', 'Something is on the plug pins. Take it off first.');
    return accept(checkFromPlug(setup.oven, state.oven));
  },
  evolve: (state) => state,
  describe: ({ earth, insulation }) =>
    `tested from the plug: earth ${earth === null ? 'open' : `${earth} Ω`}, insulation ${
      insulation === null ? 'over 2 GΩ' : `${Number((insulation / 1e6).toPrecision(3))} MΩ`
    }`,
});

const inUse = ({ probes, discharge, battery }: BenchState): boolean =>
  [probes.red, probes.black, discharge.clip, discharge.tip, battery.neg, battery.oneK].some(
    (target) => target?.startsWith('P1.'),
  );

function runWithDoorShut(bench: Bench, ordered: number): Decision<z.infer<typeof runOutcome>> {
  if (!bench.state.oven.isDoorClosed)
    return refuse('door-is-open', 'The door is open. Close it first: it is checked closed.');
  return runOven.decide(bench, { ordered });
}
