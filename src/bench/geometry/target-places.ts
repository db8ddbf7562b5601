import type { TargetRef } from '../../../shared/oven/oven.ts';
import { outlet } from './bench-furniture.ts';
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
  const [dx, dy] = plugShift(drawing, isCordIn);
  return new Map(
    [...drawing.targets].map(([target, { at, isOnPlug }]) => [
      target,
      isOnPlug ? [at[0] + dx, at[1] + dy] : at,
    ]),
  );
};
