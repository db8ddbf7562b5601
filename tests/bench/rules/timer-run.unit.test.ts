import { describe, expect, it } from 'vitest';
import { poweredRun, standing } from '../../../shared/bench/powered-run/powered-run.ts';
import { drawOven, nominalOven } from '../../../shared/oven/draw.ts';
import type { AppliedFault } from '../../../shared/oven/fault.ts';
import { asFitted } from '../../../shared/oven/initial-state.ts';
import { loadOven } from '../../oven/oven-on-bench.ts';

const tk23 = loadOven('tarnwick-tk-23');
const oven = nominalOven(tk23);
const fault = (on: string, id: string, values?: Record<string, number>): AppliedFault => ({
  on,
  fault: id,
  ...(values ? { values } : {}),
});
const run = (...faults: AppliedFault[]) => poweredRun(oven, asFitted(tk23, faults), 30);
const withDoorOpen = (...faults: AppliedFault[]) => ({
  ...asFitted(tk23, faults),
  isDoorClosed: false,
});
const running = { isLampLit: true, isFanTurning: true, isTurntableTurning: true };

// The trade's rules (FACTS section 9); a 0.75 A high-voltage fuse lies between winding and capacitor.
describe('a 230 V oven with a timer, turned up', () => {
  it('heats, ticks and has no display to light', () => {
    const healthy = run();
    expect(healthy).toMatchObject({ ...running, isTimerRunning: true, hum: 'normal', opened: [] });
    expect(healthy.isDisplayLit).toBeUndefined();
    expect(healthy.microwavePower).toBeGreaterThan(700);
    expect(healthy.microwavePower).toBeLessThan(950);
    // 7 A at 230 V is the 14 A at 120 V of ENGINE section 4.
    expect(healthy.current).toBeGreaterThan(6.2);
    expect(healthy.current).toBeLessThan(8);
  });

  it('holds its high-voltage fuse in every drawn oven', () => {
    for (const seed of [1, 2, 3])
      expect(poweredRun(drawOven(tk23, seed), asFitted(tk23, []), 120).opened).toEqual([]);
  }, 30_000);

  it.each([
    ['capacitor shorted', fault('C1', 'shorted')],
    ['diode shorted', fault('D1', 'shorted')],
    ['magnetron shorted', fault('V1', 'heater-shorted-to-body')],
  ])(
    '%s: hums loudly until the high-voltage fuse goes, then runs on quietly and cold',
    (_, it_) => {
      const outcome = run(it_);
      expect(outcome).toMatchObject({ ...running, hum: 'quiet', opened: ['F4'], seconds: 30 });
      expect(outcome.atFirst?.hum).toBe('loud');
      expect(outcome.atFirst?.seconds).toBeLessThan(4);
      expect(outcome.waterRise).toBeLessThan(0.1);
    },
  );

  it('blows the line fuse with the winding through to the core: the other fuse is not in that path', () => {
    expect(run(fault('T1', 'hv-shorted-to-core', { part: 0 })).opened).toEqual(['F1']);
  });

  it('blows the line fuse with a shorted capacitor when a wire is in place of the high-voltage fuse', () => {
    expect(run(fault('C1', 'shorted'), fault('F4', 'bridged')).opened).toEqual(['F1']);
  });

  it('runs quietly and cold with capacitor, high-voltage fuse or heater open, and only the last leaves a charge', () => {
    for (const open of [fault('C1', 'open'), fault('F4', 'open')])
      expect(run(open)).toMatchObject({ ...running, hum: 'quiet', waterRise: 0, opened: [] });
    const cold = run(fault('V1', 'heater-open'));
    expect(cold).toMatchObject({ ...running, hum: 'quiet', waterRise: 0 });
    expect(Math.abs(cold.charge['C1:foils'] ?? 0)).toBeGreaterThan(2500);
  });

  it('hums loudly and warms little with shorted turns, and both fuses hold', () => {
    const turns = run(fault('T1', 'shorted-turns'));
    expect(turns).toMatchObject({ ...running, hum: 'loud', opened: [] });
    expect(turns.waterRise).toBeLessThan(run().waterRise / 3);
  });

  it('does not hum at all with the power contact or the secondary switch open', () => {
    for (const open of [fault('K1', 'power-open'), fault('S2', 'contact-open')])
      expect(run(open)).toMatchObject({ ...running, isTimerRunning: true, hum: 'none' });
  });

  it('is dead with the main contact, the primary switch or the line fuse open', () => {
    for (const open of [fault('K1', 'main-open'), fault('S1', 'contact-open'), fault('F1', 'open')])
      expect(run(open)).toMatchObject({ isLampLit: false, isTimerRunning: false, hum: 'none' });
  });

  it('heats and never stops by itself with the gear stripped or the motor open', () => {
    for (const stuck of [fault('K1', 'gear-stripped'), fault('K1', 'motor-open')])
      expect(run(stuck)).toMatchObject({ ...running, isTimerRunning: false, hum: 'normal' });
  });
});

describe('its door', () => {
  it('stops everything, whatever the timer says', () => {
    expect(poweredRun(oven, withDoorOpen(), 10)).toMatchObject({
      isLampLit: false,
      isTimerRunning: false,
      hum: 'none',
      opened: [],
    });
  });

  it('blows the line fuse through the monitor resistor when the primary switch is welded', () => {
    expect(standing(oven, withDoorOpen(fault('S1', 'welded')))).toEqual({ opened: ['F1'] });
    // FACTS section 8: 230 V / (0.8 + 0.5) Ohm is 177 A; with the loop here a little less.
    const { current } = poweredRun(oven, withDoorOpen(fault('S1', 'welded')), 10);
    expect(current).toBeGreaterThan(140);
    expect(current).toBeLessThan(200);
  });

  it('protects nobody then with the monitor resistor or its switch open', () => {
    for (const lost of [fault('R1', 'open'), fault('S3', 'contact-open')])
      expect(standing(oven, withDoorOpen(fault('S1', 'welded'), lost)).opened).toBeUndefined();
  });

  it('starts the oven by closing when the timer contact is welded', () => {
    expect(standing(oven, asFitted(tk23, [fault('K1', 'main-welded')]))).toEqual({
      runsByItself: true,
    });
    expect(standing(oven, asFitted(tk23, []))).toEqual({});
  });
});
