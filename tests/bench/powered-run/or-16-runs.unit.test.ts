import { describe, expect, it } from 'vitest';
import { poweredRun } from '../../../shared/bench/powered-run/powered-run.ts';
import { drawOven } from '../../../shared/oven/draw.ts';
import type { AppliedFault } from '../../../shared/oven/fault.ts';
import { asFitted } from '../../../shared/oven/initial-state.ts';
import { or16 } from '../../oven/or-16.ts';

const oven = drawOven(or16, 417);
const run = (seconds: number, ...faults: AppliedFault[]) =>
  poweredRun(oven, asFitted(or16, faults), seconds);

// ENGINE section 4, from the reference simulator: what melts a 20 A fuse and what hums.
describe('a powered run of the over-the-range oven', () => {
  it('healthy: heats a litre by 10 K in a minute, with both lamps, three motors and both vent speeds', () => {
    const outcome = run(62);
    expect(outcome).toMatchObject({
      isDisplayLit: true,
      isLampLit: true,
      isFanTurning: true,
      isTurntableTurning: true,
      hum: 'normal',
      opened: [],
      hood: { isVentTurningLow: true, isVentTurningHigh: true, isLampLit: true },
    });
    expect(Math.abs(outcome.waterRise - 10)).toBeLessThan(1.5);
  }, 30_000);

  it.each([
    ['a shorted capacitor', { on: 'C1', fault: 'shorted' }],
    [
      'a winding burnt to the core at its end',
      { on: 'T1', fault: 'hv-shorted-to-core', values: { part: 0 } },
    ],
  ])('%s melts the line fuse in seconds', (_, fault) => {
    const outcome = run(30, fault);
    expect(outcome).toMatchObject({ opened: ['F1'], hum: 'loud', waterRise: 0 });
    expect(outcome.seconds).toBeLessThan(5);
  });

  it.each([
    ['a shorted diode', { on: 'D1', fault: 'shorted' }],
    ['a shorted magnetron', { on: 'V1', fault: 'heater-shorted-to-body' }],
  ])('%s hums loudly, and the fuse holds', (_, fault) => {
    expect(run(30, fault)).toMatchObject({ opened: [], hum: 'loud', waterRise: 0, seconds: 30 });
  });

  it('an open capacitor runs quietly and leaves nothing; an open heater leaves kilovolts', () => {
    const open = run(30, { on: 'C1', fault: 'open' });
    expect(open).toMatchObject({ hum: 'quiet', waterRise: 0, charge: {} });
    const cold = run(30, { on: 'V1', fault: 'heater-open' });
    expect(cold).toMatchObject({ hum: 'quiet', waterRise: 0 });
    expect(Math.abs(cold.charge['C1:foils'] ?? 0)).toBeGreaterThan(2500);
  });

  it('a seized magnetron fan: the cut-out opens after minutes, the display stays', () => {
    const outcome = run(300, { on: 'M1', fault: 'seized' });
    expect(outcome).toMatchObject({
      isDisplayLit: true,
      isFanTurning: false,
      opened: ['F2'],
      seconds: 300,
    });
    const [move] = outcome.heat?.moves ?? [];
    expect(move?.after).toBeGreaterThan(120);
    expect(move?.after).toBeLessThan(210);
  }, 30_000);

  it('a cracked magnet: no heat in the water, all of it in the magnetron', () => {
    const outcome = run(120, { on: 'V1', fault: 'cracked-magnet' });
    expect(outcome).toMatchObject({ waterRise: 0, isFanTurning: true });
    expect(outcome.heat?.moves[0]).toMatchObject({ part: 'F2', isOpen: true });
  }, 30_000);

  it.each([
    ['open', { on: 'S4', fault: 'contact-open' }],
    ['filmed over', { on: 'S4', fault: 'film' }],
    ['out of the hook’s way', { on: 'S4', fault: 'lever-bent' }],
    ['on a board whose door line is broken', { on: 'A1', fault: 'door-line-open' }],
  ])('a door sensing switch %s: nothing starts, the hood answers', (_, fault) => {
    expect(run(10, fault)).toMatchObject({
      isDisplayLit: true,
      isLampLit: false,
      hum: 'none',
      hood: { isVentTurningLow: true, isVentTurningHigh: true },
    });
  });

  it.each([
    ['low only', { on: 'M3', fault: 'auxiliary-open' }, false, true],
    ['low only, gummed up', { on: 'M3', fault: 'greasy' }, false, true],
    ['low only, relay', { on: 'K4', fault: 'coil-open' }, false, true],
    ['high only, relay', { on: 'K3', fault: 'contact-open' }, true, false],
    ['both', { on: 'M3', fault: 'seized' }, false, false],
  ])('a vent that has lost %s', (_, fault, isVentTurningLow, isVentTurningHigh) => {
    expect(run(10, fault).hood).toMatchObject({ isVentTurningLow, isVentTurningHigh });
  });
});
