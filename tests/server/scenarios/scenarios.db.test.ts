import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { publishJobs } from '../../../server/scenarios/publish-jobs.ts';
import { hum } from '../../support/server-content.ts';
import { openTestServer, type Name, type TestServer } from '../../support/server.ts';

let server: TestServer;

beforeAll(async () => {
  server = await openTestServer();
});

afterAll(() => server.close());

const create = async (draft: object = hum) =>
  (await server.as('iris', 'post', '/api/scenarios').send({ draft })).body.scenario.id as string;
const save = (id: string, draft: object) =>
  server.as('iris', 'put', `/api/scenarios/${id}`).send({ draft });
const publish = (id: string) => server.as('iris', 'post', `/api/scenarios/${id}/publish`);
const jobsOf = async (name: Name) =>
  (await server.as(name, 'get', '/api/jobs')).body.jobs as Record<string, unknown>[];

describe('the workshop', () => {
  test('scenarios are numbered within their organisation, also when two are made at once', async () => {
    const made = await Promise.all([create(), create(), create()]);
    const { body } = await server.as('iris', 'get', '/api/scenarios');
    const mine = (body.scenarios as { id: string; number: number }[]).filter(({ id }) =>
      made.includes(id),
    );
    expect(mine.map(({ number }) => number)).toEqual([1, 2, 3]);
    expect(mine[0]).toMatchObject({
      title: hum.title,
      oven: hum.oven,
      published: null,
      hasUnpublishedChanges: true,
      attempts: 0,
    });
    expect((await server.as('ines', 'get', '/api/scenarios')).body.scenarios).toEqual([]);
  });

  test('a draft is saved, published as version 1, changed, published as version 2', async () => {
    const id = await create();
    const state = async () =>
      (await server.as('iris', 'get', `/api/scenarios/${id}`)).body.scenario;
    expect((await publish(id)).body.scenario).toMatchObject({
      published: 1,
      hasUnpublishedChanges: false,
    });
    const changed = { ...hum, title: 'Louder than before' };
    expect((await save(id, changed)).body.scenario).toMatchObject({
      draft: changed,
      published: 1,
      hasUnpublishedChanges: true,
    });
    expect(await state()).toMatchObject({ hasUnpublishedChanges: true });
    expect((await publish(id)).body.scenario).toMatchObject({ published: 2 });
    const rows = await server.raw.sql(
      `SELECT version, content ->> 'title' AS title FROM scenario_version
        WHERE scenario_id = $1 ORDER BY version`,
      [id],
    );
    expect(rows).toEqual([
      { version: 1, title: hum.title },
      { version: 2, title: 'Louder than before' },
    ]);
  });

  test('what did not change is not published again, also when it was changed and changed back', async () => {
    const id = await create();
    await publish(id);
    expect((await publish(id)).body).toMatchObject({ status: 409, code: 'scenario-unchanged' });
    await save(id, { ...hum, title: 'Other' });
    expect((await save(id, hum)).body.scenario.hasUnpublishedChanges).toBe(false);
    expect((await publish(id)).status).toBe(409);
  });

  test('published twice at once it becomes one version', async () => {
    const id = await create();
    const both = await Promise.all([publish(id), publish(id)]);
    expect(both.map(({ status }) => status).sort()).toEqual([200, 409]);
  });

  test.each([
    ['an unknown oven', { oven: 'no-such-oven' }, 'draft.oven'],
    ['an unknown part', { faults: [{ on: 'C9', fault: 'open' }] }, 'draft.faults.0.on'],
    ['an unknown fault', { faults: [{ on: 'D1', fault: 'melted' }] }, 'draft.faults.0.fault'],
    [
      'a part that is no reference',
      { faults: [{ on: 'diode', fault: 'open' }] },
      'draft.faults.0.on',
    ],
    ['a level that is none', { level: 6 }, 'draft.level'],
    ['no complaint', { ticket: { ...hum.ticket, complaint: ' ' } }, 'draft.ticket.complaint'],
    ['a long title', { title: 'x'.repeat(91) }, 'draft.title'],
    ['a field too many', { hints: [] }, 'draft.hints'],
    ['seven faults', { faults: Array(7).fill(hum.faults[0]) }, 'draft.faults'],
  ])('%s is refused by its path, in a new one and in a saved one', async (_, odd, path) => {
    const draft = { ...hum, ...odd };
    const made = await server.as('iris', 'post', '/api/scenarios').send({ draft });
    expect(made.body).toMatchObject({ status: 422, code: 'invalid-fields', errors: [{ path }] });
    const saved = await save(await create(), draft);
    expect(saved.body.errors).toEqual(made.body.errors);
  });

  test('an id of another organisation and an unknown one are both not found', async () => {
    const id = await create();
    for (const unknown of [id, randomUUID()]) {
      const path = `/api/scenarios/${unknown}`;
      expect((await server.as('ines', 'get', path)).status).toBe(404);
      expect((await server.as('ines', 'put', path).send({ draft: hum })).status).toBe(404);
      expect((await server.as('ines', 'post', `${path}/publish`)).status).toBe(404);
    }
    const { body } = await server.as('iris', 'get', `/api/scenarios/${id}`);
    expect(body.scenario.draft).toEqual(hum);
  });
});

describe('jobs', () => {
  test('a job tells the ticket and the oven, and nowhere the faults', async () => {
    const id = await create();
    await publish(id);
    const { body, text } = await server.as('tom', 'get', `/api/jobs/${id}`);
    expect(body.job).toMatchObject({
      scenario: id,
      version: 1,
      title: hum.title,
      oven: { id: hum.oven, supply: '120 V 60 Hz' },
      ticket: hum.ticket,
      condition: hum.condition,
      attempts: 0,
      best: null,
    });
    expect(text).not.toMatch(/fault|shorted|D1/);
    expect(JSON.stringify(await jobsOf('tom'))).not.toMatch(/fault|shorted|D1/);
  });

  test('are what the organisation has published, then the practice ones', async () => {
    const draft = await create();
    const published = await create();
    await publish(published);
    const ids = (await jobsOf('tom')).map(({ scenario }) => scenario);
    expect(ids).toContain(published);
    expect(ids).not.toContain(draft);
    const [practice] = await server.stores.scenarios.listPractice();
    expect(ids.at(-1)).toBe(practice?.scenario);
    expect((await jobsOf('timo')).map(({ scenario }) => scenario)).toEqual([practice?.scenario]);
  });

  test('one’s own attempts are counted, trials are not', async () => {
    const id = await create();
    await publish(id);
    await server.as('iris', 'post', '/api/attempts').send({ scenario: id });
    await server.as('iris', 'post', '/api/attempts').send({ scenario: id, isTrial: true });
    const { body } = await server.as('iris', 'get', `/api/jobs/${id}`);
    expect(body.job).toMatchObject({ attempts: 1, best: null });
    expect((await server.as('tom', 'get', `/api/jobs/${id}`)).body.job.attempts).toBe(0);
  });
});

describe('practice jobs from files', () => {
  const at = new Date('2026-02-01T00:00:00Z');
  const job = { origin: 'weak', content: { ...hum, title: 'Weak heat' } };
  const all = async () =>
    (await server.stores.scenarios.listPractice()).map(({ version, content }) => [
      content.title,
      version,
    ]);

  test('are published once, and again when the file has changed', async () => {
    const { practice } = server.organisations;
    const put = (content = job.content) =>
      publishJobs(server.stores.scenarios, practice, [{ ...job, content }], at);
    await put();
    await put();
    expect(await all()).toEqual([
      [hum.title, 1],
      ['Weak heat', 1],
    ]);
    await put({ ...job.content, title: 'Weaker heat' });
    expect(await all()).toEqual([
      [hum.title, 1],
      ['Weaker heat', 2],
    ]);
  });

  test('an organisation’s own copy stands in for the practice one, for its people alone', async () => {
    const { foreign } = server.organisations;
    const before = (await jobsOf('timo')).length;
    await publishJobs(server.stores.scenarios, foreign, [job], at);
    const jobs = await jobsOf('timo');
    expect(jobs).toHaveLength(before);
    const own = jobs.filter(({ title }) => title === 'Weak heat');
    expect(own).toHaveLength(1);
    expect((await jobsOf('tom')).map(({ title }) => title)).toContain('Weaker heat');
  });
});
