import type { TargetRef } from '../../../shared/oven/oven.ts';
import { outlet } from './bench-furniture.ts';
import { batteryTargets } from './bench-furniture.ts';
import type { BenchPoint } from './bench-point.ts';
import type { BenchDrawing } from './draw-bench.ts';

/** How far the plug is from where the layout has it: in the outlet while the cord is in. */
export const plugShift = ({ definition, layout }: BenchDrawing, isCordIn: boolean): BenchPoint => {
  const plug = definition.parts.find(({ kind }) => kind === 'plug');
  const place = plug === undefined ? undefined : layout.parts[plug.ref];
  if (!isCordIn || place === undefined) return [0, 0];
  return [outlet.at[0] + 3 - place.at[0], outlet.at[1] - 2 - place.at[1]];
};

/** Where every terminal of the oven and the battery is now. */
export const targetPlaces = (
  drawing: BenchDrawing,
  isCordIn: boolean,
): ReadonlyMap<TargetRef, BenchPoint> => {
  const shift = plugShift(drawing, isCordIn);
  const isPlug = (target: string): boolean =>
    drawing.definition.parts.find(({ ref }) => ref === target.split('.')[0])?.kind === 'plug';
  return new Map([
    ...Object.entries(drawing.layout.terminals).map(([target, { at }]): [string, BenchPoint] => [
      target,
      isPlug(target) ? [at[0] + shift[0], at[1] + shift[1]] : at,
    ]),
    ...Object.entries(batteryTargets),
  ]);
};
