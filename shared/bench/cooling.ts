import type { OvenState } from '../oven/oven-state.ts';
import type { BenchState, Warmth } from './bench-state.ts';
import { cutOutsOf } from './powered-run/cut-outs.ts';
import { coolingTime, warmed } from './powered-run/magnetron-heat.ts';
import { standing } from './powered-run/powered-run.ts';
import type { RunHeat } from './record.ts';
import type { Setup } from './setup.ts';

type Closing = Warmth['closings'][number];

/** What stays warm after a run, and when each cut-out that is open will have closed again by itself. */
export function warmthAfter(setup: Setup, { oven, benchMs }: BenchState, heat: RunHeat): Warmth {
  const hottest = Math.max(...Object.values(heat.celsius), -Infinity);
  const closings = cutOutsOf(setup.oven, oven.faults).flatMap((one): Closing[] => {
    if (!heat.open.includes(one.ref) || one.isFixed) return [];
    // Cavity and hood lose their warmth while the magnetron is still losing its own.
    const seconds = coolingTime(hottest, one.closesAt);
    return seconds === Infinity
      ? []
      : [{ part: one.ref, atMs: benchMs + Math.round(seconds * 1000) }];
  });
  return { atMs: benchMs, celsius: heat.celsius, closings };
}

/** The next cut-out to close by itself until then; null: none does. */
export function nextClosing({ oven, warmth }: BenchState, untilMs: number): Closing | null {
  const due = (warmth?.closings ?? [])
    .filter(({ part, atMs }) => oven.opened.includes(part) && atMs <= untilMs)
    .sort((a, b) => a.atMs - b.atMs);
  return due[0] ?? null;
}

/** The bench once that cut-out has closed; with the cord in, the display may come back. */
export function afterClosing(setup: Setup, state: BenchState, { part }: Closing): BenchState {
  const oven = { ...state.oven, opened: state.oven.opened.filter((one) => one !== part) };
  if (!state.isCordIn) return { ...state, oven };
  const { isDisplayLit = null, runsByItself = false } = standing(setup.oven, oven);
  return { ...state, oven, isDisplayLit, runsByItself };
}

/**
 * The oven as it was when a run began that ends now: what time has closed during the run itself is
 * for the run to say. °C of each magnetron then.
 */
export function beforeRun(
  before: BenchState,
  startMs: number,
): { oven: OvenState; celsius: Record<string, number> } {
  const began = Math.max(startMs, before.benchMs);
  const closed = (before.warmth?.closings ?? [])
    .filter(({ atMs }) => atMs <= began)
    .map(({ part }) => part);
  const { warmth } = before;
  const still = { watts: 0, isFanTurning: false };
  const celsius = Object.entries(warmth?.celsius ?? {}).map(([ref, degrees]) => [
    ref,
    warmed(degrees, still, Math.max(0, began - (warmth?.atMs ?? 0)) / 1000),
  ]);
  return {
    oven: { ...before.oven, opened: before.oven.opened.filter((ref) => !closed.includes(ref)) },
    celsius: Object.fromEntries(celsius) as Record<string, number>,
  };
}
