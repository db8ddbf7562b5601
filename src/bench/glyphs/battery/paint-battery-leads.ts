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
  const isFar = clip[0] > 140;
  const back: BenchPoint = isFar ? [clip[0] - 40, clip[1] + 14] : [clip[0], clip[1] - 30];
  const way: BenchPoint[] = isFar
    ? [
        from,
        [from[0] + 30, from[1] + 8],
        [(from[0] + clip[0]) / 2, (from[1] + clip[1]) / 2 + 40],
        back,
      ]
    : [
        from,
        [128, from[1] + 18],
        [129, (from[1] + clip[1]) / 2],
        [clip[0] + 10, clip[1] - 50],
        back,
      ];
  paintWire(pen, [...way, clip], 4, tones, shade.soft);
  paintClip(pen, clip, Math.atan2(back[1] - clip[1], back[0] - clip[0]), tones);
};
