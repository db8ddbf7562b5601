import { describe, expect, it } from 'vitest';
import { advance } from '../../shared/engine/analyses/advance.ts';
import type { Element, Storage, Wave } from '../../shared/engine/circuit/circuit.ts';
import {
  battery,
  capacitor,
  circuit,
  coupling,
  diode,
  inductor,
  relativeError,
  resistor,
  sine,
  solved,
} from './elements.ts';

const nothing: Storage = { voltages: {}, currents: {} };
const holding = (
  voltages: Record<string, number>,
  currents: Record<string, number> = {},
): Storage => ({
  voltages,
  currents,
});

describe('what capacitors and windings hold', () => {
  const rc = circuit(
    battery('V', 'a', '0', 10),
    resistor('R', 'a', 'c', 1e4),
    capacitor('C', 'c', '0', 1e-6, 4),
  );

  it('starts from storage by name, else from the element, else from nothing', () => {
    const after = (storage: Storage) => solved(advance(rc, storage, 0.01)).storage.voltages['C']!;
    expect(after(holding({ C: 2 }))).toBeCloseTo(10 - 8 / Math.E, 4);
    expect(after(nothing)).toBeCloseTo(10 - 6 / Math.E, 4);
  });

  it('keeps entries for elements of this circuit alone', () => {
    const { storage } = solved(advance(rc, holding({ C: 1, gone: 5 }, { lost: 3 }), 1e-3));
    expect(Object.keys(storage.voltages)).toEqual(['C']);
    expect(Object.keys(storage.currents)).toEqual([]);
  });

  it('is the same in one wait or in many', () => {
    let storage = holding({ C: 0 });
    for (let n = 0; n < 30; n += 1) storage = solved(advance(rc, storage, 1e-3)).storage;
    const once = solved(advance(rc, holding({ C: 0 }), 0.03)).storage;
    expect(relativeError(storage.voltages['C']!, once.voltages['C']!)).toBeLessThan(1e-5);
  });

  it('is untouched by no time at all', () => {
    const { storage, samples, means } = solved(
      advance(rc, holding({ C: 7 }), 0, { observe: [['c', '0']] }),
    );
    expect(storage.voltages['C']).toBeCloseTo(7, 9);
    expect(samples.time).toEqual([0]);
    expect(samples.values[0]![0]).toBeCloseTo(7, 9);
    expect(means[0]).toBeCloseTo(7, 9);
  });
});

describe('samples of a pair', () => {
  it('begin just after the change, end with the duration, and may be joined by straight lines', () => {
    const tau = 10;
    const drain = circuit(capacitor('C', 'a', '0', 1e-6), resistor('B', 'a', '0', 1e7));
    const { samples, means } = solved(
      advance(drain, holding({ C: 1000 }), 30, {
        observe: [
          ['a', '0'],
          ['0', 'a'],
          ['gone', '0'],
        ],
      }),
    );
    expect(samples.time[0]).toBe(0);
    expect(samples.time.at(-1)).toBe(30);
    expect(samples.values[0]![0]).toBeCloseTo(1000, 6);
    samples.time.slice(1).forEach((end, n) => {
      const begin = samples.time[n]!;
      expect(end).toBeGreaterThan(begin);
      const middle = (samples.values[0]![n]! + samples.values[0]![n + 1]!) / 2;
      expect(relativeError(middle, 1000 * Math.exp(-(begin + end) / 2 / tau))).toBeLessThan(1e-4);
      expect(samples.values[1]![n]).toBe(-samples.values[0]![n]!);
      expect(samples.values[2]![n]).toBe(0);
    });
    expect(relativeError(means[0]!, ((1000 * tau) / 30) * -Math.expm1(-30 / tau))).toBeLessThan(
      1e-4,
    );
  });

  it('follow a sine through a meter: mean nothing, crest right', () => {
    const { samples, means } = solved(
      advance(
        circuit(
          battery('V', 'a', '0', sine(170, 60)),
          resistor('R', 'a', 'b', 1e6),
          resistor('M', 'b', '0', 1e7),
        ),
        nothing,
        0.1,
        { observe: [['b', '0']] },
      ),
    );
    expect(Math.abs(means[0]!)).toBeLessThan(0.01);
    expect(Math.max(...samples.values[0]!)).toBeCloseTo((170 * 10) / 11, 1);
  });

  it('have two values where a source jumps, on the clock of the sources', () => {
    const wave: Wave = {
      shape: 'pulse',
      low: 0,
      high: 5,
      delay: 100.5,
      rise: 0,
      fall: 0,
      width: 10,
      period: 0,
    };
    const { samples } = solved(
      advance(circuit(battery('V', 'a', '0', wave), resistor('R', 'a', '0', 10)), nothing, 1, {
        observe: [['a', '0']],
        startTime: 100,
      }),
    );
    const jump = samples.time.findIndex((time, n) => n > 0 && time === samples.time[n - 1]);
    expect(samples.time[jump]).toBeCloseTo(0.5, 9);
    expect(samples.values[0]![jump - 1]).toBe(0);
    expect(samples.values[0]![jump]).toBe(5);
  });
});

describe('a sudden change', () => {
  it.each([
    ['through 3 milliohm', [resistor('w', 'a', 'b', 0.003)], 'b'],
    ['directly', [], 'a'],
  ] as const)('joins a charged capacitor to another %s', (_, joint, other) => {
    const { storage } = solved(
      advance(
        circuit(capacitor('C', 'a', '0', 1e-6), capacitor('D', other, '0', 0.5e-6), ...joint),
        holding({ C: 3000, D: 0 }),
        1e-3,
      ),
    );
    expect(relativeError(storage.voltages['C']!, 2000)).toBeLessThan(1e-6);
    expect(relativeError(storage.voltages['D']!, 2000)).toBeLessThan(1e-6);
  });

  it('puts a charged capacitor on a battery that differs', () => {
    const { storage } = solved(
      advance(
        circuit(battery('V', 'a', '0', 12), capacitor('C', 'a', '0', 1e-6)),
        holding({ C: 3000 }),
        1,
      ),
    );
    expect(storage.voltages['C']).toBeCloseTo(12, 6);
  });

  it.each([1e9, 1e12])('interrupts a winding of 0.16 H at 10 A into %f ohm', (ohms) => {
    const { storage, final } = solved(
      advance(
        circuit(inductor('L', 'a', '0', 0.16, 0.55), resistor('gap', 'a', '0', ohms)),
        holding({}, { L: 10 }),
        1,
      ),
    );
    expect(Math.abs(storage.currents['L']!)).toBeLessThan(1e-9);
    expect(Math.abs(final.voltages['a']!)).toBeLessThan(1e-3);
  });

  it('lets a diode take over the current of a winding', () => {
    const { samples, storage } = solved(
      advance(
        circuit(
          inductor('L', 'a', '0', 0.16, 0.55),
          resistor('gap', 'a', '0', 1e9),
          diode('D', '0', 'a', { saturationCurrent: 1e-9, emission: 1.8 }),
        ),
        holding({}, { L: -2 }),
        0.05,
        { observe: [['a', '0']] },
      ),
    );
    // wrong way round for the diode: nothing to take over
    expect(Math.abs(storage.currents['L']!)).toBeLessThan(1e-6);
    expect(samples.values[0]!.every(Number.isFinite)).toBe(true);
    const right = solved(
      advance(
        circuit(
          inductor('L', 'a', '0', 0.16, 0.55),
          resistor('gap', 'a', '0', 1e9),
          diode('D', '0', 'a', { saturationCurrent: 1e-9, emission: 1.8 }),
        ),
        holding({}, { L: 2 }),
        0.05,
        { observe: [['a', '0']] },
      ),
    );
    expect(Math.min(...right.samples.values[0]!)).toBeGreaterThan(-1.1);
    // L di/dt = -R i - about 1 V
    const decay = Math.exp((-0.05 * 0.55) / 0.16);
    expect(right.storage.currents['L']).toBeLessThan(2 * decay);
    expect(right.storage.currents['L']).toBeGreaterThan(2 * decay - (1.1 * 0.05) / 0.16);
  });
});

describe('long waits', () => {
  it('cost few samples where nothing happens and end where they should', () => {
    const parts: Element[] = [
      battery('V', 'a', '0', 5),
      resistor('R', 'a', 'b', 0.003),
      capacitor('C', 'b', '0', 500e-12),
      capacitor('D', 'b', '0', 1e-6),
      resistor('slow', 'b', 'c', 1e9),
      capacitor('E', 'c', '0', 1e-6),
    ];
    const settled = holding({ C: 5, D: 5, E: 5 });
    const quiet = solved(advance(circuit(...parts), settled, 300, { observe: [['c', '0']] }));
    expect(quiet.samples.time.length).toBeLessThan(30);
    const { storage, samples } = solved(
      advance(circuit(...parts), nothing, 1000, { observe: [['c', '0']] }),
    );
    // the node's own picosiemens stands beside the gigohm
    expect(relativeError(storage.voltages['E']!, (5 / 1.001) * -Math.expm1(-1.001))).toBeLessThan(
      1e-4,
    );
    expect(samples.time.length).toBeLessThan(2000);
  });

  it('do not follow a ring that nobody will see, yet bring it to rest', () => {
    const started = performance.now();
    const { storage } = solved(
      advance(
        circuit(
          inductor('L', 'a', 'b', 46, 95),
          capacitor('C', 'b', '0', 1e-9),
          resistor('w', 'a', '0', 0.003),
        ),
        holding({}, { L: 1e-3 }),
        300,
      ),
    );
    expect(Math.abs(storage.currents['L']!)).toBeLessThan(1e-9);
    expect(Math.abs(storage.voltages['C']!)).toBeLessThan(1e-6);
    expect(performance.now() - started).toBeLessThan(4000);
  });
});

describe('switches', () => {
  const model = { threshold: 5, hysteresis: 1, onResistance: 1, offResistance: 1e9 };

  it('turn when their control crosses, above and below by the hysteresis', () => {
    // 10 V through 1 kohm into 1 uF; at 6 V the switch drains it through 100 ohm down to 4 V
    const oscillator = circuit(
      battery('V', 'a', '0', 10),
      resistor('R', 'a', 'c', 1000),
      capacitor('C', 'c', '0', 1e-6),
      resistor('RD', 'c', 'd', 100),
      { kind: 'switch', name: 'S', nodes: ['d', '0'], control: ['c', '0'], model },
    );
    const { samples } = solved(advance(oscillator, nothing, 5e-3, { observe: [['c', '0']] }));
    const [volts] = samples.values;
    const settled = volts!.slice(Math.floor(volts!.length / 2));
    expect(Math.max(...settled)).toBeCloseTo(6, 2);
    expect(Math.min(...settled)).toBeCloseTo(4, 2);
    const first = samples.time[volts!.findIndex((v) => v > 5.999)]!;
    expect(first).toBeCloseTo(1e-3 * Math.log(10 / 4), 6);
  });

  it('keep the state they start with while their control is between', () => {
    for (const isInitiallyOn of [true, false]) {
      const { final } = solved(
        advance(
          circuit(battery('V', 'a', '0', 5), resistor('R', 'a', 'b', 1), {
            kind: 'switch',
            name: 'S',
            nodes: ['b', '0'],
            control: ['a', '0'],
            model,
            isInitiallyOn,
          }),
          nothing,
          1,
        ),
      );
      expect(final.voltages['b']).toBeCloseTo(isInitiallyOn ? 2.5 : 5, 6);
    }
  });
});

describe('coupled windings', () => {
  const transformer = (k: number, turns: number, load: number): Element[] => [
    battery('V', 'a', '0', sine(100, 50)),
    inductor('P', 'a', '0', 1, 0.01),
    inductor('S', 's', '0', turns ** 2, 0.01),
    coupling('K', 'P', 'S', k),
    resistor('load', 's', '0', load),
  ];

  it.each([1, -1])('at k = %i transform by the turns, the dots telling the sign', (k) => {
    const { samples } = solved(
      advance(circuit(...transformer(k, 3, 1e6)), nothing, 0.5, {
        observe: [
          ['a', '0'],
          ['s', '0'],
        ],
      }),
    );
    samples.time.forEach((time, n) => {
      if (time < 0.4) return;
      expect(Math.abs(samples.values[1]![n]! - 3 * k * samples.values[0]![n]!)).toBeLessThan(0.1);
    });
  });

  it('without coupling leave each other alone', () => {
    const { final } = solved(advance(circuit(...transformer(0, 3, 100)), nothing, 0.1));
    expect(Math.abs(final.voltages['s']!)).toBeLessThan(1e-9);
  });

  it('of three keep their ampere-turns with a shorted one among them', () => {
    const { storage } = solved(
      advance(
        circuit(
          battery('V', 'a', 'x', sine(100, 50)),
          resistor('R', 'x', '0', 1),
          inductor('P', 'a', '0', 1),
          inductor('S', 's', '0', 4),
          inductor('T', 't', '0', 0.01, 1e-3),
          coupling('K1', 'P', 'S', 0.98),
          coupling('K2', 'P', 'T', 0.98),
          coupling('K3', 'S', 'T', 0.98),
          resistor('open', 's', '0', 1e9),
          resistor('short', 't', '0', 1e-3),
        ),
        nothing,
        0.505,
      ),
    );
    const { P, S, T } = storage.currents as Record<'P' | 'S' | 'T', number>;
    expect(Math.abs(S)).toBeLessThan(1e-6);
    // the shorted tenth of the turns carries nearly ten times the current, the other way
    expect(T / P).toBeLessThan(-8.5);
    expect(T / P).toBeGreaterThan(-10);
  });
});
