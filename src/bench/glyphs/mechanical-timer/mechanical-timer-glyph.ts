import { material, palette, shade } from '../../../styles/tokens.ts';
import type { Glyph, GlyphPart } from '../glyph.ts';
import { brushed, rivet, tab } from '../paint/hardware.ts';
import { box, chain, circle, disc, rule, stroke } from '../paint/outline.ts';
import { apart, linear, radial, raised, type Pen } from '../paint/pen.ts';
import { scorch } from '../paint/scorch.ts';
import { paintBell } from './paint-bell.ts';
import { paintWheel } from './paint-wheel.ts';

/** A clockwork timer behind the front: contact block with its tabs, wheels between two plates, motor, bell, shaft to the knob. */
export const mechanicalTimerGlyph: Glyph = (pen, part) => {
  const { size, looks, isTurning, isPressed } = part;
  const [width, height] = size;
  const plate = [6, 34, width - 12, height - 52] as const;
  paintShaft(pen, width, height, isPressed || isTurning);
  raised(pen, 7, shade.drop, () => box(pen, plate, 5, material.zinc[2]));
  box(
    pen,
    plate,
    5,
    linear(
      pen,
      [plate[0], plate[1], plate[0] + plate[2], plate[1] + plate[3]],
      [material.zinc[0], material.zinc[1], material.zinc[2]],
    ),
    material.zinc[3],
    1,
  );
  brushed(pen, plate, 43, 3);
  if (looks.includes('greasy')) greasy(pen, plate);
  for (const [x, y] of [
    [14, 42],
    [width - 14, 42],
    [14, height - 26],
    [width - 14, height - 26],
  ] as const)
    rivet(pen, x, y, 3.2);
  const middle = width * 0.5;
  paintWheel(pen, [middle - 24, height * 0.56, 19], 20);
  paintWheel(pen, [middle + 4, height * 0.62, 13], 14);
  paintMotor(pen, [42, height * 0.58, 27], isTurning);
  paintBell(pen, [width - 44, height * 0.62, 17], looks.includes('bell'));
  paintContacts(pen, part);
};

/** The shaft through the front; a blue mark where the knob stands off zero. */
const paintShaft = (pen: Pen, width: number, height: number, isTurned: boolean): void => {
  const x = width * 0.63;
  box(
    pen,
    [x - 5, height - 22, 10, 28],
    2,
    linear(pen, [x - 5, 0, x + 5, 0], [material.brass[1], material.brass[0], material.brass[2]]),
    material.brass[3],
    0.8,
  );
  // Outside the front: the knob.
  raised(pen, 4, shade.drop, () => box(pen, [x - 24, height + 43, 48, 15], 5, material.plastic[2]));
  box(
    pen,
    [x - 24, height + 43, 48, 15],
    5,
    linear(
      pen,
      [x - 24, 0, x + 24, 0],
      [material.plastic[3], material.plastic[0], material.plastic[1], material.plastic[3]],
    ),
    material.plastic[3],
    1,
  );
  rule(pen, [x, height + 45, x, height + 57], material.nylon[0], 2);
  if (!isTurned) return;
  disc(pen, [x, height - 6, 9], palette.act, palette.sheet, 2);
  pen.beginPath();
  pen.arc(x, height - 6, 4.4, -0.8 * Math.PI, 0.5 * Math.PI);
  stroke(pen, palette.sheet, 1.8);
  chain(pen, [
    [x - 4, height - 2],
    [x + 0.4, height - 1.6],
    [x - 1.6, height + 2],
  ]);
  stroke(pen, palette.sheet, 1.6);
};

/** The flat can of the synchronous motor, its two tabs above it. */
const paintMotor = (
  pen: Pen,
  [x, y, radius]: readonly [number, number, number],
  isTurning: boolean,
): void => {
  raised(pen, 5, shade.drop, () => disc(pen, [x, y, radius], material.tin[2]));
  disc(
    pen,
    [x, y, radius],
    radial(pen, [x, y, radius], material.tin.slice(0, 3)),
    material.tin[3],
    1,
  );
  circle(pen, x, y, radius - 5);
  stroke(pen, shade.soft, 1.2);
  disc(pen, [x, y, 5], radial(pen, [x, y, 5], material.brass), material.brass[3], 0.8);
  if (!isTurning) return;
  apart(pen, () => {
    pen.lineCap = 'round';
    pen.beginPath();
    pen.arc(x, y, radius - 11, 0.3, 4.6);
    stroke(pen, material.plastic[1], 3);
    const tip = [x + Math.cos(4.6) * (radius - 11), y + Math.sin(4.6) * (radius - 11)] as const;
    chain(pen, [[tip[0] - 6, tip[1] - 6], tip, [tip[0] - 6, tip[1] + 6]]);
    stroke(pen, material.plastic[1], 3);
  });
};

/** The moulded block that holds both contacts, its tabs towards the back. */
const paintContacts = (pen: Pen, { size: [width], terminals, looks }: GlyphPart): void => {
  for (const at of Object.values(terminals)) tab(pen, at, -Math.PI / 2, 24);
  const block = [10, 22, width - 20, 26] as const;
  raised(pen, 4, shade.drop, () => box(pen, block, 3, material.phenolic[2]));
  box(
    pen,
    block,
    3,
    linear(pen, [0, 22, 0, 48], [material.phenolic[1], material.phenolic[2], material.phenolic[3]]),
    material.phenolic[3],
    1,
  );
  rule(pen, [14, 24.5, width - 14, 24.5], shade.sheen, 1.4);
  const [one, two, three] = ['1', '2', '3'].map((id) => terminals[id]);
  for (const [from, to] of [
    [one, two],
    [two, three],
  ] as const)
    if (from && to) paintSpring(pen, from[0], to[0]);
  for (const [look, at] of [
    ['burnt-2', two],
    ['burnt-3', three],
  ] as const)
    if (looks.includes(look) && at) scorch(pen, at[0], 32, 12);
};

/** A contact spring in its chamber, as far as it can be seen. */
const paintSpring = (pen: Pen, from: number, to: number): void => {
  box(pen, [from + 8, 30, to - from - 16, 11], 2, material.plastic[3]);
  rule(pen, [from + 10, 36, to - 12, 34], material.brass[1], 2);
  disc(pen, [to - 13, 34.5, 2.4], material.tin[0], material.tin[3], 0.6);
};

const greasy = (
  pen: Pen,
  [x, y, width, height]: readonly [number, number, number, number],
): void => {
  for (const [share, down] of [
    [0.2, 0.4],
    [0.5, 0.25],
    [0.72, 0.5],
  ] as const) {
    pen.beginPath();
    pen.ellipse(x + width * share, y + height * down, width * 0.2, height * 0.2, 0.3, 0, 7);
    pen.fillStyle = shade.oil;
    pen.fill();
  }
};
