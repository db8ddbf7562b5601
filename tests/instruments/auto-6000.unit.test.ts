import { describe, expect, it } from 'vitest';
import { auto6000 } from '../../shared/instruments/auto-6000.ts';
import { autoRange } from '../../shared/instruments/auto-range.ts';
import { manual2000 } from '../../shared/instruments/manual-2000.ts';
import { meterById } from '../../shared/instruments/meters.ts';
import { showOhms, tipVolts } from './across.ts';

const on = { meter: auto6000 };

function ranged(ohms: number): string {
  let setting = 'ohms-600';
  for (let step = 0; step < 10; step += 1)
    setting = autoRange(auto6000, setting, showOhms(setting, ohms, on));
  return setting;
}

describe('auto-ranging meter, 6000 counts', () => {
  // ENGINE 2: 2.5 V open on the lowest range, 0.55 V above; to 60 MOhm; no 2000 MOhm range.
  it('has 2.5 V open on its lowest ohms range and 0.55 V above', () => {
    expect(tipVolts(Infinity, 'ohms-600', auto6000)).toBe(2.5);
    for (const id of ['ohms-6k', 'ohms-60k', 'ohms-600k', 'ohms-6M', 'ohms-60M'])
      expect(tipVolts(Infinity, id, auto6000)).toBe(0.55);
    expect(auto6000.settings.some(({ id }) => id.includes('2000M'))).toBe(false);
  });

  it.each([
    [95, 'ohms-600', '95.2'],
    [400, 'ohms-600', '400.2'],
    [3200, 'ohms-6k', '3.200'],
    [680e3, 'ohms-6M', '0.680'],
    [10e6, 'ohms-60M', '10.00'],
  ])('reads %d Ohm on %s as %s', (ohms, setting, display) => {
    expect(ranged(ohms)).toBe(setting);
    expect(showOhms(setting, ohms, on).display).toBe(display);
  });

  it('stays on its highest range with its tips open and comes down when they are joined', () => {
    expect(ranged(Infinity)).toBe('ohms-60M');
    let setting = 'ohms-60M';
    for (let step = 0; step < 5; step += 1)
      setting = autoRange(auto6000, setting, showOhms(setting, 0, on));
    expect(setting).toBe('ohms-600');
  });

  it('does not hunt: from its resting range it never moves again', () => {
    for (let exponent = 0; exponent < 7.7; exponent += 0.01) {
      const ohms = 10 ** exponent;
      const rest = ranged(ohms);
      expect(autoRange(auto6000, rest, showOhms(rest, ohms, on))).toBe(rest);
    }
  });

  it('leaves a manual meter where its dial is', () => {
    expect(autoRange(manual2000, 'ohms-200', showOhms('ohms-200', 1e6))).toBe('ohms-200');
  });

  it('is found by its id', () => {
    expect(meterById('auto-6000')).toBe(auto6000);
    expect(() => meterById('none')).toThrow('no meter none');
  });
});
