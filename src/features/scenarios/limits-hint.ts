import type { FaultKind } from '../../../shared/oven/fault.ts';
import { withUnit } from './quantity.ts';

type Limits = NonNullable<FaultKind['parameters']>[string];

/** "0.01 Ω to 50 Ω, usually 0.1 Ω" */
export const limitsHint = ({ min, max, usual, unit }: Limits): string =>
  `${withUnit(min, unit)} to ${withUnit(max, unit)}, usually ${withUnit(usual, unit)}`;
