import type { BenchBox } from '../../geometry/bench-box.ts';
import { material, shade } from '../../../styles/tokens.ts';
import { box, rule } from '../paint/outline.ts';
import { apart, linear, raised, type Pen } from '../paint/pen.ts';

/** How far the open door stands off, radians: enough to see that it is open, little enough to stay on the mat. */
const ajar = 0.16;

/** The oven's front from above: the door's edge, closed or ajar, and the control panel beside it. */
export const paintFront = (pen: Pen, { at, size }: BenchBox, isDoorOpen: boolean): void => {
  const [x, y] = at;
  const front = y + size[1];
  const split = x + size[0] * 0.405;
  paintPanel(pen, split + 6, front, x + size[0] - split - 12);
  apart(pen, () => {
    pen.translate(x + 14, front + 2);
    if (isDoorOpen) pen.rotate(ajar);
    paintDoor(pen, split - x - 18);
  });
};

const paintPanel = (pen: Pen, x: number, y: number, width: number): void => {
  raised(pen, 6, shade.drop, () => box(pen, [x, y - 6, width, 22], 4, material.zinc[2]));
  box(
    pen,
    [x, y - 6, width, 22],
    4,
    linear(pen, [0, y, 0, y + 16], [material.zinc[0], material.zinc[2]]),
    material.zinc[3],
    1,
  );
  box(
    pen,
    [x + 6, y + 10, width - 12, 7],
    3,
    linear(pen, [0, y + 10, 0, y + 17], [material.plastic[1], material.plastic[3]]),
  );
};

const paintDoor = (pen: Pen, width: number): void => {
  // The hooks that work the switches.
  for (const dx of [12, 28])
    box(pen, [width - dx, -9, 7, 12], 2, material.nylon[1], material.nylon[3], 0.7);
  raised(pen, 7, shade.drop, () => box(pen, [0, 0, width, 23], 4, material.zinc[2]));
  box(
    pen,
    [0, 0, width, 23],
    4,
    linear(
      pen,
      [0, 0, 0, 23],
      [material.zinc[2], material.zinc[0], material.zinc[1], material.zinc[2]],
    ),
    material.zinc[3],
    1,
  );
  box(
    pen,
    [8, 17, width - 16, 8],
    3,
    linear(pen, [0, 17, 0, 25], [material.plastic[1], material.plastic[3]]),
  );
  rule(pen, [14, 19, width * 0.6, 19], shade.sheen, 1.2);
  box(
    pen,
    [width - 50, 21, 34, 9],
    4,
    linear(pen, [0, 21, 0, 30], [material.tin[0], material.tin[1], material.tin[3]]),
    material.tin[3],
    0.8,
  );
};
