import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { request, type IncomingMessage } from 'node:http';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { afterAll, afterEach, beforeAll, expect, test, vi } from 'vitest';
import { createDatabase, type TestDatabase } from '../support/database.ts';
import { root } from '../support/server-content.ts';

/** ms: the sources are compiled at each start, on a machine that may be busy */
const patience = 180_000;
vi.setConfig({ testTimeout: patience });

let raw: TestDatabase;
let child: ChildProcess | null = null;

beforeAll(async () => {
  raw = await createDatabase();
});

afterEach(() => {
  child?.kill('SIGKILL');
});

afterAll(() => raw.drop());

interface Started {
  process: ChildProcess;
  output: () => string;
  ended: Promise<[number | null, NodeJS.Signals | null]>;
}

/** The server as its sources, in a process of its own: no wrapper stands between it and our signals. */
function start(env: Record<string, string>): Started {
  const loader = pathToFileURL(join(root, 'node_modules', 'tsx', 'dist', 'loader.mjs')).href;
  const args = ['--import', loader, join(root, 'server', 'main.ts')];
  const tsconfig = join(root, 'server', 'tsconfig.json');
  const started = spawn(process.execPath, args, {
    cwd: '/',
    env: { PATH: process.env['PATH'], TSX_TSCONFIG_PATH: tsconfig, ...env },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  child = started;
  let output = '';
  for (const stream of [started.stdout, started.stderr]) {
    stream.on('data', (chunk: Buffer) => (output += chunk.toString()));
  }
  const ended = once(started, 'exit') as Promise<[number | null, NodeJS.Signals | null]>;
  return { process: started, output: () => output, ended };
}

async function address(server: Started): Promise<string> {
  const port = () => /"port":(\d+)\},"msg":"Coldbench listens"/.exec(server.output())?.[1];
  await expect.poll(port, { timeout: patience, interval: 100 }).toBeDefined();
  return `http://127.0.0.1:${port()}`;
}

/** A request whose headers the server has read and whose body is still to come. */
async function signInHalfway(url: string): Promise<{ finish: () => Promise<number | undefined> }> {
  const body = JSON.stringify({ email: 'tom@northgate.example', password: 'cold-bench-demo' });
  const sent = request(`${url}/api/sign-in`, {
    method: 'POST',
    headers: {
      'Content-Type': 'application/json',
      'Content-Length': Buffer.byteLength(body),
      Expect: '100-continue',
    },
  });
  sent.flushHeaders();
  await once(sent, 'continue');
  return {
    finish: async () => {
      sent.end(body);
      const [response] = (await once(sent, 'response')) as [IncomingMessage];
      response.resume();
      return response.statusCode;
    },
  };
}

const usual = () => ({ DATABASE_URL: raw.url, PORT: '0', NODE_ENV: 'production' });

test('it starts on an empty database, answers, and on SIGTERM ends what is under way first', async () => {
  const server = start(usual());
  const url = await address(server);
  const health = await fetch(`${url}/api/health`);
  expect(await health.json()).toEqual({ status: 'up', database: 'up' });
  const halfway = await signInHalfway(url);
  server.process.kill('SIGTERM');
  await expect.poll(server.output, { timeout: patience }).toContain('Coldbench stops');
  // 401: nobody has an account here yet
  expect(await halfway.finish()).toBe(401);
  expect(await server.ended).toEqual([0, null]);
  await expect(fetch(`${url}/api/health`)).rejects.toThrow();
});

test('a second start finds everything in place, judges in its other thread, and stops on SIGINT', async () => {
  const server = start(usual());
  const url = await address(server);
  const ovens = (await (await fetch(`${url}/api/ovens`)).json()) as { ovens: unknown[] };
  expect(ovens.ovens.length).toBeGreaterThan(0);
  expect(server.output()).not.toContain('brought up to date');
  const visit = await fetch(`${url}/api/try`, { method: 'POST' });
  expect(await visit.json()).toMatchObject({ attempt: { next: 1, status: 'on the bench' } });
  server.process.kill('SIGINT');
  expect(await server.ended).toEqual([0, null]);
});

test('variables at fault are all named, and it does not start', async () => {
  const server = start({ DATABASE_URL: 'postgres', PORT: 'http', NODE_ENV: 'live' });
  expect(await server.ended).toEqual([1, null]);
  expect(server.output()).toMatch(/DATABASE_URL must read.*\n.*PORT must be.*\n.*NODE_ENV/);
});

test('a database that refuses the password is no database to wait for', async () => {
  const wrong = Object.assign(new URL(raw.url), { password: 'wrong' }).href;
  const server = start({ ...usual(), DATABASE_URL: wrong });
  expect(await server.ended).toEqual([1, null]);
  expect(server.output()).toContain('Coldbench cannot start');
  expect(server.output()).not.toContain('wrong@');
});
