import type { BenchPoint } from '../../geometry/bench-point.ts';
import { smoothPath } from '../../geometry/smooth-path.ts';
import type { Pen } from '../paint/pen.ts';

/** Traces the smooth curve through points, moved by an offset: for shadows and highlights. */
export const traceCurve = (
  pen: Pen,
  points: readonly BenchPoint[],
  [dx, dy]: BenchPoint = [0, 0],
): void => {
  pen.beginPath();
  smoothPath(points).forEach(([a, b, c, d], i) => {
    if (i === 0) pen.moveTo(a[0] + dx, a[1] + dy);
    pen.bezierCurveTo(b[0] + dx, b[1] + dy, c[0] + dx, c[1] + dy, d[0] + dx, d[1] + dy);
  });
};

/** A round, insulated wire lying on the bench: shadow, edge, body, light. `tones`: light, body, shade. */
export const paintWire = (
  pen: Pen,
  points: readonly BenchPoint[],
  width: number,
  tones: readonly [string, string, string],
  shadow: string,
): void => {
  pen.lineCap = 'round';
  pen.lineJoin = 'round';
  const run = (ink: string, thick: number, offset?: BenchPoint): void => {
    traceCurve(pen, points, offset);
    pen.strokeStyle = ink;
    pen.lineWidth = thick;
    pen.stroke();
  };
  run(shadow, width + 1.6, [width * 0.35, width * 0.75]);
  run(tones[2], width + 1.1);
  run(tones[1], width - 0.5);
  run(tones[0], width * 0.26, [-width * 0.12, -width * 0.2]);
};
