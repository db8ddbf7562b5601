import type { BenchPoint } from '../../geometry/bench-point.ts';

/** The ends and the corners of a way, without what lies straight between. */
export const corners = (points: readonly BenchPoint[]): BenchPoint[] =>
  points.filter((point, i) => {
    const before = points[i - 1];
    const after = points[i + 1];
    if (!before || !after) return true;
    return (
      before[0] - point[0] !== point[0] - after[0] || before[1] - point[1] !== point[1] - after[1]
    );
  });
