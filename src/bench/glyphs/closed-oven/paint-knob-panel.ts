import type { ClosedOvenShape } from '../../geometry/closed-oven.ts';
import { material, shade } from '../../../styles/tokens.ts';
import { write } from '../paint/lettering.ts';
import { box, chain, circle, disc, fill, rule, stroke, type Rect } from '../paint/outline.ts';
import { apart, linear, radial, raised, type Pen } from '../paint/pen.ts';

/** Radians clockwise from straight up; a timer's scale runs once around but for a gap. */
const sweep = 1.7 * Math.PI;
const minutes = [0, 5, 10, 15, 20, 25, 30] as const;
const powers = ['defrost', 'low', 'medium', 'full'] as const;

/** The front of an oven with a mechanical timer: a power knob above, the timer below. `atMinute`: where the timer stands. */
export const paintKnobPanel = (pen: Pen, shape: ClosedOvenShape, atMinute: number): void => {
  const [x, y, width, height]: Rect = [...shape.panel.at, ...shape.panel.size];
  box(
    pen,
    [x, y, width, height],
    10,
    linear(
      pen,
      [x, y, x + width, y + height],
      [material.enamel[0], material.nylon[1], material.enamel[1]],
    ),
    material.enamel[3],
    1,
  );
  rule(pen, [x + 10, y + 1.5, x + width - 10, y + 1.5], shade.gleam, 1.4);
  const middle = x + width / 2;
  const radius = Math.min(width * 0.2, height * 0.1);
  const upper = y + height * 0.285;
  const lower = y + height * 0.71;
  paintPowers(pen, middle, upper, radius);
  paintKnob(pen, middle, upper, radius, turnOf(3, 3));
  title(pen, 'Power', middle, y + height * 0.05);
  paintMinutes(pen, middle, lower, radius * 1.15);
  paintKnob(pen, middle, lower, radius * 1.15, turnOf(atMinute, 30));
  title(pen, 'Minutes', middle, y + height * 0.478);
};

/** The angle of a mark on a scale that ends at `last`. */
const turnOf = (value: number, last: number): number => (value / last) * sweep;

const title = (pen: Pen, text: string, x: number, y: number): void =>
  write(pen, text, x, y, { size: 17, family: 'sans', ink: material.plastic[2] });

const onScale = (x: number, y: number, turn: number, reach: number): readonly [number, number] => [
  x + Math.sin(turn) * reach,
  y - Math.cos(turn) * reach,
];

const paintMinutes = (pen: Pen, x: number, y: number, radius: number): void => {
  for (let minute = 0; minute <= 30; minute++) {
    const turn = turnOf(minute, 30);
    const from = onScale(x, y, turn, radius + 8);
    const to = onScale(x, y, turn, radius + (minute % 5 === 0 ? 17 : 12));
    rule(pen, [...from, ...to], material.plastic[2], minute % 5 === 0 ? 2 : 1);
  }
  for (const minute of minutes)
    write(pen, String(minute), ...onScale(x, y, turnOf(minute, 30), radius + 28), {
      size: 14,
      family: 'sans',
      ink: material.plastic[3],
    });
};

const paintPowers = (pen: Pen, x: number, y: number, radius: number): void =>
  powers.forEach((name, i) => {
    const turn = turnOf(i, 3);
    rule(
      pen,
      [...onScale(x, y, turn, radius + 8), ...onScale(x, y, turn, radius + 16)],
      material.plastic[2],
      2,
    );
    const [tx, ty] = onScale(x, y, turn, radius + 26);
    write(pen, name, tx, ty, {
      size: 13,
      family: 'sans',
      ink: material.plastic[3],
      align: turn === 0 ? 'center' : turn < Math.PI ? 'left' : 'right',
    });
  });

const paintKnob = (pen: Pen, x: number, y: number, radius: number, turn: number): void => {
  raised(pen, 9, shade.drop, () => disc(pen, [x, y, radius], material.plastic[2]));
  disc(
    pen,
    [x, y, radius],
    radial(pen, [x, y, radius], material.plastic),
    material.plastic[3],
    1.2,
  );
  for (let i = 0; i < 36; i++) {
    const at = (i / 36) * 2 * Math.PI;
    rule(
      pen,
      [...onScale(x, y, at, radius - 5), ...onScale(x, y, at, radius - 1)],
      shade.haze,
      1.4,
    );
  }
  circle(pen, x, y, radius * 0.72);
  fill(pen, linear(pen, [x, y - radius, x, y + radius], [material.tin[0], material.tin[2]]));
  stroke(pen, material.tin[3], 1);
  apart(pen, () => {
    pen.translate(x, y);
    pen.rotate(turn);
    chain(pen, [
      [-radius * 0.13, radius * 0.66],
      [radius * 0.13, radius * 0.66],
      [radius * 0.1, -radius * 0.9],
      [-radius * 0.1, -radius * 0.9],
    ]);
    pen.closePath();
    fill(
      pen,
      linear(
        pen,
        [-radius * 0.13, 0, radius * 0.13, 0],
        [material.plastic[0], material.plastic[2]],
      ),
    );
    stroke(pen, material.plastic[3], 1);
    rule(pen, [0, -radius * 0.46, 0, -radius * 0.84], material.nylon[0], 3);
  });
};
