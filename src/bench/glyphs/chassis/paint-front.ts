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
  raised(pen, 6, shade.drop, () => box(pen, [x, y - 6, width, 20], 4, material.plastic[1]));
  box(
    pen,
    [x, y - 6, width, 20],
    4,
    linear(pen, [0, y, 0, y + 14], [material.plastic[0], material.plastic[1], material.plastic[3]]),
  );
  rule(pen, [x + 5, y + 4, x + width - 5, y + 4], shade.haze, 1);
};

const paintDoor = (pen: Pen, width: number): void => {
  raised(pen, 6, shade.drop, () => box(pen, [0, 0, width, 21], 4, material.plastic[2]));
  box(pen, [0, 0, width, 6], 2, linear(pen, [0, 0, 0, 6], [material.zinc[2], material.zinc[3]]));
  box(
    pen,
    [0, 5, width, 16],
    4,
    linear(pen, [0, 5, 0, 21], [material.plastic[1], material.plastic[2], material.plastic[3]]),
  );
  box(
    pen,
    [26, 14, width - 60, 4],
    2,
    linear(pen, [26, 0, width - 34, 0], [shade.haze, shade.sheen, shade.haze]),
  );
  box(
    pen,
    [width - 26, 18, 18, 7],
    3,
    linear(pen, [0, 18, 0, 25], [material.plastic[0], material.plastic[3]]),
  );
  // The hooks that work the switches.
  for (const dx of [10, 24])
    box(pen, [width - dx, -9, 6, 11], 2, material.nylon[1], material.nylon[3], 0.7);
};
