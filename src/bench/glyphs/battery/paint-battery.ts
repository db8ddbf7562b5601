import { battery, batteryTargets } from '../../geometry/bench-furniture.ts';
import { insulation, material, shade } from '../../../styles/tokens.ts';
import { paintWire } from '../lead/paint-curve.ts';
import { write } from '../paint/lettering.ts';
import { box, disc, rule } from '../paint/outline.ts';
import { linear, radial, raised, type Pen } from '../paint/pen.ts';

/** The bench's 12.6 V battery and, behind its positive pole, the 1 kOhm resistor. */
export const paintBattery = (pen: Pen): void => {
  const [x, y] = battery.at;
  const [width, height] = battery.size;
  raised(pen, 9, shade.drop, () => box(pen, [x, y, width, height], 8, material.plastic[2]));
  box(
    pen,
    [x, y, width, height],
    8,
    linear(
      pen,
      [x, y, x + width, y + height],
      [material.plastic[1], material.plastic[2], material.plastic[3]],
    ),
    material.plastic[3],
    1,
  );
  box(
    pen,
    [x + 5, y + 44, width - 10, height - 50],
    5,
    linear(pen, [0, y + 44, 0, y + height], [material.zinc[0], material.zinc[1], material.zinc[2]]),
    material.plastic[3],
    0.8,
  );
  rule(pen, [x + 8, y + 2, x + width - 8, y + 2], shade.sheen, 1.6);
  write(pen, '12.6 V', x + width / 2, y + 70, { size: 19, weight: 800, ink: material.plastic[3] });
  write(pen, 'known source', x + width / 2, y + 92, {
    size: 11,
    family: 'sans',
    ink: material.plastic[2],
  });
  write(pen, '+', x + 26, y + 110, { size: 17, weight: 800, ink: insulation.red[2] });
  write(pen, '\u2212', x + width - 26, y + 110, {
    size: 17,
    weight: 800,
    ink: material.plastic[3],
  });
  pole(pen, batteryTargets['BAT.pos'], insulation.red);
  pole(pen, batteryTargets['BAT.neg'], insulation.black);
  paintResistor(pen);
};

const pole = (
  pen: Pen,
  at: readonly [number, number] | undefined,
  tones: readonly string[],
): void => {
  if (at === undefined) return;
  disc(pen, [at[0], at[1], 16], tones[2]!, tones[2]!, 1);
  disc(
    pen,
    [at[0], at[1], 14.5],
    radial(pen, [at[0], at[1], 14.5], [tones[0]!, tones[1]!, tones[2]!]),
  );
  disc(
    pen,
    [at[0], at[1], 10],
    radial(pen, [at[0], at[1], 10], material.tin.slice(0, 3)),
    material.tin[3],
    0.8,
  );
};

const paintResistor = (pen: Pen): void => {
  const from = batteryTargets['BAT.pos'];
  const to = batteryTargets['BAT.1k'];
  if (from === undefined || to === undefined) return;
  const y = to[1];
  paintWire(
    pen,
    [from, [from[0] - 8, (from[1] + y) / 2], [from[0], y]],
    3.4,
    insulation.red,
    shade.soft,
  );
  rule(pen, [from[0], y, to[0], y], material.tin[2], 2.6);
  raised(pen, 3, shade.drop, () => box(pen, [from[0] + 4, y - 8, 32, 16], 7, material.paper[1]));
  box(
    pen,
    [from[0] + 4, y - 8, 32, 16],
    7,
    linear(pen, [0, y - 8, 0, y + 8], [material.paper[0], material.paper[1], material.paper[2]]),
    material.paper[3],
    0.8,
  );
  // Brown, black, red, gold: 1 kOhm, 5 % (colour code of IEC 60062).
  for (const [i, tone] of [
    insulation.brown[1],
    insulation.black[1],
    insulation.red[1],
    material.brass[2],
  ].entries())
    box(pen, [from[0] + 9 + i * 6.4, y - 8, 3, 16], 0, tone);
};
