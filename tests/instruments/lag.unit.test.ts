import { describe, expect, it } from 'vitest';
import { filtered, lagAlong } from '../../shared/instruments/lag.ts';
import { manual2000 } from '../../shared/instruments/manual-2000.ts';
import { show } from './across.ts';

const along = (id: string, time: number[], volts: number[], before: number | null) =>
  lagAlong(manual2000, id, { time, volts }, before);

describe('low-pass of the highest ohms ranges', () => {
  // First order, 0.8 s: a step of 1 V is at 1 - exp(-t / 0.8) after t.
  it('answers a step by 1 - exp(-t / 0.8 s)', () => {
    expect(along('ohms-20M', [0, 0.8], [1, 1], 0)).toBeCloseTo(1 - Math.exp(-1), 12);
    expect(along('ohms-2000M', [0, 4], [1, 1], 0)).toBeCloseTo(1 - Math.exp(-5), 12);
  });

  it('follows a ramp 0.8 s behind', () => {
    expect(along('ohms-20M', [0, 20], [0, 20], 0)).toBeCloseTo(20 - 0.8, 9);
  });

  it('does not depend on how the trace is cut', () => {
    const whole = along('ohms-20M', [0, 1, 1, 3], [0.2, 0.6, 0.1, 0.5], 0.65);
    const first = along('ohms-20M', [0, 0.4], [0.2, 0.36], 0.65);
    const second = along('ohms-20M', [0, 0.6, 0.6, 1], [0.36, 0.6, 0.1, 0.18], first);
    expect(along('ohms-20M', [0, 1.6], [0.18, 0.5], second)).toBeCloseTo(whole ?? NaN, 12);
  });

  it('starts at the first sample when nothing was held', () => {
    expect(filtered({ time: [0, 1], volts: [0.3, 0.3] }, 0.8, null).volts).toEqual([0.3, 0.3]);
  });

  it('is on no other setting', () => {
    expect(along('ohms-2M', [0, 1], [1, 1], 0.2)).toBeNull();
    expect(along('dc-20', [0, 1], [1, 1], 0.2)).toBeNull();
  });

  // Tips from open (0.65 V held) onto 10 MOhm (0.325 V): after t the meter holds
  // 0.325 (1 + exp(-t / 0.8)); the display is the mean of its last 0.1 s.
  it('lets 20 MOhm fall from OL to 10.00 over seconds', () => {
    const after = (seconds: number) =>
      show('ohms-20M', { time: [0, seconds], volts: [0.325, 0.325] }, { lagState: 0.65 });
    const held = (t: number) => {
      const mean = 0.325 * (1 + (0.8 / 0.1) * (Math.exp(-(t - 0.1) / 0.8) - Math.exp(-t / 0.8)));
      return (10e6 * mean) / (0.65 - mean);
    };
    expect(after(0.5).display).toBe('OL');
    for (const t of [1, 2, 4])
      expect(Math.abs((after(t).value ?? NaN) - held(t)) / 1e4).toBeLessThanOrEqual(1);
    expect(after(8).display).toBe('10.00');
  });
});
