import { Brackets, type DataSource, type EntityManager } from 'typeorm';
import type { RecordedEvent } from '../../shared/bench/event.ts';
import { AttemptCheckpointEntity } from './attempt-checkpoint.entity.ts';
import { AttemptEventEntity } from './attempt-event.entity.ts';
import { attemptLines, attemptRecords } from './attempt-rows-store.ts';
import { AttemptEntity } from './attempt.entity.ts';
import type {
  Advance,
  AttemptLine,
  AttemptRecord,
  AttemptState,
  AttemptStore,
  Checkpoint,
  LockedAttempt,
  NewAttempt,
  Owner,
} from './attempt.ts';

const ownerOf = (row: AttemptEntity): Owner =>
  row.personId !== null && row.organisationId !== null
    ? { person: row.personId, organisation: row.organisationId, visitor: null }
    : { person: null, organisation: null, visitor: row.visitorTokenHash ?? '' };

const stateOf = (row: AttemptEntity): AttemptState => ({
  id: row.id,
  seed: row.seed,
  content: row.content,
  engineVersion: row.engineVersion,
  owner: ownerOf(row),
  epoch: row.epoch,
  writer: row.writer,
  next: row.nextSequence,
  benchMs: row.benchMs,
  status: row.status,
});

/** Version 1 is the only one so far; an older one would be brought up to date here, step by step. */
const eventOf = (row: AttemptEventEntity): RecordedEvent => ({
  sequence: row.sequence,
  type: row.type,
  version: 1,
  data: row.data as Record<string, unknown>,
  benchMs: row.benchMs,
  recordedAt: row.recordedAt.toISOString(),
});

const rowOf = (attemptId: string, event: RecordedEvent) => ({
  attemptId,
  sequence: event.sequence,
  type: event.type,
  version: event.version,
  data: event.data,
  benchMs: event.benchMs,
  recordedAt: new Date(event.recordedAt),
});

async function eventsFrom(
  manager: EntityManager,
  attemptId: string,
  sequence: number,
): Promise<RecordedEvent[]> {
  const rows = await manager
    .createQueryBuilder(AttemptEventEntity, 'event')
    .where('event.attemptId = :attemptId AND event.sequence >= :sequence', { attemptId, sequence })
    .orderBy('event.sequence')
    .getMany();
  return rows.map(eventOf);
}

async function saveCheckpoint(
  manager: EntityManager,
  attempt: { id: string; engineVersion: number },
  { sequence, state }: Checkpoint,
): Promise<void> {
  await manager
    .createQueryBuilder()
    .insert()
    .into(AttemptCheckpointEntity)
    .values({
      attemptId: attempt.id,
      engineVersion: attempt.engineVersion,
      sequence,
      state,
    })
    .orIgnore()
    .updateEntity(false)
    .execute();
}

/** One attempt whose row is locked until the transaction of `manager` ends. */
class LockedRow implements LockedAttempt {
  readonly #manager: EntityManager;
  readonly attempt: AttemptState;

  constructor(manager: EntityManager, row: AttemptEntity) {
    this.#manager = manager;
    this.attempt = stateOf(row);
  }

  eventsFrom = (sequence: number): Promise<RecordedEvent[]> =>
    eventsFrom(this.#manager, this.attempt.id, sequence);

  newestCheckpoint = async (): Promise<Checkpoint | null> => {
    const { id: attemptId, engineVersion } = this.attempt;
    const row = await this.#manager.findOne(AttemptCheckpointEntity, {
      where: { attemptId, engineVersion },
      order: { sequence: 'DESC' },
    });
    return row && { sequence: row.sequence, state: row.state };
  };

  advance = async (advance: Advance): Promise<void> => {
    const { id, next } = this.attempt;
    await this.#manager.insert(
      AttemptEventEntity,
      advance.events.map((event) => rowOf(id, event)),
    );
    await this.#manager.update(AttemptEntity, id, {
      nextSequence: next + advance.events.length,
      benchMs: advance.benchMs,
      writer: advance.writer,
      ...(advance.handedIn && {
        status: 'handed in' as const,
        handedInAt: advance.handedIn.at,
        debrief: advance.handedIn.debrief,
      }),
    });
    if (advance.checkpoint) await saveCheckpoint(this.#manager, this.attempt, advance.checkpoint);
  };

  takeOver = async (writer: string, epoch: number): Promise<void> => {
    await this.#manager.update(AttemptEntity, this.attempt.id, { writer, epoch });
  };
}

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
      await manager.insert(AttemptEventEntity, rowOf(attempt.id, attempt.first));
      const { sequence } = attempt.first;
      await saveCheckpoint(manager, attempt, { sequence, state: attempt.state });
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
      const row = await manager.findOne(AttemptEntity, {
        where: { id },
        lock: { mode: 'pessimistic_write' },
      });
      return row ? work(new LockedRow(manager, row)) : null;
    });
}
