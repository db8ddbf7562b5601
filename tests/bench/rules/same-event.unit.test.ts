import { describe, expect, it } from 'vitest';
import { isSameEvent } from '../../../shared/bench/same-event.ts';

const run = (charge: number, hum = 'normal', opened: string[] = []) => ({
  type: 'OvenRun',
  version: 1 as const,
  benchMs: 104_700,
  data: { ordered: 60, seconds: 60, hum, opened, charge: { 'C1:foils': charge } },
});

describe('two accounts of one run', () => {
  it('are the same when they differ by what text loses', () => {
    expect(isSameEvent(run(0.3), run(0.1 + 0.2))).toBe(true);
  });

  it('are not the same when a number, a word, a list or the time differs', () => {
    expect(isSameEvent(run(-581.38), run(-581.37))).toBe(false);
    expect(isSameEvent(run(-581.38), run(-581.38, 'loud'))).toBe(false);
    expect(isSameEvent(run(-581.38), run(-581.38, 'normal', ['F1']))).toBe(false);
    expect(isSameEvent(run(0), { ...run(0), benchMs: 104_701 })).toBe(false);
    expect(isSameEvent(run(0), { ...run(0), data: { ...run(0).data, more: null } })).toBe(false);
  });
});
