import { material, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { box, disc, rule } from '../paint/outline.ts';
import { linear, radial, raised } from '../paint/pen.ts';
import { crack, scorch } from '../paint/scorch.ts';

/** The high-voltage diode: a moulded stick, its cathode band on the side of terminal k. */
export const hvDiodeGlyph: Glyph = (pen, { size: [width, height], terminals, looks }) => {
  const y = height / 2;
  const isLeft = (terminals['k']?.[0] ?? width) < (terminals['a']?.[0] ?? 0);
  const isBandLeft = isLeft !== looks.includes('reversed');
  for (const at of Object.values(terminals)) {
    rule(pen, [at[0], at[1], width / 2, y], material.tin[3], 4.6);
    rule(pen, [at[0], at[1], width / 2, y], material.tin[1], 3);
    raised(pen, 1.4, shade.drop, () => disc(pen, [at[0], at[1], 10], material.tin[2]));
    disc(
      pen,
      [at[0], at[1], 10],
      radial(pen, [at[0], at[1], 10], material.tin.slice(0, 3)),
      material.tin[3],
      0.8,
    );
  }
  const body = [30, y - 12, width - 60, 24] as const;
  raised(pen, 4, shade.drop, () => box(pen, body, 6, material.plastic[2]));
  box(
    pen,
    body,
    6,
    linear(
      pen,
      [0, y - 12, 0, y + 12],
      [material.plastic[1], material.plastic[0], material.plastic[2], material.plastic[3]],
    ),
    material.plastic[3],
    0.9,
  );
  rule(pen, [36, y - 6, width - 36, y - 6], shade.sheen, 2);
  const band = isBandLeft ? 38 : width - 48;
  box(
    pen,
    [band, y - 12, 9, 24],
    0,
    linear(
      pen,
      [0, y - 12, 0, y + 12],
      [material.nylon[1], material.nylon[0], material.nylon[2], material.nylon[3]],
    ),
  );
  if (looks.includes('burnt')) scorch(pen, width * 0.45, y, 12);
  if (looks.includes('cracked')) crack(pen, [width * 0.4, y - 12], [width * 0.5, y + 12]);
};
