import { describe, expect, it } from 'vitest';
import { readNumber } from '../../../shared/engine/deck/read-number.ts';

const value = (text: string): number => {
  const read = readNumber(text);
  if (!read.ok) throw new Error(read.failure);
  return read.value;
};

describe('a number in deck notation', () => {
  it.each([
    ['1', 1],
    ['-1.5', -1.5],
    ['+.5', 0.5],
    ['3.', 3],
    ['1e-7', 1e-7],
    ['2E3', 2000],
    ['1t', 1e12],
    ['1g', 1e9],
    ['10meg', 1e7],
    ['10MEG', 1e7],
    ['4.7k', 4700],
    ['1m', 1e-3],
    ['1M', 1e-3],
    ['2.2u', 2.2e-6],
    ['33n', 33e-9],
    ['47p', 47e-12],
    ['1f', 1e-15],
    ['1e3k', 1e6],
  ])('%s is %d', (text, expected) => {
    expect(value(text)).toBe(expected);
  });

  it.each([
    ['10kOhm', 1e4],
    ['2.2uF', 2.2e-6],
    ['10megohms', 1e7],
    ['5V', 5],
    ['60Hz', 60],
    ['100ohm', 100],
    ['1A', 1],
    ['20ms', 0.02],
    ['1F', 1e-15],
  ])('%s is %d: letters after the suffix, or a unit, count for nothing', (text, expected) => {
    expect(value(text)).toBe(expected);
  });

  it.each(['10q', '1x', '10mil', '1e', '5z'])('%s has an unknown suffix', (text) => {
    const read = readNumber(text);
    expect(read).toMatchObject({ ok: false, failure: expect.stringContaining('unknown suffix') });
  });

  it.each(['', 'k', '1k5', '1..2', '--1', '1,5', '4.7%', '0x10', 'nan', '1 k', '1µ'])(
    '"%s" is no number',
    (text) => {
      expect(readNumber(text)).toMatchObject({
        ok: false,
        failure: expect.stringContaining('is not a number'),
      });
    },
  );

  it('refuses what no double can hold', () => {
    expect(readNumber('1e999')).toMatchObject({ ok: false });
    expect(readNumber('1e300t')).toMatchObject({ ok: false });
    expect(value('1e-999')).toBe(0);
  });

  it('shows a long or binary word short and printable', () => {
    const read = readNumber('\u0001'.repeat(500));
    if (read.ok) expect.fail('read a number');
    expect(read.failure.length).toBeLessThan(80);
    expect(read.failure).toMatch(/^[\x20-\x7e…]*$/);
  });
});
