import { afterEach, expect, test, vi } from 'vitest';
import type * as argon2 from '@node-rs/argon2';
import { Passwords } from '../../../server/accounts/passwords.ts';

// The real argon2, counted: how many hashes run at once cannot be seen from outside.
const running = vi.hoisted(() => ({ now: 0, most: 0, verified: [] as string[] }));

vi.mock('@node-rs/argon2', async (original) => {
  const real = await original<typeof argon2>();
  const counted = async <T>(work: () => Promise<T>): Promise<T> => {
    running.now += 1;
    running.most = Math.max(running.most, running.now);
    try {
      return await work();
    } finally {
      running.now -= 1;
    }
  };
  return {
    ...real,
    hash: (...args: Parameters<typeof real.hash>) => counted(() => real.hash(...args)),
    verify: (...args: Parameters<typeof real.verify>) => {
      running.verified.push(String(args[0]));
      return counted(() => real.verify(...args));
    },
  };
});

afterEach(() => {
  Object.assign(running, { now: 0, most: 0, verified: [] });
});

test('a password fits its own hash and no other does', async () => {
  const passwords = new Passwords();
  const hash = await passwords.hash('a long enough password');
  expect(await passwords.fits('a long enough password', hash)).toBe(true);
  expect(await passwords.fits('a long enough passwort', hash)).toBe(false);
});

test('two spellings of one letter are one password', async () => {
  const passwords = new Passwords();
  const hash = await passwords.hash('Schl\u00fcssel am Haken');
  expect(await passwords.fits('Schlu\u0308ssel am Haken', hash)).toBe(true);
});

test('with nobody known a real hash is checked all the same, and never fits', async () => {
  const passwords = new Passwords();
  expect(await passwords.fits('nobody has this password', null)).toBe(false);
  expect(running.verified).toEqual([expect.stringMatching(/^\$argon2id\$v=19\$m=47104,t=1,p=1\$/)]);
});

test('at most two are computed at once, and all get their turn', async () => {
  const passwords = new Passwords();
  const hash = await passwords.hash('a long enough password');
  const all = await Promise.all(
    Array.from({ length: 8 }, (_, index) => passwords.fits(`password ${index}`, hash)),
  );
  expect(all).toEqual(Array(8).fill(false));
  expect(running.most).toBe(2);
});

test('a hash that cannot be read fails without taking a place for ever', async () => {
  const passwords = new Passwords();
  const broken = Array.from({ length: 4 }, () => passwords.fits('a password', 'no hash'));
  const settled = await Promise.allSettled(broken);
  expect(settled.map(({ status }) => status)).toEqual(Array(4).fill('rejected'));
  expect(await passwords.hash('still works here')).toContain('argon2id');
});
