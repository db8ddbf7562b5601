import { describe, expect, it } from 'vitest';
import {
  followPinch,
  noFingers,
  type FingerEvent,
  type PinchStep,
} from '../../../src/bench/camera/pinch-gesture.ts';

const play = (events: readonly FingerEvent[]): PinchStep[] => {
  const steps: PinchStep[] = [];
  for (const event of events) steps.push(followPinch(steps.at(-1)?.fingers ?? noFingers, event));
  return steps;
};

describe('fingers on the bench', () => {
  it('lets one finger press, move and let go', () => {
    const steps = play([
      { kind: 'down', id: 1, at: [10, 10] },
      { kind: 'move', id: 1, at: [20, 10] },
      { kind: 'up', id: 1, at: [20, 10] },
    ]);
    expect(steps.map(({ press }) => press)).toEqual(['down', 'move', 'up']);
    expect(steps.map(({ pinch }) => pinch)).toEqual([null, null, null]);
  });

  it('cancels the press when a second finger lands, then pinches until both are up', () => {
    const steps = play([
      { kind: 'down', id: 1, at: [10, 10] },
      { kind: 'down', id: 2, at: [50, 10] },
      { kind: 'move', id: 2, at: [90, 10] },
      { kind: 'up', id: 1, at: [10, 10] },
      { kind: 'move', id: 2, at: [95, 10] },
      { kind: 'up', id: 2, at: [95, 10] },
      { kind: 'down', id: 3, at: [5, 5] },
    ]);
    expect(steps.map(({ press }) => press)).toEqual([
      'down',
      'cancel',
      null,
      null,
      null,
      null,
      'down',
    ]);
    expect(steps[2]!.pinch).toEqual({
      before: [
        [10, 10],
        [50, 10],
      ],
      after: [
        [10, 10],
        [90, 10],
      ],
    });
    expect(steps[4]!.pinch).toBeNull();
  });
});
