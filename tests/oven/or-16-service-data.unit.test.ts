import { describe, expect, it } from 'vitest';
import { drawMeter } from '../../shared/instruments/draw-meter.ts';
import { manual2000 } from '../../shared/instruments/manual-2000.ts';
import type { Reading } from '../../shared/instruments/meter.ts';
import { settingOf } from '../../shared/instruments/meters.ts';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import { drawOven } from '../../shared/oven/draw.ts';
import type { ServiceMeasurement } from '../../shared/oven/oven.ts';
import { settled } from './lc-28.ts';
import { or16, or16Cold } from './or-16.ts';

// FACTS 13, a healthy oven on the bench: common practice, no source.

const display = { Ω: 1, kΩ: 1e3, MΩ: 1e6 } as const;

function isGood(line: ServiceMeasurement, reading: Reading): boolean {
  switch (line.expect) {
    case 'open':
      return reading.isOverRange;
    case 'beep':
      return reading.isBeeping;
    case 'range': {
      if (reading.value === null) return false;
      const shown = reading.value / display[line.unit as keyof typeof display];
      return shown >= (line.low ?? -Infinity) && shown <= (line.high ?? Infinity);
    }
  }
}

function measure(line: ServiceMeasurement, faults: readonly AppliedFault[], seed: number): Reading {
  const { lift, press, clean, between, setting } = line;
  return settled({
    state: or16Cold({ lift, pressed: press ?? [], cleaned: clean ?? [] }, faults),
    red: between[0],
    black: between[1],
    setting,
    oven: drawOven(or16, seed),
    unit: drawMeter(manual2000, seed),
    readingNumber: seed,
  });
}

const line = (id: string): ServiceMeasurement => {
  const found = or16.serviceData.find((candidate) => candidate.id === id);
  if (!found) throw new Error(`no measurement ${id}`);
  return found;
};

describe('service data of the OR-16', () => {
  it('names settings of the manual meter, in the unit that setting shows', () => {
    for (const { setting, unit } of or16.serviceData) {
      const found = settingOf(manual2000, setting);
      expect(found && 'scale' in found ? found.scale.unit : null).toBe(unit);
    }
  });

  it('covers every part that a meter can judge', () => {
    const judged = new Set(or16.serviceData.map(({ part }) => part));
    const parts = or16.parts.filter(({ kind }) => kind !== 'chassis').map(({ ref }) => ref);
    expect([...judged].sort()).toEqual(parts.sort());
  });

  it.each(or16.serviceData.map((entry) => [entry.id, entry] as const))(
    '%s is good on 25 drawn ovens with 25 drawn meters',
    (_, entry) => {
      for (let seed = 1; seed <= 25; seed += 1)
        expect(isGood(entry, measure(entry, [], seed)), `seed ${seed}`).toBe(true);
    },
    60_000,
  );

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
  it.each(bad)('%s finds %o', (id, fault) => {
    for (const seed of [1, 2, 3])
      expect(isGood(line(id), measure(line(id), [fault], seed))).toBe(false);
  });

  it('leaves the high speed good when only the winding of the low one is broken', () => {
    const fault = { on: 'M3', fault: 'auxiliary-open' };
    expect(isGood(line('vent-high'), measure(line('vent-high'), [fault], 1))).toBe(true);
  });

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
  it.each(unseen)(
    'no settled line sees %o',
    (fault) => {
      for (const entry of or16.serviceData)
        expect(isGood(entry, measure(entry, [fault], 4)), entry.id).toBe(true);
    },
    60_000,
  );
});
