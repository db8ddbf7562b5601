import { copper, material, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { pad } from '../paint/hardware.ts';
import { box, rule } from '../paint/outline.ts';
import { linear, raised, type Pen } from '../paint/pen.ts';
import { scorch } from '../paint/scorch.ts';

/** The small transformer of the control board: stacked core, taped bobbin, pads on the board. */
export const boardTransformerGlyph: Glyph = (pen, { size: [width, height], terminals, looks }) => {
  for (const [id, at] of Object.entries(terminals)) {
    if (id === 'core') continue;
    const toX = Math.min(width - 8, Math.max(8, at[0]));
    const toY = Math.min(height - 8, Math.max(8, at[1]));
    rule(pen, [at[0], at[1], toX, toY], material.board[0], 5);
    pad(pen, at);
  }
  raised(pen, 6, shade.drop, () => box(pen, [0, 0, width, height], 3, material.lamination[2]));
  box(
    pen,
    [0, 0, width, height],
    3,
    linear(
      pen,
      [0, 0, 0, height],
      [material.lamination[0], material.lamination[1], material.lamination[2]],
    ),
    material.lamination[3],
    1,
  );
  for (let y = 2; y < height; y += 2.4)
    rule(pen, [1, y, width - 1, y], y < 26 ? shade.haze : shade.soft, 0.6);
  paintBobbin(pen, width, height);
  if (looks.includes('burnt')) scorch(pen, width / 2, height * 0.58, 16);
};

const paintBobbin = (pen: Pen, width: number, height: number): void => {
  const top = 27;
  const tall = height - top - 20;
  for (const [x, wide] of [
    [10, width * 0.4],
    [width * 0.52, width * 0.4],
  ] as const) {
    box(pen, [x, top - 3, wide, tall + 6], 3, material.nylon[1], material.nylon[3], 0.8);
    box(
      pen,
      [x + 3, top, wide - 6, tall],
      4,
      linear(pen, [0, top, 0, top + tall], [copper[0], copper[1], copper[2]]),
      copper[2],
      0.6,
    );
    for (let y = top + 2; y < top + tall; y += 2)
      rule(pen, [x + 4, y, x + wide - 4, y], shade.soft, 0.5);
    box(
      pen,
      [x + wide * 0.3, top, wide * 0.4, tall],
      0,
      linear(pen, [0, top, 0, top + tall], [material.film[0], material.film[1], material.film[2]]),
    );
  }
};
