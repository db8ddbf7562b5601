import type { BenchPoint } from '../../geometry/bench-point.ts';
import { insulation, material, shade } from '../../../styles/tokens.ts';
import { paintWire } from '../lead/paint-curve.ts';
import { box, rule } from '../paint/outline.ts';
import { apart, linear, raised, type Pen } from '../paint/pen.ts';

/** The cord's jacket over its three leads, and the strain relief where it enters the oven. */
export const paintCord = (pen: Pen, cord: readonly BenchPoint[]): void => {
  const entry = cord.at(-1);
  if (entry === undefined) return;
  paintWire(pen, cord, 13, insulation.black, shade.drop);
  apart(pen, () => {
    pen.translate(entry[0], entry[1]);
    raised(pen, 3, shade.drop, () => box(pen, [-16, -12, 14, 24], 4, material.plastic[2]));
    box(
      pen,
      [-16, -12, 14, 24],
      4,
      linear(pen, [0, -12, 0, 12], [material.plastic[0], material.plastic[2], material.plastic[3]]),
      material.plastic[3],
      0.8,
    );
    box(
      pen,
      [-3, -9, 8, 18],
      2,
      linear(pen, [0, -9, 0, 9], [material.plastic[0], material.plastic[2], material.plastic[3]]),
    );
    for (const x of [-12, -8]) rule(pen, [x, -10, x, 10], shade.haze, 1);
  });
};
