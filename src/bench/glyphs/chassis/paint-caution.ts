import { material, palette, shade } from '../../../styles/tokens.ts';
import { box, chain, fill, rule, stroke } from '../paint/outline.ts';
import { apart, raised, type Pen } from '../paint/pen.ts';

/** The maker's caution label: the warning sign for electricity (ISO 7010 W012) and lines of small print. */
export const paintCaution = (pen: Pen, x: number, y: number): void =>
  apart(pen, () => {
    pen.translate(x, y);
    raised(pen, 1, shade.soft, () => box(pen, [0, 0, 96, 38], 3, material.nylon[0]));
    box(pen, [0, 0, 96, 38], 3, material.nylon[0], material.nylon[2], 0.8);
    pen.lineJoin = 'round';
    chain(pen, [
      [19, 6],
      [34, 32],
      [4, 32],
    ]);
    pen.closePath();
    fill(pen, palette.caution);
    stroke(pen, palette.ink, 2.2);
    chain(pen, [
      [21.5, 12],
      [16, 21.5],
      [21, 21.5],
      [17.5, 29],
    ]);
    stroke(pen, palette.ink, 1.8);
    for (const [i, width] of [48, 52, 40, 50, 30].entries())
      rule(
        pen,
        [40, 9 + i * 5.2, 40 + width, 9 + i * 5.2],
        i === 0 ? palette.ink : material.nylon[3],
        i === 0 ? 2.4 : 1.4,
      );
  });
