import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { problemDetails } from '../../shared/contracts/problem.ts';
import { hum } from '../support/server-content.ts';
import { cookieOf } from '../support/server-cookies.ts';
import { openTestServer, type Name, type TestServer, type Verb } from '../support/server.ts';

let server: TestServer;
let visitorCookie: string;
let own: { attempt: string; scenario: string; person: string };

/** Tom's attempt, Iris's published scenario and Mina, all of one school; a visitor's cookie. */
beforeAll(async () => {
  server = await openTestServer();
  const created = await server.as('iris', 'post', '/api/scenarios').send({ draft: hum });
  const scenario = created.body.scenario.id as string;
  await server.as('iris', 'post', `/api/scenarios/${scenario}/publish`);
  const started = await server.as('tom', 'post', '/api/attempts').send({ scenario });
  visitorCookie = cookieOf(await server.as(null, 'post', '/api/try').send({}));
  own = { attempt: started.body.attempt.id, scenario, person: await server.personId('mina') };
});

afterAll(() => server.close());

const callers = {
  nobody: null,
  visitor: null,
  trainee: 'tom',
  instructor: 'iris',
  administrator: 'ada',
  'foreign trainee': 'timo',
  'foreign instructor': 'ines',
  'foreign administrator': 'olga',
} as const satisfies Record<string, Name | null>;
type CallerName = keyof typeof callers;

/** Statuses in the order of `callers`. */
type Expected = readonly [number, number, number, number, number, number, number, number];

interface Case {
  expected: Expected;
  body?: () => object;
  /** in place of the school's own ids */ path?: () => string;
}

const everybody: Expected = [200, 200, 200, 200, 200, 200, 200, 200];
const members: Expected = [401, 401, 200, 200, 200, 200, 200, 200];
const appended = () => ({
  writer: randomUUID(),
  epoch: 0,
  from: 9,
  events: [{ type: 'DoorOpened', version: 1, data: {}, benchMs: 1 }],
});

/** What every route answers everybody. A route that is not here fails the test. */
const cases: Readonly<Record<string, Case>> = {
  'GET /api/health': { expected: everybody },
  'GET /api/me': { expected: everybody },
  'POST /api/sign-in': {
    expected: [401, 401, 401, 401, 401, 401, 401, 401],
    body: () => ({ email: `${randomUUID()}@school.example`, password: 'wrong' }),
  },
  'POST /api/sign-up': {
    expected: [409, 409, 409, 409, 409, 409, 409, 409],
    body: () => ({ name: 'Tom', email: 'tom@school.example', password: 'long enough words' }),
  },
  'POST /api/me/organisation': {
    expected: [401, 401, 200, 200, 200, 404, 404, 404],
    body: () => ({ organisation: server.organisations.school }),
  },
  'GET /api/ovens': { expected: everybody },
  'GET /api/ovens/:oven': { expected: everybody, path: () => `/api/ovens/${hum.oven}` },
  'GET /api/jobs': { expected: members },
  'GET /api/jobs/:scenario': { expected: [401, 401, 200, 200, 200, 404, 404, 404] },
  'GET /api/scenarios': { expected: [401, 401, 403, 200, 403, 403, 200, 403] },
  'POST /api/scenarios': {
    expected: [401, 401, 403, 200, 403, 403, 200, 403],
    body: () => ({ draft: hum }),
  },
  'GET /api/scenarios/:scenario': { expected: [401, 401, 403, 200, 403, 403, 404, 403] },
  'PUT /api/scenarios/:scenario': {
    expected: [401, 401, 403, 200, 403, 403, 404, 403],
    body: () => ({ draft: hum }),
  },
  // 409: nothing changed since it was published above
  'POST /api/scenarios/:scenario/publish': { expected: [401, 401, 403, 409, 403, 403, 404, 403] },
  'POST /api/attempts': {
    expected: [401, 401, 200, 200, 200, 404, 404, 404],
    body: () => ({ scenario: own.scenario }),
  },
  'POST /api/try': { expected: everybody },
  'GET /api/attempts': { expected: members },
  'GET /api/review': { expected: [401, 401, 403, 200, 200, 403, 200, 200] },
  'GET /api/attempts/:attempt': { expected: [401, 404, 200, 200, 200, 404, 404, 404] },
  'GET /api/attempts/:attempt/events': { expected: [401, 404, 200, 200, 200, 404, 404, 404] },
  // 409: the owner leaves a gap; nobody else may append at all
  'POST /api/attempts/:attempt/events': {
    expected: [401, 404, 409, 404, 404, 404, 404, 404],
    body: appended,
  },
  'POST /api/attempts/:attempt/take-over': {
    expected: [401, 404, 200, 404, 404, 404, 404, 404],
    body: () => ({ writer: '7a1fc0de-0000-4000-8000-000000000001' }),
  },
  // 409: not handed in
  'GET /api/attempts/:attempt/debrief': { expected: [401, 404, 409, 409, 409, 404, 404, 404] },
  'GET /api/people': { expected: [401, 401, 403, 403, 200, 403, 403, 200] },
  'PATCH /api/people/:person': {
    expected: [401, 401, 403, 403, 200, 403, 403, 404],
    body: () => ({ role: 'trainee' }),
  },
  // last: it ends the sessions of all these callers
  'POST /api/sign-out': { expected: everybody },
};

const pathOf = (path: string): string =>
  path.replace(/:(\w+)/g, (_, name: string) => own[name as keyof typeof own]);

test('every route of the server has its line here, and every line its route', () => {
  const table = server.routes.map(({ endpoint }) => `${endpoint.method} ${endpoint.path}`);
  expect([...table].sort()).toEqual(Object.keys(cases).sort());
});

test('a refusal of a stranger tells nothing that an unknown id would not', async () => {
  const paths = ['attempts/:id', 'attempts/:id/events', 'attempts/:id/debrief', 'jobs/:id'];
  for (const path of paths) {
    const at = (id: string) => server.as('timo', 'get', `/api/${path.replace(':id', id)}`);
    const real = await at(path.startsWith('jobs') ? own.scenario : own.attempt);
    const unknown = await at(randomUUID());
    expect(real.body).toEqual(unknown.body);
  }
});

describe.each(Object.entries(cases))('%s', (route, { expected, body, path }) => {
  const [method = '', template = ''] = route.split(' ');
  const names = Object.keys(callers) as CallerName[];

  test.each(names.map((name, index) => [name, expected[index]] as const))(
    'answers %s with %i',
    async (name, status) => {
      const verb = method.toLowerCase() as Verb;
      const sent = server.as(callers[name], verb, path?.() ?? pathOf(template));
      if (name === 'visitor') sent.set('Cookie', visitorCookie);
      const response = await (method === 'GET' ? sent : sent.send(body?.() ?? {}));
      expect(response.status, JSON.stringify(response.body)).toBe(status);
      if (response.status < 400) return;
      expect(response.type).toBe('application/problem+json');
      expect(problemDetails.parse(response.body).status).toBe(status);
    },
  );
});
