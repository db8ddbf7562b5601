import { copper, material, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { screw, tab } from '../paint/hardware.ts';
import { box, circle, disc, fill, rule, stroke } from '../paint/outline.ts';
import { apart, linear, radial, raised, type Pen } from '../paint/pen.ts';
import { scorch } from '../paint/scorch.ts';

/** The cooling fan: blades in a moulded shroud, driven by a shaded-pole motor beside it. */
export const paintFan: Glyph = (pen, { size: [width, height], terminals, isTurning, looks }) => {
  const radius = Math.min(width, height) * 0.44;
  const [x, y] = [width / 2, radius + 8];
  paintMotor(pen, width, height, terminals);
  raised(pen, 7, shade.drop, () =>
    box(pen, [0, 0, width, y + radius + 2], 10, material.plastic[1]),
  );
  box(
    pen,
    [0, 0, width, y + radius + 2],
    10,
    linear(
      pen,
      [0, 0, width * 0.6, height],
      [material.plastic[0], material.plastic[1], material.plastic[2]],
    ),
    material.plastic[3],
    1,
  );
  for (const [dx, dy] of [
    [11, 11],
    [width - 11, 11],
    [11, y + radius - 9],
    [width - 11, y + radius - 9],
  ] as const)
    screw(pen, dx, dy, 4.4);
  disc(
    pen,
    [x, y, radius],
    radial(pen, [x, y, radius], [material.plastic[3], material.plastic[3], material.plastic[2]]),
    material.plastic[3],
    2,
  );
  apart(pen, () => {
    circle(pen, x, y, radius - 1);
    pen.clip();
    paintBlades(pen, x, y, radius - 4, isTurning);
    circle(pen, x + 3, y + 6, radius + 3);
    stroke(pen, shade.drop, 9);
  });
  circle(pen, x, y, radius);
  stroke(pen, shade.haze, 1.4);
  if (looks.includes('burnt')) scorch(pen, width * 0.26, height * 0.96, 15);
};

const paintBlades = (pen: Pen, x: number, y: number, radius: number, isTurning: boolean): void => {
  if (isTurning) {
    // Turning blades are a blur: a still picture says so without motion.
    disc(
      pen,
      [x, y, radius],
      radial(
        pen,
        [x, y, radius],
        [
          [0, shade.soft],
          [0.5, shade.sheen],
          [1, shade.haze],
        ],
      ),
    );
    for (let i = 0; i < 9; i++) {
      pen.beginPath();
      pen.arc(x, y, radius * (0.35 + i * 0.07), i * 1.3, i * 1.3 + 1.5);
      stroke(pen, shade.sheen, 1.6);
    }
  } else
    for (let i = 0; i < 5; i++)
      apart(pen, () => {
        pen.translate(x, y);
        pen.rotate((i * Math.PI * 2) / 5 + 0.25);
        pen.beginPath();
        pen.moveTo(10, -9);
        pen.bezierCurveTo(
          radius * 0.45,
          -radius * 0.52,
          radius * 0.8,
          -radius * 0.6,
          radius * 0.86,
          -radius * 0.46,
        );
        pen.bezierCurveTo(
          radius * 1.04,
          -radius * 0.1,
          radius * 0.98,
          radius * 0.16,
          radius * 0.9,
          radius * 0.2,
        );
        pen.bezierCurveTo(radius * 0.6, radius * 0.02, radius * 0.36, radius * 0.06, 11, 8);
        pen.closePath();
        fill(
          pen,
          linear(
            pen,
            [0, -radius * 0.5, radius * 0.5, radius * 0.25],
            [material.zinc[0], material.zinc[2], material.zinc[3]],
          ),
        );
        stroke(pen, material.lamination[3], 1);
        rule(pen, [16, -7, radius * 0.8, -radius * 0.4], shade.gleam, 1);
      });
  raised(pen, 3, shade.drop, () => disc(pen, [x, y, 16], material.zinc[2]));
  disc(pen, [x, y, 16], radial(pen, [x, y, 16], material.zinc), material.lamination[2], 1);
  disc(pen, [x, y, 5], radial(pen, [x, y, 5], material.brass), material.brass[3], 0.8);
};

const paintMotor = (
  pen: Pen,
  width: number,
  height: number,
  terminals: Readonly<Record<string, readonly [number, number]>>,
): void => {
  const [x, y, wide, tall] = [width * 0.05, height * 0.86, width * 0.6, height * 0.2];
  for (const at of Object.values(terminals)) tab(pen, at, Math.PI / 2, 20);
  raised(pen, 4, shade.drop, () => box(pen, [x, y, wide, tall], 3, material.lamination[2]));
  box(
    pen,
    [x, y, wide, tall],
    3,
    linear(
      pen,
      [0, y, 0, y + tall],
      [material.lamination[0], material.lamination[1], material.lamination[2]],
    ),
    material.lamination[3],
    1,
  );
  for (let dy = 3; dy < tall; dy += 2.6)
    rule(pen, [x + 1, y + dy, x + wide - 1, y + dy], shade.soft, 0.6);
  const coil = [x + wide * 0.38, y + 4, wide * 0.3, tall - 2] as const;
  box(
    pen,
    coil,
    4,
    linear(pen, [coil[0], 0, coil[0] + coil[2], 0], [copper[0], copper[1], copper[2]]),
    copper[2],
    0.7,
  );
  for (let dx = 2; dx < coil[2]; dx += 2.2)
    rule(pen, [coil[0] + dx, coil[1] + 1, coil[0] + dx, coil[1] + coil[3] - 1], shade.soft, 0.5);
};
