import { material, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { screw, tab } from '../paint/hardware.ts';
import { write } from '../paint/lettering.ts';
import { box, circle, disc, stroke } from '../paint/outline.ts';
import { apart, linear, radial, raised, type Pen } from '../paint/pen.ts';
import { scorch } from '../paint/scorch.ts';

type Spot = readonly [number, number, number];

/** The turntable's synchronous motor: a flat round can with its flattened shaft, tabs on a moulded block. */
export const paintTurntableMotor: Glyph = (
  pen,
  { size: [width, height], terminals, stamp, isTurning, looks },
) => {
  const [x, y, radius] = [width / 2, height * 0.55, width * 0.35];
  for (const at of Object.values(terminals)) tab(pen, at, -Math.PI / 2, 20);
  const block = [x - 31, y - radius - 6, 62, 18] as const;
  box(
    pen,
    block,
    3,
    linear(pen, [0, block[1], 0, block[1] + 18], [material.plastic[0], material.plastic[2]]),
    material.plastic[3],
    0.8,
  );
  for (const side of [-1, 1]) {
    const ear = [x + side * (radius + 4) - 11, y - 8, 22, 16] as const;
    box(
      pen,
      ear,
      6,
      linear(pen, [0, y - 8, 0, y + 8], [material.zinc[0], material.zinc[2]]),
      material.zinc[3],
      0.8,
    );
    screw(pen, x + side * (radius + 8), y, 3.6);
  }
  paintCan(pen, [x, y, radius]);
  paintShaft(pen, [x, y, 13]);
  if (isTurning) paintTurning(pen, [x, y, 18]);
  stamp
    .slice(0, 1)
    .forEach((line) => write(pen, line, x, y + radius * 0.6, { size: 8, ink: material.tin[3] }));
  if (looks.includes('burnt')) scorch(pen, x, y - radius + 4, 11);
};

const paintCan = (pen: Pen, [x, y, radius]: Spot): void => {
  raised(pen, 6, shade.drop, () => disc(pen, [x, y, radius], material.tin[2]));
  disc(pen, [x, y, radius], radial(pen, [x, y, radius], material.tin), material.tin[3], 1);
  circle(pen, x, y, radius - 4);
  stroke(pen, shade.soft, 1);
  circle(pen, x, y, radius - 5.2);
  stroke(pen, shade.gleam, 1);
  for (let i = 0; i < 4; i++) {
    const angle = 0.4 + (i * Math.PI) / 2;
    const [dx, dy] = [Math.cos(angle) * (radius - 9), Math.sin(angle) * (radius - 9)];
    disc(pen, [x + dx, y + dy, 2.2], material.tin[3]);
  }
};

const paintShaft = (pen: Pen, [x, y, radius]: Spot): void => {
  const nylon = radial(pen, [x, y, radius], material.nylon.slice(0, 3));
  disc(pen, [x, y, radius], nylon, material.nylon[3], 0.9);
  apart(pen, () => {
    pen.translate(x, y);
    pen.rotate(0.5);
    const brass = linear(pen, [0, -4.4, 0, 4.4], material.brass.slice(0, 3));
    box(pen, [-7, -4.4, 14, 8.8], 3, brass, material.brass[3], 0.8);
  });
};

/** Three arrows around the shaft: a still picture of turning. */
const paintTurning = (pen: Pen, [x, y, radius]: Spot): void => {
  for (const start of [0.3, 2.4, 4.5]) {
    const end = start + 1.2;
    pen.beginPath();
    pen.arc(x, y, radius, start, end);
    pen.lineTo(x + Math.cos(end - 0.24) * (radius + 4), y + Math.sin(end - 0.24) * (radius + 4));
    stroke(pen, material.plastic[1], 1.8);
  }
};
