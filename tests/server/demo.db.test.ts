import { readdir } from 'node:fs/promises';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { Passwords } from '../../server/accounts/passwords.ts';
import { makeDatabase, type Database } from '../../server/database/data-source.ts';
import { openDatabase } from '../../server/database/open-database.ts';
import { readDemoAccounts } from '../../server/demo/demo-accounts.ts';
import { prepare } from '../../server/prepare.ts';
import { makeStores, type Stores } from '../../server/stores.ts';
import { createDatabase, silent, type TestDatabase } from '../support/database.ts';
import { root } from '../support/server-content.ts';

let raw: TestDatabase;
let database: Database;
let stores: Stores;
const passwords = new Passwords();

beforeAll(async () => {
  raw = await createDatabase();
  database = makeDatabase(raw.url, silent);
  await openDatabase(database, silent);
  stores = makeStores(database);
});

afterAll(async () => {
  await database?.destroy();
  await raw?.drop();
});

const start = (isSeeded: boolean) =>
  prepare({ root, isSeeded, stores, passwords, clock: () => new Date(), log: silent });

const rows = async (sql: string) => (await raw.sql(sql)).map((row) => Object.values(row));
const organisations = () =>
  rows(`SELECT organisation.name, is_practice,
               (SELECT count(*)::integer FROM scenario_version
                  JOIN scenario ON scenario.id = scenario_id
                 WHERE organisation_id = organisation.id) AS versions,
               (SELECT count(*)::integer FROM membership
                 WHERE organisation_id = organisation.id) AS people
          FROM organisation ORDER BY is_practice DESC`);

test('without the demonstration there are the practice jobs and nobody', async () => {
  await start(false);
  const [[name, isPractice, versions, people] = []] = await organisations();
  expect([name, isPractice, people]).toEqual(['Coldbench practice', true, 0]);
  expect(versions).toBeGreaterThanOrEqual(3);
});

test('with it there is a school with its people and its own copies of the jobs', async () => {
  await start(true);
  const [[, , versions] = [], school] = await organisations();
  expect(school).toEqual(['Northgate Trade School', false, versions, 5]);
  const { password, accounts } = await readDemoAccounts(root);
  for (const { email, role } of accounts) {
    const account = await stores.accounts.findByEmail(email);
    expect(await passwords.fits(password, account?.passwordHash ?? null)).toBe(true);
    expect(await stores.accounts.membershipsOf(account?.id ?? '')).toMatchObject([{ role }]);
  }
});

test('a second start changes nothing', async () => {
  const all = () => rows('SELECT id, draft, updated_at FROM scenario ORDER BY id');
  const before = [await organisations(), await all()];
  await start(true);
  expect([await organisations(), await all()]).toEqual(before);
});

test('a start that was broken off is gone on with', async () => {
  const other = await createDatabase();
  const its = makeDatabase(other.url, silent);
  await openDatabase(its, silent);
  const whole = makeStores(its);
  let made = 0;
  const create: Stores['attempts']['create'] = (attempt) => {
    made += 1;
    return made === 2
      ? Promise.reject(new Error('the power went'))
      : whole.attempts.create(attempt);
  };
  const attempts = Object.create(whole.attempts, {
    create: { value: create },
  }) as Stores['attempts'];
  const options = { root, isSeeded: true, passwords, clock: () => new Date(), log: silent };
  await expect(prepare({ ...options, stores: { ...whole, attempts } })).rejects.toThrow('power');
  await prepare({ ...options, stores: whole });
  const counted = await other.sql(
    'SELECT count(*)::integer AS n, count(handed_in_at)::integer AS done FROM attempt',
  );
  const recorded = (await readdir(join(root, 'scenarios', 'recordings'))).length;
  expect(counted).toEqual([{ n: recorded, done: recorded }]);
  await its.destroy();
  await other.drop();
});
