import { closedOvenShape, type ClosedOvenShape } from '../../geometry/closed-oven.ts';
import { material, shade } from '../../../styles/tokens.ts';
import { brushed, screw } from '../paint/hardware.ts';
import { box, chain, fill, rule, stroke, type Rect } from '../paint/outline.ts';
import { apart, linear, radial, raised, type Pen } from '../paint/pen.ts';
import type { ClosedOven } from './closed-oven.ts';
import { paintDoor, paintInside, paintOpenDoor } from './paint-door.ts';
import { paintKey, paintPanel } from './paint-panel.ts';

/** An oven that hangs over a cooktop: cabinet above, vent grille over the front, hood with filters and lamp beneath. */
export const paintOverTheRange = (pen: Pen, oven: ClosedOven): void => {
  const shape = closedOvenShape(oven);
  const front: Rect = [...shape.front.at, ...shape.front.size];
  paintCabinet(pen, front, shape.rise);
  if (oven.isHoodLit) paintLight(pen, front);
  paintHood(pen, front, oven.isHoodLit);
  paintBody(pen, front, shape.rise);
  paintGrille(pen, front, shape.rise, oven.isVentTurning);
  if (oven.isDoorOpen) {
    paintInside(pen, shape, oven.isLampLit, oven.isTurning);
    paintOpenDoor(pen, shape);
  } else paintDoor(pen, shape, oven.isLampLit, oven.isTurning);
  paintPanel(pen, shape, oven.isDisplayLit, oven.display);
  paintHoodKeys(pen, shape);
};

/** The keys of vent and cooktop lamp, in the gap under the display. */
const paintHoodKeys = (pen: Pen, { display, keys }: ClosedOvenShape): void => {
  const [first] = keys;
  if (!first) return;
  const top = display.at[1] + display.size[1];
  const height = Math.min(24, first.at[1] - top - 12);
  const width = (display.size[0] - 10) / 2;
  for (const [i, text] of ['Vent', 'Light'].entries())
    paintKey(
      pen,
      {
        at: [display.at[0] + i * (width + 10), (top + first.at[1] - height) / 2],
        size: [width, height],
      },
      text,
      13,
    );
};

/** How far the grille's band reaches above the front, as a share of the rise. */
const band = 0.62;

/** The kitchen cabinet that it hangs from: a board and the lower edges of two doors. */
const paintCabinet = (pen: Pen, [x, y, width]: Rect, rise: ClosedOvenShape['rise']): void => {
  const [top, height] = [y - rise - 14, rise * (1 - band) + 6];
  raised(pen, 10, shade.drop, () =>
    box(pen, [x - 6, top, width + 12, height], 3, material.wood[2]),
  );
  for (const [i, left] of [x - 6, x + width / 2 + 1].entries()) {
    const door: Rect = [left, top, width / 2 + 5, height];
    box(
      pen,
      door,
      3,
      linear(pen, [0, top, 0, top + height], [material.wood[0], material.wood[1]]),
      material.wood[3],
      1,
    );
    brushed(pen, door, 17 + i, 6);
    const knob = i === 0 ? door[0] + door[2] - 26 : door[0] + 14;
    box(pen, [knob, top + 6, 12, 12], 6, material.tin[2], material.tin[3], 0.8);
  }
};

const paintBody = (pen: Pen, [x, y, width, height]: Rect, rise: number): void => {
  const top = y - rise * band;
  const body: Rect = [x, top, width, height + y - top];
  raised(pen, 12, shade.drop, () => box(pen, body, 7, material.zinc[2]));
  box(
    pen,
    body,
    7,
    linear(
      pen,
      [x, top, x, top + body[3]],
      [material.zinc[0], material.zinc[1], material.zinc[1], material.zinc[2]],
    ),
    material.zinc[3],
    1,
  );
  brushed(pen, body, 23, 3);
  rule(pen, [x + 8, top + 1.5, x + width - 8, top + 1.5], shade.gleam, 1.6);
  rule(pen, [x + 4, y + 3, x + width - 4, y + 3], shade.soft, 1.4);
};

/** The slots above the front that the vent blows through; when it does, streaks rise from them. */
const paintGrille = (pen: Pen, [x, y, width]: Rect, rise: number, isBlowing: boolean): void => {
  const top = y - rise * band;
  const grille: Rect = [x + 70, top + 12, width - 140, rise * band - 20];
  for (const dx of [30, width - 30]) screw(pen, x + dx, top + rise * band * 0.5, 5);
  box(pen, grille, 6, material.lamination[3], material.zinc[3], 1);
  const slats = 5;
  const pitch = grille[3] / slats;
  for (let i = 0; i < slats; i++) {
    const at = grille[1] + i * pitch;
    box(
      pen,
      [grille[0] + 3, at + pitch * 0.34, grille[2] - 6, pitch * 0.52],
      2,
      linear(pen, [0, at, 0, at + pitch], [material.zinc[0], material.zinc[2]]),
      material.lamination[2],
      0.7,
    );
  }
  for (let i = 1; i < 6; i++) {
    const bar = grille[0] + (grille[2] * i) / 6;
    rule(pen, [bar, grille[1] + 2, bar, grille[1] + grille[3] - 2], material.lamination[2], 2.4);
  }
  if (!isBlowing) return;
  apart(pen, () => {
    pen.lineCap = 'round';
    for (let i = 0; i < 14; i++) {
      const from = grille[0] + 16 + (i * (grille[2] - 32)) / 13;
      pen.beginPath();
      pen.moveTo(from, top + 8);
      pen.bezierCurveTo(from + 9, top - 4, from - 9, top - 12, from + 4, top - 26);
      stroke(pen, shade.gleam, 2);
    }
  });
};

/** The underside, leaning back: two grease filters and the lamp's lens between them. */
const paintHood = (pen: Pen, [x, y, width, height]: Rect, isLit: boolean): void => {
  const [top, bottom, lean] = [y + height - 8, y + height + 34, 46];
  const side = (at: number, left: boolean): number => {
    const share = (at - top) / (bottom - top);
    return left ? x + 4 + lean * share : x + width - 4 - lean * share;
  };
  const slab = (from: number, to: number, a: number, b: number): void => {
    const along = (at: number, share: number): number =>
      side(at, true) + (side(at, false) - side(at, true)) * share;
    chain(pen, [
      [along(from, a), from],
      [along(from, b), from],
      [along(to, b), to],
      [along(to, a), to],
    ]);
    pen.closePath();
  };
  raised(pen, 12, shade.drop, () => {
    slab(top, bottom, 0, 1);
    fill(pen, material.zinc[3]);
  });
  slab(top, bottom, 0, 1);
  fill(pen, linear(pen, [0, top, 0, bottom], [material.lamination[2], material.zinc[3]]));
  stroke(pen, material.lamination[3], 1);
  for (const from of [0.07, 0.6]) {
    slab(top + 14, bottom - 7, from, from + 0.33);
    fill(pen, material.lamination[3]);
    stroke(pen, material.zinc[2], 1.6);
    apart(pen, () => {
      slab(top + 14, bottom - 7, from, from + 0.33);
      pen.clip();
      pen.globalAlpha = 0.6;
      for (let at = x - 40; at < x + width + 40; at += 7) {
        rule(pen, [at, top, at + 30, bottom], material.zinc[1], 0.8);
        rule(pen, [at + 30, top, at, bottom], material.zinc[1], 0.8);
      }
    });
  }
  slab(top + 15, bottom - 8, 0.44, 0.56);
  fill(pen, isLit ? material.glow[0] : material.glass[2]);
  stroke(pen, isLit ? material.glow[3] : material.glass[3], 1.4);
};

/** The lamp's light on what stands below. */
const paintLight = (pen: Pen, [x, y, width, height]: Rect): void => {
  const [middle, from] = [x + width / 2, y + height + 22];
  apart(pen, () => {
    pen.beginPath();
    pen.ellipse(middle, from, width * 0.46, 58, 0, 0, Math.PI * 2);
    pen.globalAlpha = 0.5;
    fill(
      pen,
      radial(
        pen,
        [middle, from, width * 0.46],
        [
          [0, material.glow[1]],
          [0.45, shade.sheen],
          [1, shade.clear],
        ],
      ),
    );
  });
};
