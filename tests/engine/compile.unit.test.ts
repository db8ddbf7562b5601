import { describe, expect, it } from 'vitest';
import { compile } from '../../shared/engine/analyses/compile.ts';
import { operatingPoint } from '../../shared/engine/analyses/operating-point.ts';
import {
  battery,
  capacitor,
  circuit,
  diode,
  inductor,
  relativeError,
  resistor,
  solved,
} from './elements.ts';

const parts = (ohms: number, volts: number) =>
  circuit(
    battery('V', 'a', '0', volts),
    resistor('R', 'a', 'b', ohms),
    diode('D', 'b', 'c', { saturationCurrent: 12e-9, emission: 26, seriesResistance: 20 }),
    inductor('L', 'c', '0', 0.1, 5),
    capacitor('C', 'b', '0', 1e-6),
  );

describe('a compiled circuit', () => {
  it('solves with other values as the circuit made anew with them does', () => {
    const compiled = solved(compile(parts(1000, 12)));
    for (const [ohms, volts] of [
      [1000, 12],
      [0.003, 9],
      [1e12, 9],
      [47, -300],
      [1e6, 3000],
    ] as const) {
      expect(compiled.setValue('R', ohms)).toBeUndefined();
      expect(compiled.setValue('V', volts)).toBeUndefined();
      expect(compiled.solve()).toBeUndefined();
      expect(compiled.kclResidual()).toBeLessThan(1e-9);
      const { voltages, currents } = solved(operatingPoint(parts(ohms, volts)));
      for (const [node, value] of Object.entries(voltages)) {
        expect(Math.abs(compiled.voltage(node) - value)).toBeLessThan(1e-9 * Math.abs(volts));
      }
      expect(relativeError(compiled.current('D'), currents['D']!)).toBeLessThan(1e-9);
      expect(compiled.point().voltages['b']).toBe(compiled.voltage('b'));
    }
  });

  it('forgets on reset and then answers to the last bit as the first time', () => {
    const compiled = solved(compile(parts(1000, 12)));
    compiled.reset();
    compiled.solve();
    const first = compiled.point();
    compiled.setValue('R', 5);
    compiled.solve();
    compiled.setValue('R', 1000);
    compiled.reset();
    compiled.solve();
    expect(compiled.point()).toEqual(first);
  });

  it('refuses a value that cannot be, and leaves the old one', () => {
    const compiled = solved(compile(parts(1000, 12)));
    compiled.solve();
    const before = compiled.current('R');
    for (const [name, value] of [
      ['R', 0],
      ['R', NaN],
      ['C', -1],
      ['V', Infinity],
      ['D', 5],
      ['nothing', 5],
    ] as const) {
      expect(compiled.setValue(name, value)).toMatchObject({ code: 'bad-element', element: name });
    }
    compiled.solve();
    expect(relativeError(compiled.current('R'), before)).toBeLessThan(1e-12);
  });

  it('knows ground, and says not-a-number for what is not there', () => {
    const compiled = solved(compile(parts(1000, 12)));
    compiled.solve();
    expect(compiled.voltage('0')).toBe(0);
    expect(compiled.voltage('elsewhere')).toBeNaN();
    expect(compiled.current('elsewhere')).toBeNaN();
  });
});
