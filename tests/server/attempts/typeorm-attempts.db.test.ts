import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { attemptStoreBehaviour } from '../../support/server-attempt-behaviour.ts';
import { hum } from '../../support/server-content.ts';
import { openTestServer, type TestServer } from '../../support/server.ts';

let server: TestServer;

beforeAll(async () => {
  server = await openTestServer();
});

afterAll(() => server.close());

async function publishedScenario(organisation: string) {
  const { scenarios } = server.stores;
  const at = new Date('2026-01-05T08:00:00Z');
  const { id } = await scenarios.create({ organisation, draft: hum, origin: null, at });
  await scenarios.publish({ organisation, scenario: id, by: null, at, check: () => [] });
  const published = await scenarios.findPublished(organisation, id);
  if (!published) throw new Error('not published');
  return published;
}

describe('the store', () => {
  attemptStoreBehaviour(async () => {
    const organisation = server.organisations.school;
    const one = await publishedScenario(organisation);
    const other = await publishedScenario(organisation);
    return {
      store: server.stores.attempts,
      content: hum,
      scenario: one.scenario,
      otherScenario: other.scenario,
      versionId: one.versionId,
      otherVersionId: other.versionId,
      tom: { id: await server.personId('tom'), name: 'tom' },
      iris: { id: await server.personId('iris'), name: 'iris' },
      organisation,
    };
  });
});

describe('the record', () => {
  test.each([
    ['UPDATE attempt_event SET bench_ms = 1'],
    ['DELETE FROM attempt_event'],
    [`UPDATE scenario_version SET content = '{}'`],
  ])('refuses %s', async (sql) => {
    // 23001: restrict_violation, PostgreSQL documentation, appendix A
    await expect(server.raw.sql(sql)).rejects.toMatchObject({ code: '23001' });
  });

  test('an attempt belongs to a person in an organisation or to a visitor, never to both', async () => {
    await expect(
      server.raw.sql(`UPDATE attempt SET visitor_token_hash = repeat('a', 64)
        WHERE person_id IS NOT NULL`),
    ).rejects.toMatchObject({ constraint: 'attempt_owner' });
  });

  test('one sequence number holds one event', async () => {
    await expect(
      server.raw.sql('INSERT INTO attempt_event SELECT * FROM attempt_event LIMIT 1'),
    ).rejects.toMatchObject({ constraint: 'attempt_event_pkey' });
  });
});
