import { palette, tint } from '../../../styles/tokens.ts';
import { circle, fill, stroke } from '../paint/outline.ts';
import { apart, type Pen } from '../paint/pen.ts';

/** The mark of a hazard on a terminal; `share` 0 to 1: from the flash to the ring that stays. */
export const paintFlash = (pen: Pen, [x, y]: readonly [number, number], share: number): void =>
  apart(pen, () => {
    const rest = 1 - share;
    pen.globalAlpha = rest;
    circle(pen, x, y, 12 + 34 * share);
    fill(pen, tint['danger-lamp']);
    pen.globalAlpha = 1;
    circle(pen, x, y, 13);
    stroke(pen, palette.sheet, 6);
    circle(pen, x, y, 13);
    stroke(pen, palette.danger, 3.4);
  });
