import { openDB } from 'idb';
import type { DBSchema, IDBPDatabase } from 'idb';
import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { WireEvent } from '../../shared/bench/event.ts';

export interface WaitingStep {
  sequence: number;
  event: WireEvent;
}

/** Steps not yet acknowledged, by attempt and sequence number; kept on this device until the server has them. */
/** The bench after the first `sequence` events of a record: a cache, good for one engine and one history. */
export interface Checkpoint {
  engine: number;
  sequence: number;
  /** the event before it, to know the history again */ last: WireEvent;
  state: BenchState;
}

export interface OutboxStore {
  /** false: the browser refuses storage, steps live as long as the page */ isKept: boolean;
  /** oldest first */ load: (attempt: string) => Promise<WaitingStep[]>;
  add: (attempt: string, from: number, events: readonly WireEvent[]) => Promise<void>;
  /** forgets all below `next` */ acknowledge: (attempt: string, next: number) => Promise<void>;
  /** Steps that can never be stored leave the way free; they are kept apart, with why. */
  setAside: (attempt: string, why: string) => Promise<void>;
  checkpoint: (attempt: string) => Promise<Checkpoint | null>;
  keepCheckpoint: (attempt: string, checkpoint: Checkpoint) => Promise<void>;
}

interface Row extends WaitingStep {
  attempt: string;
}

interface Stored extends DBSchema {
  steps: { key: [string, number]; value: Row };
  'set-aside': {
    key: number;
    value: { attempt: string; why: string; at: string; steps: WaitingStep[] };
  };
  checkpoints: { key: string; value: Checkpoint & { attempt: string } };
}

const all = Number.MAX_SAFE_INTEGER;

export async function openOutboxStore(): Promise<OutboxStore> {
  const database: IDBPDatabase<Stored> = await openDB<Stored>('coldbench', 2, {
    upgrade: (made, before) => {
      if (before < 1) {
        made.createObjectStore('steps', { keyPath: ['attempt', 'sequence'] });
        made.createObjectStore('set-aside', { autoIncrement: true });
      }
      if (before < 2) made.createObjectStore('checkpoints', { keyPath: 'attempt' });
    },
  });
  const below = (attempt: string, next: number): IDBKeyRange =>
    IDBKeyRange.bound([attempt, 0], [attempt, next], false, true);
  return {
    isKept: true,
    load: async (attempt) =>
      (await database.getAll('steps', below(attempt, all))).map(withoutAttempt),
    add: async (attempt, from, events) => {
      const work = database.transaction('steps', 'readwrite');
      await Promise.all([
        ...events.map((event, i) => work.store.put({ attempt, sequence: from + i, event })),
        work.done,
      ]);
    },
    acknowledge: (attempt, next) => database.delete('steps', below(attempt, next)),
    setAside: async (attempt, why) => {
      const work = database.transaction(['steps', 'set-aside'], 'readwrite');
      const rows = await work.objectStore('steps').getAll(below(attempt, all));
      const at = new Date().toISOString();
      await work
        .objectStore('set-aside')
        .add({ attempt, why, at, steps: rows.map(withoutAttempt) });
      await work.objectStore('steps').delete(below(attempt, all));
      await work.done;
    },
    checkpoint: async (attempt) => (await database.get('checkpoints', attempt)) ?? null,
    keepCheckpoint: async (attempt, checkpoint) => {
      await database.put('checkpoints', { ...checkpoint, attempt });
    },
  };
}

const withoutAttempt = ({ sequence, event }: Row): WaitingStep => ({ sequence, event });

/** For a browser that refuses storage: steps live as long as the page. */
export function memoryOutboxStore(): OutboxStore {
  let rows: Row[] = [];
  const checkpoints = new Map<string, Checkpoint>();
  const isOf = (attempt: string) => (row: Row) => row.attempt === attempt;
  return {
    isKept: false,
    load: (attempt) => Promise.resolve(rows.filter(isOf(attempt)).map(withoutAttempt)),
    add: (attempt, from, events) => {
      rows = [...rows, ...events.map((event, i) => ({ attempt, sequence: from + i, event }))];
      return Promise.resolve();
    },
    acknowledge: (attempt, next) => {
      rows = rows.filter((row) => row.attempt !== attempt || row.sequence >= next);
      return Promise.resolve();
    },
    setAside: (attempt) => {
      rows = rows.filter((row) => row.attempt !== attempt);
      return Promise.resolve();
    },
    checkpoint: (attempt) => Promise.resolve(checkpoints.get(attempt) ?? null),
    keepCheckpoint: (attempt, checkpoint) => {
      checkpoints.set(attempt, checkpoint);
      return Promise.resolve();
    },
  };
}
