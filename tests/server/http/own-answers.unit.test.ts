import express from 'express';
import { pino } from 'pino';
import request from 'supertest';
import { expect, test } from 'vitest';
import { z } from 'zod';
import { answerErrors } from '../../../server/http/answer-errors.ts';
import { route, type ApiRoute } from '../../../server/http/api-route.ts';
import { nobody } from '../../../server/http/caller.ts';
import { mountRoutes } from '../../../server/http/mount-routes.ts';
import { done } from '../../../server/outcome.ts';
import { endpoint } from '../../../shared/contracts/endpoint.ts';
import { none } from '../../../shared/contracts/fields.ts';

const count = endpoint({
  method: 'GET',
  path: '/api/count',
  params: none,
  query: none,
  body: none,
  response: z.strictObject({ count: z.int() }),
});

function appWith(routes: ApiRoute[], isStrict: boolean) {
  const logged: string[] = [];
  const log = pino({ level: 'error' }, { write: (line: string) => logged.push(line) });
  const app = express();
  mountRoutes(app, routes, { identify: async () => nobody, isStrict });
  app.use(answerErrors(log));
  return { app, logged };
}

test('an answer against our own contract is our fault, not the caller’s, and is in the log', async () => {
  const { app, logged } = appWith([route(count, 'open', async () => done({ count: 0.5 }))], true);
  const response = await request(app).get('/api/count');
  expect(response.status).toBe(500);
  expect(response.body.code).toBe('internal');
  expect(logged.join()).toContain('GET /api/count answers against its contract');
});

test('in production it is sent as it is', async () => {
  const { app } = appWith([route(count, 'open', async () => done({ count: 0.5 }))], false);
  expect((await request(app).get('/api/count')).body).toEqual({ count: 0.5 });
});

test('nothing of a thrown error reaches the answer', async () => {
  const secret = 'select password from person';
  const { app, logged } = appWith(
    [route(count, 'open', () => Promise.reject(new Error(secret)))],
    true,
  );
  const response = await request(app).get('/api/count');
  expect(response.status).toBe(500);
  expect(response.text).not.toContain(secret);
  expect(response.text).not.toContain('at ');
  expect(logged.join()).toContain(secret);
});

test('a lost database is said to be away, and when to come again', async () => {
  const lost = Object.assign(new Error('terminating connection'), { code: '57P01' });
  const { app } = appWith([route(count, 'open', () => Promise.reject(lost))], true);
  const response = await request(app).get('/api/count');
  expect(response.body).toMatchObject({ status: 503, code: 'database-away' });
  expect(response.get('Retry-After')).toBe('5');
});
