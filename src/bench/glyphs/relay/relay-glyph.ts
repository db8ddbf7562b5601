import { material, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { pad, tab } from '../paint/hardware.ts';
import { write } from '../paint/lettering.ts';
import { box, roundRect, rule, stroke } from '../paint/outline.ts';
import { linear, raised } from '../paint/pen.ts';
import { scorch } from '../paint/scorch.ts';

/** A sealed relay on the board: coil pads on one side, contact tabs on the other, its diagram on the lid. */
export const relayGlyph: Glyph = (pen, { size: [width, height], terminals, stamp, looks }) => {
  for (const [id, at] of Object.entries(terminals)) {
    pad(pen, at);
    if (!id.startsWith('A')) tab(pen, at, at[1] > height / 2 ? Math.PI / 2 : -Math.PI / 2, 20);
  }
  raised(pen, 6, shade.drop, () => box(pen, [0, 0, width, height], 4, material.relay[2]));
  box(
    pen,
    [0, 0, width, height],
    4,
    linear(
      pen,
      [0, 0, width * 0.3, height],
      [material.relay[0], material.relay[1], material.relay[2]],
    ),
    material.relay[3],
    1,
  );
  roundRect(pen, [3.5, 3.5, width - 7, height - 7], 3);
  stroke(pen, shade.haze, 1.2);
  rule(pen, [5, 2, width - 5, 2], shade.sheen, 1.4);
  const x = width / 2;
  const ink = material.nylon[1];
  box(pen, [x - 22, height - 22, 12, 8], 0, shade.clear, ink, 1);
  rule(pen, [x - 2, height - 15, x + 6, height - 15], ink, 1);
  rule(pen, [x + 6, height - 15, x + 15, height - 21], ink, 1);
  rule(pen, [x + 16, height - 15, x + 23, height - 15], ink, 1);
  stamp
    .slice(0, 2)
    .forEach((line, i) => write(pen, line, width * 0.66, 14 + i * 11, { size: 8.5, ink }));
  if (looks.includes('burnt')) scorch(pen, width * 0.7, height * 0.8, 12);
};
