import type { BenchPoint } from '../geometry/bench-point.ts';

/** The fingers on the screen, and whether two of them have met: then none of them presses until all are up. */
export interface Fingers {
  down: readonly { id: number; at: BenchPoint }[];
  isPinching: boolean;
}

export const noFingers: Fingers = { down: [], isPinching: false };

export interface FingerEvent {
  kind: 'down' | 'move' | 'up' | 'cancel';
  id: number;
  /** screen px */ at: BenchPoint;
}

/** Two fingers before and after a move, screen px. */
export interface PinchMove {
  before: readonly [BenchPoint, BenchPoint];
  after: readonly [BenchPoint, BenchPoint];
}

export interface PinchStep {
  fingers: Fingers;
  /** what a press makes of the event; null: nothing, the fingers pinch */
  press: FingerEvent['kind'] | null;
  pinch: PinchMove | null;
}

/** One finger presses; a second one that lands cancels the press and begins a pinch. Pure. */
export const followPinch = (fingers: Fingers, event: FingerEvent): PinchStep => {
  const others = fingers.down.filter(({ id }) => id !== event.id);
  const isUp = event.kind === 'up' || event.kind === 'cancel';
  const down = isUp ? others : replaceOrAdd(fingers.down, event);
  const isPinching = down.length > 0 && (fingers.isPinching || down.length > 1);
  const next = { down, isPinching };
  if (event.kind === 'down' && down.length > 1)
    return { fingers: next, press: fingers.isPinching ? null : 'cancel', pinch: null };
  if (!fingers.isPinching) return { fingers: next, press: event.kind, pinch: null };
  const before = pairOf(fingers);
  const after = pairOf(next);
  const pinch = event.kind === 'move' && before && after ? { before, after } : null;
  return { fingers: next, press: null, pinch };
};

const replaceOrAdd = (down: Fingers['down'], { id, at, kind }: FingerEvent): Fingers['down'] => {
  if (down.some((finger) => finger.id === id))
    return down.map((finger) => (finger.id === id ? { id, at } : finger));
  return kind === 'down' ? [...down, { id, at }] : down;
};

const pairOf = ({ down }: Fingers): [BenchPoint, BenchPoint] | null => {
  const [a, b] = down;
  return a === undefined || b === undefined ? null : [a.at, b.at];
};
