import type { WireEvent } from '../../../shared/bench/event.ts';

/** Steps that need no bench behind them: what carries them never looks inside. */
export const step = (type: string, benchMs: number): WireEvent => ({
  type,
  version: 1,
  data: {},
  benchMs,
});

/** `n` steps, a decision each. */
export const decisions = (n: number, from = 0): WireEvent[][] =>
  Array.from({ length: n }, (_, i) => [step('CordPulled', from + i)]);
