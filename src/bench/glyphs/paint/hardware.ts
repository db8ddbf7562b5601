import { material, shade } from '../../../styles/tokens.ts';
import { grain } from './grain.ts';
import { box, circle, disc, rule, stroke, type Rect } from './outline.ts';
import { apart, linear, radial, raised, type Pen } from './pen.ts';

/** A cross-head screw. */
export const screw = (pen: Pen, x: number, y: number, radius = 5): void => {
  raised(pen, 1.2, shade.drop, () => disc(pen, [x, y, radius], material.tin[2]));
  disc(
    pen,
    [x, y, radius],
    radial(pen, [x, y, radius], material.tin.slice(0, 3)),
    material.tin[3],
    0.7,
  );
  const turn = grain(x * 3 + y) * Math.PI;
  apart(pen, () => {
    pen.translate(x, y);
    pen.rotate(turn);
    pen.lineCap = 'round';
    const reach = radius * 0.55;
    rule(pen, [-reach, 0, reach, 0], material.tin[3], radius * 0.28);
    rule(pen, [0, -reach, 0, reach], material.tin[3], radius * 0.28);
  });
};

/** A flat rivet or spot weld. */
export const rivet = (pen: Pen, x: number, y: number, radius = 2.6): void => {
  disc(
    pen,
    [x, y, radius],
    radial(pen, [x, y, radius], [material.zinc[0], material.zinc[2]]),
    material.zinc[3],
    0.5,
  );
};

/** A pressed hole, darker than its sheet, lit on its lower edge. */
export const hole = (pen: Pen, x: number, y: number, radius: number): void => {
  disc(pen, [x, y, radius], material.lamination[2]);
  pen.beginPath();
  pen.arc(x, y, radius, 0.1 * Math.PI, 0.7 * Math.PI);
  stroke(pen, shade.gleam, 0.8);
};

/** A push-on tab that a receptacle slides over; `angle`: radians, the way it points. The terminal is its middle. */
export const tab = (
  pen: Pen,
  [x, y]: readonly [number, number],
  angle: number,
  length = 22,
): void =>
  apart(pen, () => {
    pen.translate(x, y);
    pen.rotate(angle);
    raised(pen, 1.4, shade.drop, () =>
      box(pen, [-length + 8, -4.4, length, 8.8], 1.4, material.tin[2]),
    );
    box(
      pen,
      [-length + 8, -4.4, length, 8.8],
      1.4,
      linear(pen, [0, -4.4, 0, 4.4], [material.tin[0], material.tin[1], material.tin[2]]),
      material.tin[3],
      0.7,
    );
  });

/** A soldered pad on a board, its hole under the terminal. */
export const pad = (pen: Pen, [x, y]: readonly [number, number]): void => {
  disc(pen, [x, y, 9], radial(pen, [x, y, 9], material.tin.slice(0, 3)), material.tin[3], 0.6);
  circle(pen, x, y, 11.5);
  stroke(pen, shade.haze, 1.4);
};

/** Fine lines of brushed or rolled sheet along x, inside a rectangle. */
export const brushed = (pen: Pen, [x, y, width, height]: Rect, seed: number, step = 2.2): void =>
  apart(pen, () => {
    pen.beginPath();
    pen.rect(x, y, width, height);
    pen.clip();
    for (let i = 0; i * step < height; i++) {
      const start = x + grain(seed + i * 2) * width * 0.6 - width * 0.1;
      const length = (0.25 + grain(seed + i * 2 + 1) * 0.6) * width;
      const at = y + i * step + grain(seed + i) * step;
      rule(pen, [start, at, start + length, at], i % 2 === 0 ? shade.haze : shade.faint, 0.5);
    }
  });

/** A band of stamped louvres. */
export const louvres = (pen: Pen, [x, y, width, height]: Rect, count: number): void => {
  const step = width / count;
  for (let i = 0; i < count; i++) {
    const at = x + i * step;
    box(pen, [at, y, step * 0.55, height], step * 0.27, material.lamination[2]);
    rule(pen, [at + step * 0.62, y + 2, at + step * 0.62, y + height - 2], shade.gleam, 1);
  }
};

/** Printing on a board: a thin outline. */
export const silk = (pen: Pen, rect: Rect, radius = 2): void => {
  box(pen, rect, radius, shade.clear, shade.sheen, 0.9);
};
