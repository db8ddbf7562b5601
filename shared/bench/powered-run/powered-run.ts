import type { DrawnOven, OvenState } from '../../oven/oven-state.ts';
import type { OvenPart } from '../../oven/oven.ts';
import { partKinds } from '../../oven/parts/catalogue.ts';
import type { RunOutcome } from '../record.ts';
import { chargeLeft } from './charge-left.ts';
import { fuseTime, fusesOf } from './fuse-time.ts';
import type { Electrical } from './run-electrically.ts';
import { isDead, refsOf } from './run-electrically.ts';
import type { Started } from './start.ts';
import { healthyRun, inStandby, isBoardAlive, start } from './start.ts';

/** Share of its healthy power with which a lamp is seen to be lit; of its healthy current with which a motor turns. Judgement. */
const seen = 0.3;
const turning = 0.5;
/** J/(kg K); P = 4187 m dT / t into 1 kg, the method of IEC 60705 (from memory, FACTS 9). */
const water = { heat: 4187, mass: 1 };
/** of the anode power; 4 kV x 0.3 A in for 800 W out (FACTS 7) */
const efficiency = 0.7;
/** Primary current against a healthy run: below is quieter, above is louder. Judgement. */
const silentBelow = 0.005;
const quietBelow = 0.5;
const loudAbove = 1.15;

/** A stretch of a run in which nothing opens. */
interface Stretch extends Started {
  state: OvenState;
  seconds: number;
  /** what opened at its end */ opened: readonly string[];
}

/** What a run of up to `ordered` s does to this oven: seen, heard, blown, heated, and left on the capacitors. */
export function poweredRun(oven: DrawnOven, state: OvenState, ordered: number): RunOutcome {
  const stretches = stretchesOf(oven, state, ordered);
  const first = stretches[0] as Stretch;
  const last = stretches.at(-1) as Stretch;
  const humming = hum(oven, last.ran);
  const heat = stretches.reduce(
    (sum, { state: then, ran, seconds }) => sum + microwaves(oven, then, ran) * seconds,
    0,
  );
  const timers = refsOf(oven, 'mechanical-timer');
  const before = first === last ? humming : hum(oven, first.ran);
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
    microwavePower: round(microwaves(oven, last.state, last.ran), 1),
    waterRise: round(heat / (water.heat * water.mass), 0.01),
    opened: stretches.flatMap(({ opened }) => opened),
    charge: chargeLeft(oven, last.state, last.ran, first === last ? 0 : last.seconds),
  };
}

/** A run goes on after a high-voltage fuse, without what it fed; after the line fuse nothing does. */
function stretchesOf(oven: DrawnOven, state: OvenState, ordered: number): Stretch[] {
  const stretches: Stretch[] = [];
  let left = ordered;
  let now = state;
  for (;;) {
    const started = start(oven, now, stretches.at(-1)?.ran.storage.voltages ?? {});
    const times = fusesOf(oven)
      .filter((ref) => !now.opened.includes(ref))
      .map((ref) => ({ ref, after: fuseTime(oven, now, ref, started.ran) }));
    const soonest = Math.min(left, ...times.map(({ after }) => after));
    const opened = times.filter(({ after }) => after <= soonest).map(({ ref }) => ref);
    stretches.push({ ...started, state: now, seconds: soonest, opened });
    left -= soonest;
    now = { ...now, opened: [...now.opened, ...opened] };
    if (opened.length === 0 || left <= 0 || isDead(oven, now)) return stretches;
  }
}

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
  refsOf(oven, 'lamp').every((ref) => isPower(oven, ran, `${ref}:filament`));

const isAnyLampLit = (oven: DrawnOven, ran: Electrical): boolean =>
  refsOf(oven, 'lamp').some((ref) => isPower(oven, ran, `${ref}:filament`));

function turns(oven: DrawnOven, part: OvenPart, state: OvenState, ran: Electrical): boolean {
  const how = partKinds[part.kind].running?.turns;
  if (!how) return false;
  const element = `${part.ref}:${how.winding}`;
  const isStopped = state.faults.some(
    ({ on, fault }) => on === part.ref && how.stoppedBy.includes(fault),
  );
  return !isStopped && ran.current(element) > turning * healthyRun(oven).current(element);
}

const isTurning = (
  oven: DrawnOven,
  { state, ran }: Stretch,
  kind: OvenPart['kind'],
  variant?: string,
): boolean =>
  oven.definition.parts
    .filter((part) => part.kind === kind && part.variant === variant)
    .every((part) => turns(oven, part, state, ran));

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

/** W into the food: of what beam and threshold of each sound magnetron take up. */
const microwaves = (oven: DrawnOven, state: OvenState, ran: Electrical): number =>
  refsOf(oven, 'magnetron')
    .filter(
      (ref) => !state.faults.some(({ on, fault }) => on === ref && fault === 'cracked-magnet'),
    )
    .reduce(
      (sum, ref) =>
        sum + efficiency * Math.max(0, ran.power(`${ref}:beam`) + ran.power(`${ref}:threshold`)),
      0,
    );

const round = (value: number, step: number): number => Math.round(value / step) * step;
