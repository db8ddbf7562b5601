import { describe, expect, it } from 'vitest';
import { lc28, setupWith } from '../support/bench.ts';
import { untouched } from '../../shared/bench/fold.ts';
import { meterAt, readingPeriod } from '../../shared/bench/reading.ts';
import { seededUniform } from '../../shared/engine/quantities/seeded-uniform.ts';
import { drawMeter } from '../../shared/instruments/draw-meter.ts';
import { manual2000 } from '../../shared/instruments/manual-2000.ts';
import { drawOven } from '../../shared/oven/draw.ts';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import type { ServiceMeasurement } from '../../shared/oven/oven.ts';
import { noFault } from '../../shared/reasoning/candidate.ts';
import { changeOfLeads, changeOfParts, joined } from '../../shared/reasoning/candidate-change.ts';
import { countsAt, faultTable, OVER_RANGE } from '../../shared/reasoning/fault-table.ts';
import { fitted, inPosition, positionOf } from '../../shared/reasoning/position.ts';
import { predict, predictionBase, probingOf } from '../../shared/reasoning/prediction.ts';
import { singleFaults } from '../../shared/reasoning/single-faults.ts';

const faults = singleFaults(lc28);
const lines = lc28.serviceData;
const table = faultTable({
  definition: lc28,
  candidates: [noFault, ...faults.map((fault) => ({ faults: [fault], opened: [] }))],
  lines,
  seeds: [1, 2, 3],
  meter: manual2000,
});
const row = (on: string, fault: string): number =>
  1 + faults.findIndex((one) => one.on === on && one.fault === fault);
const column = (id: string): number => lines.findIndex((line) => line.id === id);

/** ms; stray capacitance behind 1e9 Ohm of an open contact creeps by some counts for minutes. */
const tenMinutes = 600_000;

/** The bench itself in the line's position, left alone until nothing moves: its circuit is integrated. */
function onTheBench(fault: AppliedFault, line: ServiceMeasurement, seed: number) {
  const setup = setupWith([fault], { seed });
  const begun = untouched(setup);
  const [red, black] = line.between;
  const state = {
    ...begun,
    isCordIn: false,
    isCoverOn: false,
    oven: inPosition({ ...begun.oven, isDoorClosed: false }, positionOf(line)),
    meter: { ...begun.meter, setting: line.setting },
    probes: { red, black },
  };
  const view = meterAt(setup, state, tenMinutes)!;
  return { view, readingNumber: Math.floor(tenMinutes / readingPeriod) };
}

function predicted(
  fault: AppliedFault,
  line: ServiceMeasurement,
  seed: number,
  readingNumber: number,
) {
  const oven = drawOven(lc28, seed);
  const whole = fitted(lc28, noFault);
  const state = inPosition(fitted(lc28, { faults: [fault], opened: [] }), positionOf(line));
  const change = joined(changeOfParts(oven, whole, state), changeOfLeads(lc28, whole, state));
  const base = predictionBase(oven, whole, manual2000, drawMeter(manual2000, seed));
  const probing = probingOf(manual2000, line.between, line.setting);
  return predict(base, change, () => state, [probing], readingNumber)[0]!;
}

describe('the fault table', () => {
  it('shows what the bench shows when nothing moves any more, for 120 drawn triples', () => {
    for (let turn = 0; turn < 120; turn += 1) {
      const pick = (what: string, of: number) => Math.floor(of * seededUniform(turn, what));
      const fault = faults[pick('fault', faults.length)]!;
      const line = lines[turn % lines.length]!;
      const seed = 1 + pick('oven', 25);
      const { view, readingNumber } = onTheBench(fault, line, seed);
      const ours = predicted(fault, line, seed, readingNumber);
      const what = `${fault.on} ${fault.fault}, ${line.id}, oven ${seed}`;
      expect(view.isSettled, what).toBe(true);
      expect(ours.isOverRange, what).toBe(view.reading.isOverRange);
      const apart = Math.abs((ours.counts ?? 0) - (view.reading.counts ?? 0));
      expect(apart, `${what}: ${ours.display} and ${view.reading.display}`).toBeLessThanOrEqual(1);
    }
  }, 120_000);

  it('shows for every part fault what its own circuit solved whole shows', () => {
    const oven = drawOven(lc28, 2);
    const unit = drawMeter(manual2000, 2);
    faults
      .filter(({ on }) => !on.startsWith('W'))
      .forEach((fault) => {
        const at = faults.indexOf(fault);
        const line = lines[(at * 5) % lines.length]!;
        const state = inPosition(fitted(lc28, { faults: [fault], opened: [] }), positionOf(line));
        const base = predictionBase(oven, state, manual2000, unit);
        const probing = probingOf(manual2000, line.between, line.setting);
        const [whole] = predict(base, null, () => state, [probing]);
        const cell = countsAt(table, 1 + at, lines.indexOf(line), 1);
        expect(cell, `${fault.on} ${fault.fault}, ${line.id}`).toBe(whole!.counts ?? OVER_RANGE);
      });
  });

  it('knows the trade: a blown fuse is open, a shorted diode a short, shorted turns nothing', () => {
    const fuse = countsAt(table, row('F1', 'open'), column('fuse'), 0);
    const diode = countsAt(table, row('D1', 'shorted'), column('diode-reverse'), 0);
    expect(fuse).toBe(OVER_RANGE);
    // 2000 MOhm range with its own 10 MOhm in the display
    expect(Math.abs(diode - 10)).toBeLessThanOrEqual(3);
    lines.forEach((line, at) => {
      // 3.2 % of the turns shorted are 3.2 % of the winding's resistance, and nothing anywhere else
      const good = countsAt(table, 0, at, 0);
      const apart = Math.abs(countsAt(table, row('T1', 'shorted-turns'), at, 0) - good);
      expect(apart, line.id).toBeLessThanOrEqual(line.id === 'hv-winding' ? 0.04 * good : 0);
    });
  });

  it('has every fault of every part and lead once', () => {
    const keys = faults.map(({ on, fault }) => `${on} ${fault}`);
    expect(new Set(keys).size).toBe(keys.length);
    expect(keys).toContain('V1 cracked-magnet');
    expect(keys).toContain('W12 off-a');
    expect(keys.length).toBeGreaterThanOrEqual(60);
  });
});
