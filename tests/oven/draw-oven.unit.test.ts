import { describe, expect, it } from 'vitest';
import { drawOven, nominalOven } from '../../shared/oven/draw.ts';
import { partKinds } from '../../shared/oven/parts/catalogue.ts';
import { lc28 } from './lc-28.ts';

describe('drawing an oven from a seed', () => {
  it('gives the same oven for the same seed, another for another', () => {
    expect(drawOven(lc28, 7)).toEqual(drawOven(lc28, 7));
    expect(drawOven(lc28, 7).values['T1']?.['hv']).not.toBe(drawOven(lc28, 8).values['T1']?.['hv']);
  });

  it('gives these values for seed 1 for ever', () => {
    const { values } = drawOven(lc28, 1);
    expect(values['T1']?.['hv']).toBe(88.88361453590915);
    expect(values['C1']?.['capacitance']).toBe(9.400703953420743e-7);
  });

  it('stays within tolerance and spreads over it', () => {
    const drawn = Array.from(
      { length: 200 },
      (_, seed) => drawOven(lc28, seed).values['T1']?.['hv'] ?? 0,
    );
    expect(Math.min(...drawn)).toBeGreaterThan(85.5);
    expect(Math.min(...drawn)).toBeLessThan(86.5);
    expect(Math.max(...drawn)).toBeLessThan(104.5);
    expect(Math.max(...drawn)).toBeGreaterThan(103.5);
    const mean = drawn.reduce((sum, value) => sum + value, 0) / drawn.length;
    expect(Math.abs(mean - 95)).toBeLessThan(1.2);
  });

  it('draws two values of one part, and one value of two parts, apart from each other', () => {
    const { values } = drawOven(lc28, 3);
    expect(values['F2']?.['contact']).not.toBe(values['F3']?.['contact']);
    expect((values['T2']?.['eleven-volt'] ?? 0) / 12).not.toBeCloseTo(
      (values['T2']?.['five-volt'] ?? 0) / 4,
      6,
    );
  });

  it('leaves all others as they were when a part is added', () => {
    const more = {
      ...lc28,
      parts: [{ ref: 'E9', kind: 'lamp' as const, name: 'Second lamp' }, ...lc28.parts],
    };
    const { E9, ...others } = drawOven(more, 5).values;
    expect(E9).toBeDefined();
    expect(others).toEqual(drawOven(lc28, 5).values);
  });

  it('takes the nominal of the oven before that of the kind', () => {
    expect(nominalOven(lc28).values['M2']?.['resistance']).toBe(3200);
    expect(nominalOven(lc28).values['M1']?.['resistance']).toBe(
      partKinds.motor.values['resistance']?.nominal,
    );
  });
});
