import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { poweredRun, standing } from '../../../shared/bench/powered-run/powered-run.ts';
import { makeSetup } from '../../../shared/bench/setup.ts';
import { asFitted } from '../../../shared/oven/initial-state.ts';
import { ovenDefinition } from '../../../shared/oven/oven.ts';
import { scenarioContent } from '../../../shared/scenario/scenario.ts';

const read = (path: string): unknown => JSON.parse(readFileSync(`scenarios/${path}`, 'utf8'));

/** A job's oven as drawn for seed 21, run as the customer and the colleague at site ran it. */
function onSite(job: string) {
  const content = scenarioContent.parse(read(`jobs/${job}.json`));
  const definition = ovenDefinition.parse(read(`ovens/${content.oven}.json`));
  const { oven } = makeSetup({ ...content, definition, seed: 21 });
  const state = asFitted(definition, content.faults);
  return { oven, state, run: (seconds: number) => poweredRun(oven, state, seconds) };
}

const heatsWell = { isDisplayLit: true, isLampLit: true, hum: 'normal', opened: [] } as const;

// What each ticket says was seen, against what the circuit does with the job's faults.
describe('tickets of the over-the-range oven', () => {
  it('vent on high only: heats, lamp lit, vent still on low', () => {
    const outcome = onSite('vent-only-on-high').run(60);
    expect(outcome).toMatchObject({
      ...heatsWell,
      hood: { isVentTurningLow: false, isVentTurningHigh: true, isLampLit: true },
    });
    expect(outcome.waterRise).toBeGreaterThan(8);
  }, 30_000);

  it('start does nothing: display lit, nothing else, but the hood answers', () => {
    expect(onSite('start-key-does-nothing').run(10)).toMatchObject({
      isDisplayLit: true,
      isLampLit: false,
      isFanTurning: false,
      hum: 'none',
      hood: { isVentTurningLow: true, isVentTurningHigh: true, isLampLit: true },
    });
  }, 30_000);

  it('fan still: stops after two to three minutes, display and turntable go on, vent strong', () => {
    const outcome = onSite('stops-after-minutes-fan-still').run(240);
    expect(outcome).toMatchObject({
      isDisplayLit: true,
      isFanTurning: false,
      isTurntableTurning: true,
      hum: 'none',
      atFirst: { hum: 'normal' },
      hood: { isVentTurningHigh: true },
    });
    expect(outcome.atFirst?.seconds).toBeGreaterThan(120);
    expect(outcome.atFirst?.seconds).toBeLessThan(190);
  }, 30_000);

  it('after frying: dead with the door open and closed', () => {
    const { oven, state, run } = onSite('dead-after-frying');
    expect(run(10)).toMatchObject({ isDisplayLit: false, isLampLit: false, hum: 'none' });
    expect(standing(oven, { ...state, isDoorClosed: false })).toEqual({ isDisplayLit: false });
  }, 30_000);

  it('fuse at the door: dead now; with a new fuse it heats, until the door opens', () => {
    const { oven, state, run } = onSite('fuse-goes-at-the-door');
    expect(run(10)).toMatchObject({ isDisplayLit: false });
    const fused = { ...state, faults: state.faults.filter(({ on }) => on !== 'F1') };
    expect(poweredRun(oven, fused, 60)).toMatchObject(heatsWell);
    expect(standing(oven, { ...fused, isDoorClosed: false })).toMatchObject({ opened: ['F1'] });
  }, 30_000);

  it('before letting, and lukewarm: nothing to see; a litre rises by 10 K in a minute', () => {
    for (const job of ['check-before-letting', 'lukewarm-since-the-holidays']) {
      const { oven, state, run } = onSite(job);
      const outcome = run(62);
      expect(outcome).toMatchObject({
        ...heatsWell,
        isFanTurning: true,
        isTurntableTurning: true,
        hood: { isVentTurningLow: true, isVentTurningHigh: true, isLampLit: true },
      });
      expect(Math.abs(outcome.waterRise - 10)).toBeLessThan(1);
      expect(standing(oven, { ...state, isDoorClosed: false })).toEqual({ isDisplayLit: true });
    }
  }, 30_000);

  it('fan turns: stops after about two minutes, back about a minute later, air all the time', () => {
    const outcome = onSite('stops-after-minutes-fan-turns').run(240);
    expect(outcome).toMatchObject({ isDisplayLit: true, isFanTurning: true });
    const [stop, back] = outcome.heat?.moves ?? [];
    expect(stop).toMatchObject({ part: 'F2', isOpen: true });
    expect(stop?.after).toBeGreaterThan(90);
    expect(stop?.after).toBeLessThan(150);
    expect((back?.after ?? 0) - (stop?.after ?? 0)).toBeGreaterThan(40);
    expect((back?.after ?? 0) - (stop?.after ?? 0)).toBeLessThan(90);
  }, 30_000);
});
