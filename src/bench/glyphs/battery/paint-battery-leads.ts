import { batteryTargets, rest } from '../../geometry/bench-furniture.ts';
import type { BenchPoint } from '../../geometry/bench-point.ts';
import type { SceneBattery } from '../../geometry/bench-scene.ts';
import { insulation, shade } from '../../../styles/tokens.ts';
import { paintWire } from '../lead/paint-curve.ts';
import type { Pen } from '../paint/pen.ts';
import { paintClip } from './paint-clip.ts';

/** The battery's two leads, each from its place on the battery to its clip: connected, in hand or at rest. */
export const paintBatteryLeads = (
  pen: Pen,
  battery: SceneBattery,
  handAt: BenchPoint | null,
): void => {
  const where = (end: 'neg' | 'oneK', at: BenchPoint | null): BenchPoint =>
    (battery.inHand === end ? handAt : null) ?? at ?? rest.battery[end];
  paintOne(pen, batteryTargets['BAT.neg'], where('neg', battery.negAt), insulation.black);
  paintOne(pen, batteryTargets['BAT.1k'], where('oneK', battery.oneKAt), insulation.red);
};

const paintOne = (
  pen: Pen,
  from: BenchPoint | undefined,
  clip: BenchPoint,
  tones: readonly [string, string, string],
): void => {
  if (from === undefined) return;
  const way = clip[0] > 140 ? aroundOven(from, clip) : besideBattery(from, clip);
  const back = way.at(-1) ?? from;
  paintWire(pen, [...way, clip], 4, tones, shade.soft);
  paintClip(pen, clip, Math.atan2(back[1] - clip[1], back[0] - clip[0]), tones);
};

/** Along the front of the oven and up to the clip from below, so that the lead hides as little as it can. */
const aroundOven = (from: BenchPoint, clip: BenchPoint): BenchPoint[] => {
  const turn = Math.max(200, clip[0] - 70);
  return [
    from,
    [128, from[1] + 44],
    [131, 650],
    [170, 704],
    [(170 + turn) / 2, 710],
    [turn, 690],
    [clip[0] - 34, (clip[1] + 690) / 2],
    [clip[0] - 12, clip[1] + 40],
  ];
};

const besideBattery = (from: BenchPoint, clip: BenchPoint): BenchPoint[] => [
  from,
  [128, from[1] + 18],
  [129, (from[1] + clip[1]) / 2],
  [clip[0] + 10, clip[1] - 50],
  [clip[0], clip[1] - 30],
];
