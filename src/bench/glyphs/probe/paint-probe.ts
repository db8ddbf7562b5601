import { along, type BenchPoint } from '../../geometry/bench-point.ts';
import type { ProbeColour } from '../../geometry/bench-scene.ts';
import { probeLength } from '../../geometry/probe-pose.ts';
import { insulation, material, palette, shade } from '../../../styles/tokens.ts';
import { paintWire } from '../lead/paint-curve.ts';
import { box, chain, disc, fill, rule, stroke } from '../paint/outline.ts';
import { apart, linear, type Pen } from '../paint/pen.ts';

const colours = {
  red: { body: [insulation.red[0], palette['probe-red'], insulation.red[2]], wire: insulation.red },
  black: {
    body: [insulation.black[0], palette['probe-black'], insulation.black[2]],
    wire: insulation.black,
  },
} as const;

/**
 * A test probe: its steel tip exactly on `tip`, its handle away from it in direction `angle` (radians),
 * its cable in one sweep to the meter.
 */
export const paintProbe = (
  pen: Pen,
  colour: ProbeColour,
  tip: BenchPoint,
  angle: number,
  jack: BenchPoint,
): void => {
  const { body, wire } = colours[colour];
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
  });
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
