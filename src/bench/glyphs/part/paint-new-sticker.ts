import type { BenchPoint } from '../../geometry/bench-point.ts';
import { material, palette, shade } from '../../../styles/tokens.ts';
import { box } from '../paint/outline.ts';
import { write } from '../paint/lettering.ts';
import { apart, raised, type Pen } from '../paint/pen.ts';

/** The paper sticker of a replacement part, on its lower edge: terminals are rarely there. */
export const paintNewSticker = (pen: Pen, [width, height]: BenchPoint): void =>
  apart(pen, () => {
    pen.translate(width / 2 - 15, height - 11);
    pen.rotate(-0.06);
    raised(pen, 1.5, shade.drop, () => box(pen, [0, 0, 29, 14], 2, material.nylon[0]));
    box(pen, [0, 0, 29, 14], 2, material.nylon[0], material.nylon[2], 0.8);
    write(pen, 'new', 14.5, 7, { size: 10, weight: 800, ink: palette.ink });
  });
