import { describe, expect, it } from 'vitest';
import { benchClock } from '../../src/components/bench-clock.ts';

describe('benchClock', () => {
  it.each([
    [0, '00:00'],
    [999, '00:00'],
    [131_000, '02:11'],
    [3_599_999, '59:59'],
    [3_600_000, '1:00:00'],
    [7_384_000, '2:03:04'],
  ])('shows %d ms', (ms, text) => {
    expect(benchClock(ms)).toBe(text);
  });
});
