import { describe, expect, it } from 'vitest';
import { checkFaults, faultsOf } from '../../shared/oven/check-faults.ts';
import { asFitted } from '../../shared/oven/initial-state.ts';
import { lc28 } from './lc-28.ts';

const seats = (...faults: Parameters<typeof asFitted>[1]) => asFitted(lc28, faults).leadEnds;
const ids = (ref: string) => (faultsOf(lc28, ref) ?? []).map(({ id }) => id);

describe('leads that an earlier repair misplaced', () => {
  it('sit on the tab beside their own, or on the one the fault names', () => {
    expect(seats({ on: 'W15', fault: 'wrong-terminal-a' })['W15/a']).toBe('S3.COM');
    expect(seats({ on: 'W13', fault: 'wrong-terminal-a', other: 'S2.NO' })['W13/a']).toBe('S2.NO');
  });

  it('are exchanged with another lead of the same part, or with the one the fault names', () => {
    const swapped = seats({ on: 'W11', fault: 'swapped-b' });
    expect([swapped['W11/b'], swapped['W12/a']]).toEqual(['T1.2', 'T1.1']);
    const named = seats({ on: 'W14', fault: 'swapped-b', other: 'W15/a' });
    expect([named['W14/b'], named['W15/a']]).toEqual(['S3.NC', 'S3.COM']);
  });

  it('leave every other lead where it belongs', () => {
    const home = seats();
    const swapped = seats({ on: 'W11', fault: 'swapped-b' });
    const moved = Object.keys(home).filter((end) => home[end] !== swapped[end]);
    expect(moved.sort()).toEqual(['W11/b', 'W12/a']);
  });

  it('cannot be misplaced on a moulded plug or the chassis, nor exchanged on a part of two tabs', () => {
    expect(ids('W3')).not.toContain('wrong-terminal-a');
    expect(ids('W3')).not.toContain('wrong-terminal-b');
    expect(ids('W7')).not.toContain('swapped-b');
    expect(ids('W7')).toContain('wrong-terminal-b');
    expect(ids('W11')).toContain('swapped-b');
  });

  it('are refused when they name what the oven does not have', () => {
    const problems = checkFaults(lc28, [
      { on: 'W11', fault: 'swapped-b', other: 'W99/a' },
      { on: 'W15', fault: 'wrong-terminal-a', other: 'S3.NO' },
      { on: 'F1', fault: 'open', other: 'S3.NC' },
    ]);
    expect(problems.map(({ path, message }) => `${path}: ${message}`)).toEqual([
      'faults.0.other: unknown lead end W99/a; did you mean W9/a?',
      'faults.1.other: unknown terminal S3.NO; did you mean S3.NC?',
      'faults.2.other: open has no other S3.NC',
    ]);
  });
});
