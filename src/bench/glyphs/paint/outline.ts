import type { Pen } from './pen.ts';

export type Rect = readonly [number, number, number, number];

/** Traces a rectangle (x, y, width, height) with round corners. */
export const roundRect = (pen: Pen, [x, y, width, height]: Rect, radius: number): void => {
  const r = Math.max(0, Math.min(radius, width / 2, height / 2));
  pen.beginPath();
  pen.moveTo(x + r, y);
  pen.arcTo(x + width, y, x + width, y + height, r);
  pen.arcTo(x + width, y + height, x, y + height, r);
  pen.arcTo(x, y + height, x, y, r);
  pen.arcTo(x, y, x + width, y, r);
  pen.closePath();
};

/** Traces a circle. */
export const circle = (pen: Pen, x: number, y: number, radius: number): void => {
  pen.beginPath();
  pen.arc(x, y, radius, 0, Math.PI * 2);
};

/** Traces a chain of straight pieces. */
export const chain = (pen: Pen, points: readonly (readonly [number, number])[]): void => {
  pen.beginPath();
  points.forEach(([x, y], i) => (i === 0 ? pen.moveTo(x, y) : pen.lineTo(x, y)));
};

export type Ink = string | CanvasGradient | CanvasPattern;

/** Fills what was traced. */
export const fill = (pen: Pen, ink: Ink): void => {
  pen.fillStyle = ink;
  pen.fill();
};

/** Strokes what was traced. */
export const stroke = (pen: Pen, ink: Ink, width: number): void => {
  pen.strokeStyle = ink;
  pen.lineWidth = width;
  pen.stroke();
};

/** A filled rectangle with round corners, and an edge if one is given. */
export const box = (
  pen: Pen,
  rect: Rect,
  radius: number,
  ink: Ink,
  edge?: Ink,
  width = 1,
): void => {
  roundRect(pen, rect, radius);
  fill(pen, ink);
  if (edge !== undefined) stroke(pen, edge, width);
};

/** A filled circle, and an edge if one is given. */
export const disc = (
  pen: Pen,
  [x, y, radius]: readonly [number, number, number],
  ink: Ink,
  edge?: Ink,
  width = 1,
): void => {
  circle(pen, x, y, radius);
  fill(pen, ink);
  if (edge !== undefined) stroke(pen, edge, width);
};

/** One straight stroke. */
export const rule = (
  pen: Pen,
  [x0, y0, x1, y1]: readonly [number, number, number, number],
  ink: Ink,
  width: number,
): void => {
  chain(pen, [
    [x0, y0],
    [x1, y1],
  ]);
  stroke(pen, ink, width);
};
