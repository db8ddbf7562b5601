import { square } from '../../engine/elementary/power.ts';
import { asFitted } from '../../oven/initial-state.ts';
import type { DrawnOven, OvenState } from '../../oven/oven-state.ts';
import type { OvenPart, PartKindName } from '../../oven/oven.ts';
import { partKinds } from '../../oven/parts/catalogue.ts';
import type { Running } from '../../oven/part-kind.ts';
import { relaysFor } from './relays-for.ts';
import type { Electrical } from './run-electrically.ts';
import { heaterCurrents, refsOf, runElectrically } from './run-electrically.ts';

/** W: the board's logic runs, and the display glows, from about two thirds of the rated voltage up. Judgement. */
const logicWatts = 0.15;
const displayWatts = 0.5;
/** s of mains after which the board's supply, and the high-voltage side, repeat themselves */
const standbySeconds = 0.15;
const settledSeconds = 0.3;
/** Of its rail, what the door's switch has to leave on the pull-up for the board to take the door for closed. Judgement. */
const doorClosedShare = 0.5;
/** Share of its healthy current with which a heater emits, and with which a motor turns. Judgement. */
const emitting = 0.6;
const turning = 0.5;

export interface Started {
  ran: Electrical;
  /** absent: the oven has no display */ isDisplayLit?: boolean;
}

/**
 * A control board first, on its own transformer, which starts nothing while it is dead or the door is
 * open; a timer asks nobody, its contacts are closed by hand. Then what they hold closed. A magnetron
 * emits when its heater carries most of what it carries in a healthy oven.
 * @param charged V on capacitors to begin with, by element name
 */
export function start(
  oven: DrawnOven,
  state: OvenState,
  charged: Readonly<Record<string, number>>,
): Started {
  const board = throughBoard(oven, state);
  if (board && (!board.isDisplayLit || !state.isDoorClosed || !boardSeesDoor(oven, board.ran)))
    return board;
  const running = inFullRun(oven, state);
  const heaters = heaterCurrents(oven, running);
  const sound = heaterCurrents(oven, inFullRun(oven, asFitted(oven.definition, [])));
  const hot = (running.hot ?? []).filter((ref) => {
    const healthy = sound[ref];
    return healthy === undefined || (heaters[ref] ?? 0) > emitting * healthy;
  });
  const ran = runElectrically(oven, { ...running, hot }, settledSeconds, boards, charged);
  return { ran, ...(board ? { isDisplayLit: true } : {}) };
}

function throughBoard(oven: DrawnOven, state: OvenState): Started | null {
  if (refsOf(oven, 'control-board').length === 0) return null;
  const ran = inStandby(oven, state);
  return { ran, isDisplayLit: isBoardAlive(oven, state, ran) ?? false };
}

/** Plugged in, nobody starts it: what then flows. */
export const inStandby = (oven: DrawnOven, state: OvenState): Electrical =>
  runElectrically(oven, { ...state, energised: [], hot: [] }, standbySeconds);

/** Judged in standby, and of no weight beside what the relays switch. */
const boards: readonly PartKindName[] = ['control-board', 'board-transformer'];

const having = (oven: DrawnOven, trait: keyof Running): string[] =>
  oven.definition.parts
    .filter(({ kind }) => partKinds[kind].running?.[trait])
    .map(({ ref }) => ref);

/** A vent runs on one of its speeds at a time: in a run on the high one. */
const idle = (oven: DrawnOven): string[] => relaysFor(oven, ['vent-low']);

const inFullRun = (oven: DrawnOven, state: OvenState): OvenState => ({
  ...state,
  energised: having(oven, 'isSwitchedOn').filter((ref) => !idle(oven).includes(ref)),
  hot: having(oven, 'isHot'),
});

/** Whether the display glows and the logic runs; undefined: the oven has no board. */
export function isBoardAlive(
  oven: DrawnOven,
  state: OvenState,
  standby: Electrical,
): boolean | undefined {
  const all = refsOf(oven, 'control-board');
  if (all.length === 0) return undefined;
  return all.every(
    (ref) =>
      standby.power(`${ref}:load`) > logicWatts &&
      standby.power(`${ref}:filament`) > displayWatts &&
      !state.faults.some((fault) => fault.on === ref && fault.fault === 'dead'),
  );
}

/** A board that senses the door: V across its pull-up against V of its rail, from P = V²/R of both. */
const boardSeesDoor = (oven: DrawnOven, standby: Electrical): boolean =>
  oven.definition.parts
    .filter(({ kind, variant }) => kind === 'control-board' && variant === 'door-sensing')
    .every(({ ref }) => {
      const { load = 0, pullUp = 0 } = oven.values[ref] ?? {};
      const rail = standby.power(`${ref}:load`) * load;
      const line = standby.power(`${ref}:pull-up`) * pullUp;
      return line > square(doorClosedShare) * rail;
    });

const healthyRuns = new WeakMap<DrawnOven, Electrical>();

/** The same oven without a fault: what its sounds and lights are compared with. */
export function healthyRun(oven: DrawnOven): Electrical {
  const known = healthyRuns.get(oven);
  if (known) return known;
  const sound = inFullRun(oven, asFitted(oven.definition, []));
  const ran = runElectrically(oven, sound, settledSeconds, boards);
  healthyRuns.set(oven, ran);
  return ran;
}

/** Whether what this part turns goes round with what flows. */
export function turns(oven: DrawnOven, part: OvenPart, state: OvenState, ran: Electrical): boolean {
  const how = partKinds[part.kind].running?.turns;
  if (!how) return false;
  const element = `${part.ref}:${how.winding}`;
  const isStopped = state.faults.some(
    ({ on, fault }) => on === part.ref && how.stoppedBy.includes(fault),
  );
  return !isStopped && ran.current(element) > turning * healthyRun(oven).current(element);
}

export const isTurning = (
  oven: DrawnOven,
  { state, ran }: { state: OvenState; ran: Electrical },
  kind: OvenPart['kind'],
  variant?: string,
): boolean =>
  oven.definition.parts
    .filter((part) => part.kind === kind && part.variant === variant)
    .every((part) => turns(oven, part, state, ran));
