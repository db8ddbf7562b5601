import { along, type BenchPoint } from '../../geometry/bench-point.ts';
import type { SceneProbe } from '../../geometry/bench-scene.ts';
import { probeLength } from '../../geometry/probe-pose.ts';
import { insulation, material, palette, shade } from '../../../styles/tokens.ts';
import { paintClip } from '../battery/paint-clip.ts';
import { paintWire } from '../lead/paint-curve.ts';
import { box, chain, disc, fill, rule, stroke } from '../paint/outline.ts';
import { apart, cast, linear, type Pen } from '../paint/pen.ts';

const colours = {
  red: { body: [insulation.red[0], palette['probe-red'], insulation.red[2]], wire: insulation.red },
  black: {
    body: [insulation.black[0], palette['probe-black'], insulation.black[2]],
    wire: insulation.black,
  },
} as const;

/** From the jaws of a clip lead to the tip it takes in its sleeve, units. */
const clipLength = 34;

/**
 * A test probe: its steel tip, or the clip lead on it, exactly `at` what it touches, its handle away from
 * it in direction `angle` (radians), its cable in one sweep to the meter.
 */
export const paintProbe = (
  pen: Pen,
  { colour, hold }: Pick<SceneProbe, 'colour' | 'hold'>,
  at: BenchPoint,
  angle: number,
  jack: BenchPoint,
): void => {
  const { body, wire } = colours[colour];
  const tip = hold === 'clip' ? along(at, angle, clipLength) : at;
  const tail = along(tip, angle, probeLength - 4);
  const out = along(tip, angle, probeLength + 46);
  const sag: BenchPoint = [
    (out[0] + jack[0]) / 2 + (colour === 'red' ? 26 : -26),
    Math.max(out[1], jack[1]) - 34,
  ];
  paintWire(pen, [tail, out, sag, jack], 5, wire, shade.soft);
  apart(pen, () => {
    pen.translate(tip[0], tip[1]);
    paintHandleShadow(pen, angle);
    pen.rotate(angle);
    paintTip(pen);
    paintHandle(pen, body);
    if (hold === 'fingers') paintFingers(pen);
  });
  if (hold === 'clip') paintClip(pen, at, angle, wire);
};

const paintHandleShadow = (pen: Pen, angle: number): void =>
  apart(pen, () => {
    pen.rotate(angle + 0.045);
    chain(pen, [
      [2, 0],
      [34, -8],
      [probeLength, -6],
      [probeLength, 8],
      [34, 8],
    ]);
    pen.closePath();
    pen.translate(0, 4);
    fill(pen, shade.soft);
  });

const paintTip = (pen: Pen): void => {
  chain(pen, [
    [0, 0],
    [24, -2.5],
    [24, 2.5],
  ]);
  pen.closePath();
  fill(pen, linear(pen, [0, -2.5, 0, 2.5], material.tin));
  stroke(pen, material.tin[3], 0.5);
  chain(pen, [
    [20, -3.1],
    [38, -4.6],
    [38, 4.6],
    [20, 3.1],
  ]);
  pen.closePath();
  fill(pen, linear(pen, [0, -4, 0, 4], material.plastic.slice(0, 3)));
};

const paintHandle = (pen: Pen, tones: readonly string[]): void => {
  const across = (half: number): CanvasGradient =>
    linear(pen, [0, -half, 0, half], [tones[0]!, tones[1]!, tones[1]!, tones[2]!]);
  pen.beginPath();
  pen.moveTo(40, -6);
  pen.bezierCurveTo(70, -8.4, 100, -8, 122, -5);
  pen.lineTo(probeLength, -3.6);
  pen.lineTo(probeLength, 3.6);
  pen.lineTo(122, 5);
  pen.bezierCurveTo(100, 8, 70, 8.4, 40, 6);
  pen.closePath();
  fill(pen, across(8));
  stroke(pen, tones[2]!, 0.8);
  box(pen, [34, -10.5, 7, 21], 3, across(10), tones[2]!, 0.8);
  for (let i = 0; i < 7; i++) rule(pen, [50 + i * 5, -6.6, 50 + i * 5, 6.6], tones[2]!, 1.4);
  for (let i = 0; i < 4; i++) rule(pen, [114 + i * 4, -4.4, 114 + i * 4, 4.4], tones[2]!, 1);
  rule(pen, [46, -4, 110, -4.6], shade.sheen, 1.6);
  disc(pen, [0, 0, 0.9], material.tin[3]);
};

/** Thumb and finger on the bare metal, where they do not belong. */
const paintFingers = (pen: Pen): void => {
  for (const side of [-1, 1] as const) {
    apart(pen, () => {
      pen.translate(17, side * 6.5);
      pen.rotate(side * 0.5);
      cast(pen, 2.4, () => box(pen, [-9, -6.5, 36, 13], 6.5, shade.soft));
      box(
        pen,
        [-9, -6.5, 36, 13],
        6.5,
        linear(pen, [0, -6.5, 0, 6.5], material.skin.slice(0, 3)),
        material.skin[2],
        0.8,
      );
      box(pen, [-7, -3.4, 8, 6.8], 3, material.skin[0], material.skin[2], 0.5);
    });
  }
};
