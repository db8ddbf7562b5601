import { describe, expect, it } from 'vitest';
import { handsOn, opened, setupWith } from '../../support/bench.ts';

describe('a spare of another size', () => {
  it('is refused when there is none of that size', () => {
    const hands = opened(handsOn(setupWith()));
    expect(hands.isRefused('ReplacePart', { part: 'F1', size: 17 })).toBe('no-such-size');
    expect(hands.isRefused('ReplacePart', { part: 'D1', size: 1 })).toBe('no-such-size');
  });

  it('of the oven’s own size is no fault', () => {
    const hands = opened(handsOn(setupWith([{ on: 'F1', fault: 'open' }])));
    hands.does('ReplacePart', { part: 'F1', size: 20 });
    expect(hands.state().oven.faults).toEqual([]);
  });

  it('holds what the right fuse would not: 30 A with a shorted capacitor', () => {
    const blown = (size: number) => {
      const hands = opened(handsOn(setupWith([{ on: 'C1', fault: 'shorted' }])));
      hands.does('ReplacePart', { part: 'F1', size });
      hands.does('FitCover', {});
      hands.does('PlugCord', {});
      const [run] = hands.does('RunOven', { ordered: 10 }, 10);
      return run?.data['opened'];
    };
    expect(blown(20)).toEqual(['F1']);
    expect(blown(30)).toEqual([]);
    expect(blown(8)).toEqual(['F1']);
  });

  it('of a capacitor changes the heat: 0.7 instead of 0.95 µF', () => {
    const power = (size: number): number => {
      const hands = opened(handsOn(setupWith()));
      for (const end of ['W23/b', 'W24/a', 'W27/a']) hands.does('LiftLead', { end });
      hands.does('ReplacePart', { part: 'C1', size });
      for (const [end, terminal] of [
        ['W23/b', 'C1.1'],
        ['W24/a', 'C1.2'],
        ['W27/a', 'C1.2'],
      ] as const)
        hands.does('RefitLead', { end, terminal });
      hands.does('FitCover', {});
      hands.does('PlugCord', {});
      return Number(hands.does('RunOven', { ordered: 30 }, 30)[0]?.data['microwavePower']);
    };
    expect(power(0.7e-6)).toBeLessThan(0.9 * power(0.95e-6));
  });
});
