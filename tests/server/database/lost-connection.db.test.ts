import request from 'supertest';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { makeDatabase, type Database } from '../../../server/database/data-source.ts';
import { isDatabaseUp } from '../../../server/database/is-up.ts';
import { createApp } from '../../../server/app.ts';
import { makeStores } from '../../../server/stores.ts';
import { handsAtHum } from '../../support/server-attempts.ts';
import { hum } from '../../support/server-content.ts';
import { silent } from '../../support/database.ts';
import { openGate, type Gate } from '../../support/server-gate.ts';
import { openTestServer, testSeed, type TestServer } from '../../support/server.ts';
import { directJudge } from '../../../server/attempts/judge.ts';
import { attemptRules } from '../../../server/attempts/attempt-rules.ts';

let server: TestServer;
let gate: Gate;
/** on connections that pass the gate */
let gated: Database;

beforeAll(async () => {
  server = await openTestServer();
  gate = await openGate(server.raw.url);
  gated = makeDatabase(gate.url, silent);
  await gated.initialize();
});

afterAll(async () => {
  await gated.destroy();
  await gate.shut();
  await server.close();
});

/** The same server on the gated database. */
function gatedServer(more: object = {}): TestServer {
  const deps = {
    ...server.deps,
    ...makeStores(gated),
    isDatabaseUp: () => isDatabaseUp(gated),
    ...more,
  };
  const app = createApp(deps).app;
  return { ...server, app, as: (...call) => requestOn(app, ...call) };
}

const requestOn = (app: TestServer['app'], ...[name, verb, path]: Parameters<TestServer['as']>) => {
  const sent = request(app)[verb](path);
  return name === null ? sent : sent.set('Cookie', server.cookies[name]);
};

const health = async (as: TestServer['as']) => (await as(null, 'get', '/api/health')).body;

async function begin(as: TestServer['as']) {
  const [practice] = (await as('tom', 'get', '/api/jobs')).body.jobs;
  const started = await as('tom', 'post', '/api/attempts').send({ scenario: practice.scenario });
  return started.body.attempt.id as string;
}

test('while the database is gone, answers say so; when it is back, work goes on', async () => {
  const { as } = gatedServer();
  const id = await begin(as);
  expect(await health(as)).toEqual({ status: 'up', database: 'up' });
  await gate.shut();
  for (let count = 0; count < 20; count += 1) {
    const response = await as('tom', 'get', `/api/attempts/${id}`);
    expect(response.body).toMatchObject({ status: 503, code: 'database-away' });
    expect(response.get('Retry-After')).toBe('5');
  }
  expect(await health(as)).toEqual({ status: 'up', database: 'away' });
  const oven = await as(null, 'get', `/api/ovens/${hum.oven}`);
  expect(oven.status).toBe(200);
  await gate.open();
  expect((await as('tom', 'get', `/api/attempts/${id}`)).status).toBe(200);
  expect(await health(as)).toEqual({ status: 'up', database: 'up' });
});

test('a connection cut in the middle of an append stores nothing, and sent again it is stored once', async () => {
  let cut = async (): Promise<void> => undefined;
  const rules = {
    ...attemptRules,
    verify: (...args: Parameters<typeof attemptRules.verify>) => {
      void cut();
      return attemptRules.verify(...args);
    },
  };
  const { as } = gatedServer({ rules, judge: directJudge(rules) });
  const id = await begin(as);
  const events = handsAtHum(testSeed).does('OpenDoor', {});
  const body = { writer: await server.personId('tom'), epoch: 0, from: 1, events };
  const append = () => as('tom', 'post', `/api/attempts/${id}/events`).send(body);
  cut = gate.shut;
  expect((await append()).body).toMatchObject({ status: 503, code: 'database-away' });
  expect((await server.as('tom', 'get', `/api/attempts/${id}`)).body.attempt.next).toBe(1);
  cut = async () => undefined;
  await gate.open();
  expect((await append()).body).toEqual({ next: 2 });
  expect((await append()).body).toEqual({ next: 2 });
  const { body: read } = await server.as('tom', 'get', `/api/attempts/${id}/events`);
  expect(read.events).toHaveLength(2);
});

test('connections that PostgreSQL itself ends, idle or at work, are replaced', async () => {
  const { as } = gatedServer();
  const id = await begin(as);
  const slow = gated.query('SELECT pg_sleep(5)');
  const outcome = slow.then(
    () => 'answered',
    () => 'broken',
  );
  await expect
    .poll(() =>
      server.raw.sql(`SELECT 1 FROM pg_stat_activity WHERE query LIKE '%pg_sleep(5)'
      AND pid <> pg_backend_pid()`),
    )
    .toHaveLength(1);
  await server.raw.sql(`SELECT pg_terminate_backend(pid) FROM pg_stat_activity
    WHERE datname = current_database() AND pid <> pg_backend_pid()`);
  expect(await outcome).toBe('broken');
  await expect.poll(async () => (await as('tom', 'get', `/api/attempts/${id}`)).status).toBe(200);
});
