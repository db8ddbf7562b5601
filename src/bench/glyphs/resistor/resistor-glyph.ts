import { material, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { tab } from '../paint/hardware.ts';
import { write } from '../paint/lettering.ts';
import { box, rule } from '../paint/outline.ts';
import { apart, linear, raised } from '../paint/pen.ts';
import { scorch } from '../paint/scorch.ts';

/** A wire-wound resistor cast into a ceramic trough, a tab at each end, its value printed on the cement. */
export const resistorGlyph: Glyph = (pen, part) => {
  const [width, height] = part.size;
  if (width >= height) return lying(pen, part);
  // Standing: drawn lying, turned a quarter clockwise.
  apart(pen, () => {
    pen.translate(width, 0);
    pen.rotate(Math.PI / 2);
    const turned = Object.entries(part.terminals).map(([id, [x, y]]) => [id, [y, width - x]]);
    lying(pen, { ...part, size: [height, width], terminals: Object.fromEntries(turned) });
  });
};

const lying: Glyph = (pen, { size: [width, height], terminals, stamp, looks }) => {
  const y = height / 2;
  for (const at of Object.values(terminals)) tab(pen, at, at[0] < width / 2 ? Math.PI : 0, 26);
  const body = [20, y - 12, width - 40, 24] as const;
  raised(pen, 4, shade.drop, () => box(pen, body, 2, material.ceramic[2]));
  box(
    pen,
    body,
    2,
    linear(
      pen,
      [0, y - 12, 0, y + 12],
      [material.ceramic[0], material.ceramic[1], material.ceramic[2]],
    ),
    material.ceramic[3],
    1,
  );
  box(pen, [24, y - 8, width - 48, 16], 1, material.nylon[1], material.ceramic[2], 0.8);
  rule(pen, [24, y - 10, width - 24, y - 10], shade.gleam, 1.2);
  stamp
    .slice(0, 1)
    .forEach((line) => write(pen, line, width / 2, y, { size: 9, ink: material.plastic[2] }));
  if (looks.includes('burnt')) scorch(pen, width - 28, y, 10);
};
