import type { OvenState } from '../../../shared/oven/oven-state.ts';
import type { BenchHand } from './bench-hand.ts';
import type { BenchPoint } from './bench-point.ts';
import type { ScenePart } from './bench-scene.ts';
import type { BenchDrawing } from './draw-bench.ts';
import { plugShift } from './target-places.ts';

/** Every part that has a place on the bench, as it looks now, in the order of drawing. */
export const sceneParts = (drawing: BenchDrawing, oven: OvenState, hand: BenchHand): ScenePart[] =>
  drawing.partsByHeight.flatMap((part): ScenePart[] => {
    const place = drawing.layout.parts[part.ref];
    if (place === undefined) return [];
    const shift = part.kind === 'plug' ? plugShift(drawing, hand.isCordIn) : [0, 0];
    const at: BenchPoint = [place.at[0] + shift[0]!, place.at[1] + shift[1]!];
    const isPressed = oven.pressed.includes(part.ref);
    const isSwitch = part.kind === 'door-switch';
    return [
      {
        ref: part.ref,
        kind: part.kind,
        variant: part.variant,
        at,
        size: place.size,
        angle: place.angle ?? 0,
        name: part.name,
        label:
          part.kind === 'plug' && hand.isCordIn ? null : (drawing.partLabels.get(part.ref) ?? null),
        terminals: drawing.partTerminals.get(part.ref) ?? {},
        stamp: hand.stamps[part.ref] ?? [],
        looks: hand.looks[part.ref] ?? [],
        isActuated:
          (isSwitch && (oven.isDoorClosed || isPressed)) ||
          (part.kind === 'plug' && hand.isCordIn) ||
          oven.energised.includes(part.ref),
        isLit: hand.lit.includes(part.ref),
        isTurning: hand.turning.includes(part.ref),
        isReplaced: hand.replaced.includes(part.ref),
        isPressed,
      },
    ];
  });
