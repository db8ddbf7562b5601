import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  chainLength,
  distanceToChain,
  flatten,
  smoothPath,
} from '../../../src/bench/geometry/smooth-path.ts';

const point = fc.tuple(fc.integer({ min: 0, max: 1000 }), fc.integer({ min: 0, max: 760 }));

describe('a smooth path', () => {
  it('begins and ends exactly on its ends and runs through every point', () => {
    fc.assert(
      fc.property(
        fc.uniqueArray(point, { minLength: 2, maxLength: 9, selector: String }),
        (points) => {
          const curve = flatten(smoothPath(points));
          expect(curve[0]).toEqual(points[0]);
          expect(curve.at(-1)).toEqual(points.at(-1));
          for (const through of points) expect(distanceToChain(through, curve)).toBeLessThan(1e-6);
        },
      ),
    );
  });

  it('of two points is straight', () => {
    const curve = flatten(
      smoothPath([
        [0, 0],
        [30, 40],
      ]),
    );
    expect(chainLength(curve)).toBeCloseTo(50, 9);
    expect(distanceToChain([15, 20], curve)).toBeCloseTo(0, 9);
  });

  it('of points on a line stays on the line and does not turn back', () => {
    const curve = flatten(
      smoothPath([
        [0, 0],
        [10, 0],
        [100, 0],
        [101, 0],
      ]),
    );
    expect(curve.every(([, y]) => Math.abs(y) < 1e-9)).toBe(true);
    expect(chainLength(curve)).toBeCloseTo(101, 6);
  });

  it('leaves out points given twice', () => {
    expect(
      smoothPath([
        [5, 5],
        [5, 5],
      ]),
    ).toEqual([]);
    expect(
      smoothPath([
        [0, 0],
        [9, 0],
        [9, 0],
        [9, 9],
      ]),
    ).toHaveLength(2);
  });
});

it('measures the distance to a chain by hand-made triangles', () => {
  expect(
    distanceToChain(
      [0, 5],
      [
        [-10, 0],
        [10, 0],
      ],
    ),
  ).toBe(5);
  expect(
    distanceToChain(
      [13, 4],
      [
        [-10, 0],
        [10, 0],
      ],
    ),
  ).toBe(5);
  expect(
    distanceToChain(
      [3, 4],
      [
        [0, 0],
        [0, 0],
      ],
    ),
  ).toBe(5);
  expect(distanceToChain([1, 1], [])).toBe(Infinity);
});
