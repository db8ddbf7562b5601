import { memo, useCallback } from 'react';
import type { Camera } from '../camera/camera.ts';
import { benchSize, meterJacks, rest } from '../geometry/bench-furniture.ts';
import type { BenchPoint } from '../geometry/bench-point.ts';
import type { BenchScene, SceneProbe } from '../geometry/bench-scene.ts';
import { probeAngle } from '../geometry/probe-pose.ts';
import { paintBatteryLeads } from '../glyphs/battery/paint-battery-leads.ts';
import { paintDischargeLead } from '../glyphs/discharge-lead/paint-discharge-lead.ts';
import { paintHover } from '../glyphs/lead/paint-hover.ts';
import { Painted } from '../glyphs/paint/painted.tsx';
import type { Pen } from '../glyphs/paint/pen.ts';
import { paintProbe } from '../glyphs/probe/paint-probe.ts';
import { paintRing } from '../glyphs/terminal/paint-terminal.ts';
import { BenchLayer } from './bench-layer.tsx';
import { HazardFlash } from './hazard-flash.tsx';
import { useSameValue } from './use-same-value.ts';

/** What moves: probes, tools, and what is under the hand. */
export const LiveLayer = memo(function LiveLayer({
  scene,
  camera,
  viewBottom,
  reducesMotion,
}: {
  scene: BenchScene;
  camera: Camera;
  /** lower edge of the view, bench units: there the test leads leave towards the meter */
  viewBottom: number;
  reducesMotion: boolean;
}) {
  const live = useSameValue({
    probes: scene.probes,
    discharge: scene.discharge,
    battery: scene.battery,
    handAt: scene.handAt,
    isCoverOn: scene.isCoverOn,
    rings: scene.terminals
      .filter(({ isHovered, isFocused, isReachable }) => isReachable && (isHovered || isFocused))
      .map(({ at, isFocused }) => ({ at, isFocused })),
    outlined: outlined(scene),
  });
  const targets = useSameValue(
    scene.terminals.filter(({ isReachable }) => isReachable).map(({ at }) => at),
  );
  const paint = useCallback(
    (pen: Pen) => {
      for (const { lead, part, isFocused } of live.outlined) paintHover(pen, lead, part, isFocused);
      for (const { at, isFocused } of live.rings) paintRing(pen, at, isFocused ? 'focus' : 'hover');
      paintBatteryLeads(pen, live.battery, live.handAt);
      paintDischargeLead(pen, live.discharge, live.handAt);
      for (const probe of live.probes) {
        const other = live.probes.find(({ colour }) => colour !== probe.colour);
        paintOneProbe(pen, probe, other?.at ?? null, live.handAt, targets, viewBottom);
      }
    },
    [live, targets, viewBottom],
  );
  const flashAt = scene.terminals.find(({ target }) => target === scene.hazardFlash)?.at ?? null;
  return (
    <BenchLayer camera={camera}>
      <Painted paint={paint} />
      {flashAt === null ? null : <HazardFlash at={flashAt} reducesMotion={reducesMotion} />}
    </BenchLayer>
  );
});

const outlined = (scene: BenchScene) =>
  scene.isCoverOn
    ? []
    : [...new Set([scene.hovered, scene.focused])].flatMap((ref) => {
        if (ref === null) return [];
        const lead = scene.leads.find((each) => each.ref === ref) ?? null;
        const part =
          scene.parts.find((each) => each.ref === ref && each.kind !== 'chassis') ?? null;
        return lead === null && part === null
          ? []
          : [{ lead, part, isFocused: ref === scene.focused }];
      });

const paintOneProbe = (
  pen: Pen,
  probe: SceneProbe,
  other: BenchPoint | null,
  handAt: BenchPoint | null,
  targets: readonly BenchPoint[],
  viewBottom: number,
): void => {
  const { colour, at, isInHand } = probe;
  const jack: BenchPoint = [
    meterJacks[colour][0],
    Math.max(meterJacks[colour][1], viewBottom + 10),
  ];
  const isMoving = isInHand && handAt !== null;
  const tip = isMoving ? handAt : at;
  if (tip === null) return paintProbe(pen, probe, rest.probe[colour], Math.PI, jack);
  paintProbe(
    pen,
    probe,
    tip,
    probeAngle(colour, tip, other, isMoving ? [] : targets, benchSize),
    jack,
  );
};
