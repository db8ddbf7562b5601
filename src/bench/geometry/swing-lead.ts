import { between, type BenchPoint } from './bench-point.ts';
import type { SceneLead } from './bench-scene.ts';

/** How far along a moved end is at a share of the time: out past its place a little, and back. */
const settle = (share: number): number => {
  const rest = 1 - share;
  return 1 - rest * rest * (1 - 1.4 * share);
};

/** A lead on its way from where it was to where it is, at a share (0 to 1) of the time. Seated ends are exact at 1. */
export const swingLead = (from: SceneLead, to: SceneLead, share: number): SceneLead => {
  const t = settle(share);
  const end = (i: 0 | 1): BenchPoint => between(from.ends[i].at, to.ends[i].at, t);
  return {
    ...to,
    path: [end(0), ...to.path.slice(1, -1), end(1)],
    ends: [
      { ...to.ends[0], at: end(0) },
      { ...to.ends[1], at: end(1) },
    ],
  };
};
