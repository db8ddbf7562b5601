import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  fitCamera,
  keepInView,
  panBy,
  pinchCamera,
  toBench,
  toScreen,
  wheelFactor,
  zoomAbout,
  zoomLimits,
} from '../../../src/bench/camera/camera.ts';

const coordinate = fc.double({ min: -4000, max: 4000, noNaN: true });
const point = fc.tuple(coordinate, coordinate);
const camera = fc.record({
  zoom: fc.double({ min: zoomLimits.min, max: zoomLimits.max, noNaN: true }),
  x: coordinate,
  y: coordinate,
});

describe('the camera', () => {
  it('brings every point back: bench to screen to bench', () => {
    fc.assert(
      fc.property(camera, point, (view, at) => {
        const [x, y] = toBench(view, toScreen(view, at));
        expect(x).toBeCloseTo(at[0], 6);
        expect(y).toBeCloseTo(at[1], 6);
      }),
    );
  });

  it('fits the bench into a view and centres it', () => {
    // 836 / 1000 = 0.836 < 652 / 760: the width decides; (652 - 760 x 0.836) / 2 = 8.32 above and below.
    const fit = fitCamera({ width: 836, height: 652 }, [1000, 760]);
    expect(fit.zoom).toBeCloseTo(0.836, 9);
    expect(fit.x).toBeCloseTo(0, 9);
    expect(fit.y).toBeCloseTo(8.32, 9);
    expect(fitCamera({ width: 0, height: 0 }, [1000, 760]).zoom).toBe(1);
  });

  it('zooms about a point that stays where it is, between its limits', () => {
    fc.assert(
      fc.property(
        camera,
        point,
        fc.double({ min: 0.1, max: 10, noNaN: true }),
        (view, about, by) => {
          const next = zoomAbout(view, about, by);
          const [x, y] = toScreen(next, toBench(view, about));
          expect(x).toBeCloseTo(about[0], 5);
          expect(y).toBeCloseTo(about[1], 5);
          expect(next.zoom).toBeGreaterThanOrEqual(zoomLimits.min);
          expect(next.zoom).toBeLessThanOrEqual(zoomLimits.max);
        },
      ),
    );
  });

  it('pans by screen px', () => {
    expect(panBy({ zoom: 2, x: 10, y: 20 }, [5, -7])).toEqual({ zoom: 2, x: 15, y: 13 });
  });

  it('pinches: zooms by the spread, pans by the middle', () => {
    const before = [
      [100, 100],
      [200, 100],
    ] as const;
    const after = [
      [80, 140],
      [280, 140],
    ] as const;
    const next = pinchCamera({ zoom: 1, x: 0, y: 0 }, before, after);
    expect(next.zoom).toBeCloseTo(2, 9);
    // The bench point that was under the fingers' middle (150, 100) is under the new one (180, 140).
    expect(toBench(next, [180, 140])).toEqual([150, 100]);
  });

  it('never loses the bench off the screen', () => {
    fc.assert(
      fc.property(camera, (view) => {
        const kept = keepInView(view, { width: 800, height: 600 }, [1000, 760]);
        const [right, bottom] = toScreen(kept, [1000, 760]);
        expect(right).toBeGreaterThan(99);
        expect(bottom).toBeGreaterThan(75);
        expect(kept.x).toBeLessThan(701);
        expect(kept.y).toBeLessThan(525);
      }),
    );
  });

  it('zooms in by a wheel away from the hand, out by one towards it, and back by the same', () => {
    expect(wheelFactor(-100, false)).toBeGreaterThan(1);
    expect(wheelFactor(100, false)).toBeLessThan(1);
    expect(wheelFactor(100, false) * wheelFactor(-100, false)).toBeCloseTo(1, 9);
  });
});
