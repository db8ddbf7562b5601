import { along, distance, type BenchPoint } from './bench-point.ts';
import type { ProbeColour } from './bench-scene.ts';

/** Directions a probe's handle may take, radians, best first: from the hands below, the red one from the right. */
const leanings: Readonly<Record<ProbeColour, readonly number[]>> = {
  red: [-0.95, 0.75, -0.5, 0.35, -1.3, -2.2, 2.4],
  black: [2.35, -2.2, 2.7, -2.6, 2, -0.95, 0.75],
};

const length = 132;

/**
 * The direction of a probe's handle from its tip: the first leaning that keeps the handle on the bench
 * and does not lie over the other probe's tip. Radians.
 */
export const probeAngle = (
  colour: ProbeColour,
  tip: BenchPoint,
  other: BenchPoint | null,
  bench: BenchPoint,
): number => {
  const fits = (angle: number): boolean => {
    const end = along(tip, angle, length);
    const onBench = end[0] > 6 && end[0] < bench[0] - 6 && end[1] > 6 && end[1] < bench[1] - 6;
    const isClear =
      other === null ||
      [0.25, 0.45, 0.65, 0.85].every(
        (share) => distance(along(tip, angle, length * share), other) > 22,
      );
    return onBench && isClear;
  };
  const [first, ...others] = leanings[colour];
  return [first!, ...others].find(fits) ?? first!;
};
