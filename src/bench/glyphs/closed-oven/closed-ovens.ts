import type { OvenDefinition } from '../../../../shared/oven/oven.ts';
import type { PaintClosedOven } from './closed-oven.ts';
import { paintClosedOven } from './paint-closed-oven.ts';
import { paintOverTheRange } from './paint-over-the-range.ts';

/** The picture of each type of oven with its cover on. */
export const closedOvens: Readonly<Record<OvenDefinition['type'], PaintClosedOven>> = {
  countertop: paintClosedOven,
  'over-the-range': paintOverTheRange,
};
