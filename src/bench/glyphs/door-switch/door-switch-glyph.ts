import { material, palette, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { rivet, tab } from '../paint/hardware.ts';
import { box, chain, disc, roundRect, rule, stroke } from '../paint/outline.ts';
import { apart, linear, raised, type Pen } from '../paint/pen.ts';
import { scorch } from '../paint/scorch.ts';

/** A snap switch on the latch bracket: lever and plunger towards the door's hook, tabs at the other end. */
export const doorSwitchGlyph: Glyph = (pen, part) => {
  const { size, terminals, variant, isActuated, isPressed, looks } = part;
  const height = size[1];
  const right = Math.min(...Object.values(terminals).map(([x]) => x), size[0]) - 8;
  const body = [12, 7, right - 12, height - 14] as const;
  const tones = variant === 'monitor' ? material.soot : material.plastic;
  for (const at of Object.values(terminals)) tab(pen, at, 0, 26);
  raised(pen, 4, shade.drop, () => box(pen, body, 4, tones[2]));
  box(
    pen,
    body,
    4,
    linear(pen, [0, 7, 0, height - 7], [tones[0], tones[1], tones[2], tones[3]]),
    tones[3],
    0.9,
  );
  roundRect(pen, [15, 10, right - 18, height - 20], 3);
  stroke(pen, shade.haze, 1);
  rivet(pen, 20, height - 13, 3);
  rivet(pen, right - 8, 13, 3);
  contactSign(pen, right - 26, height / 2 + 5, isActuated !== 'NC' in terminals);
  lever(pen, height, isActuated && (isPressed || !looks.includes('bent')));
  if (isPressed) {
    disc(pen, [4, height / 2, 8], palette.act, palette.sheet, 2);
    chain(pen, [
      [1, height / 2 - 3.4],
      [6.4, height / 2],
      [1, height / 2 + 3.4],
    ]);
    stroke(pen, palette.sheet, 1.8);
  }
  if (looks.includes('burnt')) scorch(pen, right, height / 2, 12);
  if (looks.includes('welded')) scorch(pen, right - 4, height / 2 + 6, 7);
};

const lever = (pen: Pen, height: number, isIn: boolean): void =>
  apart(pen, () => {
    const out = isIn ? 4 : 0;
    box(
      pen,
      [7 + out, height / 2 - 5, 9 - out, 10],
      2,
      linear(
        pen,
        [0, height / 2 - 5, 0, height / 2 + 5],
        [material.insulator[0], material.insulator[1], material.insulator[2]],
      ),
      material.insulator[3],
      0.7,
    );
    pen.translate(14, height - 12);
    pen.rotate(isIn ? -0.16 : -0.36);
    pen.lineCap = 'round';
    rule(pen, [0, 0, 0, -height + 18], material.tin[3], 3.4);
    rule(pen, [0, 0, 0, -height + 18], material.tin[1], 2);
  });

/** The contact as moulded on the body, open or closed as it is now. */
const contactSign = (pen: Pen, x: number, y: number, isClosed: boolean): void =>
  apart(pen, () => {
    pen.globalAlpha = 0.75;
    pen.lineCap = 'round';
    rule(pen, [x - 12, y + 6, x - 6, y + 6], material.nylon[2], 1.2);
    rule(pen, [x + 7, y + 6, x + 13, y + 6], material.nylon[2], 1.2);
    rule(pen, [x - 6, y + 6, x + 6, isClosed ? y + 6 : y], material.nylon[2], 1.2);
  });
