import { outlet } from '../../geometry/bench-furniture.ts';
import { material, shade } from '../../../styles/tokens.ts';
import { screw } from '../paint/hardware.ts';
import { box, circle, fill, stroke } from '../paint/outline.ts';
import { linear, raised, type Pen } from '../paint/pen.ts';

/** The outlet on the bench: two slots and an earth hole, as the plug has pins. */
export const paintOutlet = (pen: Pen): void => {
  const [x, y] = outlet.at;
  const [width, height] = outlet.size;
  raised(pen, 7, shade.drop, () => box(pen, [x, y, width, height], 8, material.nylon[1]));
  box(
    pen,
    [x, y, width, height],
    8,
    linear(pen, [x, y, x, y + height], [material.nylon[0], material.nylon[1], material.nylon[2]]),
    material.nylon[3],
    0.8,
  );
  const middle = x + width / 2;
  box(
    pen,
    [middle - 34, y + 9, 68, height - 18],
    16,
    linear(pen, [0, y, 0, y + height], [material.nylon[2], material.nylon[1]]),
    material.nylon[3],
    0.8,
  );
  for (const [dx, long] of [
    [-16, 18],
    [12, 22],
  ] as const)
    box(pen, [middle + dx, y + 20, 5, long], 1, material.plastic[3], material.nylon[3], 0.8);
  circle(pen, middle, y + 58, 5.4);
  fill(pen, material.plastic[3]);
  stroke(pen, material.nylon[3], 0.8);
  screw(pen, x + 9, y + height / 2, 4);
  screw(pen, x + width - 9, y + height / 2, 4);
};
