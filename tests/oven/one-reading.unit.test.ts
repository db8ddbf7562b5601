import { describe, expect, it } from 'vitest';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import { cold, settled, voltsBetween } from './lc-28.ts';

// FACTS 8.1 (CALC): one reading from the junction of capacitor, diode and magnetron to chassis, high
// voltage side assembled.
const HV = 'C1.2';
const chassis = 'CH.2';
const state = (...faults: AppliedFault[]) => cold({}, faults);
const shown = (setting: string, ...faults: AppliedFault[]) => ({
  redOnHv: settled({ state: state(...faults), red: HV, black: chassis, setting }),
  redOnChassis: settled({ state: state(...faults), red: chassis, black: HV, setting }),
});

/** Display of a ratiometric 20 MOhm range with this open voltage and a 10 MOhm standard. */
function ratiometric(volts: number, red: string, black: string): number {
  const branch = { name: 'range', from: red, to: black, resistance: 10e6, volts };
  const tips = voltsBetween(state(), red, black, [branch]);
  return (10 * tips) / (volts - tips);
}

describe('one reading at the high-voltage junction, all parts connected', () => {
  it('all good, 2.8 V open: 6.82 MOhm with red on the junction, 9.28 MOhm reversed', () => {
    expect(ratiometric(2.8, HV, chassis)).toBeCloseTo(6.82, 1);
    expect(ratiometric(2.8, chassis, HV)).toBeCloseTo(9.28, 1);
  });

  it('all good, 0.65 V open: 8.17 and 8.74 MOhm', () => {
    const { redOnHv, redOnChassis } = shown('ohms-20M');
    expect(Math.abs(redOnHv.value! / 1e6 - 8.17)).toBeLessThanOrEqual(0.02);
    expect(Math.abs(redOnChassis.value! / 1e6 - 8.74)).toBeLessThanOrEqual(0.02);
  });

  it('diode shorted: nothing but the leads, both ways', () => {
    const { redOnHv, redOnChassis } = shown('ohms-200', { on: 'D1', fault: 'shorted' });
    expect(redOnHv.display).toBe('0.3');
    expect(redOnChassis.display).toBe('0.3');
  });

  it('magnetron shorted: 0.0 to 0.5 Ohm plus leads, and lifting the heater leads tells it from the diode', () => {
    const faults: AppliedFault[] = [{ on: 'V1', fault: 'heater-shorted-to-body' }];
    expect(shown('ohms-200', ...faults).redOnHv.value).toBeCloseTo(0.5, 1);
    const apart = cold({ lift: ['W24/b', 'W25/b', 'W26/b'] }, faults);
    expect(settled({ state: apart, red: HV, black: chassis, setting: 'ohms-200' }).display).toBe(
      'OL',
    );
  });

  it('capacitor shorted: the high-voltage winding, 70 to 120 Ohm', () => {
    const { redOnHv } = shown('ohms-200', { on: 'C1', fault: 'shorted' });
    expect(redOnHv.display).toBe('95.3');
  });

  it('capacitor shorted to its can: nothing at that terminal', () => {
    const { redOnHv } = shown('ohms-200', { on: 'C1', fault: 'shorted-to-can' });
    expect(redOnHv.value).toBeLessThan(0.5);
  });

  it('bleeder open: OL reversed on 20 MOhm, diode alone forward on 3 V', () => {
    const fault = { on: 'C1', fault: 'bleeder-open' };
    expect(shown('ohms-2000M', fault).redOnHv.value! / 1e6).toBeLessThan(30);
    expect(shown('ohms-2000M', fault).redOnChassis.value! / 1e6).toBeGreaterThan(180);
    expect(shown('ohms-20M', fault).redOnChassis.display).toBe('OL');
  });

  it('winding open: OL reversed even with a good bleeder, whose path is through the winding', () => {
    const { redOnChassis } = shown('ohms-20M', { on: 'T1', fault: 'hv-open' });
    expect(redOnChassis.display).toBe('OL');
  });

  it('capacitor apart: 10.00 MOhm both ways', () => {
    const apart = cold({ lift: ['W23/b', 'W24/a', 'W27/a'] });
    const probe = { state: apart, setting: 'ohms-20M' };
    expect(settled({ ...probe, red: 'C1.1', black: 'C1.2' }).display).toBe('10.00');
    expect(settled({ ...probe, red: 'C1.2', black: 'C1.1' }).display).toBe('10.00');
  });
});
