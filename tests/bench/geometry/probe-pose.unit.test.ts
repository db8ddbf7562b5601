import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { benchSize } from '../../../src/bench/geometry/bench-furniture.ts';
import { along, distance, type BenchPoint } from '../../../src/bench/geometry/bench-point.ts';
import { probeAngle, probeLength } from '../../../src/bench/geometry/probe-pose.ts';
import { distanceToChain } from '../../../src/bench/geometry/smooth-path.ts';
import { drawing } from '../../support/larkfield.ts';

const targets = [...drawing.targets.values()].map(({ at }) => at);

describe('how a probe is held', () => {
  it('comes from below in the open, the red one from the right, the black one from the left', () => {
    const tip: BenchPoint = [500, 300];
    expect(probeAngle('red', tip, null, [], benchSize)).toBeCloseTo(0.8, 9);
    expect(probeAngle('black', tip, null, [], benchSize)).toBeCloseTo(2.35, 9);
  });

  it('keeps its handle on the bench from every target, and off the other tip', () => {
    fc.assert(
      fc.property(fc.constantFrom(...targets), fc.constantFrom(...targets), (tip, other) => {
        fc.pre(tip !== other);
        const angle = probeAngle('red', tip, other, targets, benchSize);
        const [x, y] = along(tip, angle, probeLength);
        expect(x > 0 && y > 0 && x < benchSize[0] && y < benchSize[1] + 24).toBe(true);
        const handle = [along(tip, angle, 20), along(tip, angle, probeLength)];
        expect(distance(tip, other) < 40 || distanceToChain(other, handle) > 12).toBe(true);
      }),
    );
  });
});
