import { rest } from '../../geometry/bench-furniture.ts';
import type { BenchPoint } from '../../geometry/bench-point.ts';
import type { SceneDischarge } from '../../geometry/bench-scene.ts';
import { insulation, material, palette, shade } from '../../../styles/tokens.ts';
import { paintClip } from '../battery/paint-clip.ts';
import { paintWire } from '../lead/paint-curve.ts';
import { write } from '../paint/lettering.ts';
import { box, chain, fill, rule, stroke } from '../paint/outline.ts';
import { apart, cast, linear, type Pen } from '../paint/pen.ts';

/** Way of the wand from its tip, radians: towards the hand below it. */
const wandAngle = 0.62;
const restAngle = Math.PI;
const wandLength = 118;

/** The discharge lead: an insulated wand with 20 kOhm in its handle, and a clip lead for the chassis. */
export const paintDischargeLead = (
  pen: Pen,
  { clipAt, tipAt, inHand }: SceneDischarge,
  handAt: BenchPoint | null,
): void => {
  const clip = (inHand === 'clip' ? handAt : null) ?? clipAt ?? rest.discharge.clip;
  const held = (inHand === 'tip' ? handAt : null) ?? tipAt;
  const tip = held ?? rest.discharge.tip;
  const angle = held === null ? restAngle : wandAngle;
  const tail: BenchPoint = [
    tip[0] + Math.cos(angle) * wandLength,
    tip[1] + Math.sin(angle) * wandLength,
  ];
  const sag: BenchPoint = [(tail[0] + clip[0]) / 2, Math.max(tail[1], clip[1]) + 18];
  const back: BenchPoint = [clip[0] + (sag[0] < clip[0] ? -34 : 34), clip[1] + 12];
  paintWire(
    pen,
    [tail, [tail[0] + Math.cos(angle) * 26, tail[1] + Math.sin(angle) * 26], sag, back, clip],
    4.4,
    insulation.green,
    shade.soft,
  );
  paintClip(pen, clip, Math.atan2(back[1] - clip[1], back[0] - clip[0]), insulation.green);
  apart(pen, () => {
    pen.translate(tip[0], tip[1]);
    pen.rotate(angle);
    paintWand(pen, Math.cos(angle) < 0);
  });
};

const paintWand = (pen: Pen, isTurned: boolean): void => {
  cast(pen, 4, () => box(pen, [20, -8, wandLength - 24, 18], 9, shade.soft));
  chain(pen, [
    [0, 0],
    [9, -2.6],
    [16, -2.6],
    [16, 2.6],
    [9, 2.6],
  ]);
  pen.closePath();
  fill(pen, linear(pen, [0, -3, 0, 3], material.tin));
  stroke(pen, material.tin[3], 0.6);
  box(
    pen,
    [14, -4.6, 30, 9.2],
    3,
    linear(pen, [0, -4.6, 0, 4.6], [insulation.red[0], insulation.red[1], insulation.red[2]]),
    insulation.red[2],
    0.7,
  );
  box(
    pen,
    [40, -13, 7, 26],
    3,
    linear(pen, [0, -13, 0, 13], [material.plastic[0], material.plastic[3]]),
    material.plastic[3],
    0.8,
  );
  box(
    pen,
    [46, -9, wandLength - 50, 18],
    8,
    linear(pen, [0, -9, 0, 9], [material.plastic[0], material.plastic[1], material.plastic[3]]),
    material.plastic[3],
    0.8,
  );
  rule(pen, [52, -5, wandLength - 12, -5], shade.sheen, 1.6);
  box(pen, [58, -7, 44, 14], 2, palette.tag);
  apart(pen, () => {
    pen.translate(80, 0);
    if (isTurned) pen.rotate(Math.PI);
    write(pen, '20 k\u03A9', 0, 0, { size: 10.5, weight: 800, ink: palette.ink });
  });
};
