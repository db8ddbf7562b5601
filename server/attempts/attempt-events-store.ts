import type { EntityManager } from 'typeorm';
import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { RecordedEvent } from '../../shared/bench/event.ts';
import type { Checkpoint } from './attempt.ts';

// The way of every append: plain SQL, because here the time that a query builder takes is felt.

interface EventRow {
  sequence: number;
  type: string;
  data: Record<string, unknown>;
  benchMs: number;
  recordedAt: Date;
}

const selectEvents = `
  SELECT sequence, type, data, bench_ms AS "benchMs", recorded_at AS "recordedAt"
    FROM attempt_event WHERE attempt_id = $1 AND sequence >= $2 ORDER BY sequence`;

/** Version 1 is the only one so far; an older one would be brought up to date here, step by step. */
const eventOf = (row: EventRow): RecordedEvent => ({
  sequence: row.sequence,
  type: row.type,
  version: 1,
  data: row.data,
  benchMs: row.benchMs,
  recordedAt: row.recordedAt.toISOString(),
});

/** Events from this sequence number on, in order. */
export async function eventsFrom(
  manager: EntityManager,
  attempt: string,
  sequence: number,
): Promise<RecordedEvent[]> {
  const rows = await manager.query<EventRow[]>(selectEvents, [attempt, sequence]);
  return rows.map(eventOf);
}

/** $1 attempt, $2 events as JSON */
export const insertEvents = `
  INSERT INTO attempt_event (attempt_id, sequence, type, version, data, bench_ms, recorded_at)
  SELECT $1, sequence, type, version, data, "benchMs", "recordedAt"
    FROM jsonb_to_recordset($2::jsonb) AS event (sequence integer, type text, version smallint,
         data jsonb, "benchMs" double precision, "recordedAt" timestamptz)`;

/** Stores events that are new; a sequence number that is taken refuses them all. */
export async function insertEventsOf(
  manager: EntityManager,
  attempt: string,
  events: readonly RecordedEvent[],
): Promise<void> {
  await manager.query(insertEvents, [attempt, JSON.stringify(events)]);
}

const selectCheckpoint = `
  SELECT sequence, state FROM attempt_checkpoint
   WHERE attempt_id = $1 AND engine_version = $2 ORDER BY sequence DESC LIMIT 1`;

/** The newest checkpoint that this version of the rules folded. */
export async function newestCheckpoint(
  manager: EntityManager,
  attempt: string,
  engineVersion: number,
): Promise<{ sequence: number; state: BenchState } | null> {
  const values = [attempt, engineVersion];
  const [row] = await manager.query<{ sequence: number; state: BenchState }[]>(
    selectCheckpoint,
    values,
  );
  return row ?? null;
}

const insertCheckpoint = `
  INSERT INTO attempt_checkpoint (attempt_id, sequence, engine_version, state)
  VALUES ($1, $2, $3, $4) ON CONFLICT DO NOTHING`;

export async function saveCheckpoint(
  manager: EntityManager,
  attempt: string,
  { sequence, engineVersion, state }: Checkpoint,
): Promise<void> {
  const values = [attempt, sequence, engineVersion, JSON.stringify(state)];
  await manager.query(insertCheckpoint, values);
}
