import { spawn } from 'node:child_process';
import type { ChildProcess } from 'node:child_process';
import { randomUUID } from 'node:crypto';
import { once } from 'node:events';
import pg from 'pg';

/** The built server on a database of its own, seeded with the demo. */
export interface E2eServer {
  url: string;
  /** the server's own database, to break its connections on purpose */ databaseUrl: string;
  database: string;
  admin: pg.Client;
  stop: () => Promise<void>;
}

const required = (name: string): string => {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is not set: run the e2e tests through npm test -- e2e`);
  return value;
};

/** Starts the build; rejects with the server's own last words when it does not come up within 60 s. */
export async function startServer(): Promise<E2eServer> {
  const adminUrl = required('TEST_DATABASE_URL');
  const port = required('COLDBENCH_E2E_PORT');
  const database = `e2e_${randomUUID().replaceAll('-', '')}`;
  const admin = new pg.Client({ connectionString: adminUrl });
  admin.on('error', () => undefined);
  await admin.connect();
  await admin.query(`CREATE DATABASE ${database}`);
  const databaseUrl = Object.assign(new URL(adminUrl), { pathname: `/${database}` }).href;
  const child = spawn(
    process.execPath,
    ['--enable-source-maps', required('COLDBENCH_E2E_SERVER')],
    {
      env: {
        PATH: process.env['PATH'],
        DATABASE_URL: databaseUrl,
        PORT: port,
        HOST: '127.0.0.1',
        NODE_ENV: 'production',
        COLDBENCH_SEED: 'demo',
        LOG_LEVEL: 'warn',
      },
      stdio: ['ignore', 'pipe', 'pipe'],
    },
  );
  const said: string[] = [];
  for (const stream of [child.stdout, child.stderr]) {
    stream?.on('data', (chunk: Buffer) => said.push(chunk.toString()));
  }
  const url = `http://127.0.0.1:${port}`;
  await isUp(url, child, said);
  return {
    url,
    databaseUrl,
    database,
    admin,
    stop: async () => {
      const gone = once(child, 'exit');
      child.kill('SIGTERM');
      await gone;
      await admin.query(`DROP DATABASE IF EXISTS ${database} WITH (FORCE)`);
      await admin.end();
    },
  };
}

async function isUp(url: string, child: ChildProcess, said: readonly string[]): Promise<void> {
  const until = Date.now() + 60_000;
  while (Date.now() < until && child.exitCode === null) {
    const answer = await fetch(`${url}/api/health`).catch(() => null);
    if (answer?.ok) return;
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
  child.kill('SIGKILL');
  throw new Error(`the server did not come up: ${said.join('').slice(-2000)}`);
}
