import type { WireEvent } from './event.ts';

/** Which events of a record, by place, were taken back by a step back: what was done, never the hazard it brought. */
export function undonePlaces(events: readonly WireEvent[]): ReadonlySet<number> {
  const undone = new Set<number>();
  events.forEach(({ type, data }, place) => {
    if (type !== 'SteppedBack') return;
    const at = events
      .slice(0, place)
      .findLastIndex((one) => one.type === data['undone'] && one.benchMs === data['doneAtMs']);
    if (at >= 0) undone.add(at);
  });
  return undone;
}

/** The record without what was taken back. */
export function withoutUndone<E extends WireEvent>(events: readonly E[]): readonly E[] {
  const undone = undonePlaces(events);
  return undone.size === 0 ? events : events.filter((_event, place) => !undone.has(place));
}
