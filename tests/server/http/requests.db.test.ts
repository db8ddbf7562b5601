import { randomUUID } from 'node:crypto';
import type { AddressInfo } from 'node:net';
import { gzipSync } from 'node:zlib';
import request from 'supertest';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { listen } from '../../../server/listening.ts';
import { problemDetails } from '../../../shared/contracts/problem.ts';
import { openTestServer, type TestServer } from '../../support/server.ts';

let server: TestServer;

beforeAll(async () => {
  server = await openTestServer();
});

afterAll(() => server.close());

describe('a body that cannot be read', () => {
  const send = (body: string, type = 'application/json') =>
    server.as('tom', 'post', '/api/attempts').set('Content-Type', type).send(body);

  test.each([
    ['broken JSON', '{"scenario":', 400, 'malformed-json'],
    ['no JSON at all', 'scenario=1', 400, 'malformed-json'],
    ['null', 'null', 422, 'invalid-fields'],
    ['a list', '[]', 422, 'invalid-fields'],
    ['a text', '"scenario"', 422, 'invalid-fields'],
    ['an empty object', '{}', 422, 'invalid-fields'],
    ['more than 1 MB', JSON.stringify({ scenario: 'x'.repeat(1_100_000) }), 413, 'too-large'],
    ['half a million brackets', '['.repeat(500_000) + ']'.repeat(500_000), 422, 'invalid-fields'],
  ])('%s', async (_, body, status, code) => {
    const response = await send(body);
    expect(response.status).toBe(status);
    expect(problemDetails.parse(response.body)).toMatchObject({
      code,
      status,
      type: `urn:coldbench:problem:${code}`,
    });
    expect(response.type).toBe('application/problem+json');
  });

  test.each(['text/plain', 'application/x-www-form-urlencoded', 'multipart/form-data; boundary=x'])(
    'sent as %s, as a form of another site could',
    async (type) => {
      const response = await send(JSON.stringify({ scenario: randomUUID() }), type);
      expect(response.status).toBe(400);
      expect(response.body.code).toBe('bad-request');
    },
  );

  test('in an unknown encoding', async () => {
    const response = await send('{}').set('Content-Encoding', 'pigeon');
    expect(response.body).toMatchObject({ status: 400, code: 'bad-request' });
  });

  test('a small one that unpacks to 100 MB', async () => {
    const listening = await listen(server.app, 0, '127.0.0.1');
    const { port } = listening.address() as AddressInfo;
    const response = await fetch(`http://127.0.0.1:${port}/api/attempts`, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json', 'Content-Encoding': 'gzip' },
      body: gzipSync(Buffer.alloc(100_000_000, ' ')),
    });
    expect(await response.json()).toMatchObject({ status: 413, code: 'too-large' });
    listening.close();
  });
});

describe('fields', () => {
  test('every one at fault is named by its path, unknown ones too', async () => {
    const response = await server.as('tom', 'post', `/api/attempts/${randomUUID()}/events`).send({
      writer: 'me',
      epoch: 0.5,
      from: 0,
      events: [{ type: 'lower', version: 2, data: [], benchMs: -1 }],
      extra: true,
    });
    expect(response.status).toBe(422);
    const paths = (response.body.errors as { path: string }[]).map(({ path }) => path);
    expect(paths.sort()).toEqual([
      'epoch',
      'events.0.benchMs',
      'events.0.data',
      'events.0.type',
      'events.0.version',
      'extra',
      'from',
      'writer',
    ]);
  });

  test('an id in the path that is no id', async () => {
    const response = await server.as('tom', 'get', '/api/attempts/7');
    expect(response.body).toMatchObject({ status: 422, errors: [{ path: 'params.attempt' }] });
  });

  test('an unknown or repeated field of the query', async () => {
    const unknown = await server.as('tom', 'get', '/api/attempts?page=2');
    expect(unknown.body).toMatchObject({ status: 422, errors: [{ path: 'query.page' }] });
    const id = randomUUID();
    const twice = await server.as('tom', 'get', `/api/attempts?scenario=${id}&scenario=${id}`);
    expect(twice.body).toMatchObject({ status: 422, errors: [{ path: 'query.scenario' }] });
  });

  test('more than 200 events at once', async () => {
    const event = { type: 'DoorOpened', version: 1, data: {}, benchMs: 1 };
    const response = await server.as('tom', 'post', `/api/attempts/${randomUUID()}/events`).send({
      writer: randomUUID(),
      epoch: 0,
      from: 1,
      events: Array.from({ length: 201 }, () => event),
    });
    expect(response.body).toMatchObject({ status: 422, errors: [{ path: 'events' }] });
  });

  test('data nested a hundred thousand deep, or with a character that cannot be stored', async () => {
    const send = (data: string) =>
      server
        .as('tom', 'post', `/api/attempts/${randomUUID()}/events`)
        .set('Content-Type', 'application/json')
        .send(
          `{"writer":"${randomUUID()}","epoch":0,"from":1,"events":[{"type":"DoorOpened",` +
            `"version":1,"benchMs":1,"data":${data}}]}`,
        );
    const deep = await send(`{"a":${'['.repeat(100_000)}${']'.repeat(100_000)}}`);
    expect(deep.status).toBe(404);
    for (const data of ['{"a":["\\u0000"]}', '{"a":["\\ud800"]}']) {
      const response = await send(data);
      expect(response.body).toMatchObject({ status: 422, errors: [{ path: 'events.0.data.a.0' }] });
    }
    expect((await send('{"\\u0000":1}')).body).toMatchObject({ status: 422 });
  });

  test('who may not send them does not learn about them', async () => {
    const response = await request(server.app).post('/api/attempts').send({ extra: 1 });
    expect(response.body).toMatchObject({ status: 401, code: 'not-signed-in' });
  });
});

describe('addresses', () => {
  test('an unknown one', async () => {
    for (const path of ['/api', '/api/', '/api/nothing', '/api/attempts/a/b/c']) {
      const response = await server.as('tom', 'get', path);
      expect(response.body).toMatchObject({ status: 404, code: 'not-found' });
    }
  });

  test('a known one with another method says which it takes', async () => {
    const response = await server.as('tom', 'delete', '/api/scenarios');
    expect(response.body).toMatchObject({ status: 405, code: 'method-not-allowed' });
    expect(response.get('Allow')).toBe('GET, POST');
  });

  test('one that cannot be decoded', async () => {
    const response = await server.as('tom', 'get', '/api/ovens/%E0%A4%A');
    expect(response.body).toMatchObject({ status: 400, code: 'bad-request' });
  });
});

describe('a change asked for from elsewhere', () => {
  const signOut = (headers: Record<string, string>) =>
    server.as('mina', 'post', '/api/attempts').set(headers).send({ scenario: randomUUID() });

  test.each([
    ['another site, as the browser says', { 'Sec-Fetch-Site': 'cross-site' }],
    ['a neighbour of our host', { 'Sec-Fetch-Site': 'same-site' }],
    ['another origin, in an older browser', { Origin: 'https://evil.example' }],
    ['an opaque origin', { Origin: 'null' }],
    ['our name on another port', { Origin: 'http://127.0.0.1:1' }],
  ])('is refused: %s', async (_, headers) => {
    const response = await signOut(headers);
    expect(response.body).toMatchObject({ status: 403, code: 'cross-site' });
  });

  test.each([
    ['our own page', { 'Sec-Fetch-Site': 'same-origin' }],
    ['the person, by the address bar', { 'Sec-Fetch-Site': 'none' }],
    ['our own page in an older browser', { Origin: 'http://bench.example', Host: 'bench.example' }],
    ['a program that is no browser', {}],
  ])('is heard from %s', async (_, headers) => {
    const response = await signOut(headers);
    expect(response.body).toMatchObject({ status: 404, code: 'not-found' });
  });

  test('reading is not refused: the answer stays unreadable there', async () => {
    const response = await server.as('mina', 'get', '/api/me').set('Sec-Fetch-Site', 'cross-site');
    expect(response.status).toBe(200);
    expect(response.get('Access-Control-Allow-Origin')).toBeUndefined();
  });
});

test('answers are not kept, and say nothing about what made them', async () => {
  const response = await server.as('tom', 'get', '/api/me');
  expect(response.get('Cache-Control')).toBe('no-store');
  expect(response.get('X-Powered-By')).toBeUndefined();
  expect(response.get('X-Content-Type-Options')).toBe('nosniff');
  expect(response.get('Content-Security-Policy')).toBe(
    "default-src 'none';script-src 'self';style-src 'self';img-src 'self' blob: data:;" +
      "font-src 'self';connect-src 'self';worker-src 'self';base-uri 'none';form-action 'self';" +
      "frame-ancestors 'none'",
  );
});
