import { randomUUID } from 'node:crypto';
import request from 'supertest';
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import type { WireEvent } from '../../../shared/bench/event.ts';
import { attempt as attemptContract } from '../../../shared/contracts/attempts.ts';
import type { Hands } from '../../support/bench.ts';
import { handsAtHum } from '../../support/server-attempts.ts';
import { hum } from '../../support/server-content.ts';
import { cookieOf } from '../../support/server-cookies.ts';
import { openTestServer, testSeed, type Name, type TestServer } from '../../support/server.ts';

let server: TestServer;
let scenario: string;
let hands: Hands;

beforeAll(async () => {
  server = await openTestServer();
  const { body } = await server.as('iris', 'post', '/api/scenarios').send({ draft: hum });
  scenario = body.scenario.id;
  await server.as('iris', 'post', `/api/scenarios/${scenario}/publish`);
});

beforeEach(() => {
  hands = handsAtHum(testSeed);
});

afterAll(() => server.close());

async function start(name: Name, body: object = { scenario }) {
  const response = await server.as(name, 'post', '/api/attempts').send(body);
  expect(response.status, response.text).toBe(200);
  return attemptContract.parse(response.body.attempt);
}

const writer = randomUUID();
const append = (name: Name, id: string, from: number, events: WireEvent[], more: object = {}) =>
  server
    .as(name, 'post', `/api/attempts/${id}/events`)
    .send({ writer, epoch: 0, from, events, ...more });

const get = (name: Name, path: string) => server.as(name, 'get', `/api/attempts${path}`);

const opened = (): WireEvent[] => hands.does('OpenDoor', {});

function handedIn(): WireEvent[] {
  return [
    ...hands.does('StateCause', { causes: [{ on: 'D1', fault: 'shorted' }] }),
    ...hands.does('HandIn', {}),
  ];
}

describe('starting', () => {
  test('pins the newest version, draws a seed and begins the record', async () => {
    const attempt = await start('tom');
    expect(attempt).toMatchObject({
      scenario,
      version: 1,
      number: 1,
      title: hum.title,
      person: { id: await server.personId('tom'), name: 'tom' },
      status: 'on the bench',
      isTrial: false,
      seed: testSeed,
      content: hum,
      epoch: 0,
      next: 1,
      events: 1,
      benchMs: 0,
      isOwn: true,
      score: null,
      handedInAt: null,
    });
    const { body } = await get('tom', `/${attempt.id}/events`);
    expect(body.events).toMatchObject([{ sequence: 0, ...hands.events()[0] }]);
  });

  test('a running attempt keeps its version when a new one is published', async () => {
    const { body } = await server.as('iris', 'post', '/api/scenarios').send({ draft: hum });
    const id = body.scenario.id as string;
    await server.as('iris', 'post', `/api/scenarios/${id}/publish`);
    const before = await start('tom', { scenario: id });
    const draft = { ...hum, title: 'Another title' };
    await server.as('iris', 'put', `/api/scenarios/${id}`).send({ draft });
    await server.as('iris', 'post', `/api/scenarios/${id}/publish`);
    const after = await get('tom', `/${before.id}`);
    expect(after.body.attempt).toMatchObject({ version: 1, title: hum.title });
    expect(await start('tom', { scenario: id })).toMatchObject({ version: 2, title: draft.title });
  });

  test('of an unpublished scenario is refused, of a foreign one not found', async () => {
    const { body } = await server.as('iris', 'post', '/api/scenarios').send({ draft: hum });
    const unpublished = { scenario: body.scenario.id };
    const refused = await server.as('tom', 'post', '/api/attempts').send(unpublished);
    expect(refused.body).toMatchObject({ status: 409, code: 'scenario-not-published' });
    const foreign = await server.as('timo', 'post', '/api/attempts').send(unpublished);
    expect(foreign.body).toMatchObject({ status: 404 });
  });

  test('an instructor tries a draft of their organisation; a trainee may not', async () => {
    const { body } = await server.as('iris', 'post', '/api/scenarios').send({ draft: hum });
    const trial = { scenario: body.scenario.id as string, isTrial: true };
    expect(await start('iris', trial)).toMatchObject({ isTrial: true, version: 0, isOwn: true });
    const trainee = await server.as('tom', 'post', '/api/attempts').send(trial);
    expect(trainee.body).toMatchObject({ status: 403, code: 'not-allowed' });
    const foreign = await server.as('ines', 'post', '/api/attempts').send(trial);
    expect(foreign.body).toMatchObject({ status: 404 });
  });

  test('practice jobs can be started from every organisation', async () => {
    const { body } = await server.as('timo', 'get', '/api/jobs');
    const practice = body.jobs[0].scenario as string;
    expect(await start('timo', { scenario: practice })).toMatchObject({ version: 1, isOwn: true });
  });
});

describe('visiting', () => {
  const visit = (cookie = '') =>
    request(server.app).post('/api/try').set('Cookie', cookie).send({});

  test('starts the first practice job, and goes on with it in the same browser', async () => {
    const first = await visit();
    expect(attemptContract.parse(first.body.attempt)).toMatchObject({
      person: null,
      isOwn: true,
      version: 1,
    });
    expect(first.get('Set-Cookie')?.[0]).toMatch(
      /^coldbench_visitor=.{43};.*HttpOnly; SameSite=Lax/,
    );
    const again = await visit(cookieOf(first));
    expect(again.body.attempt.id).toBe(first.body.attempt.id);
    expect(again.get('Set-Cookie')).toBeUndefined();
    expect((await visit()).body.attempt.id).not.toBe(first.body.attempt.id);
  });

  test('the database does not hold the token', async () => {
    const token = cookieOf(await visit()).split('=')[1] ?? '';
    const rows = await server.raw.sql('SELECT 1 FROM attempt WHERE visitor_token_hash = $1', [
      token,
    ]);
    expect(rows).toEqual([]);
  });

  test('a visitor appends, hands in and reads the debrief; another visitor sees nothing', async () => {
    const first = await visit();
    const { id } = first.body.attempt;
    const at = `/api/attempts/${id}`;
    const events = [...opened(), ...handedIn()];
    const sent = await request(server.app)
      .post(`${at}/events`)
      .set('Cookie', cookieOf(first))
      .send({ writer, epoch: 0, from: 1, events });
    expect(sent.body).toEqual({ next: 1 + events.length });
    const debrief = await request(server.app).get(`${at}/debrief`).set('Cookie', cookieOf(first));
    expect(debrief.body.debrief.isCauseFound).toBe(true);
    const stranger = cookieOf(await visit());
    for (const path of ['', '/events', '/debrief']) {
      const response = await request(server.app)
        .get(at + path)
        .set('Cookie', stranger);
      expect(response.status).toBe(404);
    }
    expect((await visit(cookieOf(first))).body.attempt.id).not.toBe(id);
  });

  test('a person who is signed in gets an attempt of their own, once', async () => {
    const first = await server.as('mina', 'post', '/api/try').send({});
    expect(first.body.attempt).toMatchObject({ person: { name: 'mina' }, isOwn: true });
    const again = await server.as('mina', 'post', '/api/try').send({});
    expect(again.body.attempt.id).toBe(first.body.attempt.id);
  });

  test('instructors do not see what visitors do', async () => {
    const { id } = (await visit()).body.attempt;
    expect((await get('iris', `/${id}`)).status).toBe(404);
  });
});

describe('appending', () => {
  test('answers the next number, and the events come back as they were sent', async () => {
    const { id } = await start('tom');
    const events = opened();
    const response = await append('tom', id, 1, events);
    expect(response.body).toEqual({ next: 2 });
    const { body } = await get('tom', `/${id}/events`);
    expect(body.events[1]).toMatchObject({ ...events[0], sequence: 1 });
  });

  test.each([
    ['a gap', 3, {}, 409, { code: 'sequence-gap', expected: 1 }],
    ['an epoch that is not in force', 1, { epoch: 5 }, 409, { code: 'another-writer', epoch: 0 }],
  ])('refuses %s', async (_, from, more, status, problem) => {
    const { id } = await start('tom');
    const response = await append('tom', id, from, opened(), more);
    expect(response.body).toMatchObject({ status, ...problem });
  });

  test('what cannot have happened is named and nothing of its batch is stored', async () => {
    const { id } = await start('tom');
    const never: WireEvent = { type: 'CoverFitted', version: 1, data: {}, benchMs: 60_000 };
    const response = await append('tom', id, 1, [...opened(), never]);
    expect(response.body).toMatchObject({
      status: 422,
      code: 'cannot-have-happened',
      errors: [{ path: 'events.1' }],
    });
    expect(response.body.detail).toContain('Event 1 of the batch, CoverFitted');
    expect((await get('tom', `/${id}`)).body.attempt.next).toBe(1);
  });

  test('the same batch sent ten times at once is stored once', async () => {
    const { id } = await start('tom');
    const events = opened();
    const all = await Promise.all(Array.from({ length: 10 }, () => append('tom', id, 1, events)));
    expect(all.map(({ body }) => body)).toEqual(all.map(() => ({ next: 2 })));
    const { body } = await get('tom', `/${id}/events`);
    expect(body.events).toHaveLength(2);
  });

  test('of two tabs that write at once one becomes the writer, the other hears the epoch', async () => {
    const { id } = await start('tom');
    const events = opened();
    const tabs = [randomUUID(), randomUUID()];
    const all = await Promise.all(tabs.map((tab) => append('tom', id, 1, events, { writer: tab })));
    expect(all.map(({ status }) => status).sort()).toEqual([200, 409]);
    const late = all.find(({ status }) => status === 409);
    expect(late?.body).toMatchObject({ code: 'another-writer', epoch: 0 });
    const taken = await server
      .as('tom', 'post', `/api/attempts/${id}/take-over`)
      .send({ writer: randomUUID() });
    expect(taken.body).toEqual({ epoch: 1, next: 2 });
  });

  test('nobody appends to another’s attempt, not even who may read it', async () => {
    const { id } = await start('tom');
    const events = opened();
    for (const name of ['mina', 'iris', 'ada', 'ines'] as const) {
      expect((await append(name, id, 1, events)).status).toBe(404);
    }
  });

  test('after handing in nothing more is taken', async () => {
    const { id } = await start('tom');
    const events = handedIn();
    await append('tom', id, 1, events);
    const event: WireEvent = { type: 'DoorOpened', version: 1, data: {}, benchMs: 60_000 };
    const late = await append('tom', id, 1 + events.length, [event]);
    expect(late.body).toMatchObject({ status: 409, code: 'attempt-closed' });
    expect((await get('tom', `/${id}`)).body.attempt.isOwn).toBe(false);
  });
});

describe('reading', () => {
  test('own attempts, newest first, with their results, of one scenario when asked', async () => {
    const mine = await start('mina');
    await append('mina', mine.id, 1, handedIn());
    const { body } = await get('mina', `?scenario=${scenario}`);
    expect(body.attempts).toMatchObject([
      { id: mine.id, status: 'handed in', score: expect.any(Number), outcome: expect.any(String) },
    ]);
    const other = await get('mina', `?scenario=${randomUUID()}`);
    expect(other.body.attempts).toEqual([]);
  });

  test('a trainee reads neither another trainee’s attempt nor the review', async () => {
    const { id } = await start('tom');
    expect((await get('mina', `/${id}`)).status).toBe(404);
    expect((await server.as('mina', 'get', '/api/review')).status).toBe(403);
  });

  test('reviewers see the attempts of their organisation, but no trial of somebody else', async () => {
    const attempt = await start('tom');
    const trial = await start('iris', { scenario, isTrial: true });
    const seenBy = async (name: Name) => {
      const { body } = await server.as(name, 'get', '/api/review');
      return (body.attempts as { id: string }[]).map(({ id }) => id);
    };
    expect(await seenBy('iris')).toEqual(expect.arrayContaining([attempt.id, trial.id]));
    expect(await seenBy('ada')).toContain(attempt.id);
    expect(await seenBy('ada')).not.toContain(trial.id);
    expect((await get('ada', `/${trial.id}`)).status).toBe(404);
    expect(await seenBy('ines')).not.toContain(attempt.id);
    expect((await get('iris', `/${attempt.id}`)).body.attempt.isOwn).toBe(false);
  });

  test('the debrief comes after handing in, to the trainee and to the reviewers', async () => {
    const { id } = await start('tom');
    const early = await get('tom', `/${id}/debrief`);
    expect(early.body).toMatchObject({ status: 409, code: 'not-handed-in' });
    await append('tom', id, 1, handedIn());
    const debrief = await get('tom', `/${id}/debrief`);
    expect(debrief.body.debrief).toMatchObject({ isCauseFound: true, faults: hum.faults });
    expect((await get('iris', `/${id}/debrief`)).body).toEqual(debrief.body);
  });
});
