import { copper, material, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { rivet, screw, tab } from '../paint/hardware.ts';
import { box, disc, rule } from '../paint/outline.ts';
import { linear, radial, raised, type Pen } from '../paint/pen.ts';
import { crack, scorch } from '../paint/scorch.ts';

/** The magnetron: cooling fins in a steel yoke between two ring magnets, its heater box with two chokes below. */
export const magnetronGlyph: Glyph = (pen, { size: [width, height], terminals, looks }) => {
  const deep = height * 0.68;
  paintAntenna(pen, height * 0.36);
  paintYoke(pen, width, deep);
  paintFins(pen, [22, 20, width - 44, deep - 38]);
  paintMagnet(pen, [16, 5, width - 32, 15]);
  paintMagnet(pen, [16, deep - 18, width - 32, 15]);
  paintHeaterBox(pen, [20, deep + 2, width - 36, height - deep - 3], terminals);
  const body = terminals['body'];
  if (body !== undefined) {
    disc(
      pen,
      [body[0], body[1], 10],
      radial(pen, [body[0], body[1], 10], material.tin.slice(0, 3)),
      material.tin[3],
      0.8,
    );
    screw(pen, body[0], body[1], 7);
  }
  if (looks.includes('cracked')) {
    crack(pen, [width * 0.42, 4], [width * 0.52, 21]);
    crack(pen, [width * 0.66, 4], [width * 0.6, 21]);
  }
  if (looks.includes('burnt')) scorch(pen, width * 0.54, height * 0.84, 17);
};

const paintAntenna = (pen: Pen, y: number): void => {
  box(
    pen,
    [-26, y - 12, 30, 24],
    6,
    linear(
      pen,
      [0, y - 12, 0, y + 12],
      [material.ceramic[1], material.ceramic[0], material.ceramic[2]],
    ),
    material.ceramic[3],
    0.8,
  );
  box(
    pen,
    [-30, y - 8, 9, 16],
    4,
    linear(pen, [0, y - 8, 0, y + 8], [copper[0], copper[1], copper[2]]),
    copper[2],
    0.8,
  );
};

const paintYoke = (pen: Pen, width: number, deep: number): void => {
  raised(pen, 9, shade.drop, () => box(pen, [2, 0, width - 4, deep], 4, material.zinc[2]));
  box(
    pen,
    [2, 0, width - 4, deep],
    4,
    linear(
      pen,
      [0, 0, width, deep],
      [material.zinc[0], material.zinc[1], material.zinc[2], material.zinc[3]],
    ),
    material.zinc[3],
    1,
  );
  box(pen, [16, 3, width - 32, deep - 6], 3, material.lamination[3]);
  for (const y of [10, deep - 10]) rivet(pen, 9, y, 2.8);
  rivet(pen, width - 9, deep - 10, 2.8);
  rule(pen, [5, 1.4, width - 6, 1.4], shade.gleam, 1.2);
};

const paintFins = (
  pen: Pen,
  [x, y, width, height]: readonly [number, number, number, number],
): void => {
  const count = 7;
  const step = height / count;
  for (let i = 0; i < count; i++) {
    const at = y + i * step + step * 0.2;
    box(pen, [x, at + 2, width, step * 0.6], 1, shade.drop);
    box(
      pen,
      [x, at, width, step * 0.58],
      1,
      linear(
        pen,
        [x, 0, x + width, 0],
        [
          [0, material.tin[2]],
          [0.3, material.tin[0]],
          [0.5, material.tin[1]],
          [0.72, material.tin[0]],
          [1, material.tin[2]],
        ],
      ),
      material.tin[3],
      0.5,
    );
  }
  box(
    pen,
    [x + width / 2 - 15, y - 1, 30, height + 2],
    3,
    linear(
      pen,
      [x + width / 2 - 15, 0, x + width / 2 + 15, 0],
      [copper[2], copper[0], copper[1], copper[2]],
    ),
    copper[2],
    0.8,
  );
  for (let i = 0; i < count; i++) {
    const at = y + i * step + step * 0.2;
    rule(pen, [x + width / 2 - 15, at + 2, x + width / 2 + 15, at + 2], shade.soft, 1.2);
  }
};

const paintMagnet = (pen: Pen, rect: readonly [number, number, number, number]): void => {
  const [x, y, width, height] = rect;
  raised(pen, 2, shade.drop, () => box(pen, rect, 5, material.ferrite[2]));
  box(
    pen,
    rect,
    5,
    linear(
      pen,
      [0, y, 0, y + height],
      [material.ferrite[0], material.ferrite[1], material.ferrite[2], material.ferrite[3]],
    ),
    material.ferrite[3],
    0.9,
  );
  rule(pen, [x + 6, y + 3, x + width - 6, y + 3], shade.haze, 1.4);
};

const paintHeaterBox = (
  pen: Pen,
  rect: readonly [number, number, number, number],
  places: Readonly<Record<string, readonly [number, number]>>,
): void => {
  const [x, y, width, height] = rect;
  raised(pen, 4, shade.drop, () => box(pen, rect, 4, material.tin[2]));
  box(
    pen,
    rect,
    4,
    linear(pen, [0, y, 0, y + height], [material.tin[0], material.tin[1], material.tin[2]]),
    material.tin[3],
    0.9,
  );
  for (const dx of [6, width - 6]) rivet(pen, x + dx, y + 7, 2);
  for (const id of ['1', '2']) {
    const at = places[id];
    if (at === undefined) continue;
    raised(pen, 2, shade.drop, () => disc(pen, [at[0], at[1], 14], material.ceramic[2]));
    disc(
      pen,
      [at[0], at[1], 14],
      radial(pen, [at[0], at[1], 14], material.ceramic),
      material.ceramic[3],
      0.9,
    );
    tab(pen, at, Math.PI / 2, 20);
  }
};
