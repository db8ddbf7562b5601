import { describe, expect, it } from 'vitest';
import { majorOf } from '../../server/bin/lib/postgres-programs.mjs';

describe('the version that initdb tells', () => {
  it.each([
    ['initdb (PostgreSQL) 15.13 (Debian 15.13-0+deb12u1)\n', 15],
    ['initdb (PostgreSQL) 17.5 (Homebrew)\n', 17],
    ['initdb (PostgreSQL) 18beta1\n', 18],
    ['initdb (PostgreSQL) 9.6.24\n', 9],
    ['', null],
    ['command not found', null],
  ])('in %j is %j', (text, major) => {
    expect(majorOf(text)).toBe(major);
  });
});
