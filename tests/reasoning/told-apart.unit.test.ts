import { describe, expect, it } from 'vitest';
import { manual2000 } from '../../shared/instruments/manual-2000.ts';
import { auto6000 } from '../../shared/instruments/auto-6000.ts';
import { weighedCandidates } from '../../shared/reasoning/candidates.ts';
import { settingOn } from '../../shared/reasoning/study.ts';
import { toldApart } from '../../shared/reasoning/told-apart.ts';
import { lc28 } from '../support/bench.ts';

describe('candidates of the first oven', () => {
  const weighed = weighedCandidates(lc28);

  it('are no fault, every single one and the likeliest pairs, all together 1', () => {
    expect(weighed.reduce((sum, { prior }) => sum + prior, 0)).toBeCloseTo(1, 9);
    expect(weighed[0]).toEqual({ candidate: { faults: [], opened: [] }, prior: 0.03 });
    const sizes = weighed.map(({ candidate }) => candidate.faults.length);
    expect(sizes.filter((size) => size === 2)).toHaveLength(20);
    for (const { candidate } of weighed)
      expect(new Set(candidate.faults.map(({ on }) => on)).size).toBe(candidate.faults.length);
  });
});

describe('what can be told apart in the first oven', () => {
  const found = toldApart(lc28, manual2000, [{ on: 'C1', fault: 'shorted' }]);

  it('finds a shorted capacitor by its terminals, every step leaving no more than before', () => {
    expect(found.isFound).toBe(true);
    expect(found.route.at(-1)?.label).toMatch(/^Capacitor/);
    const left = found.route.map((step) => step.left);
    expect(left).toEqual([...left].sort((p, q) => q - p));
    expect(found.seconds).toBeCloseTo(
      found.makeSafeSeconds + found.route.reduce((sum, { seconds }) => sum + seconds, 0),
      9,
    );
  });

  it('says that a worn magnetron cannot be told from a seized fan or a cracked magnet cold', () => {
    const { alike } = toldApart(lc28, manual2000, [{ on: 'V1', fault: 'weak' }]);
    const names = alike.map((faults) => faults.map(({ on, fault }) => `${on} ${fault}`).join('+'));
    expect(names).toContain('V1 cracked-magnet');
    expect(names).toContain('M1 seized');
    expect(names).not.toContain('D1 open');
    expect(names).not.toContain('V1 weak');
  });
}, 120_000);

describe('service data on another meter', () => {
  it('takes the next range above, and none where there is none', () => {
    expect(settingOn(manual2000, 'ohms-2000M')).toBe('ohms-2000M');
    expect(settingOn(auto6000, 'ohms-200')).toBe('ohms-600');
    expect(settingOn(auto6000, 'ohms-20M')).toBe('ohms-60M');
    expect(settingOn(auto6000, 'beep')).toBe('beep');
    expect(settingOn(auto6000, 'ohms-2000M')).toBeNull();
  });
});
