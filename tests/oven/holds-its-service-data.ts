import { expect, it } from 'vitest';
import { drawMeter } from '../../shared/instruments/draw-meter.ts';
import { manual2000 } from '../../shared/instruments/manual-2000.ts';
import { settingOf } from '../../shared/instruments/meters.ts';
import { drawOven } from '../../shared/oven/draw.ts';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import type { ServiceMeasurement } from '../../shared/oven/oven.ts';
import { isGood, type OnBench } from './oven-on-bench.ts';

interface Expected {
  /** each drawn oven with a drawn meter of its own */ seeds: number;
  /** line of the service data, and a fault that it finds */
  bad: readonly (readonly [line: string, AppliedFault])[];
  /** faults without a settled cold reading: found by a look, by elimination or by a run */
  unseen: readonly AppliedFault[];
}

/** Whether this line of an oven's service data, measured as it says, calls the oven good. */
export const judging =
  ({ definition, cold, settled }: OnBench) =>
  (entry: ServiceMeasurement | string, faults: readonly AppliedFault[], seed: number): boolean => {
    const line =
      typeof entry === 'string' ? definition.serviceData.find(({ id }) => id === entry) : entry;
    if (!line) throw new Error(`no measurement ${String(entry)}`);
    const { lift, press, clean, between, setting } = line;
    const reading = settled(cold({ lift, pressed: press ?? [], cleaned: clean ?? [] }, faults), {
      red: between[0],
      black: between[1],
      setting,
      oven: drawOven(definition, seed),
      unit: drawMeter(manual2000, seed),
      readingNumber: seed,
    });
    return isGood(line, reading);
  };

/** Tests that a healthy oven's service data holds, that it finds faults, and which it cannot find. FACTS 13: common practice, no source. */
export function holdsItsServiceData(bench: OnBench, { seeds, bad, unseen }: Expected): void {
  const { serviceData } = bench.definition;
  const isJudgedGood = judging(bench);

  it('names settings of the manual meter, in the unit that setting shows', () => {
    for (const { setting, unit } of serviceData) {
      const found = settingOf(manual2000, setting);
      expect(found && 'scale' in found ? found.scale.unit : null).toBe(unit);
    }
  });

  it.each(serviceData.map((entry) => [entry.id, entry] as const))(
    `%s is good on ${seeds} drawn ovens with ${seeds} drawn meters`,
    (_, entry) => {
      for (let seed = 1; seed <= seeds; seed += 1)
        expect(isJudgedGood(entry, [], seed), `seed ${seed}`).toBe(true);
    },
    60_000,
  );

  it.each(bad)('%s finds %o', (id, fault) => {
    for (const seed of [1, 2, 3]) expect(isJudgedGood(id, [fault], seed)).toBe(false);
  });

  it.each(unseen)(
    'no settled line sees %o',
    (fault) => {
      for (const entry of serviceData) expect(isJudgedGood(entry, [fault], 4), entry.id).toBe(true);
    },
    60_000,
  );
}
