import { copper, material, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { pad, screw, silk, tab } from '../paint/hardware.ts';
import { box, chain, circle, disc, rule, stroke } from '../paint/outline.ts';
import { apart, linear, radial, raised, type Pen } from '../paint/pen.ts';
import { crack, scorch } from '../paint/scorch.ts';
import { write } from '../paint/lettering.ts';

/** The mains filter board: a ring choke of two windings, a film capacitor across, two disc capacitors to chassis. */
export const filterBoardGlyph: Glyph = (pen, { size: [width, height], terminals, looks }) => {
  raised(pen, 5, shade.drop, () => box(pen, [0, 0, width, height], 4, material.phenolic[2]));
  box(
    pen,
    [0, 0, width, height],
    4,
    linear(
      pen,
      [0, 0, width, height],
      [material.phenolic[0], material.phenolic[1], material.phenolic[1], material.phenolic[2]],
    ),
    material.phenolic[3],
    1,
  );
  paintTracks(pen, width, height);
  for (const [x, y] of [
    [10, 58],
    [width - 10, 12],
    [width - 10, height - 48],
    [150, height - 9],
  ] as const)
    screw(pen, x, y, 4.4);
  paintFilm(pen, [48, 66, 50, 34]);
  paintChoke(pen, width * 0.6, height * 0.6, 35);
  paintDiscs(pen, 58, height - 22);
  paintResistor(pen, [102, height - 22, 30, 9]);
  for (const at of Object.values(terminals)) {
    pad(pen, at);
    tab(pen, at, at[0] > width / 2 ? 0 : Math.PI, 20);
  }
  if (looks.includes('burnt')) scorch(pen, width * 0.6, height * 0.33, 15);
  if (looks.includes('cracked')) {
    scorch(pen, 76, 84, 13);
    crack(pen, [56, 68], [88, 98]);
  }
};

const paintTracks = (pen: Pen, width: number, height: number): void =>
  apart(pen, () => {
    pen.globalAlpha = 0.5;
    pen.lineJoin = 'round';
    const track = (points: readonly (readonly [number, number])[]): void => {
      chain(pen, points);
      stroke(pen, material.phenolic[2], 9);
      chain(pen, points);
      stroke(pen, shade.haze, 1);
    };
    track([
      [130, 28],
      [width - 40, 28],
      [width - 66, 60],
    ]);
    track([
      [24, height - 26],
      [60, height - 44],
      [110, height - 50],
    ]);
    track([
      [width - 18, 80],
      [width - 50, 80],
    ]);
    track([
      [width - 18, height - 24],
      [width - 50, height - 40],
    ]);
    silk(pen, [16, 6, 122, 44], 4);
  });

const paintFilm = (
  pen: Pen,
  [x, y, width, height]: readonly [number, number, number, number],
): void => {
  raised(pen, 4, shade.drop, () => box(pen, [x, y, width, height], 3, material.film[2]));
  box(
    pen,
    [x, y, width, height],
    3,
    linear(pen, [x, y, x, y + height], [material.film[0], material.film[1], material.film[2]]),
    material.film[3],
    0.8,
  );
  rule(pen, [x + 4, y + 3, x + width - 4, y + 3], shade.gleam, 1.4);
  write(pen, '.22 X2', x + width / 2, y + height / 2, { size: 9, ink: material.film[3] });
};

const paintChoke = (pen: Pen, x: number, y: number, radius: number): void => {
  raised(pen, 5, shade.drop, () => disc(pen, [x, y, radius], material.ferrite[2]));
  disc(pen, [x, y, radius], radial(pen, [x, y, radius], material.ferrite), material.ferrite[3], 1);
  const turns = 11;
  for (const side of [-1, 1])
    for (let i = 0; i < turns; i++) {
      const angle = side * (0.42 + (i * (Math.PI - 0.84)) / (turns - 1)) - Math.PI / 2;
      turn(pen, x, y, radius, angle);
    }
  disc(pen, [x, y, radius * 0.36], material.phenolic[1], material.ferrite[3], 1.4);
  pen.beginPath();
  pen.arc(x, y, radius * 0.36, Math.PI, 1.7 * Math.PI);
  stroke(pen, shade.drop, 3);
  rule(pen, [x, y - radius + 1, x, y + radius - 1], material.nylon[1], 3.4);
  circle(pen, x, y, radius);
};

/** One turn of copper over the ring, thicker outside than in the hole. */
const turn = (pen: Pen, x: number, y: number, radius: number, angle: number): void => {
  const at = (r: number, lean: number): readonly [number, number] => [
    x + Math.cos(angle + lean) * r,
    y + Math.sin(angle + lean) * r,
  ];
  pen.lineCap = 'round';
  const ends = [at(radius * 0.34, -0.12), at(radius * 1.05, 0.02)] as const;
  chain(pen, ends);
  stroke(pen, copper[2], 5.4);
  chain(pen, ends);
  stroke(pen, copper[1], 4);
  chain(pen, [at(radius * 0.42, -0.16), at(radius * 0.98, -0.02)]);
  stroke(pen, copper[0], 1.3);
};

const paintDiscs = (pen: Pen, x: number, y: number): void => {
  for (const dx of [0, 18]) {
    raised(pen, 3, shade.drop, () => disc(pen, [x + dx, y, 7.5], material.disc[2]));
    disc(
      pen,
      [x + dx, y, 7.5],
      radial(pen, [x + dx, y, 7.5], material.disc),
      material.disc[3],
      0.7,
    );
  }
};

const paintResistor = (
  pen: Pen,
  [x, y, width, height]: readonly [number, number, number, number],
): void => {
  rule(pen, [x - 8, y + height / 2, x + width + 8, y + height / 2], material.tin[2], 1.6);
  raised(pen, 2, shade.drop, () => box(pen, [x, y, width, height], 4, material.paper[1]));
  box(
    pen,
    [x, y, width, height],
    4,
    linear(pen, [0, y, 0, y + height], [material.paper[0], material.paper[1], material.paper[2]]),
    material.paper[3],
    0.6,
  );
  const bands = [material.relay[2], material.soot[3], material.film[1], material.brass[2]];
  bands.forEach((tone, i) => box(pen, [x + 5 + i * 5.6, y, 2.4, height], 0, tone));
};
