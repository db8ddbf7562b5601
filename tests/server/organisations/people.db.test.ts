import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { person } from '../../../shared/contracts/people.ts';
import { openTestServer, type Name, type TestServer } from '../../support/server.ts';

let server: TestServer;

beforeAll(async () => {
  server = await openTestServer();
});

afterAll(() => server.close());

const change = async (by: Name, whose: Name, role: string) =>
  server.as(by, 'patch', `/api/people/${await server.personId(whose)}`).send({ role });

test('an administrator sees the people of the organisation, by name', async () => {
  const { body } = await server.as('ada', 'get', '/api/people');
  expect(body.people.map(({ name, role }: { name: string; role: string }) => [name, role])).toEqual(
    [
      ['ada', 'administrator'],
      ['iris', 'instructor'],
      ['mina', 'trainee'],
      ['tom', 'trainee'],
    ],
  );
  expect(person.parse(body.people[0])).toMatchObject({
    email: 'ada@school.example',
    joinedAt: '2026-01-05T08:00:00.000Z',
    attempts: 0,
  });
});

test('and changes a role', async () => {
  const response = await change('ada', 'mina', 'instructor');
  expect(response.body.person).toMatchObject({ name: 'mina', role: 'instructor' });
  expect((await server.as('mina', 'get', '/api/scenarios')).status).toBe(200);
});

test('the last administrator stays one, and hears why', async () => {
  const response = await change('ada', 'ada', 'trainee');
  expect(response.body).toMatchObject({ status: 403, code: 'not-allowed' });
  expect(response.body.detail).toBe(
    'North School would have no administrator left. Make somebody else one first.',
  );
  expect((await change('ada', 'ada', 'administrator')).status).toBe(200);
});

test('of two administrators who demote each other at once one stays', async () => {
  await change('ada', 'mina', 'administrator');
  const both = await Promise.all([
    change('ada', 'mina', 'trainee'),
    change('mina', 'ada', 'trainee'),
  ]);
  expect(both.filter(({ status }) => status === 200)).toHaveLength(1);
  const [row] = await server.raw.sql(
    `SELECT count(*)::integer AS count FROM membership
      WHERE organisation_id = $1 AND role = 'administrator'`,
    [server.organisations.school],
  );
  expect(row).toEqual({ count: 1 });
});

test('people of another organisation and unknown ones are not found', async () => {
  expect((await change('olga', 'tom', 'instructor')).status).toBe(404);
  const unknown = server.as('olga', 'patch', `/api/people/${randomUUID()}`);
  expect((await unknown.send({ role: 'trainee' })).status).toBe(404);
});

test('a role that is none is refused', async () => {
  const response = await change('olga', 'timo', 'owner');
  expect(response.body).toMatchObject({ status: 422, errors: [{ path: 'role' }] });
});
