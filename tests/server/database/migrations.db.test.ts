import { afterAll, beforeAll, expect, test } from 'vitest';
import { makeDatabase, type Database } from '../../../server/database/data-source.ts';
import { openDatabase } from '../../../server/database/open-database.ts';
import { createDatabase, silent, type TestDatabase } from '../../support/database.ts';

let raw: TestDatabase;
let database: Database;

beforeAll(async () => {
  raw = await createDatabase();
  database = makeDatabase(raw.url, silent);
  await openDatabase(database, silent);
});

afterAll(async () => {
  await database?.destroy();
  await raw?.drop();
});

test('after migrating, the entities and the schema say the same', async () => {
  const { upQueries } = await database.driver.createSchemaBuilder().log();
  expect(upQueries.map(({ query }) => query)).toEqual([]);
});

test('every instant is stored with its time zone, every id is a uuid or a hash', async () => {
  const columns = await raw.sql(
    `SELECT table_name || '.' || column_name AS name, data_type AS type
       FROM information_schema.columns
      WHERE table_schema = 'public' AND table_name <> 'migration'`,
  );
  const typesOf = (ending: RegExp) =>
    new Set(columns.filter(({ name }) => ending.test(String(name))).map(({ type }) => type));
  expect(typesOf(/_at$/)).toEqual(new Set(['timestamp with time zone']));
  expect(typesOf(/_id$/)).toEqual(new Set(['uuid']));
  expect(typesOf(/^session\.id$|_token_hash$/)).toEqual(new Set(['character']));
});

test('the migration can be undone and done again', async () => {
  await database.undoLastMigration({ transaction: 'all' });
  const tables = await raw.sql(`SELECT table_name FROM information_schema.tables
    WHERE table_schema = 'public'`);
  expect(tables).toEqual([{ table_name: 'migration' }]);
  const done = await database.runMigrations();
  expect(done).toHaveLength(1);
});

test('two addresses that differ in case alone cannot both have an account', async () => {
  const insert = (email: string) =>
    raw.sql(
      `INSERT INTO person (id, email, name, password_hash, created_at)
      VALUES (gen_random_uuid(), $1, 'x', 'x', now())`,
      [email],
    );
  await insert('a@b.example');
  await expect(insert('A@b.example')).rejects.toMatchObject({ constraint: 'person_email_lower' });
  await expect(insert('a@b.example')).rejects.toMatchObject({ constraint: 'person_email_key' });
});
