import { describe, expect, it } from 'vitest';
import type { Wave } from '../../shared/engine/circuit/circuit.ts';
import { waveSlope } from '../../shared/engine/circuit/wave-slope.ts';
import { waveCorners, waveValue } from '../../shared/engine/circuit/wave-value.ts';

const pulse: Wave = {
  shape: 'pulse',
  low: -1,
  high: 3,
  delay: 10,
  rise: 2,
  fall: 4,
  width: 6,
  period: 20,
};
const jump: Wave = { ...pulse, rise: 0, fall: 0 };
const damped: Wave = {
  shape: 'sine',
  offset: 1,
  amplitude: 2,
  frequency: 0.25,
  delay: 3,
  damping: 0.1,
  phaseDegrees: 30,
};

describe('a pulse', () => {
  it.each([
    [0, -1],
    [9.999, -1],
    [10, -1],
    [11, 1],
    [12, 3],
    [18, 3],
    [20, 1],
    [22, -1],
    [29, -1],
    [31, 1],
    [1031, 1],
  ])('at %f s is %f', (time, value) => {
    expect(waveValue(pulse, time)).toBeCloseTo(value, 9);
  });

  it('takes the side asked for where it jumps, at the origin too', () => {
    expect([waveValue(jump, 10, -1), waveValue(jump, 10, 1)]).toEqual([-1, 3]);
    expect([waveValue(jump, 16, -1), waveValue(jump, 16, 1)]).toEqual([3, -1]);
    expect([waveValue(jump, 1030, -1), waveValue(jump, 1030, 1)]).toEqual([-1, 3]);
    const now: Wave = { ...jump, delay: 0 };
    expect([waveValue(now, 0, -1), waveValue(now, 0, 1)]).toEqual([-1, 3]);
  });

  it('does not come back without a period', () => {
    expect(waveValue({ ...pulse, period: 0 }, 31)).toBe(-1);
    expect(waveCorners({ ...pulse, period: 0 }, 0, 100)).toEqual([10, 12, 18, 22]);
  });

  it('lists its corners strictly inside a stretch of time', () => {
    expect(waveCorners(pulse, 0, 40)).toEqual([10, 12, 18, 22, 30, 32, 38]);
    expect(waveCorners(pulse, 12, 30)).toEqual([18, 22]);
    expect(waveCorners(pulse, 1000, 1013)).toEqual([1002, 1010, 1012]);
  });

  it('has the slope of the side asked for at a corner', () => {
    expect([waveSlope(pulse, 10, -1), waveSlope(pulse, 10, 1)]).toEqual([0, 2]);
    expect([waveSlope(pulse, 12, -1), waveSlope(pulse, 12, 1)]).toEqual([2, 0]);
    expect([waveSlope(pulse, 18, -1), waveSlope(pulse, 18, 1)]).toEqual([0, -1]);
  });
});

describe('a damped sine', () => {
  it('waits at its phase, then decays about its offset', () => {
    expect(waveValue(damped, 0)).toBeCloseTo(2, 12);
    expect(waveValue(damped, 4)).toBeCloseTo(
      1 + 2 * Math.exp(-0.1) * Math.sin((2 * Math.PI) / 3),
      12,
    );
    expect(waveCorners(damped, 0, 10)).toEqual([3]);
    expect(waveCorners(damped, 3, 10)).toEqual([]);
  });

  it('has the slope that its values have', () => {
    for (const time of [3.5, 4.2, 11, 30]) {
      const difference = (waveValue(damped, time + 1e-5) - waveValue(damped, time - 1e-5)) / 2e-5;
      expect(waveSlope(damped, time, 1)).toBeCloseTo(difference, 7);
    }
    expect(waveSlope(damped, 1, 1)).toBe(0);
    expect(waveSlope(damped, 3, -1)).toBe(0);
    expect(waveSlope(damped, 3, 1)).not.toBe(0);
  });
});
