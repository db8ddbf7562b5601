import { describe, expect, it } from 'vitest';
import { parseQuantity, quantityText, withUnit } from '../../src/features/scenarios/quantity.ts';

describe('parseQuantity', () => {
  it.each([
    ['0.1', 0.1],
    ['200 k', 200e3],
    ['200K', 200e3],
    ['1,5M', 1.5e6],
    ['8e6', 8e6],
    ['22 m', 0.022],
    ['0.95 µ', 0.95e-6],
    ['4.7n', 4.7e-9],
    [' 680 p ', 680e-12],
    ['-5', -5],
    ['0', 0],
  ])('reads %s', (text, value) => {
    expect(parseQuantity(text)).toBeCloseTo(value, 15);
  });

  it.each(['', 'some', '1.2.3', '5 x', '5 Ω', '--1', 'k'])('refuses %j', (text) => {
    expect(parseQuantity(text)).toBeNaN();
  });

  it('keeps milli and mega apart', () => {
    expect(parseQuantity('3 m') * 1e9).toBeCloseTo(parseQuantity('3 M'), 6);
  });
});

describe('quantityText', () => {
  it.each([
    [0.1, '0.1'],
    [200e3, '200 k'],
    [8e6, '8 M'],
    [0.95e-6, '950 n'],
    [999, '999'],
    [1000, '1 k'],
    [0, '0'],
    [-1500, '-1.5 k'],
  ])('writes %d', (value, text) => {
    expect(quantityText(value)).toBe(text);
  });

  it('writes nothing for what is no number', () => {
    expect(quantityText(Number.NaN)).toBe('');
  });

  it('is read back as the same number', () => {
    for (const value of [0.01, 0.33, 47, 1234.5, 2.2e6, 1.5e7, 4.7e-9])
      expect(parseQuantity(quantityText(value)) / value).toBeCloseTo(1, 5);
  });
});

describe('withUnit', () => {
  it.each([
    [200e3, 'Ω', '200 kΩ'],
    [0.1, 'Ω', '0.1 Ω'],
    [1200, 'V', '1.2 kV'],
    [0.5, '', '0.5'],
  ])('sets %d %s', (value, unit, text) => {
    expect(withUnit(value, unit)).toBe(text);
  });
});
