import { along, distance, type BenchPoint } from './bench-point.ts';
import type { ProbeColour } from './bench-scene.ts';
import { distanceToChain } from './smooth-path.ts';

/** From a probe's tip to where its cable leaves the handle, units. */
export const probeLength = 132;

/** Where a hand holds a probe from, radians: both from below, the red one from the right. */
const usual: Readonly<Record<ProbeColour, number>> = { red: 0.8, black: 2.35 };

const step = Math.PI / 12;

/**
 * The direction of a probe's handle from its tip, radians. Of 24 directions the one that covers the
 * fewest targets, stays on the bench, keeps off the other probe's tip and is nearest to how a hand
 * would hold it. With nothing to cover (in hand, moving) it depends on the tip alone and does not jump about.
 */
export const probeAngle = (
  colour: ProbeColour,
  tip: BenchPoint,
  other: BenchPoint | null,
  covered: readonly BenchPoint[],
  bench: BenchPoint,
): number => {
  let best = usual[colour];
  let least = Infinity;
  for (let i = 0; i < 24; i++) {
    const angle = usual[colour] + (i % 2 === 0 ? 1 : -1) * Math.ceil(i / 2) * step;
    const cost = poseCost(tip, angle, other, covered, bench) + Math.ceil(i / 2) * 0.7;
    if (cost < least) [best, least] = [angle, cost];
  }
  return best;
};

const poseCost = (
  tip: BenchPoint,
  angle: number,
  other: BenchPoint | null,
  covered: readonly BenchPoint[],
  bench: BenchPoint,
): number => {
  const end = along(tip, angle, probeLength);
  const handle = [along(tip, angle, 20), end];
  const off =
    Math.max(0, 8 - end[0], end[0] - bench[0] + 8) + Math.max(0, 8 - end[1], end[1] - bench[1] + 8);
  const hides = covered.filter(
    (point) => distance(point, tip) > 4 && distanceToChain(point, handle) < 13,
  ).length;
  const meets = other !== null && distanceToChain(other, handle) < 22 ? 30 : 0;
  return off * 0.6 + hides * 1.6 + meets;
};
