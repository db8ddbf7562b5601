import type { BenchBox } from '../../geometry/bench-box.ts';
import { closedOvenShape, type ClosedOvenShape } from '../../geometry/closed-oven.ts';
import { material, shade } from '../../../styles/tokens.ts';
import { brushed, louvres, screw } from '../paint/hardware.ts';
import { box, chain, fill, rule, stroke, type Rect } from '../paint/outline.ts';
import { linear, raised, type Pen } from '../paint/pen.ts';
import type { PaintClosedOven } from './closed-oven.ts';
import { paintDoor, paintInside, paintOpenDoor } from './paint-door.ts';
import { paintKnobPanel } from './paint-knob-panel.ts';
import { paintPanel } from './paint-panel.ts';

const rectOf = ({ at, size }: BenchBox): Rect => [at[0], at[1], size[0], size[1]];

/** The oven with its cover on, seen from the front and a little from above. */
export const paintClosedOven: PaintClosedOven = (pen, oven) => {
  const shape = closedOvenShape(oven);
  paintFeet(pen, shape);
  paintTop(pen, shape);
  const front = rectOf(shape.front);
  raised(pen, 12, shade.drop, () => box(pen, front, 8, material.zinc[2]));
  const [x, y, , height] = front;
  box(
    pen,
    front,
    8,
    linear(pen, [x, y, x, y + height], [material.zinc[0], material.zinc[1], material.zinc[2]]),
    material.zinc[3],
    1,
  );
  if (oven.isDoorOpen) {
    paintInside(pen, shape, oven.isLampLit, oven.isTurning);
    paintOpenDoor(pen, shape);
  } else paintDoor(pen, shape, oven.isLampLit, oven.isTurning);
  if (oven.atMinute === null) paintPanel(pen, shape, oven.isDisplayLit, oven.display);
  else paintKnobPanel(pen, shape, oven.atMinute);
};

const paintTop = (pen: Pen, { front, rise }: ClosedOvenShape): void => {
  const [x, y, width] = rectOf(front);
  const inset = 40;
  const trace = (): void => {
    chain(pen, [
      [x + 3, y + 6],
      [x + inset, y - rise],
      [x + width - inset, y - rise],
      [x + width - 3, y + 6],
    ]);
    pen.closePath();
  };
  raised(pen, 10, shade.drop, () => {
    trace();
    fill(pen, material.zinc[2]);
  });
  trace();
  fill(
    pen,
    linear(pen, [0, y - rise, 0, y + 4], [material.zinc[2], material.zinc[1], material.zinc[0]]),
  );
  stroke(pen, material.zinc[3], 1);
  brushed(pen, [x + inset, y - rise + 4, width - 2 * inset, rise - 6], 7, 4);
  louvres(pen, [x + width * 0.62, y - rise + 26, width * 0.24, 30], 16);
  for (const share of [0.1, 0.5, 0.9])
    screw(pen, x + inset + (width - 2 * inset) * share, y - rise + 12, 4.6);
  rule(pen, [x + 6, y + 4, x + width - 6, y + 4], shade.gleam, 1.6);
};

const paintFeet = (pen: Pen, { front }: ClosedOvenShape): void => {
  const [x, y, width, height] = rectOf(front);
  pen.beginPath();
  pen.ellipse(x + width / 2, y + height + 16, width * 0.5, 14, 0, 0, Math.PI * 2);
  fill(pen, shade.drop);
  for (const share of [0.06, 0.9])
    box(
      pen,
      [x + width * share, y + height - 6, 34, 20],
      5,
      linear(pen, [0, y + height, 0, y + height + 14], [material.plastic[1], material.plastic[3]]),
      material.plastic[3],
      1,
    );
};
