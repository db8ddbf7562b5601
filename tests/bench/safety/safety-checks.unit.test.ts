import { describe, expect, it } from 'vitest';
import { openSlowly } from '../../../shared/bench/safety/interlocks.ts';
import { doorPlaces, leakageAround } from '../../../shared/bench/safety/leakage.ts';
import { checkFromPlug } from '../../../shared/bench/safety/earth-and-insulation.ts';
import type { AppliedFault } from '../../../shared/oven/fault.ts';
import { asFitted } from '../../../shared/oven/initial-state.ts';
import { handsOn, lc28, setupWith } from '../../support/bench.ts';

const { oven } = setupWith();
const fitted = (...faults: AppliedFault[]) => asFitted(lc28, faults);

describe('leakage around the door', () => {
  it('stays under 1 mW/cm² at 800 W while the door is sound, in 50 drawn ovens (21 CFR 1030.10(c), second hand)', () => {
    for (let seed = 1; seed <= 50; seed += 1) {
      const drawn = setupWith([], { seed }).oven;
      for (const place of doorPlaces) {
        const leak = leakageAround(drawn, fitted(), 800)[place];
        expect(leak).toBeGreaterThan(0);
        expect(leak).toBeLessThan(1);
      }
    }
  });

  it('passes 5 mW/cm² where a hinge is bent, and only there', () => {
    const leak = leakageAround(oven, fitted({ on: 'CH', fault: 'door-hinge-bent' }), 800);
    expect(leak['hinge side']).toBeGreaterThan(5);
    expect(leak['handle side']).toBeLessThan(1);
  });

  it('is nothing where nothing is radiated', () => {
    expect(leakageAround(oven, fitted({ on: 'CH', fault: 'door-seal-burnt' }), 0).window).toBe(0);
  });
});

describe('the door of a running oven opened slowly', () => {
  it('stops at the first switch and blows nothing when the chain is sound', () => {
    expect(openSlowly(oven, fitted())).toEqual({
      wasRunning: true,
      switches: 2,
      stoppedAt: 1,
      opened: [],
    });
  });

  it('stops at the second when the first is welded, and the monitor then blows the fuse', () => {
    const welded = openSlowly(oven, fitted({ on: 'S1', fault: 'welded' }));
    expect(welded).toMatchObject({ stoppedAt: 2, opened: ['F1'] });
  });

  it('tells nothing while the oven does not heat', () => {
    const opened = openSlowly(oven, fitted({ on: 'T1', fault: 'primary-open' }));
    expect(opened).toMatchObject({ wasRunning: false, stoppedAt: null });
  });
});

describe('earth and insulation from the plug', () => {
  it('finds a good bond and no leakage in a sound oven', () => {
    const { earth, insulation } = checkFromPlug(oven, fitted());
    expect(earth).toBeGreaterThan(0.02);
    expect(earth).toBeLessThan(0.1);
    expect(insulation === null || insulation > 100e6).toBe(true);
  });

  it('finds an earth that is open', () => {
    const { ref } = lc28.leads.find(({ insulation }) => insulation === 'green') ?? { ref: '' };
    const off = checkFromPlug(oven, fitted({ on: ref, fault: 'open-inside' }));
    expect(off.earth).toBeNull();
  });

  it('finds a primary that leaks to the core', () => {
    const { insulation } = checkFromPlug(
      oven,
      fitted({ on: 'T1', fault: 'primary-leaky-to-core', values: { ohms: 5e5 } }),
    );
    expect(insulation).toBeGreaterThan(3e5);
    expect(insulation).toBeLessThan(1e6);
  });
});

describe('safety checks on the bench', () => {
  it('survey, opening and plug test go on record, each where it can be done', () => {
    const hands = handsOn(setupWith());
    const [survey] = hands.does('SurveyLeakage', {}, 30);
    expect(survey).toMatchObject({
      type: 'LeakageSurveyed',
      data: { run: { ordered: 30, isLampLit: true } },
    });
    expect(hands.state().runs).toHaveLength(1);
    const [checked] = hands.does('CheckInterlocks', {}, 5);
    expect(checked).toMatchObject({ data: { stoppedAt: 1, opened: [] } });
    expect(hands.state().oven.isDoorClosed).toBe(false);
    expect(hands.isRefused('SurveyLeakage', {})).toBe('door-is-open');
    expect(hands.isRefused('TestFromPlug', {})).toBe('cord-is-in');
    hands.does('PullCord', {});
    expect(hands.does('TestFromPlug', {})[0]).toMatchObject({ type: 'PlugTested' });
  });

  it('running with a door that leaks is a hazard, surveying it is not', () => {
    const hands = handsOn(setupWith([{ on: 'CH', fault: 'door-hinge-bent' }]));
    expect(hands.does('SurveyLeakage', {}, 30)).toHaveLength(1);
    expect(hands.does('RunOven', { ordered: 10 }, 10)[1]).toMatchObject({
      type: 'HazardHappened',
      data: { kind: 'microwave-leakage' },
    });
  });

  it('a bent door is repaired and then passes', () => {
    const hands = handsOn(setupWith([{ on: 'CH', fault: 'door-hinge-bent' }]));
    const worst = () => {
      const [event] = hands.does('SurveyLeakage', {}, 30);
      return Math.max(...Object.values(event?.data['readings'] as Record<string, number>));
    };
    expect(worst()).toBeGreaterThan(5);
    hands.does('PullCord', {});
    hands.does('RepairDoor', {});
    hands.does('PlugCord', {});
    expect(worst()).toBeLessThan(1);
  });

  it('a lead gets new connectors with the cord out and the cover off', () => {
    const fault = { on: 'W8', fault: 'open-inside' };
    const hands = handsOn(setupWith([fault]));
    expect(hands.isRefused('RepairLead', { lead: 'W8' })).toBe('cover-is-on');
    hands.does('PullCord', {});
    hands.does('RemoveCover', {});
    hands.does('RepairLead', { lead: 'W8' });
    expect(hands.state().oven.faults).toEqual([]);
    expect(hands.isRefused('RepairLead', { lead: 'W99' })).toBe('no-such-lead');
  });
});
