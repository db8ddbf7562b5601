import type { OvenState } from '../../../shared/oven/oven-state.ts';
import { partKinds } from '../../../shared/oven/parts/catalogue.ts';
import { batteryTargets } from './bench-furniture.ts';
import type { BenchHand } from './bench-hand.ts';
import type { BenchPoint } from './bench-point.ts';
import type { SceneLead, SceneTerminal, TerminalState } from './bench-scene.ts';
import type { BenchDrawing } from './draw-bench.ts';

/** Everything a probe can touch: the oven's terminals, the battery's poles and every lifted lead end. */
export const sceneTerminals = (
  drawing: BenchDrawing,
  places: ReadonlyMap<string, BenchPoint>,
  oven: OvenState,
  hand: BenchHand,
  leads: readonly SceneLead[],
): SceneTerminal[] => {
  const terminal = (
    target: string,
    at: BenchPoint,
    state: TerminalState,
    isReachable: boolean,
  ): SceneTerminal => ({
    target,
    at,
    label: hand.isCordIn && isOnPlug(drawing, target) ? null : labelOf(drawing, target),
    state,
    isHovered: hand.hovered === target,
    isFocused: hand.focused === target,
    probes: (['red', 'black'] as const).filter((colour) => hand.probes[colour] === target),
    isReachable,
  });
  return [
    ...[...places].map(([target, at]) =>
      terminal(target, at, stateOf(drawing, target, oven), isReachable(drawing, hand, target)),
    ),
    ...leads.flatMap(({ ends, isInCord }) =>
      ends
        .filter(({ seatedOn }) => seatedOn === null)
        .map(({ target, at }) =>
          terminal(target, at, 'loose-end', !hand.isCoverOn || (isInCord && target.endsWith('/a'))),
        ),
    ),
  ];
};

const labelOf = (drawing: BenchDrawing, target: string): SceneTerminal['label'] =>
  drawing.terminalLabels.get(target) ?? null;

const isOnPlug = ({ definition }: BenchDrawing, target: string): boolean =>
  definition.parts.some(({ ref, kind }) => kind === 'plug' && ref === target.split('.')[0]);

/** Metal under varnish stays so until a spot on it is cleaned. */
const stateOf = ({ definition }: BenchDrawing, target: string, oven: OvenState): TerminalState => {
  if (oven.cleaned.includes(target)) return 'cleaned';
  const [ref, id] = target.split('.');
  const part = definition.parts.find((each) => each.ref === ref);
  const terminals = part === undefined ? [] : partKinds[part.kind].terminals(part.variant);
  return terminals.some((each) => each.id === id && each.isVarnished) ? 'varnished' : 'bare';
};

const isReachable = ({ definition }: BenchDrawing, hand: BenchHand, target: string): boolean => {
  if (target in batteryTargets) return true;
  const part = definition.parts.find(({ ref }) => ref === target.split('.')[0]);
  if (part?.kind === 'plug') return !hand.isCordIn;
  return !hand.isCoverOn || part?.isOutside === true;
};
