import { material, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { screw, tab } from '../paint/hardware.ts';
import { write } from '../paint/lettering.ts';
import { box, disc, fill, roundRect, rule, stroke } from '../paint/outline.ts';
import { linear, radial, raised, type Pen } from '../paint/pen.ts';
import { oilStain, scorch } from '../paint/scorch.ts';

/** The high-voltage capacitor: an oval tin can under a strap, two insulated terminals, its rating stamped on it. */
export const hvCapacitorGlyph: Glyph = (pen, part) => {
  const { size, terminals, stamp, looks } = part;
  const [width, height] = size;
  const isSwollen = looks.includes('swollen');
  if (looks.includes('oil') || looks.includes('leaking'))
    oilStain(pen, width * 0.3, height + 4, 46);
  paintCan(pen, width, height, isSwollen);
  for (const share of [0.17, 0.83]) paintStrap(pen, width * share - 10, height);
  halves(stamp).forEach((line, i) =>
    write(pen, line, width / 2, height * (0.6 + 0.19 * i), {
      size: 11,
      ink: material.lamination[3],
    }),
  );
  for (const [id, at] of Object.entries(terminals)) {
    if (id === 'can')
      disc(
        pen,
        [at[0], at[1], 9],
        radial(pen, [at[0], at[1], 9], material.tin.slice(0, 3)),
        material.tin[3],
        0.8,
      );
    else insulated(pen, at);
  }
  if (looks.includes('burnt'))
    scorch(pen, terminals['2']?.[0] ?? width / 2, terminals['2']?.[1] ?? 20, 18);
};

/** The rating on two short lines, so that it stands between the terminals and no lead lies over it. */
const halves = (stamp: readonly string[]): string[] => {
  const words = stamp.join(' ').split(' ').filter(Boolean);
  const half = Math.ceil(words.length / 2);
  return [words.slice(0, half).join(' '), words.slice(half).join(' ')].filter(Boolean);
};

const paintCan = (pen: Pen, width: number, height: number, isSwollen: boolean): void => {
  const bulge = isSwollen ? 9 : 0;
  const trace = (): void => {
    const r = height / 2;
    pen.beginPath();
    pen.moveTo(r, 1);
    pen.quadraticCurveTo(width / 2, 1 - bulge, width - r, 1);
    pen.bezierCurveTo(width + bulge - 2, 1, width + bulge - 2, height - 1, width - r, height - 1);
    pen.quadraticCurveTo(width / 2, height - 1 + bulge, r, height - 1);
    pen.bezierCurveTo(2 - bulge, height - 1, 2 - bulge, 1, r, 1);
    pen.closePath();
  };
  raised(pen, 9, shade.drop, () => {
    trace();
    fill(pen, material.tin[2]);
  });
  trace();
  fill(
    pen,
    linear(
      pen,
      [0, 0, 0, height],
      [
        [0, material.tin[1]],
        [0.22, material.tin[0]],
        [0.5, material.tin[1]],
        [0.8, material.tin[2]],
        [1, material.tin[3]],
      ],
    ),
  );
  stroke(pen, material.tin[3], 1.2);
  for (const x of [height * 0.46, width - height * 0.46]) {
    pen.beginPath();
    pen.moveTo(x, 3);
    pen.quadraticCurveTo(x + (x < width / 2 ? -10 : 10), height / 2, x, height - 3);
    stroke(pen, shade.soft, 1.6);
    pen.beginPath();
    pen.moveTo(x + 1.6, 3);
    pen.quadraticCurveTo(x + (x < width / 2 ? -8 : 12), height / 2, x + 1.6, height - 3);
    stroke(pen, shade.gleam, 1);
  }
  if (isSwollen) {
    pen.beginPath();
    pen.ellipse(width / 2, height * 0.3, width * 0.36, height * 0.16, 0, 0, Math.PI * 2);
    fill(pen, shade.gleam);
    pen.beginPath();
    pen.ellipse(width / 2, height * 0.9, width * 0.38, height * 0.12, 0, 0, Math.PI * 2);
    fill(pen, shade.soft);
  }
};

const paintStrap = (pen: Pen, x: number, height: number): void => {
  raised(pen, 2, shade.drop, () => box(pen, [x, -8, 20, height + 16], 4, material.zinc[1]));
  box(
    pen,
    [x, -8, 20, height + 16],
    4,
    linear(
      pen,
      [0, -8, 0, height + 8],
      [material.zinc[2], material.zinc[0], material.zinc[1], material.zinc[2], material.zinc[3]],
    ),
    material.zinc[3],
    0.9,
  );
  rule(pen, [x + 4, 0, x + 4, height], shade.gleam, 1);
  screw(pen, x + 10, -2, 4);
  screw(pen, x + 10, height + 2, 4);
};

const insulated = (pen: Pen, at: readonly [number, number]): void => {
  raised(pen, 4, shade.drop, () => disc(pen, [at[0], at[1], 14.5], material.paper[2]));
  disc(
    pen,
    [at[0], at[1], 14.5],
    radial(pen, [at[0], at[1], 14.5], material.paper),
    material.paper[3],
    0.9,
  );
  roundRect(pen, [at[0] - 10.5, at[1] - 10.5, 21, 21], 10.5);
  stroke(pen, shade.gleam, 0.9);
  tab(pen, at, -Math.PI / 2, 18);
};
