import { material, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { screw } from '../paint/hardware.ts';
import { box, chain, disc, fill, stroke } from '../paint/outline.ts';
import { apart, linear, radial, raised, type Pen } from '../paint/pen.ts';

/** The chassis's bare points: an earth stud with its mark, screws, an outer bracket. The sheet itself is `paintChassis`. */
export const chassisGlyph: Glyph = (pen, { terminals }) => {
  for (const [id, at] of Object.entries(terminals)) {
    if (id === '1') earthStud(pen, at);
    else if (at[1] < 20) bracket(pen, at);
    else bareScrew(pen, at);
  }
};

const earthStud = (pen: Pen, [x, y]: readonly [number, number]): void => {
  raised(pen, 2, shade.drop, () => disc(pen, [x, y, 14], material.tin[2]));
  disc(pen, [x, y, 14], radial(pen, [x, y, 14], material.tin.slice(0, 3)), material.tin[3], 0.8);
  apart(pen, () => {
    pen.translate(x, y);
    pen.rotate(0.2);
    chain(
      pen,
      Array.from({ length: 6 }, (_, i) => [
        10.5 * Math.cos((i * Math.PI) / 3),
        10.5 * Math.sin((i * Math.PI) / 3),
      ]),
    );
    pen.closePath();
    fill(pen, linear(pen, [-10, -10, 10, 10], material.brass.slice(0, 3)));
    stroke(pen, material.brass[3], 0.9);
  });
  earthMark(pen, x + 23, y - 12);
};

/** The protective earth sign, IEC 60417-5019: three bars under a line, in a circle. */
const earthMark = (pen: Pen, x: number, y: number): void =>
  apart(pen, () => {
    disc(pen, [x, y, 7], shade.clear, material.lamination[2], 1);
    pen.beginPath();
    for (const [dx, dy] of [
      [4, 0],
      [2.6, 2],
      [1.2, 4],
    ] as const) {
      pen.moveTo(x - dx, y + dy);
      pen.lineTo(x + dx, y + dy);
    }
    pen.moveTo(x, y - 4.6);
    pen.lineTo(x, y);
    stroke(pen, material.lamination[2], 1.1);
  });

const bareScrew = (pen: Pen, [x, y]: readonly [number, number]): void => {
  raised(pen, 2, shade.drop, () => disc(pen, [x, y, 13], material.tin[2]));
  disc(pen, [x, y, 13], radial(pen, [x, y, 13], material.tin.slice(0, 3)), material.tin[3], 0.8);
  screw(pen, x, y, 9.5);
};

const bracket = (pen: Pen, [x, y]: readonly [number, number]): void => {
  raised(pen, 3, shade.drop, () => box(pen, [x - 20, y - 14, 40, 27], 4, material.zinc[1]));
  box(
    pen,
    [x - 20, y - 14, 40, 27],
    4,
    linear(pen, [x, y - 14, x, y + 13], [material.zinc[0], material.zinc[1], material.zinc[2]]),
    material.zinc[3],
    0.9,
  );
  screw(pen, x, y, 9);
};
