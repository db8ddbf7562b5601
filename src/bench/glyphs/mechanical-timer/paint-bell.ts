import { material, shade } from '../../../styles/tokens.ts';
import { box, circle, disc, rule, stroke } from '../paint/outline.ts';
import { radial, raised, type Pen } from '../paint/pen.ts';

/** The bell cup on its post, the striker beside it; loose it hangs on the striker. */
export const paintBell = (
  pen: Pen,
  [x, y, radius]: readonly [number, number, number],
  isLoose: boolean,
): void => {
  box(pen, [x - 3, y - 3, 6, 6], 1, material.tin[2], material.tin[3], 0.8);
  rule(pen, [x + radius + 9, y - 14, x + radius + 1, y + 2], material.tin[3], 2.4);
  const [bx, by] = isLoose ? [x + 12, y + 15] : [x, y];
  raised(pen, 5, shade.drop, () => disc(pen, [bx, by, radius], material.brass[2]));
  disc(
    pen,
    [bx, by, radius],
    radial(pen, [bx, by, radius], material.brass.slice(0, 3)),
    material.brass[3],
    0.9,
  );
  circle(pen, bx, by, radius * 0.66);
  stroke(pen, shade.gleam, 1);
  disc(pen, [bx, by, 3], isLoose ? material.lamination[3] : material.tin[1], material.tin[3], 0.7);
};
