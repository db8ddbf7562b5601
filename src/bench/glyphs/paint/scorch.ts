import { material, shade } from '../../../styles/tokens.ts';
import { grain } from './grain.ts';
import { circle, disc, fill } from './outline.ts';
import { apart, radial, type Pen } from './pen.ts';

/** A burnt place: brown at its edge, black in its middle, with soot thrown about it. */
export const scorch = (pen: Pen, x: number, y: number, radius: number): void =>
  apart(pen, () => {
    circle(pen, x, y, radius * 1.4);
    pen.globalAlpha = 0.55;
    fill(
      pen,
      radial(
        pen,
        [x, y, radius * 1.4],
        [
          [0, material.soot[2]],
          [0.6, material.soot[0]],
          [1, shade.clear],
        ],
      ),
    );
    pen.globalAlpha = 0.92;
    circle(pen, x, y, radius * 0.8);
    fill(
      pen,
      radial(
        pen,
        [x, y, radius * 0.8],
        [
          [0, material.soot[3]],
          [0.7, material.soot[2]],
          [1, shade.clear],
        ],
      ),
    );
    for (let i = 0; i < 14; i++) {
      const angle = grain(i + x) * Math.PI * 2;
      const away = radius * (0.6 + grain(i * 7 + y) * 1.1);
      disc(
        pen,
        [x + Math.cos(angle) * away, y + Math.sin(angle) * away, 0.5 + grain(i) * 1.1],
        material.soot[2],
      );
    }
  });

/** A crack: a dark broken line with a light lip. */
export const crack = (
  pen: Pen,
  from: readonly [number, number],
  to: readonly [number, number],
): void => {
  const steps = 7;
  const trace = (dx: number, dy: number): void => {
    pen.beginPath();
    for (let i = 0; i <= steps; i++) {
      const t = i / steps;
      const off = i === 0 || i === steps ? 0 : (grain(i * 13 + from[0]) - 0.5) * 12;
      const x = from[0] + (to[0] - from[0]) * t - off * 0.5 + dx;
      const y = from[1] + (to[1] - from[1]) * t + off * 0.5 + dy;
      if (i === 0) pen.moveTo(x, y);
      else pen.lineTo(x, y);
    }
  };
  trace(0.8, 0.8);
  pen.strokeStyle = shade.gleam;
  pen.lineWidth = 1;
  pen.stroke();
  trace(0, 0);
  pen.strokeStyle = material.soot[3];
  pen.lineWidth = 1.6;
  pen.stroke();
};

/** A wet patch of leaked oil. */
export const oilStain = (pen: Pen, x: number, y: number, radius: number): void => {
  for (let i = 0; i < 5; i++) {
    pen.beginPath();
    pen.ellipse(
      x + (grain(i + 3) - 0.5) * radius,
      y + (grain(i + 9) - 0.3) * radius,
      radius * (0.5 + grain(i) * 0.5),
      radius * (0.25 + grain(i + 5) * 0.3),
      0.2,
      0,
      Math.PI * 2,
    );
    fill(pen, shade.oil);
  }
};
