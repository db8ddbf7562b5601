import { copper, material, shade } from '../../../styles/tokens.ts';
import type { Glyph } from '../glyph.ts';
import { screw, tab } from '../paint/hardware.ts';
import { box, circle, disc, fill, roundRect, rule, stroke } from '../paint/outline.ts';
import { apart, linear, radial, raised, type Pen } from '../paint/pen.ts';
import { scorch } from '../paint/scorch.ts';

type Place = readonly [number, number, number, number];

/** The vent of a hood: one motor between two blower wheels, each in its scroll, seen through their inlets. */
export const paintVentFan: Glyph = (
  pen,
  { size: [width, height], terminals, isTurning, looks },
) => {
  const scroll = width * 0.31;
  for (const x of [0, width - scroll]) paintBlower(pen, [x, 2, scroll, height - 6], isTurning);
  for (const at of Object.values(terminals)) tab(pen, at, Math.PI / 2, 18);
  const motor: Place = [scroll + 3, height * 0.1, width - 2 * scroll - 6, height * 0.68];
  paintMotor(pen, motor);
  if (looks.includes('greasy')) {
    apart(pen, () => {
      for (const [dx, radius] of [
        [-2, 11],
        [motor[2] + 2, 12],
        [motor[2] + 14, 6],
      ] as const) {
        pen.beginPath();
        pen.ellipse(motor[0] + dx, height * 0.48, radius, radius * 0.8, 0.3, 0, Math.PI * 2);
        fill(pen, shade.oil);
      }
    });
  }
  if (looks.includes('burnt')) scorch(pen, width / 2, height * 0.4, 15);
};

const paintBlower = (pen: Pen, [x, y, width, height]: Place, isTurning: boolean): void => {
  raised(pen, 6, shade.drop, () => box(pen, [x, y, width, height], 12, material.zinc[2]));
  box(
    pen,
    [x, y, width, height],
    12,
    linear(pen, [x, y, x + width, y + height], material.zinc.slice(0, 3)),
    material.zinc[3],
    1,
  );
  roundRect(pen, [x + 3, y + 3, width - 6, height - 6], 9);
  stroke(pen, shade.gleam, 1);
  for (const [dx, dy] of [
    [7, 7],
    [width - 7, 7],
    [7, height - 7],
    [width - 7, height - 7],
  ] as const)
    screw(pen, x + dx, y + dy, 2.6);
  const [cx, cy] = [x + width / 2, y + height / 2];
  const radius = Math.min(width, height) * 0.4;
  disc(
    pen,
    [cx, cy, radius],
    radial(pen, [cx, cy, radius], [material.plastic[3], material.plastic[2], material.plastic[3]]),
    material.zinc[3],
    1.4,
  );
  paintWheel(pen, cx, cy, radius - 2, isTurning);
  circle(pen, cx, cy, radius + 1.6);
  stroke(pen, shade.gleam, 1);
};

/** A blower wheel: narrow blades all around its rim; a blur when it turns. */
const paintWheel = (pen: Pen, x: number, y: number, radius: number, isTurning: boolean): void => {
  const blades = 22;
  if (isTurning) {
    circle(pen, x, y, radius * 0.84);
    stroke(pen, shade.sheen, radius * 0.3);
    for (let i = 0; i < 6; i++) {
      pen.beginPath();
      pen.arc(x, y, radius * (0.72 + i * 0.05), i * 1.9, i * 1.9 + 2.2);
      stroke(pen, shade.gleam, 0.9);
    }
  } else
    for (let i = 0; i < blades; i++) {
      const angle = (i / blades) * Math.PI * 2;
      const [from, to] = [radius * 0.68, radius];
      rule(
        pen,
        [
          x + Math.cos(angle) * from,
          y + Math.sin(angle) * from,
          x + Math.cos(angle + 0.16) * to,
          y + Math.sin(angle + 0.16) * to,
        ],
        material.zinc[1],
        1.7,
      );
    }
  const hub = radius * 0.34;
  raised(pen, 2, shade.drop, () => disc(pen, [x, y, hub], material.zinc[2]));
  disc(pen, [x, y, hub], radial(pen, [x, y, hub], material.zinc), material.lamination[2], 0.8);
  disc(pen, [x, y, hub * 0.4], radial(pen, [x, y, hub], material.brass), material.brass[3], 0.6);
};

const paintMotor = (pen: Pen, [x, y, width, height]: Place): void => {
  for (const shaft of [x - 6, x + width - 2])
    box(
      pen,
      [shaft, y + height * 0.44, 8, 6],
      1,
      linear(pen, [0, y, 0, y + height], material.brass.slice(0, 3)),
    );
  raised(pen, 5, shade.drop, () => box(pen, [x, y, width, height], 6, material.lamination[2]));
  box(
    pen,
    [x, y, width, height],
    6,
    linear(pen, [0, y, 0, y + height], material.lamination.slice(0, 3)),
    material.lamination[3],
    1,
  );
  for (let dx = 4; dx < width - 3; dx += 2.6)
    rule(pen, [x + dx, y + 2, x + dx, y + height - 2], shade.soft, 0.6);
  const coil: Place = [x + width * 0.2, y + height * 0.2, width * 0.6, height * 0.5];
  box(
    pen,
    coil,
    5,
    linear(pen, [0, coil[1], 0, coil[1] + coil[3]], [copper[0], copper[1], copper[2]]),
    copper[2],
    0.7,
  );
  for (let dx = 2; dx < coil[2]; dx += 2.2)
    rule(pen, [coil[0] + dx, coil[1] + 1, coil[0] + dx, coil[1] + coil[3] - 1], shade.soft, 0.5);
};
