import { describe, expect, it } from 'vitest';
import { cold, ohmsBetween, settled } from './lc-28.ts';

/** What two resistances give side by side, Ohm. */
const beside = (...ohms: number[]) => 1 / ohms.reduce((sum, one) => sum + 1 / one, 0);
const LEAD = 0.006;

// Worked by hand from the nominal values of ENGINE 3 and the lead table of the oven.
describe('a part in circuit reads with its neighbours', () => {
  it('magnetron heater: the heater winding beside it', () => {
    const winding = 0.008 + 2 * (0.006 + LEAD);
    expect(ohmsBetween(cold(), 'V1.1', 'V1.2', 1)).toBeCloseTo(beside(0.12, winding), 4);
    const lifted = cold({ lift: ['W25/b', 'W26/b'] });
    expect(ohmsBetween(lifted, 'V1.1', 'V1.2', 1)).toBeCloseTo(0.12, 4);
    const open = cold({}, [{ on: 'V1', fault: 'heater-open' }]);
    expect(ohmsBetween(open, 'V1.1', 'V1.2', 1)).toBeCloseTo(winding, 4);
  });

  it('lamp: the fan beside it, and the turntable and more over the neutral', () => {
    const fan = 30 + (0.02 + LEAD) + (0.015 + LEAD) + (0.02 + LEAD);
    const alone = ohmsBetween(cold({ lift: ['W17/b'] }), 'E1.1', 'E1.2', 100);
    const both = ohmsBetween(cold(), 'E1.1', 'E1.2', 100);
    const turntable = 3200;
    expect(alone).toBeCloseTo(48, 3);
    expect(both).toBeCloseTo(beside(48, beside(fan, turntable)), 1);
    const blown = cold({}, [{ on: 'E1', fault: 'open' }]);
    expect(ohmsBetween(blown, 'E1.1', 'E1.2', 100)).toBeCloseTo(beside(fan, turntable), 0);
  });

  it('high-voltage primary: alone while relay and secondary switch are open, monitor closed', () => {
    expect(ohmsBetween(cold(), 'T1.1', 'T1.2', 1)).toBeCloseTo(0.55, 3);
  });

  it('primary switch, door open: the board transformer and the monitor switch answer for it', () => {
    const state = cold();
    const shown = settled({ state, red: 'S1.COM', black: 'S1.NO', setting: 'ohms-2k' });
    expect(shown.value! / 400).toBeCloseTo(1, 2);
    const lifted = cold({ lift: ['W7/b'] });
    expect(
      settled({ state: lifted, red: 'S1.COM', black: 'S1.NO', setting: 'ohms-20M' }).display,
    ).toBe('OL');
  });

  it('plug pins: line to neutral is the board transformer, and its absence a blown fuse', () => {
    const probe = { red: 'P1.L', black: 'P1.N', setting: 'ohms-2k' };
    const shown = settled({ ...probe, state: cold() }).value!;
    expect(shown).toBeCloseTo(beside(400.3, 680e3), -0.5);
    const blown = cold({}, [{ on: 'F1', fault: 'open' }]);
    expect(settled({ ...probe, state: blown }).display).toBe('OL');
  });

  it('5.5 V winding: the display filament beside it', () => {
    const lifted = ohmsBetween(cold({ lift: ['W31/a'] }), 'T2.5', 'T2.6', 10);
    const inPlace = ohmsBetween(cold(), 'T2.5', 'T2.6', 10);
    expect(lifted).toBeCloseTo(4, 3);
    expect(inPlace).toBeCloseTo(beside(4, 22 + 2 * (0.01 + LEAD)), 3);
  });

  it('11 V winding: the bridge of the board is shut at 0.65 V and open at 3 V', () => {
    const probe = { state: cold(), red: 'A1.1', black: 'A1.2' };
    const open = cold({}, [{ on: 'T2', fault: 'eleven-volt-open' }]);
    expect(settled({ ...probe, setting: 'ohms-2k' }).display).toBe('0.012');
    expect(settled({ ...probe, state: open, setting: 'ohms-2k' }).display).toBe('OL');
    const strong = settled({ ...probe, state: open, setting: 'diode' });
    expect(strong.value).toBeGreaterThan(0.6);
    expect(strong.value).toBeLessThan(1.6);
  });

  it('varnish: nothing on the core until a spot is cleaned', () => {
    const probe = { red: 'T1.HV', black: 'T1.core', setting: 'ohms-200' };
    const lift = ['W23/a'];
    expect(settled({ ...probe, state: cold({ lift }) }).display).toBe('OL');
    const cleaned = settled({ ...probe, state: cold({ lift, cleaned: ['T1.core'] }) });
    expect(Math.abs(cleaned.value! - 95.16)).toBeLessThanOrEqual(0.1);
  });

  it('a lead on the wrong terminal connects there', () => {
    const swapped = cold({ leadEnds: { 'W24/a': 'C1.1', 'W23/b': 'C1.2' } });
    expect(ohmsBetween(swapped, 'V1.1', 'C1.1', 1)).toBeCloseTo(0.014, 4);
    expect(ohmsBetween(swapped, 'T1.HV', 'C1.2', 1)).toBeCloseTo(0.014, 4);
  });

  it('lead faults: broken inside, a burnt connector, left off', () => {
    const across = (fault: string) =>
      ohmsBetween(cold({ lift: ['W6/a'] }, [{ on: 'W8', fault }]), 'F2.2', 'T2.1', 10);
    expect(across('open-inside')).toBeGreaterThan(900);
    expect(across('off-a')).toBeGreaterThan(900);
    expect(across('burnt-connector-a')).toBeCloseTo(1.516, 2);
  });
});
