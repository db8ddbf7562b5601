import { copper, material, shade } from '../../../styles/tokens.ts';
import { grain } from '../paint/grain.ts';
import { box, roundRect, rule, stroke } from '../paint/outline.ts';
import { apart, linear, raised, type Pen } from '../paint/pen.ts';

type Area = readonly [number, number, number, number];

/** A layer-wound coil seen from its side: `pitch` units from turn to turn; the fine one is bound with tape. */
export const paintWinding = (pen: Pen, area: Area, pitch: number, isTaped: boolean): void => {
  const [x, y, width, height] = area;
  const radius = Math.min(16, height / 3);
  raised(pen, 6, shade.drop, () => box(pen, area, radius, copper[2]));
  const body = linear(
    pen,
    [0, y, 0, y + height],
    [
      [0, copper[1]],
      [0.24, copper[0]],
      [0.62, copper[1]],
      [1, copper[2]],
    ],
  );
  box(pen, area, radius, body, copper[2], 1);
  apart(pen, () => {
    roundRect(pen, area, radius);
    pen.clip();
    paintTurns(pen, area, pitch);
    const round = [
      [0, shade.drop],
      [0.1, shade.faint],
      [0.2, shade.clear],
      [0.8, shade.clear],
      [0.92, shade.faint],
      [1, shade.drop],
    ] as const;
    pen.fillStyle = linear(pen, [x, 0, x + width, 0], round);
    pen.fillRect(x, y, width, height);
    if (isTaped)
      for (const share of [0.24, 0.7]) paintTape(pen, [x + width * share, y, 20, height]);
  });
  roundRect(pen, area, radius);
  stroke(pen, copper[2], 1);
};

const paintTurns = (pen: Pen, [x, y, width, height]: Area, pitch: number): void => {
  for (let i = 0; (i + 0.5) * pitch < height; i++) {
    const at = y + (i + 0.5) * pitch;
    rule(
      pen,
      [x, at + pitch * 0.42, x + width, at + pitch * 0.42],
      copper[2],
      Math.max(0.6, pitch * 0.2),
    );
    // No hand winds quite evenly: some turns catch the light.
    if (grain(i * 3 + pitch) <= 0.35) continue;
    const gleam = at - pitch * 0.12;
    const [from, to] = [x + 8 + grain(i) * 30, x + width - 12 - grain(i + 40) * 60];
    rule(pen, [from, gleam, to, gleam], shade.sheen, Math.max(0.4, pitch * 0.16));
  }
};

const paintTape = (pen: Pen, area: Area): void => {
  const [, y, , height] = area;
  const stops = [
    [0, material.film[2]],
    [0.25, material.film[0]],
    [0.7, material.film[1]],
    [1, material.film[3]],
  ] as const;
  box(pen, area, 0, linear(pen, [0, y, 0, y + height], stops), material.film[3], 0.6);
};

/** The heater winding: a few turns of thick red insulated wire, its two ends led out to H1 and H2. */
export const paintHeaterWinding = (
  pen: Pen,
  [x, y, width, height]: Area,
  places: Readonly<Record<string, readonly [number, number]>>,
): void => {
  pen.lineCap = 'round';
  const wire = (line: Area): void => {
    rule(pen, line, material.insulator[3], 6.2);
    rule(pen, line, material.insulator[1], 4.8);
    rule(pen, [line[0], line[1] - 1.2, line[2], line[3] - 1.2], material.insulator[0], 1.2);
  };
  const rows = 3;
  ['H1', 'H2'].forEach((id, i) => {
    const at = places[id];
    if (at !== undefined) wire([at[0] + 8, at[1], x + 8, y + 2 + i * (height - 4)]);
  });
  for (let i = 0; i < rows; i++) {
    const at = y + 2 + (i * (height - 4)) / (rows - 1);
    wire([x + 4, at, x + width - 4, at]);
  }
};
