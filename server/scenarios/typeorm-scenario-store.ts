import { randomUUID } from 'node:crypto';
import { isDeepStrictEqual } from 'node:util';
import type { DataSource, EntityManager } from 'typeorm';
import type { ScenarioContent } from '../../shared/scenario/scenario.ts';
import { OrganisationEntity } from '../organisations/organisation.entity.ts';
import { publishedScenarios } from './published-scenarios-store.ts';
import { scenarioLines } from './scenario-rows-store.ts';
import { ScenarioVersionEntity } from './scenario-version.entity.ts';
import { ScenarioEntity } from './scenario.entity.ts';
import type {
  NewScenario,
  OwnResult,
  Published,
  PublishedScenario,
  PublishRequest,
  ScenarioLine,
  ScenarioRecord,
  ScenarioStore,
} from './scenario.ts';

const newestVersion = (manager: EntityManager, scenarioId: string) =>
  manager.findOne(ScenarioVersionEntity, { where: { scenarioId }, order: { version: 'DESC' } });

function recordOf(row: ScenarioEntity, newest: ScenarioVersionEntity | null): ScenarioRecord {
  return {
    id: row.id,
    number: row.number,
    draft: row.draft,
    published: newest?.version ?? null,
    hasUnpublishedChanges: !isDeepStrictEqual(row.draft, newest?.content),
    updatedAt: row.updatedAt,
  };
}

async function read(
  manager: EntityManager,
  row: ScenarioEntity | null,
): Promise<ScenarioRecord | null> {
  return row && recordOf(row, await newestVersion(manager, row.id));
}

/** The next number, safe from another author's: the organisation's row is locked until the end. */
async function nextNumber(manager: EntityManager, organisationId: string): Promise<number> {
  await manager.findOneOrFail(OrganisationEntity, {
    where: { id: organisationId },
    lock: { mode: 'pessimistic_write' },
  });
  const highest = await manager.maximum(ScenarioEntity, 'number', { organisationId });
  return (highest ?? 0) + 1;
}

/** Scenarios in PostgreSQL. */
export class TypeormScenarioStore implements ScenarioStore {
  readonly #database: DataSource;

  constructor(database: DataSource) {
    this.#database = database;
  }

  list = (organisation: string): Promise<ScenarioLine[]> =>
    scenarioLines(this.#database.manager, organisation);

  find = async (organisationId: string, id: string): Promise<ScenarioRecord | null> => {
    const { manager } = this.#database;
    return read(manager, await manager.findOneBy(ScenarioEntity, { id, organisationId }));
  };

  findByOrigin = async (organisationId: string, origin: string): Promise<ScenarioRecord | null> => {
    const { manager } = this.#database;
    return read(manager, await manager.findOneBy(ScenarioEntity, { origin, organisationId }));
  };

  create = ({ organisation, draft, origin, at }: NewScenario): Promise<ScenarioRecord> =>
    this.#database.transaction(async (manager) => {
      const row = manager.create(ScenarioEntity, {
        id: randomUUID(),
        organisationId: organisation,
        number: await nextNumber(manager, organisation),
        origin,
        draft,
        updatedAt: at,
      });
      await manager.insert(ScenarioEntity, row);
      return recordOf(row, null);
    });

  saveDraft = async (
    organisationId: string,
    id: string,
    draft: ScenarioContent,
    at: Date,
  ): Promise<ScenarioRecord | null> => {
    const where = { id, organisationId };
    const { affected } = await this.#database.manager.update(ScenarioEntity, where, {
      draft,
      updatedAt: at,
    });
    return affected === 1 ? this.find(organisationId, id) : null;
  };

  publish = ({ organisation, scenario, by, at, check }: PublishRequest): Promise<Published> =>
    this.#database.transaction(async (manager): Promise<Published> => {
      const row = await manager.findOne(ScenarioEntity, {
        where: { id: scenario, organisationId: organisation },
        lock: { mode: 'pessimistic_write' },
      });
      if (!row) return { kind: 'not-found' };
      const newest = await newestVersion(manager, scenario);
      if (newest && isDeepStrictEqual(newest.content, row.draft)) return { kind: 'unchanged' };
      const mistakes = check(row.draft);
      if (mistakes.length > 0) return { kind: 'refused', mistakes };
      const version = manager.create(ScenarioVersionEntity, {
        id: randomUUID(),
        scenarioId: scenario,
        version: (newest?.version ?? 0) + 1,
        content: row.draft,
        publishedAt: at,
        publishedBy: by,
      });
      await manager.insert(ScenarioVersionEntity, version);
      return { kind: 'published', scenario: recordOf(row, version) };
    });

  listPublished = (organisation: string): Promise<PublishedScenario[]> =>
    publishedScenarios(this.#database.manager, { organisation });

  findPublished = async (
    organisation: string,
    scenario: string,
  ): Promise<PublishedScenario | null> => {
    const found = await publishedScenarios(this.#database.manager, { organisation, scenario });
    return found[0] ?? null;
  };

  listPractice = (): Promise<PublishedScenario[]> =>
    publishedScenarios(this.#database.manager, { organisation: null });

  ownResults = (person: string, organisation: string): Promise<OwnResult[]> =>
    this.#database.query<OwnResult[]>(
      `SELECT scenario_id AS scenario, count(*)::integer AS attempts,
              max((debrief ->> 'score')::double precision) AS best
         FROM attempt
        WHERE person_id = $1 AND organisation_id = $2 AND scenario_version_id IS NOT NULL
        GROUP BY scenario_id`,
      [person, organisation],
    );
}
