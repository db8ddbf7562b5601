import { material, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { screw, tab } from '../paint/hardware.ts';
import { box, circle, disc, fill, rule, stroke } from '../paint/outline.ts';
import { apart, linear, radial, raised, type Pen } from '../paint/pen.ts';

/** The cavity lamp in its holder: a glass bulb over the cavity's wall, two tabs. */
export const lampGlyph: Glyph = (pen, { size: [width, height], terminals, isLit, looks }) => {
  const [x, y] = [width / 2, height * 0.34];
  raised(pen, 3, shade.drop, () =>
    box(pen, [6, height * 0.5, width - 12, height * 0.42], 4, material.zinc[1]),
  );
  box(
    pen,
    [6, height * 0.5, width - 12, height * 0.42],
    4,
    linear(pen, [0, height * 0.5, 0, height], [material.zinc[0], material.zinc[2]]),
    material.zinc[3],
    0.8,
  );
  screw(pen, width / 2, height * 0.82, 3.6);
  for (const at of Object.values(terminals)) tab(pen, at, at[0] < x ? Math.PI : 0, 22);
  raised(pen, 4, shade.drop, () => box(pen, [x - 13, y + 6, 26, 24], 4, material.nylon[1]));
  box(
    pen,
    [x - 13, y + 6, 26, 24],
    4,
    linear(pen, [x - 13, 0, x + 13, 0], [material.nylon[1], material.nylon[0], material.nylon[2]]),
    material.nylon[3],
    0.8,
  );
  for (const dy of [12, 16, 20]) rule(pen, [x - 12, y + dy, x + 12, y + dy], shade.faint, 1);
  paintBulb(pen, x, y, isLit, looks.includes('burnt') || looks.includes('blown'));
};

const paintBulb = (pen: Pen, x: number, y: number, isLit: boolean, isBlown: boolean): void => {
  if (isLit)
    apart(pen, () => {
      circle(pen, x, y, 60);
      fill(
        pen,
        radial(
          pen,
          [x, y, 60],
          [
            [0, material.glow[1]],
            [0.3, shade.sheen],
            [1, shade.clear],
          ],
        ),
      );
    });
  box(
    pen,
    [x - 8, y + 3, 16, 9],
    2,
    linear(pen, [x - 8, 0, x + 8, 0], [material.brass[1], material.brass[0], material.brass[2]]),
    material.brass[3],
    0.7,
  );
  raised(pen, 4, shade.soft, () =>
    disc(pen, [x, y - 6, 13], isLit ? material.glow[1] : material.glass[1]),
  );
  disc(
    pen,
    [x, y - 6, 13],
    radial(pen, [x, y - 6, 13], isLit ? material.glow.slice(0, 3) : material.glass.slice(0, 3)),
    isLit ? material.glow[3] : material.glass[3],
    0.9,
  );
  pen.beginPath();
  pen.moveTo(x - 5, y + 3);
  pen.lineTo(x - 4, y - 8);
  if (isBlown) pen.moveTo(x - 1, y - 5);
  else for (let i = 0; i < 4; i++) pen.lineTo(x - 2.6 + i * 2, i % 2 === 0 ? y - 10 : y - 7);
  pen.moveTo(x + 4, y - 8);
  pen.lineTo(x + 5, y + 3);
  stroke(pen, isLit ? material.glow[3] : material.glass[3], 1);
  pen.beginPath();
  pen.ellipse(x - 4.6, y - 11, 4, 2, -0.7, 0, Math.PI * 2);
  fill(pen, shade.gleam);
  if (isBlown) {
    disc(pen, [x, y - 6, 12.4], shade.drop);
  }
};
