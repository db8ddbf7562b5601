import { material, palette, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { pad, screw, silk } from '../paint/hardware.ts';
import { write } from '../paint/lettering.ts';
import { box, chain, disc, rule, stroke } from '../paint/outline.ts';
import { apart, linear, radial, raised, type Pen } from '../paint/pen.ts';
import { crack, scorch } from '../paint/scorch.ts';

/** The control board with its display. What else sits on it (relays, transformer) has glyphs of its own. */
export const controlBoardGlyph: Glyph = (pen, part) => {
  const { size, terminals, looks, isLit, stamp } = part;
  const [width, height] = size;
  raised(pen, 6, shade.drop, () => box(pen, [0, 0, width, height], 5, material.board[2]));
  box(
    pen,
    [0, 0, width, height],
    5,
    linear(pen, [0, 0, width, height], [material.board[0], material.board[1], material.board[2]]),
    material.board[3],
    1.2,
  );
  paintTraces(pen, width, height);
  for (const [x, y] of [
    [9, height - 9],
    [width - 9, height - 9],
    [width - 9, 9],
    [145, 9],
  ] as const)
    screw(pen, x, y, 4.4);
  paintDisplay(pen, [width * 0.455, 10, width * 0.3, 42], isLit, stamp[0] ?? '--:--');
  paintChip(pen, [width * 0.79, 12, 32, 32]);
  paintElectrolytic(pen, width * 0.945, 34, 13);
  for (let i = 0; i < 4; i++) paintSmall(pen, 138, 64 + i * 17);
  for (const at of Object.values(terminals)) pad(pen, at);
  if (looks.includes('cracked')) {
    scorch(pen, 144, 115, 9);
    crack(pen, [136, 110], [152, 121]);
  }
  if (looks.includes('burnt')) scorch(pen, width * 0.42, height * 0.66, 18);
};

type Way = readonly (readonly [number, number])[];

/** The wide tracks of the mains side: to the relay contacts and the transformer's primary. */
const mainsTracks: readonly { way: Way; wide: number }[] = [
  {
    way: [
      [172, 162],
      [172, 182],
      [236, 182],
    ],
    wide: 6,
  },
  {
    way: [
      [314, 162],
      [314, 184],
      [252, 184],
    ],
    wide: 6,
  },
  {
    way: [
      [14, 24],
      [30, 24],
      [38, 40],
    ],
    wide: 5,
  },
  {
    way: [
      [14, 72],
      [34, 72],
    ],
    wide: 5,
  },
];

const signalTracks = (width: number, height: number): { way: Way; wide: number }[] => [
  ...Array.from({ length: 6 }, (_, i) => {
    const [from, to] = [width * 0.8 + i * 5, width * 0.44 - i * 4];
    return {
      way: [
        [from, 46],
        [from, 54 + i * 3],
        [to, 54 + i * 3],
        [to, 78 + i * 9],
      ] as Way,
      wide: 1.4,
    };
  }),
  ...Array.from({ length: 4 }, (_, i) => {
    const [from, to, y] = [24 + i * 34, width * 0.42 + i * 4, height - 12 + i];
    return {
      way: [
        [from, height - 24],
        [from, y],
        [to, y],
        [to, height * 0.7],
      ] as Way,
      wide: 2,
    };
  }),
];

const paintTraces = (pen: Pen, width: number, height: number): void =>
  apart(pen, () => {
    pen.globalAlpha = 0.55;
    pen.lineJoin = 'round';
    for (const { way, wide } of [...signalTracks(width, height), ...mainsTracks]) {
      chain(pen, way);
      stroke(pen, material.board[0], wide);
    }
    for (let i = 0; i < 26; i++)
      disc(pen, [150 + ((i * 37) % 190), 58 + ((i * 53) % 128), 1.2], material.board[0]);
    silk(pen, [12, height - 40, 132, 34], 3);
  });

const paintDisplay = (
  pen: Pen,
  [x, y, width, height]: readonly [number, number, number, number],
  isLit: boolean,
  text: string,
): void => {
  raised(pen, 4, shade.drop, () => box(pen, [x, y, width, height], 3, material.plastic[3]));
  box(
    pen,
    [x, y, width, height],
    3,
    linear(pen, [x, y, x, y + height], [material.plastic[1], material.plastic[3]]),
    palette.ink,
    1,
  );
  box(
    pen,
    [x + 5, y + 5, width - 10, height - 10],
    2,
    isLit ? linear(pen, [x, y, x, y + height], [material.segment[3], palette.ink]) : palette.ink,
  );
  apart(pen, () => {
    if (isLit) {
      pen.shadowColor = material.segment[1];
      pen.shadowBlur = 12;
    }
    write(pen, text, x + width / 2, y + height / 2, {
      size: 22,
      weight: 800,
      ink: isLit ? material.segment[0] : material.segment[2],
    });
  });
  chain(pen, [
    [x + 7, y + height - 7],
    [x + 26, y + 6],
    [x + 46, y + 6],
    [x + 24, y + height - 7],
  ]);
  pen.closePath();
  pen.fillStyle = shade.haze;
  pen.fill();
};

const paintChip = (
  pen: Pen,
  [x, y, width, height]: readonly [number, number, number, number],
): void => {
  for (let i = 0; i < 8; i++) {
    const off = 3.5 + i * 3.5;
    rule(pen, [x - 3, y + off, x + width + 3, y + off], material.tin[1], 1.4);
    rule(pen, [x + off, y - 3, x + off, y + height + 3], material.tin[1], 1.4);
  }
  box(
    pen,
    [x, y, width, height],
    2,
    linear(pen, [x, y, x + width, y + height], [material.plastic[1], material.plastic[3]]),
    material.plastic[3],
    0.8,
  );
  disc(pen, [x + 5, y + 5, 1.6], material.plastic[0]);
};

const paintElectrolytic = (pen: Pen, x: number, y: number, radius: number): void => {
  raised(pen, 5, shade.drop, () => disc(pen, [x, y, radius], material.relay[3]));
  disc(pen, [x, y, radius], material.relay[3], material.plastic[3], 0.8);
  disc(pen, [x, y, radius - 2], radial(pen, [x, y, radius], material.tin.slice(0, 3)));
  rule(pen, [x - radius + 4, y, x + radius - 4, y], material.tin[3], 0.8);
  rule(pen, [x, y - radius + 4, x, y + radius - 4], material.tin[3], 0.8);
};

const paintSmall = (pen: Pen, x: number, y: number): void => {
  rule(pen, [x - 4, y, x + 16, y], material.tin[2], 1.2);
  box(
    pen,
    [x, y - 3, 12, 6],
    2.6,
    linear(pen, [0, y - 3, 0, y + 3], [material.paper[0], material.paper[1], material.paper[2]]),
    material.paper[3],
    0.5,
  );
  for (const [i, tone] of [material.insulator[1], material.soot[1], material.film[1]].entries())
    box(pen, [x + 2.4 + i * 2.8, y - 3, 1.3, 6], 0, tone);
};
