import { material, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { screw, tab } from '../paint/hardware.ts';
import { box, rule, stroke } from '../paint/outline.ts';
import { apart, linear, raised, type Pen } from '../paint/pen.ts';
import { scorch } from '../paint/scorch.ts';
import { paintHeaterWinding, paintWinding } from './paint-windings.ts';

type Places = Readonly<Record<string, readonly [number, number]>>;

/**
 * The high-voltage transformer: a welded stack of laminations, the fine high-voltage winding above, the
 * thick primary below, between them the heater winding in red and the magnetic shunts.
 */
export const hvTransformerGlyph: Glyph = (pen, { size: [width, height], terminals, looks }) => {
  const core = [30, 14, width - 42, height - 18] as const;
  paintCore(pen, core);
  const [x, y, wide, tall] = core;
  const left = x + 14;
  const across = wide - 28;
  const rows = { high: y + 26, heater: y + tall * 0.5 + 1, primary: y + tall * 0.575 };
  box(
    pen,
    [left + 4, rows.high - 6, across - 8, tall - 40],
    6,
    linear(
      pen,
      [left, 0, left + across, 0],
      [material.paper[2], material.paper[0], material.paper[2]],
    ),
    material.paper[3],
    0.8,
  );
  paintShunts(pen, left, rows.heater, across);
  const high = [left, rows.high, across, tall * 0.33] as const;
  const primary = [left, rows.primary, across, tall * 0.3] as const;
  paintPrimaryEnds(pen, terminals, primary);
  paintHighVoltageEnd(pen, terminals['HV'], high);
  paintWinding(pen, high, 2.3, true);
  paintWinding(pen, primary, 5.2, false);
  paintHeaterWinding(pen, [left - 3, rows.heater - 7, across + 6, 15], terminals);
  paintTabs(pen, terminals);
  if (looks.includes('burnt')) scorch(pen, x + wide * 0.6, rows.high + 30, 26);
};

const paintCore = (
  pen: Pen,
  [x, y, width, height]: readonly [number, number, number, number],
): void => {
  for (const [fx, fy] of [
    [x - 8, y + 8],
    [x + width - 16, y + 8],
    [x - 8, y + height - 26],
    [x + width - 16, y + height - 26],
  ] as const) {
    box(
      pen,
      [fx, fy, 24, 20],
      4,
      linear(pen, [0, fy, 0, fy + 20], [material.zinc[1], material.zinc[3]]),
      material.lamination[3],
      0.8,
    );
    screw(pen, fx < x ? fx + 5 : fx + 19, fy + 10, 3.2);
  }
  raised(pen, 9, shade.drop, () => box(pen, [x, y, width, height], 3, material.lamination[2]));
  box(
    pen,
    [x, y, width, height],
    3,
    linear(
      pen,
      [x, y, x + width, y + height],
      [material.lamination[0], material.lamination[1], material.lamination[2]],
    ),
    material.lamination[3],
    1.2,
  );
  for (let dy = 2; dy < height; dy += 2.6)
    rule(pen, [x + 1, y + dy, x + width - 1, y + dy], dy % 5 < 2.6 ? shade.soft : shade.haze, 0.7);
  for (const share of [0.2, 0.8]) paintWeld(pen, x + width * share, y, height);
  rule(pen, [x + 2, y + 1, x + width - 2, y + 1], shade.sheen, 1.4);
};

const paintWeld = (pen: Pen, x: number, y: number, height: number): void =>
  apart(pen, () => {
    pen.lineCap = 'round';
    for (const [from, to] of [
      [y + 2, y + 22],
      [y + height - 22, y + height - 2],
    ] as const)
      for (let at = from; at < to; at += 2.6) {
        pen.beginPath();
        pen.arc(x, at, 3, Math.PI * 0.1, Math.PI * 0.9);
        stroke(pen, material.tin[2], 1.2);
      }
  });

const paintShunts = (pen: Pen, x: number, y: number, across: number): void => {
  for (const dx of [-10, across - 16]) {
    box(
      pen,
      [x + dx, y - 8, 26, 17],
      2,
      linear(pen, [0, y - 8, 0, y + 9], [material.lamination[0], material.lamination[2]]),
      material.lamination[3],
      0.8,
    );
    for (let i = 0; i < 6; i++)
      rule(pen, [x + dx + 1, y - 6 + i * 2.6, x + dx + 25, y - 6 + i * 2.6], shade.soft, 0.6);
  }
};

const paintPrimaryEnds = (
  pen: Pen,
  places: Places,
  [x, y, , tall]: readonly [number, number, number, number],
): void => {
  const ends = ['1', '2'].flatMap((id) => (places[id] === undefined ? [] : [places[id]]));
  const first = ends[0];
  const last = ends.at(-1);
  if (first === undefined || last === undefined) return;
  const block = [
    Math.min(first[0], last[0]) + 6,
    Math.min(first[1], last[1]) - 11,
    18,
    Math.abs(last[1] - first[1]) + 22,
  ] as const;
  raised(pen, 3, shade.drop, () => box(pen, block, 3, material.nylon[1]));
  box(
    pen,
    block,
    3,
    linear(pen, [block[0], 0, block[0] + 18, 0], [material.nylon[0], material.nylon[2]]),
    material.nylon[3],
    0.8,
  );
  ends.forEach((end, i) => {
    rule(
      pen,
      [block[0] + 14, end[1], x + 10, y + tall * (0.2 + 0.6 * i)],
      material.varnish[2],
      5.4,
    );
    rule(
      pen,
      [block[0] + 14, end[1] - 0.6, x + 10, y + tall * (0.2 + 0.6 * i) - 0.6],
      material.varnish[0],
      2,
    );
  });
};

const paintHighVoltageEnd = (
  pen: Pen,
  at: readonly [number, number] | undefined,
  [, y]: readonly [number, number, number, number],
): void => {
  if (at === undefined) return;
  box(
    pen,
    [at[0] - 17, at[1] - 3, 34, y - at[1] + 12],
    3,
    linear(
      pen,
      [at[0] - 17, 0, at[0] + 17, 0],
      [material.paper[0], material.paper[1], material.paper[2]],
    ),
    material.paper[3],
    0.8,
  );
  pen.lineCap = 'round';
  rule(pen, [at[0], at[1] + 6, at[0], y + 8], material.insulator[2], 5.4);
  rule(pen, [at[0] - 0.8, at[1] + 6, at[0] - 0.8, y + 8], material.insulator[0], 1.6);
};

const paintTabs = (pen: Pen, places: Places): void => {
  for (const [id, at] of Object.entries(places)) {
    if (id === 'core') continue;
    tab(pen, at, id === 'HV' ? -Math.PI / 2 : Math.PI, 22);
  }
};
