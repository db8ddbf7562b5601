import type { OvenLayout } from '../../../shared/oven/layout.ts';
import type { OvenDefinition, TargetRef } from '../../../shared/oven/oven.ts';
import { partKinds } from '../../../shared/oven/parts/catalogue.ts';
import { batteryTargets } from './bench-furniture.ts';
import type { BenchPoint } from './bench-point.ts';

/** What never changes about one thing a probe can touch. */
export interface TargetTraits {
  /** where it is while the plug is out of the outlet */ at: BenchPoint;
  /** reference of its part; null: the battery's */ part: string | null;
  id: string;
  isOnPlug: boolean;
  /** reached with the cover on */ isOutside: boolean;
  isVarnished: boolean;
}

/** Every terminal of the oven and the battery, in the layout's order. */
export const targetTraits = (
  definition: OvenDefinition,
  layout: OvenLayout,
): ReadonlyMap<TargetRef, TargetTraits> => {
  const parts = new Map(definition.parts.map((part) => [part.ref, part]));
  const ofOven = Object.entries(layout.terminals).map(
    ([target, { at }]): [string, TargetTraits] => {
      const [ref = '', id = ''] = target.split('.');
      const part = parts.get(ref);
      const kinds = part === undefined ? [] : partKinds[part.kind].terminals(part.variant);
      return [
        target,
        {
          at,
          part: ref,
          id,
          isOnPlug: part?.kind === 'plug',
          isOutside: part?.isOutside === true,
          isVarnished: kinds.some((kind) => kind.id === id && kind.isVarnished === true),
        },
      ];
    },
  );
  const ofBattery = Object.entries(batteryTargets).map(([target, at]): [string, TargetTraits] => [
    target,
    { at, part: null, id: target, isOnPlug: false, isOutside: true, isVarnished: false },
  ]);
  return new Map([...ofOven, ...ofBattery]);
};
