import type { BenchBox } from '../../geometry/bench-box.ts';
import { material, shade } from '../../../styles/tokens.ts';
import { brushed, hole, rivet, screw } from '../paint/hardware.ts';
import { box, roundRect, rule, stroke, type Rect } from '../paint/outline.ts';
import { apart, linear, raised, type Pen } from '../paint/pen.ts';
import { paintCavity } from './paint-cavity.ts';
import { paintFront } from './paint-front.ts';

const rim = 12;

/** The oven's base and walls from above with the cover off: folded rim, pressed floor, cavity, front. */
export const paintChassis = (pen: Pen, chassis: BenchBox, isDoorOpen: boolean): void => {
  const [x, y] = chassis.at;
  const [width, height] = chassis.size;
  paintFront(pen, chassis, isDoorOpen);
  raised(pen, 14, shade.drop, () => box(pen, [x, y, width, height], 9, material.zinc[2]));
  box(
    pen,
    [x, y, width, height],
    9,
    linear(
      pen,
      [x, y, x + width * 0.4, y + height],
      [material.zinc[0], material.zinc[1], material.zinc[2]],
    ),
    material.zinc[3],
    1,
  );
  const floor: Rect = [x + rim, y + rim, width - 2 * rim, height - 2 * rim];
  paintFloor(pen, floor);
  paintRim(pen, [x, y, width, height]);
  paintCavity(pen, chassis);
};

const paintFloor = (pen: Pen, floor: Rect): void => {
  const [x, y, width, height] = floor;
  box(
    pen,
    floor,
    4,
    linear(
      pen,
      [x, y, x + width, y + height],
      [material.zinc[1], material.zinc[0], material.zinc[1], material.zinc[2]],
    ),
  );
  brushed(pen, floor, 17, 3);
  apart(pen, () => {
    roundRect(pen, floor, 4);
    pen.clip();
    // The rim stands above the floor: it shades it from the upper left.
    const depth = 16;
    pen.fillStyle = linear(pen, [0, y, 0, y + depth], [shade.drop, shade.faint, shade.clear]);
    pen.fillRect(x, y, width, depth);
    pen.fillStyle = linear(pen, [x, 0, x + depth, 0], [shade.soft, shade.faint, shade.clear]);
    pen.fillRect(x, y, depth, height);
    pen.fillStyle = linear(pen, [0, y + height - 6, 0, y + height], [shade.clear, shade.gleam]);
    pen.fillRect(x, y + height - 6, width, 6);
  });
  roundRect(pen, floor, 4);
  stroke(pen, material.zinc[3], 1);
  paintRibs(pen, floor);
};

/** Pressed ribs and holes of the floor: they make it sheet metal. */
const paintRibs = (pen: Pen, [x, y, width, height]: Rect): void => {
  const rib = (rect: Rect): void => {
    const [rx, ry, rw, rh] = rect;
    box(
      pen,
      rect,
      Math.min(rw, rh) / 2,
      linear(pen, [rx, ry, rx, ry + rh], [shade.soft, shade.faint, shade.gleam]),
    );
  };
  rib([x + 350, y + 232, 110, 7]);
  rib([x + width - 26, y + 190, 7, 110]);
  rib([x + 462, y + height - 18, 46, 6]);
  rib([x + width - 24, y + 360, 6, 150]);
  for (const [dx, dy] of [
    [630, 246],
    [640, 368],
    [width - 40, 330],
    [500, 590],
    [338, 246],
  ] as const)
    hole(pen, x + dx, y + dy, 3.4);
};

const paintRim = (pen: Pen, [x, y, width, height]: Rect): void => {
  rule(pen, [x + 6, y + 1, x + width - 6, y + 1], shade.gleam, 1.4);
  rule(pen, [x + 1, y + 6, x + 1, y + height - 6], shade.gleam, 1.4);
  const corners = [
    [x + rim, y + rim, x, y],
    [x + width - rim, y + rim, x + width, y],
    [x + rim, y + height - rim, x, y + height],
    [x + width - rim, y + height - rim, x + width, y + height],
  ] as const;
  for (const line of corners) rule(pen, line, material.zinc[3], 0.8);
  for (const share of [0.12, 0.5, 0.9]) screw(pen, x + width * share, y + rim / 2, 3.8);
  for (const share of [0.28, 0.72]) {
    screw(pen, x + rim / 2, y + height * share, 3.8);
    screw(pen, x + width - rim / 2, y + height * share, 3.8);
  }
  for (let i = 1; i < 12; i++) rivet(pen, x + (width * i) / 12, y + height - rim / 2, 2);
};
