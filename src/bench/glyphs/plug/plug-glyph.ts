import { material, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { box, circle, disc, fill, rule, stroke } from '../paint/outline.ts';
import { linear, radial, raised, type Pen } from '../paint/pen.ts';

/** A moulded plug. Out of the outlet its pins look up at the trainee; in it (`isActuated`) its back does. */
export const plugGlyph: Glyph = (pen, { size: [width, height], terminals, isActuated, stamp }) => {
  const middle = width / 2;
  const body = (): void => {
    pen.beginPath();
    pen.moveTo(14, 2);
    pen.lineTo(width - 14, 2);
    pen.quadraticCurveTo(width - 1, 3, width - 2, 18);
    pen.bezierCurveTo(width - 3, height * 0.74, middle + 24, height - 10, middle + 11, height);
    pen.lineTo(middle - 11, height);
    pen.bezierCurveTo(middle - 24, height - 10, 3, height * 0.74, 2, 18);
    pen.quadraticCurveTo(1, 3, 14, 2);
    pen.closePath();
  };
  raised(pen, 6, shade.drop, () => {
    body();
    fill(pen, material.plastic[2]);
  });
  body();
  fill(
    pen,
    linear(
      pen,
      [0, 0, width * 0.5, height],
      [material.plastic[0], material.plastic[1], material.plastic[2], material.plastic[3]],
    ),
  );
  stroke(pen, material.plastic[3], 1);
  for (let i = 0; i < 4; i++)
    rule(
      pen,
      [middle - 9 + i, height + 2 + i * 4, middle + 9 - i, height + 2 + i * 4],
      material.plastic[3],
      2.2,
    );
  if (isActuated) return ridges(pen, width, height);
  pen.beginPath();
  pen.ellipse(middle, height * 0.46, width * 0.41, height * 0.39, 0, 0, Math.PI * 2);
  fill(
    pen,
    linear(
      pen,
      [0, 6, 0, height * 0.85],
      [material.plastic[3], material.plastic[2], material.plastic[1]],
    ),
  );
  stroke(pen, shade.haze, 1);
  const isRound = isRoundPinned(stamp);
  for (const [id, at] of Object.entries(terminals))
    if (!isRound) pin(pen, id, at);
    else if (id === 'E') earthClip(pen, at);
    else roundPin(pen, at);
};

/** Plugs rated for 250 V have two round pins and an earth clip, those for 125 V blades and a round earth pin. */
export const isRoundPinned = (stamp: readonly string[]): boolean =>
  stamp.some((line) => line.includes('250 V'));

const roundPin = (pen: Pen, [x, y]: readonly [number, number]): void => {
  disc(pen, [x, y, 12], material.plastic[2], material.plastic[3], 1);
  raised(pen, 3, shade.drop, () => disc(pen, [x, y, 8.5], material.tin[2]));
  disc(pen, [x, y, 8.5], radial(pen, [x, y, 8.5], material.tin.slice(0, 3)), material.tin[3], 0.8);
};

const earthClip = (pen: Pen, [x, y]: readonly [number, number]): void => {
  raised(pen, 2, shade.drop, () => box(pen, [x - 13, y - 7, 26, 14], 4, material.brass[2]));
  box(
    pen,
    [x - 13, y - 7, 26, 14],
    4,
    linear(pen, [0, y - 7, 0, y + 7], [material.brass[0], material.brass[1], material.brass[2]]),
    material.brass[3],
    0.9,
  );
};

const pin = (pen: Pen, id: string, [x, y]: readonly [number, number]): void => {
  const isEarth = id === 'E';
  raised(pen, 3, shade.drop, () => {
    if (isEarth) disc(pen, [x, y, 8], material.brass[2]);
    else box(pen, [x - 4.5, y - 14, 9, 28], 2, material.brass[2]);
  });
  if (isEarth) {
    disc(pen, [x, y, 8], radial(pen, [x, y, 8], material.brass), material.brass[3], 0.8);
    return;
  }
  box(
    pen,
    [x - 4.5, y - 14, 9, 28],
    2,
    linear(
      pen,
      [x - 4.5, 0, x + 4.5, 0],
      [material.brass[1], material.brass[0], material.brass[2]],
    ),
    material.brass[3],
    0.8,
  );
  circle(pen, x, y - 9, 1.6);
  fill(pen, material.brass[3]);
};

const ridges = (pen: Pen, width: number, height: number): void => {
  for (let i = 0; i < 5; i++) {
    const y = 26 + i * 8;
    rule(pen, [16 + i * 2.4, y, width - 16 - i * 2.4, y], material.plastic[3], 2.6);
    rule(pen, [16 + i * 2.4, y + 2, width - 16 - i * 2.4, y + 2], shade.haze, 1);
  }
  rule(pen, [18, 8, width - 22, 8], shade.sheen, 2);
  rule(pen, [width / 2 - 6, height - 8, width / 2 + 6, height - 8], shade.haze, 1.4);
};
