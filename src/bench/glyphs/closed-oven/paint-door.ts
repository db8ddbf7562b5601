import type { ClosedOvenShape } from '../../geometry/closed-oven.ts';
import { material, shade } from '../../../styles/tokens.ts';
import { paintCavityView } from './paint-cavity-view.ts';
import { box, chain, fill, roundRect, rule, stroke, type Rect } from '../paint/outline.ts';
import { apart, linear, raised, type Pen } from '../paint/pen.ts';

/** The closed door: dark glass with its screen, a bar to pull, the lit cavity behind it if the lamp is on. */
export const paintDoor = (
  pen: Pen,
  { door, window }: ClosedOvenShape,
  isLampLit: boolean,
  isTurning: boolean,
): void => {
  const [x, y, width, height]: Rect = [...door.at, ...door.size];
  raised(pen, 4, shade.drop, () => box(pen, [x, y, width, height], 10, material.plastic[2]));
  box(
    pen,
    [x, y, width, height],
    10,
    linear(
      pen,
      [x, y, x + width, y + height],
      [material.plastic[1], material.plastic[2], material.plastic[3]],
    ),
    material.plastic[3],
    1,
  );
  const pane: Rect = [...window.at, ...window.size];
  paintCavityView(pen, pane, { isLit: isLampLit, isTurning, clarity: 0.82 });
  apart(pen, () => {
    roundRect(pen, pane, 14);
    pen.clip();
    pen.globalAlpha = isLampLit ? 0.34 : 0.6;
    for (let row = 0; row * 7 < pane[3]; row++)
      for (let i = 0; i * 7 < pane[2]; i++) {
        pen.fillStyle = material.plastic[3];
        pen.fillRect(pane[0] + i * 7 + (row % 2) * 3.5, pane[1] + row * 7, 3.6, 3.6);
      }
    pen.globalAlpha = 1;
    chain(pen, [
      [pane[0] + pane[2] * 0.06, pane[1] + pane[3]],
      [pane[0] + pane[2] * 0.4, pane[1]],
      [pane[0] + pane[2] * 0.56, pane[1]],
      [pane[0] + pane[2] * 0.22, pane[1] + pane[3]],
    ]);
    pen.closePath();
    fill(pen, shade.haze);
  });
  roundRect(pen, pane, 14);
  stroke(pen, material.plastic[3], 3);
  rule(pen, [x + 10, y + 1.5, x + width - 10, y + 1.5], shade.sheen, 1.4);
  paintHandle(pen, x + width - 52, y + 44, height - 88);
};

const paintHandle = (pen: Pen, x: number, y: number, height: number): void => {
  for (const at of [y + 12, y + height - 24]) box(pen, [x + 4, at, 20, 14], 4, material.plastic[3]);
  raised(pen, 8, shade.drop, () => box(pen, [x, y, 22, height], 11, material.tin[2]));
  box(
    pen,
    [x, y, 22, height],
    11,
    linear(
      pen,
      [x, 0, x + 22, 0],
      [material.tin[1], material.tin[0], material.tin[2], material.tin[3]],
    ),
    material.tin[3],
    1,
  );
};

/** The open cavity: enamel walls, lamp, turntable, and the frame that the door seals against. */
export const paintInside = (
  pen: Pen,
  { door }: ClosedOvenShape,
  isLampLit: boolean,
  isTurning: boolean,
): void => {
  const [x, y, width, height]: Rect = [...door.at, ...door.size];
  box(
    pen,
    [x, y, width, height],
    6,
    linear(pen, [x, y, x, y + height], [material.enamel[0], material.enamel[1]]),
    material.enamel[3],
    1,
  );
  paintCavityView(pen, [x + 34, y + 30, width - 72, height - 62], {
    isLit: isLampLit,
    isTurning,
    clarity: 1,
  });
  // The two slots that the door's hooks go into.
  for (const share of [0.3, 0.66])
    box(
      pen,
      [x + width - 24, y + height * share, 10, 34],
      3,
      material.lamination[3],
      material.enamel[3],
      1,
    );
};

/** The open door seen almost along its edge, swung to the left. */
export const paintOpenDoor = (pen: Pen, { door }: ClosedOvenShape): void => {
  const [x, y, , height]: Rect = [...door.at, ...door.size];
  const trace = (): void => {
    chain(pen, [
      [x + 2, y],
      [x - 34, y - 20],
      [x - 34, y + height + 24],
      [x + 2, y + height],
    ]);
    pen.closePath();
  };
  raised(pen, 12, shade.drop, () => {
    trace();
    fill(pen, material.plastic[2]);
  });
  trace();
  fill(
    pen,
    linear(
      pen,
      [x - 34, 0, x + 2, 0],
      [material.plastic[1], material.plastic[2], material.plastic[3]],
    ),
  );
  stroke(pen, material.plastic[3], 1.2);
  chain(pen, [
    [x - 8, y + 36],
    [x - 27, y + 26],
    [x - 27, y + height - 22],
    [x - 8, y + height - 36],
  ]);
  pen.closePath();
  fill(pen, material.enamel[2]);
  box(
    pen,
    [x - 43, y + 36, 11, height - 66],
    5,
    linear(pen, [x - 43, 0, x - 32, 0], [material.tin[0], material.tin[3]]),
    material.tin[3],
    1,
  );
};
