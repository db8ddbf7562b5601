import { describe, expect, it } from 'vitest';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import { holdsItsServiceData, judging } from './holds-its-service-data.ts';
import { or16, or16OnBench } from './or-16.ts';

describe('service data of the OR-16', () => {
  it('covers every part that a meter can judge', () => {
    const judged = new Set(or16.serviceData.map(({ part }) => part));
    const parts = or16.parts.filter(({ kind }) => kind !== 'chassis').map(({ ref }) => ref);
    expect([...judged].sort()).toEqual(parts.sort());
  });

  it('leaves the high speed good when only the winding of the low one is broken', () => {
    const fault = { on: 'M3', fault: 'auxiliary-open' };
    expect(judging(or16OnBench)('vent-high', [fault], 1)).toBe(true);
  });

  const bad: [string, AppliedFault][] = [
    ['magnetron-cut-out', { on: 'F2', fault: 'open' }],
    ['hood-cut-out', { on: 'F3', fault: 'open' }],
    ['sensing-switch-pressed', { on: 'S4', fault: 'contact-open' }],
    ['sensing-switch-pressed', { on: 'S4', fault: 'film' }],
    ['sensing-switch-released', { on: 'S4', fault: 'welded' }],
    ['primary-switch-pressed', { on: 'S1', fault: 'contact-open' }],
    ['monitor-switch-released', { on: 'S3', fault: 'contact-open' }],
    ['vent-high-relay-contact', { on: 'K3', fault: 'contact-welded' }],
    ['vent-low-relay-coil', { on: 'K4', fault: 'coil-open' }],
    ['cooktop-relay-contact', { on: 'K5', fault: 'contact-welded' }],
    ['cooktop-lamp', { on: 'E2', fault: 'open' }],
    ['magnetron-fan', { on: 'M1', fault: 'open' }],
    ['vent-high', { on: 'M3', fault: 'open' }],
    ['vent-high', { on: 'M3', fault: 'shorted-turns' }],
    ['vent-low', { on: 'M3', fault: 'auxiliary-open' }],
    ['hv-winding', { on: 'T1', fault: 'hv-shorted-to-core' }],
    ['capacitor-bleeder', { on: 'C1', fault: 'bleeder-open' }],
    ['diode-reverse', { on: 'D1', fault: 'leaky' }],
    ['magnetron-heater', { on: 'V1', fault: 'heater-open' }],
    ['earth', { on: 'W3', fault: 'open-inside' }],
  ];
  // No cold reading: found by looking, by elimination, or by a run.
  const unseen: AppliedFault[] = [
    { on: 'S4', fault: 'lever-bent' },
    { on: 'A1', fault: 'door-line-open' },
    { on: 'A1', fault: 'dead' },
    { on: 'F2', fault: 'weak' },
    { on: 'F2', fault: 'welded' },
    { on: 'M1', fault: 'seized' },
    { on: 'M3', fault: 'seized' },
    { on: 'M3', fault: 'greasy' },
    { on: 'V1', fault: 'cracked-magnet' },
    { on: 'T1', fault: 'breaks-down' },
  ];
  holdsItsServiceData(or16OnBench, { seeds: 25, bad, unseen });
});
