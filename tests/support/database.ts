import { randomUUID } from 'node:crypto';
import pg from 'pg';
import { pino } from 'pino';

export const silent = pino({ level: 'silent' });

export interface TestDatabase {
  url: string;
  name: string;
  /** runs SQL as the administrator of the cluster, in this database */
  sql: (text: string, values?: unknown[]) => Promise<Record<string, unknown>[]>;
  drop: () => Promise<void>;
}

function adminUrl(): string {
  const url = process.env['TEST_DATABASE_URL'];
  if (!url) throw new Error('TEST_DATABASE_URL is not set: run these tests through npm test -- db');
  return url;
}

async function run(url: string, text: string, values: unknown[] = []) {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    const { rows } = await client.query<Record<string, unknown>>(text, values);
    return rows;
  } finally {
    await client.end();
  }
}

/** An empty database of this test file's own. */
export async function createDatabase(): Promise<TestDatabase> {
  const admin = adminUrl();
  const name = `db_${randomUUID().replaceAll('-', '')}`;
  await run(admin, `CREATE DATABASE ${name}`);
  const url = Object.assign(new URL(admin), { pathname: `/${name}` }).href;
  return {
    url,
    name,
    sql: (text, values) => run(url, text, values),
    drop: async () => {
      await run(admin, `DROP DATABASE IF EXISTS ${name} WITH (FORCE)`);
    },
  };
}
