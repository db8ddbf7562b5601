import { material, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { write } from '../paint/lettering.ts';
import { box, rule } from '../paint/outline.ts';
import { linear, raised } from '../paint/pen.ts';
import { crack, scorch } from '../paint/scorch.ts';

/** A ceramic fuse in its clips. Ceramic hides its wire: only a violent end shows on it. */
export const fuseGlyph: Glyph = (pen, { size: [width, height], stamp, looks }) => {
  const middle = height / 2;
  raised(pen, 3, shade.drop, () => box(pen, [0, middle - 11, width, 22], 4, material.ceramic[2]));
  const tube = (tones: readonly string[]) =>
    linear(pen, [0, middle - 11, 0, middle + 11], [tones[1]!, tones[0]!, tones[1]!, tones[2]!]);
  box(pen, [12, middle - 10, width - 24, 20], 3, tube(material.ceramic), material.ceramic[3], 0.7);
  for (const x of [0, width - 22]) {
    box(pen, [x, middle - 11, 22, 22], 3, tube(material.tin), material.tin[3], 0.8);
    box(
      pen,
      [x + 4, middle - 14, 14, 28],
      2,
      linear(pen, [x, 0, x + 14, 0], [material.brass[0], material.brass[1], material.brass[2]]),
      material.brass[3],
      0.8,
    );
    rule(pen, [x + 5, middle - 8, x + 5, middle + 8], shade.gleam, 1);
  }
  rule(pen, [26, middle - 6, width - 26, middle - 6], shade.gleam, 1.6);
  stamp
    .slice(0, 1)
    .forEach((line) =>
      write(pen, line, width / 2, middle + 1, { size: 8.5, ink: material.ceramic[3] }),
    );
  if (looks.includes('burnt') || looks.includes('blown')) scorch(pen, width * 0.5, middle, 9);
  if (looks.includes('cracked'))
    crack(pen, [width * 0.4, middle - 10], [width * 0.58, middle + 10]);
};
