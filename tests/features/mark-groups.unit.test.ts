import { describe, expect, it } from 'vitest';
import { markGroups } from '../../src/features/debrief/mark-groups.ts';
import { pointsText } from '../../src/features/debrief/points-text.ts';

describe('markGroups', () => {
  it('makes one line of marks that say the same, with all their moments', () => {
    const settled = 'You waited until the reading stood.';
    const groups = markGroups([
      { points: 1, why: settled, sequence: 17 },
      { points: -2, why: 'You never proved the meter.', sequence: null },
      { points: 1, why: settled, sequence: 23 },
    ]);
    expect(groups).toEqual([
      { why: settled, points: 2, moments: [17, 23] },
      { why: 'You never proved the meter.', points: -2, moments: [] },
    ]);
  });
});

describe('pointsText', () => {
  it.each([
    [5, '+5'],
    [-10, '−10'],
    [0, '0'],
  ])('writes %d', (points, text) => {
    expect(pointsText(points)).toBe(text);
  });
});
