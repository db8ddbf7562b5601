import type { OvenState } from '../../../shared/oven/oven-state.ts';
import type { BenchHand } from './bench-hand.ts';
import type { BenchPoint } from './bench-point.ts';
import type { SceneLead, SceneTerminal } from './bench-scene.ts';
import type { BenchDrawing } from './draw-bench.ts';
import type { TargetTraits } from './target-traits.ts';

/** Everything a probe can touch: the oven's terminals, the battery's poles and every lifted lead end. */
export const sceneTerminals = (
  drawing: BenchDrawing,
  places: ReadonlyMap<string, BenchPoint>,
  oven: OvenState,
  hand: BenchHand,
  leads: readonly SceneLead[],
): SceneTerminal[] => {
  const flags = (target: string): Pick<SceneTerminal, 'isHovered' | 'isFocused' | 'probes'> => ({
    isHovered: hand.hovered === target,
    isFocused: hand.focused === target,
    probes: (['red', 'black'] as const).filter((colour) => hand.probes[colour] === target),
  });
  const fixed = [...drawing.targets].map(([target, traits]): SceneTerminal => ({
    target,
    at: places.get(target) ?? traits.at,
    label: traits.isOnPlug && hand.isCordIn ? null : (drawing.terminalLabels.get(target) ?? null),
    state: stateOf(target, traits, oven),
    isReachable: isReachable(traits, hand),
    ...flags(target),
  }));
  const loose = leads.flatMap(({ ends, isInCord }) =>
    ends
      .filter(({ seatedOn }) => seatedOn === null)
      .map(({ target, at }): SceneTerminal => ({
        target,
        at,
        label: null,
        state: 'loose-end',
        // End a of a lead in the cord is the plug's.
        isReachable: !hand.isCoverOn || (isInCord && target.endsWith('/a')),
        ...flags(target),
      })),
  );
  return [...fixed, ...loose];
};

/** Metal under varnish stays so until a spot on it is cleaned. */
const stateOf = (
  target: string,
  { isVarnished }: TargetTraits,
  oven: OvenState,
): SceneTerminal['state'] => {
  if (oven.cleaned.includes(target)) return 'cleaned';
  return isVarnished ? 'varnished' : 'bare';
};

const isReachable = ({ isOnPlug, isOutside }: TargetTraits, hand: BenchHand): boolean =>
  isOnPlug ? !hand.isCordIn : !hand.isCoverOn || isOutside;
