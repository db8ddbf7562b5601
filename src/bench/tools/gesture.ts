import { distance, type BenchPoint } from '../geometry/bench-point.ts';
import type { BenchHit } from '../geometry/hit-test.ts';
import type { Hand } from './tool.ts';

/** What a pointer can meet: something of the oven, or a tool that lies or sits there. */
export type Met = BenchHit | { kind: 'tool'; hand: Hand };

/** One pointer on the bench. Nothing happens before it is let go (WCAG 2.5.2). */
export type Gesture =
  | { kind: 'resting' }
  | {
      kind: 'pressing';
      pointerId: number;
      from: BenchPoint;
      /** screen px */ screen: BenchPoint;
      met: Met | null;
    }
  | { kind: 'carrying'; pointerId: number }
  | { kind: 'panning'; pointerId: number; screen: BenchPoint };

export const resting: Gesture = { kind: 'resting' };

export interface GestureEvent {
  kind: 'move' | 'down' | 'up' | 'cancel' | 'leave';
  at: BenchPoint;
  screen: BenchPoint;
  pointerType: 'mouse' | 'touch' | 'pen';
  pointerId: number;
  button: number;
}

export type Effect =
  | { kind: 'tap'; met: Met | null }
  /** a tool is dragged off its place */
  | { kind: 'take'; hand: Hand }
  /** what was dragged is let go over this */
  | { kind: 'drop'; met: Met | null }
  | { kind: 'let-go' }
  /** screen px */
  | { kind: 'pan'; by: BenchPoint }
  | { kind: 'hover'; met: Met | null };

export interface World {
  /** what lies under a bench point, for a hand that is empty or not */ meet: (
    at: BenchPoint,
  ) => Met | null;
  /** the tool whose tip or clip is at a bench point; null: none, or the hand is full */
  toolAt: (at: BenchPoint) => Hand | null;
}

/** px a pointer may stray and still have tapped */
const slop = { mouse: 5, pen: 8, touch: 12 } as const;

const nothing = (gesture: Gesture) => ({ gesture, effects: [] });

/** One event further: what the gesture is now, and what it did. Pure. */
export function followGesture(
  gesture: Gesture,
  event: GestureEvent,
  world: World,
): { gesture: Gesture; effects: Effect[] } {
  if (event.kind === 'cancel') return cancelGesture(gesture);
  if (event.kind === 'leave')
    return { gesture, effects: gesture.kind === 'resting' ? [{ kind: 'hover', met: null }] : [] };
  switch (gesture.kind) {
    case 'resting':
      return fromResting(event, world);
    case 'pressing':
      return event.pointerId === gesture.pointerId
        ? fromPressing(gesture, event, world)
        : nothing(gesture);
    case 'carrying':
      if (event.pointerId !== gesture.pointerId) return nothing(gesture);
      return event.kind === 'up'
        ? { gesture: resting, effects: [{ kind: 'drop', met: world.meet(event.at) }] }
        : { gesture, effects: [{ kind: 'hover', met: world.meet(event.at) }] };
    case 'panning': {
      if (event.pointerId !== gesture.pointerId) return nothing(gesture);
      if (event.kind === 'up') return nothing(resting);
      const by: BenchPoint = [
        event.screen[0] - gesture.screen[0],
        event.screen[1] - gesture.screen[1],
      ];
      return { gesture: { ...gesture, screen: event.screen }, effects: [{ kind: 'pan', by }] };
    }
  }
}

/** A second finger, the system or Escape: what was begun is undone. */
export function cancelGesture(gesture: Gesture): { gesture: Gesture; effects: Effect[] } {
  return { gesture: resting, effects: gesture.kind === 'carrying' ? [{ kind: 'let-go' }] : [] };
}

function fromResting(event: GestureEvent, world: World): { gesture: Gesture; effects: Effect[] } {
  const met = world.meet(event.at);
  if (event.kind === 'move') return { gesture: resting, effects: [{ kind: 'hover', met }] };
  if (event.kind !== 'down' || event.button !== 0) return nothing(resting);
  const { pointerId, at, screen } = event;
  return nothing({ kind: 'pressing', pointerId, from: at, screen, met });
}

function fromPressing(
  gesture: Extract<Gesture, { kind: 'pressing' }>,
  event: GestureEvent,
  world: World,
): { gesture: Gesture; effects: Effect[] } {
  if (event.kind === 'up') {
    const isSame = keyOf(world.meet(event.at)) === keyOf(gesture.met);
    return { gesture: resting, effects: isSame ? [{ kind: 'tap', met: gesture.met }] : [] };
  }
  if (event.kind !== 'move' || distance(event.screen, gesture.screen) <= slop[event.pointerType])
    return nothing(gesture);
  const hand = world.toolAt(gesture.from);
  if (hand)
    return {
      gesture: { kind: 'carrying', pointerId: gesture.pointerId },
      effects: [{ kind: 'take', hand }],
    };
  return nothing({ kind: 'panning', pointerId: gesture.pointerId, screen: event.screen });
}

const keyOf = (met: Met | null): string => {
  switch (met?.kind) {
    case undefined:
      return '';
    case 'target':
      return `target ${met.target}`;
    case 'lead':
      return `lead ${met.ref}`;
    case 'part':
      return `part ${met.ref}`;
    case 'tool':
      return `tool ${JSON.stringify(met.hand)}`;
  }
};
