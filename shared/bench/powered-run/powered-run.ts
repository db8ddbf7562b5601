import type { DrawnOven, OvenState } from '../../oven/oven-state.ts';
import { partKinds } from '../../oven/parts/catalogue.ts';
import type { RunOutcome } from '../record.ts';
import { chargeLeft } from './charge-left.ts';
import { fuseTime, fusesOf } from './fuse-time.ts';
import { hoodOf } from './hood.ts';
import { magnetronPower } from './magnetron-power.ts';
import type { Stretch } from './run-course.ts';
import { runCourse } from './run-course.ts';
import type { Electrical } from './run-electrically.ts';
import { refsOf } from './run-electrically.ts';
import { healthyRun, inStandby, isBoardAlive, isTurning, turns } from './start.ts';

/** Share of its healthy power with which a lamp is seen to be lit. Judgement. */
const seen = 0.3;
/** Primary current against a healthy run: below is quieter, above is louder. Judgement. */
const silentBelow = 0.005;
const quietBelow = 0.5;
const loudAbove = 1.15;

/**
 * What a run of up to `ordered` s does to this oven: seen, heard, blown, heated, and left on the
 * capacitors. `celsius` is what each magnetron has at its start; room temperature unless told.
 */
export function poweredRun(
  oven: DrawnOven,
  state: OvenState,
  ordered: number,
  celsius: Readonly<Record<string, number>> = {},
): RunOutcome {
  const { stretches, waterRise, heat } = runCourse(oven, state, ordered, celsius);
  const first = stretches[0] as Stretch;
  const last = stretches.at(-1) as Stretch;
  const humming = hum(oven, last.ran);
  const timers = refsOf(oven, 'mechanical-timer');
  const before = first === last ? humming : hum(oven, first.ran);
  const hood = hoodOf(oven, state, first.isDisplayLit ?? true);
  const isCutOff = humming === 'none' || stretches.slice(0, -1).some(isHighVoltageBlown(oven));
  const cutOff = first !== last && isCutOff ? last.seconds : 0;
  return {
    ordered,
    seconds: round(
      stretches.reduce((sum, { seconds }) => sum + seconds, 0),
      0.01,
    ),
    ...(last.isDisplayLit === undefined ? {} : { isDisplayLit: last.isDisplayLit }),
    ...(timers.length === 0 ? {} : { isTimerRunning: isTurning(oven, last, 'mechanical-timer') }),
    isLampLit: isLampLit(oven, last.ran),
    isFanTurning: isTurning(oven, last, 'motor', 'fan'),
    isTurntableTurning: isTurning(oven, last, 'motor', 'turntable'),
    hum: humming,
    ...(before === humming
      ? {}
      : { atFirst: { hum: before, seconds: round(first.seconds, 0.01) } }),
    current: round(last.ran.current('mains:loop'), 0.01),
    microwavePower: round(magnetronPower(oven, last.state, last.ran).microwaves, 1),
    waterRise: round(waterRise, 0.01),
    opened: [
      ...stretches.flatMap(({ blown }) => blown),
      ...heat.open.filter((ref) => !state.opened.includes(ref)),
    ],
    charge: chargeLeft(oven, last.state, last.ran, cutOff),
    heat,
    ...(hood ? { hood } : {}),
  };
}

/** After its fuse has gone, the high-voltage side has no supply however loud the transformer is. */
const isHighVoltageBlown =
  (oven: DrawnOven) =>
  ({ blown }: Stretch): boolean =>
    refsOf(oven, 'hv-fuse').some((ref) => blown.includes(ref));

/** All that is open after a run: fuses blown before and by it, and the cut-outs that are open at its end. */
export const openAfter = (
  { definition }: DrawnOven,
  before: readonly string[],
  opened: readonly string[],
  cutOuts: readonly string[],
): string[] => {
  const isCutOut = (ref: string): boolean =>
    definition.parts.some((part) => part.ref === ref && part.kind === 'cut-out');
  const fuses = [...before, ...opened].filter((ref) => !isCutOut(ref));
  return [...new Set([...fuses, ...cutOuts])];
};

export interface Standing {
  /** absent: the oven has no display */ isDisplayLit?: boolean;
  /** lamp or motors go although nobody has started it */ runsByItself?: true;
  /** fuses that melt at once: a monitor switch that finds a welded switch */ opened?: string[];
}

/** What the oven does plugged in, with nobody starting it and the door as it is. */
export function standing(oven: DrawnOven, state: OvenState): Standing {
  const ran = inStandby(oven, state);
  const opened = fusesOf(oven).filter(
    (ref) => !state.opened.includes(ref) && fuseTime(oven, state, ref, ran) < 1,
  );
  const isOn =
    isAnyLampLit(oven, ran) ||
    oven.definition.parts.some((part) => part.kind === 'motor' && turns(oven, part, state, ran));
  const isDisplayLit = isBoardAlive(oven, state, ran);
  return {
    ...(isDisplayLit === undefined ? {} : { isDisplayLit: isDisplayLit && opened.length === 0 }),
    ...(isOn && opened.length === 0 ? { runsByItself: true as const } : {}),
    ...(opened.length === 0 ? {} : { opened }),
  };
}

const isPower = (oven: DrawnOven, ran: Electrical, element: string): boolean =>
  ran.power(element) > seen * healthyRun(oven).power(element);

const isLampLit = (oven: DrawnOven, ran: Electrical): boolean =>
  oven.definition.parts
    .filter(({ kind, variant }) => kind === 'lamp' && variant !== 'cooktop')
    .every(({ ref }) => isPower(oven, ran, `${ref}:filament`));

const isAnyLampLit = (oven: DrawnOven, ran: Electrical): boolean =>
  refsOf(oven, 'lamp').some((ref) => isPower(oven, ran, `${ref}:filament`));

function hum(oven: DrawnOven, ran: Electrical): RunOutcome['hum'] {
  const heard = (run: Electrical): number =>
    oven.definition.parts.reduce((sum, { ref, kind }) => {
      const winding = partKinds[kind].running?.hums;
      return winding === undefined ? sum : sum + run.current(`${ref}:${winding}`);
    }, 0);
  const share = heard(ran) / heard(healthyRun(oven));
  if (share < silentBelow) return 'none';
  if (share < quietBelow) return 'quiet';
  return share > loudAbove ? 'loud' : 'normal';
}

const round = (value: number, step: number): number => Math.round(value / step) * step;
