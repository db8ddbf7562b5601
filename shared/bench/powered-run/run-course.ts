import type { DrawnOven, OvenState } from '../../oven/oven-state.ts';
import type { RunHeat } from '../record.ts';
import { cutOutsOf, openNow, temperaturesAround } from './cut-outs.ts';
import { fuseTime, fusesOf } from './fuse-time.ts';
import { roomCelsius, warmed } from './magnetron-heat.ts';
import type { MagnetronPower } from './magnetron-power.ts';
import { magnetronPower } from './magnetron-power.ts';
import { isDead, refsOf } from './run-electrically.ts';
import type { Started } from './start.ts';
import { isTurning, start } from './start.ts';

/** s; nothing that warms or cools in an oven moves a degree in less */
const step = 0.1;
/** s of heater before anything comes out (service sheet SM-9, FACTS 7) */
const warmUp = 2;
/** J/(kg K); P = 4187 m dT / t into 1 kg, the method of IEC 60705 (from memory, FACTS 9). */
const water = { heat: 4187, mass: 1 };

/** A stretch of a run in which nothing opens and nothing closes. */
export interface Stretch extends Started {
  state: OvenState;
  seconds: number;
  /** fuses that melted at its end */ blown: readonly string[];
}

export interface RunCourse {
  stretches: readonly Stretch[];
  /** K */ waterRise: number;
  heat: RunHeat;
}

interface Now {
  started: Started;
  state: OvenState;
  power: MagnetronPower;
  isFanTurning: boolean;
  /** s after start at which it began, and at which its first fuse melts */ at: number;
  melts: number;
}

/**
 * A run through its stretches: fuses melt, cut-outs open and close by temperature, each change is
 * another circuit. It ends with the time asked for, when nothing is fed any more, or when a board
 * loses its supply: a board does not start again by itself, a timer does.
 * @param celsiusBefore °C of each magnetron at its start; room temperature unless told
 */
export function runCourse(
  oven: DrawnOven,
  state: OvenState,
  ordered: number,
  celsiusBefore: Readonly<Record<string, number>>,
): RunCourse {
  const cutOuts = cutOutsOf(oven, state.faults);
  const begin = beginningsOf(oven);
  const warmth = warmthOf(oven, celsiusBefore);
  const stretches: Stretch[] = [];
  const moves: RunHeat['moves'] = [];
  let open = cutOuts.map(({ ref }) => ref).filter((ref) => state.opened.includes(ref));
  let now: Now | null = begin(state, 0, {});
  const close = (ending: Now, at: number, blown: readonly string[] = []): void => {
    const seconds = at - ending.at;
    stretches.push({ ...ending.started, state: ending.state, seconds, blown });
  };
  const next = (ending: Now, at: number, opened: readonly string[]): Now | null => {
    const after = { ...ending.state, opened };
    if (at >= ordered || isDead(oven, after)) return null;
    const begun = begin(after, at, ending.started.ran.storage.voltages);
    return ending.started.isDisplayLit && !begun.started.isDisplayLit ? null : begun;
  };
  for (let tick = 0; tick * step < ordered - 1e-9; tick += 1) {
    const from = tick * step;
    const until = Math.min(from + step, ordered);
    while (now && now.melts <= until) {
      const { state: before, melts: at } = now;
      const blown = blownBy(oven, now);
      close(now, at, blown);
      now = next(now, at, [...before.opened, ...blown]);
    }
    warmth.pass(now, until - from);
    const opened = openNow(cutOuts, open, temperaturesAround(warmth.hottest(), warmth.rise()));
    if (opened.length === open.length && opened.every((ref) => open.includes(ref))) continue;
    moves.push(...movesBetween(open, opened, until));
    const others: string[] = now ? now.state.opened.filter((ref) => !open.includes(ref)) : [];
    open = opened;
    if (!now) continue;
    close(now, until);
    now = next(now, until, [...others, ...opened]);
  }
  if (now && now.at < ordered) close(now, ordered);
  return { stretches, waterRise: warmth.rise(), heat: { celsius: warmth.celsius(), open, moves } };
}

/** The same circuit is run once, however often a cut-out comes back to it. */
function beginningsOf(
  oven: DrawnOven,
): (state: OvenState, at: number, charged: Readonly<Record<string, number>>) => Now {
  const known = new Map<string, Started>();
  return (state, at, charged) => {
    const key = [...state.opened].sort().join(' ');
    const started = known.get(key) ?? start(oven, state, charged);
    known.set(key, started);
    const { ran } = started;
    const times = fusesOf(oven)
      .filter((ref) => !state.opened.includes(ref))
      .map((ref) => fuseTime(oven, state, ref, ran));
    return {
      started,
      state,
      power: magnetronPower(oven, state, ran),
      isFanTurning: isTurning(oven, { state, ran }, 'motor', 'fan'),
      at,
      melts: at + Math.min(Infinity, ...times),
    };
  };
}

const blownBy = (oven: DrawnOven, { started, state, at, melts }: Now): string[] =>
  fusesOf(oven).filter(
    (ref) => !state.opened.includes(ref) && at + fuseTime(oven, state, ref, started.ran) <= melts,
  );

/** What a run warms: its magnetrons, and the water, once the heaters are hot. */
function warmthOf(oven: DrawnOven, before: Readonly<Record<string, number>>) {
  const refs = refsOf(oven, 'magnetron');
  const degrees = new Map(refs.map((ref) => [ref, before[ref] ?? roomCelsius]));
  let heated = 0;
  let joules = 0;
  return {
    pass(now: Now | null, seconds: number): void {
      heated = now && now.power.lost > 0 ? heated + seconds : 0;
      const isEmitting = heated > warmUp;
      if (now && isEmitting) joules += now.power.microwaves * seconds;
      const watts = now && isEmitting ? now.power.lost / refs.length : 0;
      const isFanTurning = now?.isFanTurning ?? false;
      for (const [ref, celsius] of degrees)
        degrees.set(ref, warmed(celsius, { watts, isFanTurning }, seconds));
    },
    hottest: (): number => Math.max(roomCelsius, ...degrees.values()),
    rise: (): number => joules / (water.heat * water.mass),
    celsius: (): Record<string, number> =>
      Object.fromEntries([...degrees].map(([ref, value]) => [ref, round(value)])),
  };
}

/** The cut-outs that are in one list and not in the other. */
const movesBetween = (
  before: readonly string[],
  next: readonly string[],
  after: number,
): RunHeat['moves'] =>
  [...new Set([...before, ...next])]
    .filter((ref) => before.includes(ref) !== next.includes(ref))
    .map((part) => ({ part, after: round(after), isOpen: next.includes(part) }));

const round = (value: number): number => Math.round(value * 10) / 10;
