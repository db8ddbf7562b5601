import { describe, expect, it } from 'vitest';
import { meltingTime } from '../../../shared/bench/powered-run/fuse-melting.ts';
import { poweredRun } from '../../../shared/bench/powered-run/powered-run.ts';
import type { AppliedFault } from '../../../shared/oven/fault.ts';
import { asFitted } from '../../../shared/oven/initial-state.ts';
import { lc28, setupWith } from '../../support/bench.ts';

const { oven } = setupWith();
const run = (...faults: AppliedFault[]) => poweredRun(oven, asFitted(lc28, faults), 30);

// The trade's rules (ENGINE section 4 from the reference simulator; FACTS section 9, seen trade answers).
describe('a powered run gives the symptom of its fault', () => {
  it('heats water when nothing is wrong: about 800 W class, 5 K in a litre in half a minute', () => {
    const healthy = run();
    expect(healthy).toMatchObject({
      isDisplayLit: true,
      isLampLit: true,
      isFanTurning: true,
      isTurntableTurning: true,
      hum: 'normal',
      opened: [],
    });
    expect(healthy.microwavePower).toBeGreaterThan(600);
    expect(healthy.microwavePower).toBeLessThan(950);
    // The heater takes 2 s before anything comes out (SM-9, FACTS 7).
    expect(healthy.waterRise).toBeCloseTo((healthy.microwavePower * 28) / 4187, 1);
  });

  it('hums loudly and holds the fuse with a shorted diode or magnetron', () => {
    for (const fault of [
      { on: 'D1', fault: 'shorted' },
      { on: 'V1', fault: 'heater-shorted-to-body' },
    ]) {
      expect(run(fault)).toMatchObject({ hum: 'loud', waterRise: 0, opened: [] });
    }
  });

  it('blows the fuse with a shorted capacitor', () => {
    const outcome = run({ on: 'C1', fault: 'shorted' });
    expect(outcome.opened).toEqual(['F1']);
    expect(outcome.seconds).toBeLessThan(5);
  });

  it('runs quietly with an open heater and leaves the capacitor charged', () => {
    const outcome = run({ on: 'V1', fault: 'heater-open' });
    expect(outcome).toMatchObject({ hum: 'quiet', waterRise: 0, isDisplayLit: true });
    expect(Math.abs(outcome.charge['C1:foils'] ?? 0)).toBeGreaterThan(2500);
  });

  it('is dead with a blown fuse or an open board transformer', () => {
    for (const fault of [
      { on: 'F1', fault: 'open' },
      { on: 'T2', fault: 'primary-open' },
    ]) {
      expect(run(fault)).toMatchObject({ isDisplayLit: false, isLampLit: false, hum: 'none' });
    }
  });

  it('only idles with the door open', () => {
    const open = { ...asFitted(lc28, []), isDoorClosed: false };
    expect(poweredRun(oven, open, 10)).toMatchObject({ isDisplayLit: true, hum: 'none' });
  });

  it('blows the fuse at once when the door opens on a welded primary interlock', () => {
    const welded = asFitted(lc28, [{ on: 'S1', fault: 'welded' }]);
    const outcome = poweredRun(oven, { ...welded, isDoorClosed: false }, 10);
    expect(outcome.opened).toEqual(['F1']);
    expect(outcome.seconds).toBeLessThan(0.1);
  });
});

describe('the fuse', () => {
  // Data sheet DS-F: 20 A, 575 A2s; UL 248-14 gates as quoted there: 100 % holds, 135 % within 1 h.
  it('holds its rating and melts at 135 %', () => {
    expect(meltingTime(20, 575, 20)).toBe(Infinity);
    expect(meltingTime(27, 575, 20)).toBeLessThan(3600);
  });

  it('melts by its integral alone when the current is large (300 A: 6.4 ms, FACTS section 8)', () => {
    expect(meltingTime(300, 575, 20)).toBeCloseTo(575 / 300 ** 2, 4);
  });
});
