import { benchSize } from '../../geometry/bench-furniture.ts';
import { palette } from '../../../styles/tokens.ts';
import { rule } from '../paint/outline.ts';
import type { Pen } from '../paint/pen.ts';

const grid = 20;
/** The mat goes on past the bench, so that no view shows its end. */
const beyond = 1200;

/** The cutting mat the oven stands on: a fine grid, a stronger line every five. */
export const paintMat = (pen: Pen): void => {
  const [width, height] = benchSize;
  pen.fillStyle = palette.mat;
  pen.fillRect(-beyond, -beyond, width + 2 * beyond, height + 2 * beyond);
  for (let x = -beyond; x <= width + beyond; x += grid)
    rule(pen, [x, -beyond, x, height + beyond], palette['mat-2'], x % (grid * 5) === 0 ? 1.3 : 0.6);
  for (let y = -beyond; y <= height + beyond; y += grid)
    rule(pen, [-beyond, y, width + beyond, y], palette['mat-2'], y % (grid * 5) === 0 ? 1.3 : 0.6);
};
