import { describe, expect, it } from 'vitest';
import { drawMeter } from '../../shared/instruments/draw-meter.ts';
import { manual2000 } from '../../shared/instruments/manual-2000.ts';
import type { Reading } from '../../shared/instruments/meter.ts';
import { settingOf } from '../../shared/instruments/meters.ts';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import { drawOven } from '../../shared/oven/draw.ts';
import type { ServiceMeasurement } from '../../shared/oven/oven.ts';
import { cold, lc28, settled } from './lc-28.ts';

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
    state: cold({ lift, pressed: press ?? [], cleaned: clean ?? [] }, faults),
    red: between[0],
    black: between[1],
    setting,
    oven: drawOven(lc28, seed),
    unit: drawMeter(manual2000, seed),
    readingNumber: seed,
  });
}

const line = (id: string): ServiceMeasurement => {
  const found = lc28.serviceData.find((candidate) => candidate.id === id);
  if (!found) throw new Error(`no measurement ${id}`);
  return found;
};

describe('service data of the LC-28', () => {
  it('names settings of the manual meter, in the unit that setting shows', () => {
    for (const { setting, unit } of lc28.serviceData) {
      const found = settingOf(manual2000, setting);
      expect(found && 'scale' in found ? found.scale.unit : null).toBe(unit);
    }
  });

  it.each(lc28.serviceData.map((entry) => [entry.id, entry] as const))(
    '%s is good on ten drawn ovens with ten drawn meters',
    (_, entry) => {
      for (let seed = 1; seed <= 10; seed += 1)
        expect(isGood(entry, measure(entry, [], seed)), `seed ${seed}`).toBe(true);
    },
    60_000,
  );

  const bad: [string, AppliedFault][] = [
    ['fuse', { on: 'F1', fault: 'open' }],
    ['magnetron-cut-out', { on: 'F2', fault: 'open' }],
    ['cavity-cut-out', { on: 'F3', fault: 'open' }],
    ['earth', { on: 'W3', fault: 'open-inside' }],
    ['earth', { on: 'W3', fault: 'burnt-connector-b' }],
    ['filter-bleeder', { on: 'Z1', fault: 'bleeder-open' }],
    ['primary-switch-pressed', { on: 'S1', fault: 'contact-open' }],
    ['primary-switch-released', { on: 'S1', fault: 'welded' }],
    ['secondary-switch-pressed', { on: 'S2', fault: 'contact-open' }],
    ['secondary-switch-released', { on: 'S2', fault: 'leaky' }],
    ['monitor-switch-released', { on: 'S3', fault: 'contact-open' }],
    ['monitor-switch-pressed', { on: 'S3', fault: 'welded' }],
    ['hv-relay-contact', { on: 'K1', fault: 'contact-welded' }],
    ['lamp-relay-contact', { on: 'K2', fault: 'contact-welded' }],
    ['hv-relay-coil', { on: 'K1', fault: 'coil-open' }],
    ['lamp', { on: 'E1', fault: 'open' }],
    ['fan', { on: 'M1', fault: 'open' }],
    ['fan', { on: 'M1', fault: 'shorted-turns' }],
    ['turntable', { on: 'M2', fault: 'open' }],
    ['board-primary', { on: 'T2', fault: 'primary-open' }],
    ['board-primary', { on: 'T2', fault: 'shorted-turns' }],
    ['board-eleven-volt', { on: 'T2', fault: 'eleven-volt-open' }],
    ['board-five-volt', { on: 'T2', fault: 'five-volt-open' }],
    ['board-primary-core', { on: 'T2', fault: 'primary-leaky-to-core' }],
    ['display-filament', { on: 'A1', fault: 'display-filament-open' }],
    ['hv-primary', { on: 'T1', fault: 'primary-open' }],
    ['hv-primary-core', { on: 'T1', fault: 'primary-leaky-to-core' }],
    ['heater-winding', { on: 'T1', fault: 'heater-winding-open' }],
    ['heater-winding-core', { on: 'T1', fault: 'heater-winding-shorted-to-core' }],
    ['hv-winding', { on: 'T1', fault: 'hv-open' }],
    ['hv-winding', { on: 'T1', fault: 'hv-shorted-to-core' }],
    ['capacitor-terminals', { on: 'C1', fault: 'shorted' }],
    ['capacitor-bleeder', { on: 'C1', fault: 'bleeder-open' }],
    ['capacitor-bleeder', { on: 'C1', fault: 'leaky' }],
    ['capacitor-can-1', { on: 'C1', fault: 'leaky-to-can' }],
    ['capacitor-can-2', { on: 'C1', fault: 'shorted-to-can' }],
    ['diode-forward', { on: 'D1', fault: 'open' }],
    ['diode-reverse', { on: 'D1', fault: 'leaky' }],
    ['diode-reverse', { on: 'D1', fault: 'reversed' }],
    ['magnetron-heater', { on: 'V1', fault: 'heater-open' }],
    ['magnetron-heater', { on: 'V1', fault: 'heater-loose' }],
    ['magnetron-body-1', { on: 'V1', fault: 'leaky' }],
    ['magnetron-body-2', { on: 'V1', fault: 'heater-shorted-to-body' }],
  ];
  it.each(bad)('%s finds %o', (id, fault) => {
    for (const seed of [1, 2, 3])
      expect(isGood(line(id), measure(line(id), [fault], seed))).toBe(false);
  });

  // FACTS 6.3: cold ohms stay normal with shorted turns; the fault must be found by a run.
  const unseen: AppliedFault[] = [
    { on: 'T1', fault: 'shorted-turns' },
    { on: 'T1', fault: 'breaks-down' },
    { on: 'C1', fault: 'breaks-down' },
    { on: 'C1', fault: 'drifted' },
    { on: 'C1', fault: 'open' },
    { on: 'D1', fault: 'breaks-down' },
    { on: 'V1', fault: 'weak' },
    { on: 'V1', fault: 'cracked-magnet' },
    { on: 'F2', fault: 'welded' },
    { on: 'F2', fault: 'weak' },
    { on: 'M1', fault: 'seized' },
    { on: 'A1', fault: 'dead' },
  ];
  it.each(unseen)(
    'no settled line sees %o',
    (fault) => {
      for (const entry of lc28.serviceData)
        expect(isGood(entry, measure(entry, [fault], 4)), entry.id).toBe(true);
    },
    60_000,
  );
});
