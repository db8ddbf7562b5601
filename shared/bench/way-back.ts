import { settingOf } from '../instruments/meters.ts';
import type { BenchState, WayBack } from './bench-state.ts';
import type { WireEvent } from './event.ts';
import type { Setup } from './setup.ts';

/** The bench after something was done, knowing the way back to before it. `before` has its time brought to it. */
export function withWayBack(
  setup: Setup,
  before: BenchState,
  after: BenchState,
  event: WireEvent,
): BenchState {
  if (!setup.mayStepBack) return after;
  if (before.wayBack?.isOffered && isMetersOwn(setup, before, event)) return after;
  const wayBack: WayBack = {
    before: { ...before, wayBack: null },
    done: event.type,
    atMs: event.benchMs,
    isOffered: false,
  };
  return { ...after, wayBack };
}

/** A display that stood and was noted; an auto-ranging meter that went to another range of the same dial place. */
export function isMetersOwn(setup: Setup, before: BenchState, event: WireEvent): boolean {
  if (event.type === 'ReadingTaken') return true;
  if (event.type !== 'MeterSet' || !setup.meter.isAutoRanging) return false;
  const [from, to] = [before.meter.setting, String(event.data['setting'])].map((id) =>
    settingOf(setup.meter, id),
  );
  return from?.dial === to?.dial;
}
