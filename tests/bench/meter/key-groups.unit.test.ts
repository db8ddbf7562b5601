import { describe, expect, it } from 'vitest';
import { auto6000 } from '../../../shared/instruments/auto-6000.ts';
import { manual2000 } from '../../../shared/instruments/manual-2000.ts';
import { keyGroups } from '../../../src/bench/meter/key-groups.ts';

const labels = (meter: typeof manual2000) =>
  Object.fromEntries(keyGroups(meter).map(({ id, keys }) => [id, keys.map(({ label }) => label)]));

describe('the keys of a meter', () => {
  it('are its ranges, grouped, on a manual meter', () => {
    expect(labels(manual2000)).toEqual({
      ohms: ['200', '2k', '20k', '200k', '2M', '20M', '2G'],
      checks: ['beep', 'diode', '2µF', '20µF'],
      dc: ['200m', '2', '20', '200', '1000'],
      ac: ['200', '600'],
    });
  });

  it('are its functions on an auto-ranging one, each holding all its ranges', () => {
    expect(labels(auto6000)).toEqual({
      ohms: ['Ω'],
      checks: ['beep', 'diode', 'µF'],
      dc: ['V⎓'],
      ac: ['V~'],
    });
    const [ohms] = keyGroups(auto6000)[0]?.keys ?? [];
    expect(ohms?.setting).toBe('ohms-600');
    expect(ohms?.holds).toHaveLength(6);
  });

  it.each([manual2000, auto6000])('reach every setting of $name but off', (meter) => {
    const held = keyGroups(meter).flatMap(({ keys }) => keys.flatMap(({ holds }) => holds));
    expect(held.toSorted()).toEqual(
      meter.settings
        .map(({ id }) => id)
        .filter((id) => id !== 'off')
        .toSorted(),
    );
  });
});
