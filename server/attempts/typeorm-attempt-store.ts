import { Brackets, type DataSource } from 'typeorm';
import type { RecordedEvent } from '../../shared/bench/event.ts';
import { eventsFrom, insertEventsOf, saveCheckpoint } from './attempt-events-store.ts';
import { attemptLines, attemptRecords } from './attempt-rows-store.ts';
import { AttemptEntity } from './attempt.entity.ts';
import type {
  AttemptLine,
  AttemptRecord,
  AttemptStore,
  LockedAttempt,
  NewAttempt,
  Owner,
} from './attempt.ts';
import { lockAttempt } from './locked-attempt-store.ts';

/** Attempts in PostgreSQL. */
export class TypeormAttemptStore implements AttemptStore {
  readonly #database: DataSource;

  constructor(database: DataSource) {
    this.#database = database;
  }

  create = async (attempt: NewAttempt): Promise<AttemptRecord> => {
    await this.#database.transaction(async (manager) => {
      await manager.insert(AttemptEntity, {
        id: attempt.id,
        organisationId: attempt.owner.organisation,
        personId: attempt.owner.person,
        visitorTokenHash: attempt.owner.visitor,
        scenarioId: attempt.scenario,
        scenarioVersionId: attempt.scenarioVersion,
        seed: attempt.seed,
        content: attempt.content,
        engineVersion: attempt.engineVersion,
        epoch: 0,
        writer: null,
        nextSequence: attempt.first.sequence + 1,
        benchMs: attempt.first.benchMs,
        status: 'on the bench',
        startedAt: attempt.startedAt,
        handedInAt: null,
        debrief: null,
      });
      const { first, engineVersion, state } = attempt;
      await insertEventsOf(manager, attempt.id, [first]);
      const checkpoint = { sequence: first.sequence, engineVersion, state };
      await saveCheckpoint(manager, attempt.id, checkpoint);
    });
    const record = await this.find(attempt.id);
    if (!record) throw new Error(`attempt ${attempt.id} is gone right after it was stored`);
    return record;
  };

  find = async (id: string): Promise<AttemptRecord | null> => {
    const [record] = await attemptRecords(this.#database.manager, (query) =>
      query.where('attempt.id = :id', { id }),
    );
    return record ?? null;
  };

  eventsOf = (id: string): Promise<RecordedEvent[]> => eventsFrom(this.#database.manager, id, 0);

  listOwn = (person: string, organisation: string, scenario?: string): Promise<AttemptLine[]> =>
    attemptLines(this.#database.manager, (query) => {
      query.where('attempt.personId = :person AND attempt.organisationId = :organisation', {
        person,
        organisation,
      });
      if (scenario !== undefined) query.andWhere('attempt.scenarioId = :scenario', { scenario });
    });

  listOfOrganisation = (organisation: string, reader: string): Promise<AttemptLine[]> =>
    attemptLines(this.#database.manager, (query) =>
      query
        .where('attempt.organisationId = :organisation', { organisation })
        .andWhere(
          new Brackets((either) =>
            either
              .where('attempt.scenarioVersionId IS NOT NULL')
              .orWhere('attempt.personId = :reader', { reader }),
          ),
        ),
    );

  openOf = async (owner: Owner, scenario: string | null): Promise<AttemptRecord | null> => {
    const [record] = await attemptRecords(this.#database.manager, (query) => {
      query.where(`attempt.status = 'on the bench' AND attempt.scenarioVersionId IS NOT NULL`);
      if (owner.visitor !== null) query.andWhere('attempt.visitorTokenHash = :visitor', owner);
      else
        query.andWhere(
          'attempt.personId = :person AND attempt.organisationId = :organisation',
          owner,
        );
      if (scenario !== null) query.andWhere('attempt.scenarioId = :scenario', { scenario });
      query.limit(1);
    });
    return record ?? null;
  };

  withLocked = <T>(id: string, work: (locked: LockedAttempt) => Promise<T>): Promise<T | null> =>
    this.#database.transaction(async (manager) => {
      const locked = await lockAttempt(manager, id);
      return locked && work(locked);
    });
}
