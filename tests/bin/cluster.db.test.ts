import { chmodSync, mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createChildren } from '../../server/bin/lib/children.mjs';
import { prepareDataFolder } from '../../server/bin/lib/data-folder.mjs';
import { startPrivateDatabase } from '../../server/bin/lib/private-database.mjs';
import { identify } from '../../server/bin/lib/processes.mjs';

const parent = mkdtempSync(join(tmpdir(), 'coldbench-cluster-'));
const data = join(parent, 'data');

const start = (children: ReturnType<typeof createChildren>) =>
  startPrivateDatabase(children, { data, name: 'postgres', database: 'bench', isLasting: true });

async function ask(url: string, statement: string): Promise<unknown[]> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  const { rows } = await client.query({ text: statement, rowMode: 'array' });
  await client.end();
  return rows.flat();
}

/** Runs the cluster for as long as the task takes. */
async function whileRunning<T>(
  task: (database: Awaited<ReturnType<typeof start>>) => Promise<T>,
): Promise<T> {
  const children = createChildren();
  try {
    return await task(await start(children));
  } finally {
    await children.stop();
  }
}

describe('a private cluster', () => {
  beforeAll(() => {
    // Root's PostgreSQL runs as another user, who must be able to pass through.
    chmodSync(parent, 0o711);
    prepareDataFolder(data);
  });
  afterAll(() => rmSync(parent, { recursive: true, force: true }));

  it('answers on the loopback address alone, with a password, and writes to the disk', async () => {
    await whileRunning(async ({ url }) => {
      expect(new URL(url).hostname).toBe('127.0.0.1');
      expect(await ask(url, 'SHOW listen_addresses')).toEqual(['127.0.0.1']);
      expect(await ask(url, 'SHOW unix_socket_directories')).toEqual(['']);
      expect(await ask(url, 'SHOW fsync')).toEqual(['on']);
      expect(await ask(url, 'SELECT current_database()')).toEqual(['bench']);
      const wrong = Object.assign(new URL(url), { password: 'wrong' }).href;
      await expect(ask(wrong, 'SELECT 1')).rejects.toMatchObject({ code: '28P01' });
    });
  });

  it('keeps its password and its data from one start to the next', async () => {
    await whileRunning(({ url }) => ask(url, 'CREATE TABLE kept AS SELECT 42 AS number'));
    await whileRunning(async ({ url, folder }) => {
      expect(await ask(url, 'SELECT number FROM kept')).toEqual([42]);
      const file = join(folder, 'password');
      expect(readFileSync(file, 'utf8')).toBe(new URL(url).password);
      expect(statSync(file).mode & 0o777).toBe(0o600);
    });
  });

  it('leaves no process when it is stopped', async () => {
    const pid = await whileRunning(async ({ postmaster }) => postmaster.pid);
    expect(identify(pid)).toBeNull();
  });

  it('starts over the record of a crash, even when its number is in use again', async () => {
    const folder = await whileRunning(async (database) => database.folder);
    writeFileSync(join(folder, 'cluster', 'postmaster.pid'), `${process.pid}\n/gone\n0\n`);
    expect(await whileRunning(({ url }) => ask(url, 'SELECT 1'))).toEqual([1]);
  });

  it('is not started twice', async () => {
    await whileRunning(async ({ postmaster }) => {
      await expect(whileRunning(async () => null)).rejects.toThrow(
        `process ${postmaster.pid}), and this start did not begin it`,
      );
    });
  });
});
