import { material, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { screw, tab } from '../paint/hardware.ts';
import { write } from '../paint/lettering.ts';
import { box, disc, circle, stroke } from '../paint/outline.ts';
import { linear, radial, raised } from '../paint/pen.ts';
import { scorch } from '../paint/scorch.ts';

/** A disc thermostat: aluminium cap on its flange, moulded body, two tabs. */
export const cutOutGlyph: Glyph = (pen, { size: [width, height], terminals, stamp, looks }) => {
  const [x, y] = [width / 2, height * 0.62];
  raised(pen, 3, shade.drop, () => box(pen, [2, y - 9, width - 4, 18], 9, material.zinc[1]));
  box(
    pen,
    [2, y - 9, width - 4, 18],
    9,
    linear(pen, [0, y - 9, 0, y + 9], [material.zinc[0], material.zinc[2]]),
    material.zinc[3],
    0.8,
  );
  screw(pen, 9, y, 3.4);
  screw(pen, width - 9, y, 3.4);
  for (const at of Object.values(terminals)) tab(pen, at, Math.atan2(at[1] - y, at[0] - x), 26);
  raised(pen, 4, shade.drop, () => disc(pen, [x, y, 18], material.plastic[2]));
  disc(pen, [x, y, 18], radial(pen, [x, y, 18], material.tin.slice(0, 3)), material.tin[3], 0.9);
  disc(pen, [x, y, 14], radial(pen, [x, y, 14], material.plastic), material.plastic[3], 0.8);
  circle(pen, x, y, 16);
  stroke(pen, shade.gleam, 0.8);
  stamp.slice(0, 1).forEach((line) => write(pen, line, x, y, { size: 8, ink: material.nylon[1] }));
  const burnt = terminals['2'];
  if (looks.includes('burnt') && burnt !== undefined) scorch(pen, burnt[0], burnt[1] + 8, 10);
};
