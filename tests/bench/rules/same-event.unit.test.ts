import { describe, expect, it } from 'vitest';
import { isSameEvent } from '../../../shared/bench/same-event.ts';

const run = (charge: number, waterRise: number, hum = 'normal') => ({
  type: 'OvenRun',
  version: 1 as const,
  benchMs: 104_700,
  data: { ordered: 60, seconds: 60, hum, waterRise, opened: [], charge: { 'C1:foils': charge } },
});

describe('two accounts of one run', () => {
  it('are the same though two JavaScript engines differ in the last bit: Node 20 and Chromium 156', () => {
    expect(isSameEvent(run(-581.38, 11.6), run(-567.49, 11.56))).toBe(true);
    // Shorted turns: 0.08 and 0.09 K.
    expect(isSameEvent(run(1693.39, 0.08), run(1682.02, 0.09))).toBe(true);
    expect(isSameEvent(run(0, 0), run(2, 0))).toBe(true);
  });

  it('are not the same when they are a tenth apart, or when something else was heard', () => {
    expect(isSameEvent(run(-581.38, 11.6), run(-510, 11.6))).toBe(false);
    expect(isSameEvent(run(-581.38, 11.6), run(-581.38, 11.6, 'loud'))).toBe(false);
  });
});
