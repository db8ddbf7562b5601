import { describe, expect, it } from 'vitest';
import { faultsOf } from '../../shared/oven/check-faults.ts';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import { holdsItsServiceData } from './holds-its-service-data.ts';
import { loadOven, onBench } from './oven-on-bench.ts';

const tk23 = loadOven('tarnwick-tk-23');
const bench = onBench(tk23);
const { cold, settled } = bench;

const everyFault: AppliedFault[] = [...tk23.parts, ...tk23.leads].flatMap(({ ref }) =>
  (faultsOf(tk23, ref) ?? []).map(({ id }) => ({ on: ref, fault: id })),
);

describe('the Tarnwick TK-23', () => {
  it('is read without a mistake: 19 parts, 29 leads, at least 14 measurements', () => {
    expect(tk23.parts).toHaveLength(19);
    expect(tk23.leads).toHaveLength(29);
    expect(tk23.serviceData.length).toBeGreaterThanOrEqual(14);
  });

  // PRODUCT 6 and issue 4: at least 60 single faults, over every part and lead. The chassis is what
  // everything is bolted to: nothing of it is replaced.
  it('has at least 60 single faults in its parts alone, and some on every part and lead', () => {
    expect(everyFault.filter(({ on }) => !on.startsWith('W')).length).toBeGreaterThanOrEqual(60);
    for (const { ref } of [...tk23.parts, ...tk23.leads].filter(({ ref }) => ref !== 'CH'))
      expect(
        everyFault.some(({ on }) => on === ref),
        ref,
      ).toBe(true);
  });

  it('has those that safety asks for, and those of earlier repairs', () => {
    for (const wanted of [
      { on: 'S3', fault: 'contact-open' },
      { on: 'R1', fault: 'open' },
      { on: 'W3', fault: 'open-inside' },
      { on: 'Z1', fault: 'bleeder-open' },
      { on: 'C1', fault: 'bleeder-open' },
      { on: 'F1', fault: 'wrong-rating' },
      { on: 'F4', fault: 'bridged' },
      { on: 'W20', fault: 'swapped-a' },
      { on: 'W21', fault: 'off-b' },
      { on: 'W10', fault: 'wrong-terminal-a' },
    ])
      expect(everyFault).toContainEqual(wanted);
  });

  it('can be solved with each of them', () => {
    for (const fault of everyFault)
      expect(
        settled(cold({}, [fault]), { red: 'C1.2', black: 'CH.2', setting: 'ohms-20M' }).display,
      ).not.toBe('');
  }, 60_000);
});

describe('service data of the TK-23', () => {
  const bad: [string, AppliedFault][] = [
    ['fuse', { on: 'F1', fault: 'open' }],
    ['hv-fuse', { on: 'F4', fault: 'open' }],
    ['hv-fuse', { on: 'F4', fault: 'bridged' }],
    ['hv-fuse', { on: 'F4', fault: 'burnt-holder' }],
    ['magnetron-cut-out', { on: 'F2', fault: 'open' }],
    ['cavity-cut-out', { on: 'F3', fault: 'open' }],
    ['earth', { on: 'W3', fault: 'open-inside' }],
    ['filter-bleeder', { on: 'Z1', fault: 'bleeder-open' }],
    ['primary-switch-pressed', { on: 'S1', fault: 'contact-open' }],
    ['primary-switch-released', { on: 'S1', fault: 'welded' }],
    ['secondary-switch-pressed', { on: 'S2', fault: 'contact-open' }],
    ['secondary-switch-released', { on: 'S2', fault: 'leaky' }],
    ['monitor-switch-released', { on: 'S3', fault: 'contact-open' }],
    ['monitor-switch-pressed', { on: 'S3', fault: 'welded' }],
    ['monitor-resistor', { on: 'R1', fault: 'open' }],
    ['monitor-resistor', { on: 'R1', fault: 'drifted' }],
    ['timer-main-zero', { on: 'K1', fault: 'main-welded' }],
    ['timer-main-turned', { on: 'K1', fault: 'main-open' }],
    ['timer-power', { on: 'K1', fault: 'power-open' }],
    ['timer-motor', { on: 'K1', fault: 'motor-open' }],
    ['lamp', { on: 'E1', fault: 'open' }],
    ['fan', { on: 'M1', fault: 'shorted-turns' }],
    ['turntable', { on: 'M2', fault: 'open' }],
    ['hv-primary', { on: 'T1', fault: 'primary-open' }],
    ['hv-primary-core', { on: 'T1', fault: 'primary-leaky-to-core' }],
    ['heater-winding', { on: 'T1', fault: 'heater-winding-open' }],
    ['heater-winding-core', { on: 'T1', fault: 'heater-winding-shorted-to-core' }],
    ['hv-winding', { on: 'T1', fault: 'hv-shorted-to-core' }],
    ['capacitor-terminals', { on: 'C1', fault: 'shorted' }],
    ['capacitor-bleeder', { on: 'C1', fault: 'bleeder-open' }],
    ['capacitor-can-1', { on: 'C1', fault: 'leaky-to-can' }],
    ['capacitor-can-2', { on: 'C1', fault: 'shorted-to-can' }],
    ['diode-forward', { on: 'D1', fault: 'open' }],
    ['diode-reverse', { on: 'D1', fault: 'leaky' }],
    ['magnetron-heater', { on: 'V1', fault: 'heater-open' }],
    ['magnetron-body-1', { on: 'V1', fault: 'leaky' }],
    ['magnetron-body-2', { on: 'V1', fault: 'heater-shorted-to-body' }],
  ];
  // No cold reading: to be found by a look, by elimination or by a run.
  const unseen: AppliedFault[] = [
    { on: 'K1', fault: 'gear-stripped' },
    { on: 'K1', fault: 'power-welded' },
    { on: 'K1', fault: 'bell-loose' },
    { on: 'F1', fault: 'wrong-rating' },
    { on: 'F4', fault: 'wrong-rating' },
    { on: 'T1', fault: 'shorted-turns' },
    { on: 'C1', fault: 'breaks-down' },
    { on: 'V1', fault: 'weak' },
    { on: 'M1', fault: 'seized' },
  ];
  holdsItsServiceData(bench, { seeds: 25, bad, unseen });
});
