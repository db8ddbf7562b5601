import { describe, expect, it } from 'vitest';
import { checkFaults } from '../../shared/oven/check-faults.ts';
import { parseOven } from '../../shared/oven/parse-oven.ts';
import { lc28, lc28Json } from './lc-28.ts';

interface Loose {
  parts: Record<string, unknown>[];
  leads: { ref: string; ends: string[]; resistance: number }[];
  serviceData: Record<string, unknown>[];
  supply: Record<string, unknown>;
}

function problemsOf(spoil: (oven: Loose) => void): string[] {
  const oven = lc28Json() as Loose;
  spoil(oven);
  const parsed = parseOven(oven);
  return parsed.ok ? [] : parsed.problems.map(({ path, message }) => `${path}: ${message}`);
}

describe('reading an oven definition', () => {
  it('takes the LC-28 as it is: 20 parts, 32 leads', () => {
    const parsed = parseOven(lc28Json());
    expect(parsed.ok).toBe(true);
    expect(lc28.parts).toHaveLength(20);
    expect(lc28.leads).toHaveLength(32);
  });

  it.each([null, 7, 'oven', [], {}])('refuses %o without throwing', (input) => {
    const parsed = parseOven(input);
    expect(parsed.ok).toBe(false);
  });

  it('suggests the nearest kind, and does not complain about what names that part', () => {
    expect(problemsOf((oven) => (oven.parts[18]!['kind'] = 'hv-diod'))).toEqual([
      'parts.18.kind: unknown kind hv-diod; did you mean hv-diode?',
    ]);
  });

  it('names every mistake at once', () => {
    const problems = problemsOf((oven) => {
      oven.parts[4]!['values'] = { openAt: 130 };
      oven.parts[6]!['variant'] = 'primry';
      oven.parts[3]!['ref'] = 'F1';
      oven.leads[22]!.ends[1] = 'C1.3';
      oven.leads[8]!.ref = 'W8';
      oven.serviceData[0]!['lift'] = ['W44/a'];
      oven.serviceData[1]!['between'] = ['F2.1', 'F2.9'];
      oven.serviceData[27]!['clean'] = ['C1.can'];
      oven.serviceData[5]!['press'] = ['K1'];
      oven.serviceData[15]!['low'] = 99;
      oven.supply['volts'] = -120;
    });
    const expected = [
      'unknown value openAt; did you mean opensAt?',
      'unknown variant primry; did you mean primary?',
      'part F1 is there already at parts.2',
      'unknown terminal C1.3; did you mean C1.1?',
      'lead W8 is there already at leads.7',
      'unknown lead end W44/a; did you mean W4/a?',
      'unknown terminal F2.9; did you mean F2.1?',
      'unknown varnished spot C1.can',
      'unknown actuator K1; did you mean S1?',
      'low 99 is not below high 58',
    ];
    for (const message of expected)
      expect(
        problems.some((problem) => problem.includes(message)),
        message,
      ).toBe(true);
    expect(problems.some((problem) => problem.startsWith('supply.volts'))).toBe(true);
  });

  it('says where', () => {
    expect(problemsOf((oven) => (oven.leads[22]!.ends[1] = 'C1.3'))).toEqual([
      'leads.22.ends.1: unknown terminal C1.3; did you mean C1.1?',
    ]);
  });

  it('wants a variant where the kind has variants, one chassis, and sensible resistances', () => {
    expect(problemsOf((oven) => delete oven.parts[6]!['variant'])[0]).toContain('needs a variant');
    expect(
      problemsOf((oven) => oven.parts.push({ ref: 'CX', kind: 'chassis', name: 'x' }))[0],
    ).toContain('one chassis');
    expect(problemsOf((oven) => (oven.leads[0]!.resistance = 0))[0]).toContain(
      'leads.0.resistance',
    );
  });
});

describe('what starts an oven', () => {
  it('has to be among its parts, and nothing else that would', () => {
    const asTimer = problemsOf((oven) => {
      (oven as unknown as { control: string }).control = 'mechanical timer';
    });
    expect(asTimer).toEqual([
      'control: mechanical timer control needs a mechanical-timer',
      'control: mechanical timer control has no place for a control-board',
    ]);
  });
});

describe('checking faults against an oven', () => {
  it('finds nothing wrong with known faults', () => {
    expect(
      checkFaults(lc28, [
        { on: 'C1', fault: 'shorted', values: { ohms: 0.5 } },
        { on: 'W12', fault: 'off-b' },
      ]),
    ).toEqual([]);
  });

  it('names unknown parts, faults, parameters and values out of range', () => {
    const problems = checkFaults(lc28, [
      { on: 'C7', fault: 'shorted' },
      { on: 'C1', fault: 'short' },
      { on: 'C1', fault: 'shorted', values: { ohm: 1 } },
      { on: 'C1', fault: 'shorted', values: { ohms: 1e6 } },
    ]);
    expect(problems.map(({ path }) => path)).toEqual([
      'faults.0.on',
      'faults.1.fault',
      'faults.2.values.ohm',
      'faults.3.values.ohms',
    ]);
    expect(problems[2]?.message).toBe('unknown parameter ohm; did you mean ohms?');
  });
});
