import { describe, expect, it } from 'vitest';
import { formatQuantity } from '../../../shared/engine/quantities/format-quantity.ts';

describe('a quantity in engineering notation', () => {
  it.each<[number, string, string]>([
    [94.8, 'Ω', '94.8 Ω'],
    [22.6e6, 'Ω', '22.6 MΩ'],
    [253.5e6, 'Ω', '254 MΩ'],
    [0.003, 'Ω', '3 mΩ'],
    [1e12, 'Ω', '1 TΩ'],
    [5e15, 'Ω', '5000 TΩ'],
    [0.95e-6, 'F', '950 nF'],
    [1e-6, 'F', '1 µF'],
    [500e-12, 'F', '500 pF'],
    [4e-15, 'F', '0.004 pF'],
    [-4130, 'V', '-4.13 kV'],
    [999.6, 'V', '1 kV'],
    [999.4, 'V', '999 V'],
    [1000, 'V', '1 kV'],
    [0, 'A', '0 A'],
    [-0, 'A', '0 A'],
    [0.000999999, 's', '1 ms'],
    [Infinity, 'Ω', '∞ Ω'],
    [-Infinity, 'Ω', '-∞ Ω'],
    [NaN, 'Ω', '– Ω'],
  ])('%d %s reads %s', (value, unit, expected) => {
    expect(formatQuantity(value, unit)).toBe(expected);
  });

  it('keeps as many digits as asked for', () => {
    expect(formatQuantity(8.46469, 'V', 4)).toBe('8.465 V');
    expect(formatQuantity(2969.85, 'V', 6)).toBe('2.96985 kV');
    expect(formatQuantity(1234, 'V', 1)).toBe('1 kV');
  });
});
