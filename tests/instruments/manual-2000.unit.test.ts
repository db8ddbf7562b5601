import { describe, expect, it } from 'vitest';
import { manual2000 } from '../../shared/instruments/manual-2000.ts';
import { meterBranch } from '../../shared/instruments/meter-branch.ts';
import { settingOf } from '../../shared/instruments/meters.ts';
import { show, showOhms, steady, tipVolts } from './across.ts';

describe('manual meter, 2000 counts', () => {
  // ENGINE 2, the table; two test leads of 0.08 Ohm each beside it.
  it.each([
    ['ohms-200', 3, 2900],
    ['ohms-2k', 0.65, 1900],
    ['ohms-20k', 0.65, 11e3],
    ['ohms-200k', 0.65, 105e3],
    ['ohms-2M', 0.65, 1.05e6],
    ['ohms-20M', 0.65, 10e6],
    ['ohms-2000M', 3, 10e6],
    ['beep', 3, 2900],
    ['diode', 3, 3000],
    ['dc-200m', 0, 10e6],
    ['dc-1000', 0, 10e6],
    ['ac-600', 0, 10e6],
  ])('%s puts %d V behind %d Ohm and 0.16 Ohm of leads on its tips', (id, volts, ohms) => {
    const branch = meterBranch(manual2000, id, 'C1.1', 'C1.2');
    expect(branch).toEqual({
      name: 'meter',
      from: 'C1.1',
      to: 'C1.2',
      resistance: ohms + 0.16,
      volts,
    });
  });

  it('connects nothing while off', () => {
    expect(meterBranch(manual2000, 'off', 'a', 'b')).toBeNull();
    expect(show('off', steady(900)).display).toBe('');
    expect(settingOf(manual2000, 'ohms-5k')).toBeNull();
  });

  // FACTS 4.1, ratiometric ohms; each display worked by hand from R plus 0.16 Ohm of leads.
  it.each([
    ['ohms-200', 94.64, '94.8', 'Ω'],
    ['ohms-200', 0, '0.2', 'Ω'],
    ['ohms-2k', 400, '0.400', 'kΩ'],
    ['ohms-20k', 3200, '3.20', 'kΩ'],
    ['ohms-200k', 68e3, '68.0', 'kΩ'],
    ['ohms-2M', 680e3, '0.680', 'MΩ'],
    ['ohms-20M', 10e6, '10.00', 'MΩ'],
    ['ohms-2000M', 243e6, '253', 'MΩ'],
  ])('%s shows %d Ohm as %s %s', (setting, ohms, display, unit) => {
    expect(showOhms(setting, ohms)).toMatchObject({ display, unit, isOverRange: false });
  });

  // FACTS 4.1: over-ranges for R >= 2 Rstandard: 200 Ohm on a standard of 100 Ohm.
  it.each([
    ['ohms-200', 199.5, 200.5],
    ['ohms-2k', 1995, 2005],
    ['ohms-20k', 19.95e3, 20.05e3],
    ['ohms-200k', 199.5e3, 200.5e3],
    ['ohms-2M', 1.995e6, 2.005e6],
    ['ohms-20M', 19.95e6, 20.05e6],
    ['ohms-2000M', 1985e6, 1995e6],
  ])(
    '%s still reads %d Ohm and shows OL at %d Ohm and with its tips open',
    (setting, below, above) => {
      expect(showOhms(setting, below).isOverRange).toBe(false);
      expect(showOhms(setting, above)).toMatchObject({ display: 'OL', value: null, counts: null });
      expect(showOhms(setting, Infinity).display).toBe('OL');
      expect(show(setting, { time: [], volts: [] }).display).toBe('OL');
    },
  );

  // FACTS 4.2 (two manuals, PUB-SEEN for 200 MOhm; CP inference for 2000): leads shorted show 10.
  it('shows its own source on 2000 MOhm: leads shorted read 10', () => {
    expect(showOhms('ohms-2000M', 0).display).toBe('10');
  });

  // ENGINE 2: sounds below 50 Ohm. FACTS 4.3: a winding of about 100 Ohm does not beep.
  it('beeps below 50 Ohm', () => {
    expect(showOhms('beep', 49.5).isBeeping).toBe(true);
    expect(showOhms('beep', 50.5).isBeeping).toBe(false);
    expect(showOhms('beep', 95)).toMatchObject({ isBeeping: false, isOverRange: false });
    expect(showOhms('ohms-200', 10).isBeeping).toBe(false);
    expect(show('dc-20', steady(-5)).isBeeping).toBe(false);
  });

  it('shows junction volts to 1.999', () => {
    expect(show('diode', steady(0.6)).display).toBe('0.600');
    expect(show('diode', steady(1.99)).isOverRange).toBe(false);
    expect(show('diode', steady(2.01)).display).toBe('OL');
  });

  it('reads a resistance the wrong sign when a charge drives the tips: nothing is hidden', () => {
    const reading = show('ohms-200', steady(-1));
    expect(reading.isOverRange || (reading.value ?? 0) < 0).toBe(true);
    expect(show('ohms-20M', steady(-0.01)).display).toBe('-0.15');
  });

  it('agrees with the divider it makes', () => {
    expect(tipVolts(10e6, 'ohms-20M')).toBeCloseTo(0.325, 6);
  });
});
