import { copper, material, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { write } from '../paint/lettering.ts';
import { box, disc, rule, stroke } from '../paint/outline.ts';
import { linear, radial, raised } from '../paint/pen.ts';
import { scorch } from '../paint/scorch.ts';

/** A high-voltage fuse in its two-piece plastic holder, an eyelet lead at each end. The holder hides its wire. */
export const hvFuseGlyph: Glyph = (pen, { size: [width, height], terminals, stamp, looks }) => {
  const y = height / 2;
  for (const at of Object.values(terminals)) {
    rule(pen, [at[0], at[1], width / 2, y], material.tin[3], 5);
    rule(pen, [at[0], at[1], width / 2, y], material.tin[1], 3.2);
    raised(pen, 1.4, shade.drop, () => disc(pen, [at[0], at[1], 9], material.tin[2]));
    disc(
      pen,
      [at[0], at[1], 9],
      radial(pen, [at[0], at[1], 9], material.tin.slice(0, 3)),
      material.tin[3],
      0.8,
    );
  }
  const half = (x: number, wide: number, tones: readonly string[]): void => {
    raised(pen, 4, shade.drop, () => box(pen, [x, y - 13, wide, 26], 8, tones[2]!));
    box(
      pen,
      [x, y - 13, wide, 26],
      8,
      linear(pen, [0, y - 13, 0, y + 13], [tones[1]!, tones[0]!, tones[1]!, tones[2]!]),
      tones[3]!,
      0.9,
    );
  };
  half(26, width * 0.5 - 20, material.nylon);
  half(width * 0.5 - 2, width * 0.5 - 24, material.nylon);
  box(pen, [width * 0.5 - 7, y - 15, 14, 30], 4, material.nylon[2], material.nylon[3], 0.9);
  for (const dx of [-3, 0, 3])
    rule(pen, [width * 0.5 + dx, y - 13, width * 0.5 + dx, y + 13], material.nylon[3], 0.9);
  rule(pen, [32, y - 7, width - 32, y - 7], shade.gleam, 1.8);
  stamp.slice(0, 2).forEach((line, i) =>
    write(pen, line, i === 0 ? width * 0.385 : width * 0.625, y + 1, {
      size: 7.4,
      ink: material.plastic[1],
    }),
  );
  if (looks.includes('bridged')) {
    pen.beginPath();
    pen.moveTo(20, y);
    pen.bezierCurveTo(34, y - 24, width - 34, y - 24, width - 20, y);
    stroke(pen, copper[2], 3.6);
    stroke(pen, copper[0], 1.8);
  }
  if (looks.includes('burnt')) scorch(pen, width - 34, y, 11);
};
