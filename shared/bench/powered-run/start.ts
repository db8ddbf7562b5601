import { asFitted } from '../../oven/initial-state.ts';
import type { DrawnOven, OvenState } from '../../oven/oven-state.ts';
import type { PartKindName } from '../../oven/oven.ts';
import { partKinds } from '../../oven/parts/catalogue.ts';
import type { Running } from '../../oven/part-kind.ts';
import type { Electrical } from './run-electrically.ts';
import { heaterCurrents, refsOf, runElectrically } from './run-electrically.ts';

/** W: the board's logic runs, and the display glows, from about two thirds of the rated voltage up. Judgement. */
const logicWatts = 0.15;
const displayWatts = 0.5;
/** s of mains after which the board's supply, and the high-voltage side, repeat themselves */
const standbySeconds = 0.15;
const settledSeconds = 0.3;
/** Share of its healthy current with which a heater emits. Judgement. */
const emitting = 0.6;

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
  if (board && (!board.isDisplayLit || !state.isDoorClosed)) return board;
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

const inFullRun = (oven: DrawnOven, state: OvenState): OvenState => ({
  ...state,
  energised: having(oven, 'isSwitchedOn'),
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
