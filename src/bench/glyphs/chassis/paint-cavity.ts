import type { BenchBox } from '../../geometry/bench-box.ts';
import { material, shade } from '../../../styles/tokens.ts';
import { brushed, hole, rivet, screw } from '../paint/hardware.ts';
import { paintCaution } from './paint-caution.ts';
import { box, circle, disc, fill, roundRect, rule, stroke, type Rect } from '../paint/outline.ts';
import { apart, linear, radial, raised, type Pen } from '../paint/pen.ts';

/** The cavity's place in the chassis, as shares of it, and the middle of its opening. */
const cavityIn = ({ at, size }: BenchBox): Rect => [
  at[0] + size[0] * 0.028,
  at[1] + size[1] * 0.44,
  size[0] * 0.362,
  size[1] * 0.538,
];

/** The cooking cavity from outside, its roof cut open in a circle so that the turntable shows. */
export const paintCavity = (pen: Pen, chassis: BenchBox): void => {
  const cavity = cavityIn(chassis);
  const [x, y, width, height] = cavity;
  paintWaveguide(pen, [x + width - 20, y + height * 0.17, 62, 66]);
  raised(pen, 9, shade.drop, () => box(pen, cavity, 5, material.enamel[2]));
  box(
    pen,
    cavity,
    5,
    linear(
      pen,
      [x, y, x + width, y + height],
      [material.enamel[0], material.enamel[1], material.enamel[2]],
    ),
    material.enamel[3],
    1,
  );
  brushed(pen, cavity, 91, 4);
  roundRect(pen, [x + 7, y + 7, width - 14, height - 14], 3);
  stroke(pen, shade.soft, 1);
  roundRect(pen, [x + 8, y + 8, width - 16, height - 16], 3);
  stroke(pen, shade.gleam, 1);
  rule(pen, [x + 3, y + 1, x + width - 3, y + 1], shade.gleam, 1.2);
  for (let i = 0; i < 8; i++) {
    rivet(pen, x + 20 + (i * (width - 40)) / 7, y + 3.6, 1.7);
    rivet(pen, x + 20 + (i * (width - 40)) / 7, y + height - 3.6, 1.7);
  }
  for (let row = 0; row < 4; row++)
    for (let i = 0; i < 7; i++) hole(pen, x + 128 + i * 8 + (row % 2) * 4, y + 26 + row * 7, 2.1);
  paintOpening(pen, [x + width / 2, y + height * 0.55, 112]);
  paintCaution(pen, x + 14, y + height - 54);
  for (const [dx, dy] of [
    [18, height - 20],
    [width - 18, height - 20],
    [18, 150],
    [width - 18, 150],
  ] as const)
    screw(pen, x + dx, y + dy, 4);
};

/** The duct from the magnetron into the cavity's side. */
const paintWaveguide = (pen: Pen, duct: Rect): void => {
  const [x, y, width, height] = duct;
  raised(pen, 5, shade.drop, () => box(pen, duct, 2, material.zinc[1]));
  box(
    pen,
    duct,
    2,
    linear(pen, [x, y, x, y + height], [material.zinc[0], material.zinc[1], material.zinc[2]]),
    material.zinc[3],
    0.8,
  );
  rule(pen, [x + width - 12, y, x + width - 12, y + height], material.zinc[3], 0.8);
  for (const dy of [10, height - 10]) rivet(pen, x + width - 6, y + dy, 2.2);
};

const paintOpening = (pen: Pen, [x, y, radius]: readonly [number, number, number]): void => {
  disc(
    pen,
    [x, y, radius],
    linear(
      pen,
      [x - radius, y - radius, x + radius, y + radius],
      [material.enamel[3], material.enamel[1]],
    ),
  );
  apart(pen, () => {
    circle(pen, x, y, radius - 3);
    pen.clip();
    fill(
      pen,
      radial(
        pen,
        [x, y, radius],
        [
          [0, material.enamel[2]],
          [0.62, material.enamel[3]],
          [1, material.lamination[1]],
        ],
      ),
    );
    // The roof's edge shades the floor below it.
    circle(pen, x + 5, y + 9, radius + 2);
    stroke(pen, shade.soft, 16);
    circle(pen, x + 3, y + 5, radius);
    stroke(pen, shade.soft, 9);
    paintTray(pen, x, y + 2, radius - 16);
  });
  circle(pen, x, y, radius);
  stroke(pen, material.enamel[3], 1.2);
  circle(pen, x, y, radius + 1.4);
  stroke(pen, shade.gleam, 1);
};

/** The glass turntable with its roller ring, seen through itself. */
const paintTray = (pen: Pen, x: number, y: number, radius: number): void => {
  circle(pen, x, y, radius);
  fill(
    pen,
    radial(
      pen,
      [x, y, radius],
      [
        [0, shade.haze],
        [0.86, shade.sheen],
        [1, shade.gleam],
      ],
    ),
  );
  stroke(pen, material.glass[2], 1.6);
  circle(pen, x, y, radius - 7);
  stroke(pen, shade.gleam, 1.4);
  circle(pen, x, y, radius * 0.74);
  stroke(pen, material.nylon[2], 4);
  circle(pen, x, y, radius * 0.74);
  stroke(pen, material.nylon[0], 1.4);
  for (const turn of [0.5, 2.6, 4.7]) {
    const at = [x + Math.cos(turn) * radius * 0.74, y + Math.sin(turn) * radius * 0.74] as const;
    disc(
      pen,
      [at[0], at[1], 7],
      radial(pen, [at[0], at[1], 7], material.nylon.slice(0, 3)),
      material.nylon[3],
      0.8,
    );
    disc(pen, [at[0], at[1], 2], material.nylon[3]);
  }
  pen.beginPath();
  pen.arc(x, y, radius - 12, 1.05 * Math.PI, 1.42 * Math.PI);
  stroke(pen, shade.gleam, 3.4);
};
