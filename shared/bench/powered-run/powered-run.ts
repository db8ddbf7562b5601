import { square } from '../../engine/elementary/power.ts';
import type { DrawnOven, OvenState } from '../../oven/oven-state.ts';
import type { PartKindName } from '../../oven/oven.ts';
import { asFitted } from '../../oven/initial-state.ts';
import type { RunOutcome } from '../record.ts';
import { meltingTime } from './fuse-melting.ts';
import type { Electrical } from './run-electrically.ts';
import { heaterCurrents, refsOf, runElectrically } from './run-electrically.ts';

/** W: the board's logic runs, and the display glows, from about two thirds of the rated voltage up. Judgement. */
const logicWatts = 0.15;
const displayWatts = 0.5;
/** s of mains after which the board's supply, and the high-voltage side, repeat themselves */
const standbySeconds = 0.15;
const settledSeconds = 0.3;
/** Share of its healthy power with which a lamp is seen to be lit; of its healthy current with which a heater emits. Judgement. */
const seen = 0.3;
const emitting = 0.6;
/** Share of a motor's healthy current with which it turns. Judgement. */
const turning = 0.5;
/** J/(kg K); P = 4187 m dT / t into 1 kg, the method of IEC 60705 (from memory, FACTS 9). */
const water = { heat: 4187, mass: 1 };
/** of the anode power; 4 kV x 0.3 A in for 800 W out (FACTS 7) */
const efficiency = 0.7;
/** Primary current against a healthy run: below is quieter, above is louder. Judgement. */
const silentBelow = 0.005;
const quietBelow = 0.5;
const loudAbove = 1.15;

/** What start does to this oven for up to `ordered` s: seen, heard, blown, heated, and left on the capacitors. */
export function poweredRun(oven: DrawnOven, state: OvenState, ordered: number): RunOutcome {
  const healthy = healthyRun(oven);
  const { ran, isAlive } = start(oven, state);
  const fuses = refsOf(oven, 'fuse').map((ref) => ({
    ref,
    after: fuseTime(oven, state, ref, ran),
  }));
  const until = Math.min(ordered, ...fuses.map((fuse) => fuse.after));
  const isShare = (kind: 'power' | 'current', element: string, share: number): boolean =>
    ran[kind](element) > share * healthy[kind](element);
  const hasFault = (ref: string, fault: string): boolean =>
    state.faults.some((one) => one.on === ref && one.fault === fault);
  const motor = (variant: string): boolean =>
    oven.definition.parts
      .filter((part) => part.kind === 'motor' && part.variant === variant)
      .every(
        ({ ref }) => isShare('current', `${ref}:winding`, turning) && !hasFault(ref, 'seized'),
      );
  const microwavePower = refsOf(oven, 'magnetron').reduce(
    (sum, ref) =>
      sum + efficiency * beamPower(ran, ref) * (hasFault(ref, 'cracked-magnet') ? 0 : 1),
    0,
  );
  return {
    ordered,
    seconds: round(until, 0.01),
    isDisplayLit: isAlive,
    isLampLit: refsOf(oven, 'lamp').every((ref) => isShare('power', `${ref}:filament`, seen)),
    isFanTurning: motor('fan'),
    isTurntableTurning: motor('turntable'),
    hum: hum(oven, ran, healthy),
    current: round(ran.current('mains:loop'), 0.01),
    microwavePower: round(microwavePower, 1),
    waterRise: round((microwavePower * until) / (water.heat * water.mass), 0.01),
    opened: fuses.filter((fuse) => fuse.after <= ordered).map((fuse) => fuse.ref),
    charge: chargeLeft(ran),
  };
}

interface Started {
  ran: Electrical;
  isAlive: boolean;
}

/**
 * The control first, on its own transformer; then its relays. A magnetron emits when its heater
 * carries most of what it carries in a healthy oven.
 */
function start(oven: DrawnOven, state: OvenState): Started {
  const standby = inStandby(oven, state);
  const isAlive = boardIsAlive(oven, state, standby);
  if (!isAlive || !state.isDoorClosed) return { ran: standby, isAlive };
  const running = inFullRun(oven, state);
  const heaters = heaterCurrents(oven, running);
  const sound = heaterCurrents(oven, inFullRun(oven, asFitted(oven.definition, [])));
  const hot = (running.hot ?? []).filter((ref) => {
    const healthy = sound[ref];
    return healthy === undefined || (heaters[ref] ?? 0) > emitting * healthy;
  });
  return { ran: runElectrically(oven, { ...running, hot }, settledSeconds, boards), isAlive };
}

/** Whether the display glows with the oven plugged in and nothing pressed. */
export const standsBy = (oven: DrawnOven, state: OvenState): boolean =>
  boardIsAlive(oven, state, inStandby(oven, state));

const inStandby = (oven: DrawnOven, state: OvenState): Electrical =>
  runElectrically(oven, { ...state, energised: [], hot: [] }, standbySeconds);

/** Judged in standby, and of no weight beside what the relays switch. */
const boards: readonly PartKindName[] = ['control-board', 'board-transformer'];

const inFullRun = (oven: DrawnOven, state: OvenState): OvenState => ({
  ...state,
  energised: refsOf(oven, 'relay'),
  hot: [...refsOf(oven, 'lamp'), ...refsOf(oven, 'magnetron')],
});

const boardIsAlive = (oven: DrawnOven, state: OvenState, standby: Electrical): boolean =>
  refsOf(oven, 'control-board').every(
    (ref) =>
      standby.power(`${ref}:load`) > logicWatts &&
      standby.power(`${ref}:filament`) > displayWatts &&
      !state.faults.some((fault) => fault.on === ref && fault.fault === 'dead'),
  );

const healthyRuns = new WeakMap<DrawnOven, Electrical>();

/** The same oven without a fault: what its sounds and lights are compared with. */
function healthyRun(oven: DrawnOven): Electrical {
  const known = healthyRuns.get(oven);
  if (known) return known;
  const ran = runElectrically(
    oven,
    inFullRun(oven, asFitted(oven.definition, [])),
    settledSeconds,
    boards,
  );
  healthyRuns.set(oven, ran);
  return ran;
}

function hum(oven: DrawnOven, ran: Electrical, healthy: Electrical): RunOutcome['hum'] {
  const primary = (run: Electrical): number =>
    refsOf(oven, 'hv-transformer').reduce((sum, ref) => sum + run.current(`${ref}:primary`), 0);
  const share = primary(ran) / primary(healthy);
  if (share < silentBelow) return 'none';
  if (share < quietBelow) return 'quiet';
  return share > loudAbove ? 'loud' : 'normal';
}

/** W into the anode: what the beam and its threshold take up. */
const beamPower = (ran: Electrical, ref: string): number =>
  Math.max(0, ran.power(`${ref}:beam`) + ran.power(`${ref}:threshold`));

function fuseTime(oven: DrawnOven, state: OvenState, ref: string, ran: Electrical): number {
  const { melting = Infinity, rating = Infinity } = oven.values[ref] ?? {};
  const wrong = state.faults.find((fault) => fault.on === ref && fault.fault === 'wrong-rating');
  const fitted = wrong?.values?.['amps'] ?? rating;
  // Of one make, the melting integral goes with the square of the rating.
  return meltingTime(ran.current(`${ref}:element`), melting * square(fitted / rating), fitted);
}

/** V by element name; below 30 V nobody is concerned. */
const chargeLeft = ({ storage }: Electrical): Record<string, number> =>
  Object.fromEntries(
    Object.entries(storage.voltages)
      .filter(([, volts]) => Math.abs(volts) > 30)
      .map(([element, volts]) => [element, round(volts, 0.01)]),
  );

const round = (value: number, step: number): number => Math.round(value / step) * step;
