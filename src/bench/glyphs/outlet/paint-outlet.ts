import { outlet } from '../../geometry/bench-furniture.ts';
import { material, shade } from '../../../styles/tokens.ts';
import { screw } from '../paint/hardware.ts';
import { box, circle, disc, fill, stroke } from '../paint/outline.ts';
import { linear, raised, type Pen } from '../paint/pen.ts';

/** The outlet on the bench, as the plug has pins: two slots and an earth hole, or a round well with two holes and earth clips. */
export const paintOutlet = (pen: Pen, isRound = false): void => {
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
  if (isRound) paintWell(pen, x + width / 2, y + height / 2);
  else paintSlots(pen, x + width / 2, y, height);
  screw(pen, x + 9, y + height / 2, 4);
  screw(pen, x + width - 9, y + height / 2, 4);
};

const paintSlots = (pen: Pen, middle: number, y: number, height: number): void => {
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
};

const paintWell = (pen: Pen, x: number, y: number): void => {
  disc(pen, [x, y, 37], material.nylon[2], material.nylon[3], 1);
  disc(
    pen,
    [x, y, 33],
    linear(pen, [0, y - 33, 0, y + 33], [material.nylon[3], material.nylon[1]]),
    material.nylon[3],
    0.8,
  );
  for (const dx of [-17, 17])
    disc(pen, [x + dx, y, 6.4], material.plastic[3], material.nylon[3], 1);
  for (const dy of [-33, 27])
    box(pen, [x - 6, y + dy, 12, 7], 2, material.brass[1], material.brass[3], 0.8);
};
