import type { EntityManager } from 'typeorm';
import type { ScenarioContent } from '../../shared/scenario/scenario.ts';
import {
  eventsFrom,
  insertEvents,
  newestCheckpoint,
  saveCheckpoint,
} from './attempt-events-store.ts';
import type { Advance, AttemptState, AttemptStatus, LockedAttempt, Owner } from './attempt.ts';

interface LockedRow {
  id: string;
  organisation: string | null;
  person: string | null;
  visitor: string | null;
  seed: number;
  content: ScenarioContent;
  engineVersion: number;
  epoch: number;
  writer: string | null;
  next: number;
  benchMs: number;
  status: AttemptStatus;
  startedAt: Date;
}

const select = `
  SELECT id, organisation_id AS organisation, person_id AS person, visitor_token_hash AS visitor,
         seed, content, engine_version AS "engineVersion", epoch, writer, next_sequence AS next,
         bench_ms AS "benchMs", status, started_at AS "startedAt"
    FROM attempt WHERE id = $1 FOR UPDATE`;

/** Events and projection in one journey to the database. */
const addAndProject = `
  WITH added AS (${insertEvents})
  UPDATE attempt
     SET next_sequence = $7, bench_ms = $3, writer = $4,
         status = CASE WHEN $5::timestamptz IS NULL THEN status ELSE 'handed in' END,
         handed_in_at = COALESCE($5::timestamptz, handed_in_at), debrief = COALESCE($6, debrief)
   WHERE id = $1`;

export function ownerOf(row: Pick<LockedRow, 'person' | 'organisation' | 'visitor'>): Owner {
  if (row.person !== null && row.organisation !== null) {
    return { person: row.person, organisation: row.organisation, visitor: null };
  }
  return { person: null, organisation: null, visitor: row.visitor ?? '' };
}

async function advance(
  manager: EntityManager,
  { id, next }: AttemptState,
  { events, benchMs, writer, handedIn, checkpoint }: Advance,
): Promise<void> {
  const debrief = handedIn && JSON.stringify(handedIn.debrief);
  const end = [handedIn?.at ?? null, debrief, next + events.length];
  await manager.query(addAndProject, [id, JSON.stringify(events), benchMs, writer, ...end]);
  if (checkpoint) await saveCheckpoint(manager, id, checkpoint);
}

/** Locks the attempt's row until the transaction of `manager` ends; null: there is none. */
export async function lockAttempt(
  manager: EntityManager,
  id: string,
): Promise<LockedAttempt | null> {
  const [row] = await manager.query<LockedRow[]>(select, [id]);
  if (!row) return null;
  const { person: _person, organisation: _organisation, visitor: _visitor, ...rest } = row;
  const attempt: AttemptState = { ...rest, owner: ownerOf(row) };
  return {
    attempt,
    eventsFrom: (sequence) => eventsFrom(manager, id, sequence),
    newestCheckpoint: (engineVersion) => newestCheckpoint(manager, id, engineVersion),
    advance: (step) => advance(manager, attempt, step),
    takeOver: async (writer, epoch) => {
      await manager.query('UPDATE attempt SET writer = $2, epoch = $3 WHERE id = $1', [
        id,
        writer,
        epoch,
      ]);
    },
  };
}
