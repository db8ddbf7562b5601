import type { TargetRef } from '../../../shared/oven/oven.ts';
import type { OvenState } from '../../../shared/oven/oven-state.ts';
import type { BenchHand } from './bench-hand.ts';
import type { BenchPoint } from './bench-point.ts';
import type { BenchScene, SceneBattery, SceneDischarge } from './bench-scene.ts';
import { cordPath } from './cord-path.ts';
import type { BenchDrawing } from './draw-bench.ts';
import { sceneLeads, withTags } from './scene-leads.ts';
import { sceneParts } from './scene-parts.ts';
import { sceneTerminals } from './scene-terminals.ts';
import { targetPlaces } from './target-places.ts';

/**
 * The picture of the bench at one moment. Pure. A lead end sits where the state says it sits, also on
 * a wrong terminal; a lifted one hangs where the layout says and becomes a target of its own.
 */
export const buildScene = (drawing: BenchDrawing, oven: OvenState, hand: BenchHand): BenchScene => {
  const places = targetPlaces(drawing, hand.isCordIn);
  const bare = sceneLeads(drawing, places, oven, hand);
  const terminals = sceneTerminals(drawing, places, oven, hand, bare);
  const leads = withTags(drawing, bare, terminals);
  const parts = sceneParts(drawing, oven, hand);
  const at = (target: TargetRef | null): BenchPoint | null =>
    terminals.find((terminal) => terminal.target === target)?.at ?? null;
  return {
    chassis: drawing.layout.chassis,
    ovenType: drawing.definition.type,
    isCoverOn: hand.isCoverOn,
    isDoorOpen: !oven.isDoorClosed,
    isCordIn: hand.isCordIn,
    cord: cordPath(
      parts.find(({ kind }) => kind === 'plug'),
      leads.flatMap(({ ref, isInCord }) =>
        isInCord ? [drawing.layout.leads[ref]?.via ?? []] : [],
      ),
      drawing.layout.chassis,
    ),
    parts,
    terminals,
    leads,
    probes: (['red', 'black'] as const).map((colour) => ({
      colour,
      at: at(hand.probes[colour]),
      isInHand: hand.carrying?.tool === 'probe' && hand.carrying.colour === colour,
      hold: hand.holds[colour],
    })),
    discharge: sceneDischarge(hand, at),
    battery: sceneBattery(hand, at),
    handAt: hand.handAt,
    hovered: hand.hovered,
    focused: hand.focused,
    hazardFlash: hand.hazardFlash,
  };
};

type Whereabouts = (target: TargetRef | null) => BenchPoint | null;

const sceneDischarge = (hand: BenchHand, at: Whereabouts): SceneDischarge => ({
  clipAt: at(hand.discharge.clip),
  tipAt: at(hand.discharge.tip),
  inHand: hand.carrying?.tool === 'discharge' ? hand.carrying.end : null,
});

const sceneBattery = (hand: BenchHand, at: Whereabouts): SceneBattery => ({
  negAt: at(hand.battery.neg),
  oneKAt: at(hand.battery.oneK),
  inHand: hand.carrying?.tool === 'battery' ? hand.carrying.end : null,
});
