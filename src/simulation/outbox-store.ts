import { openDB } from 'idb';
import type { DBSchema, IDBPDatabase } from 'idb';
import type { WireEvent } from '../../shared/bench/event.ts';

export interface WaitingStep {
  sequence: number;
  event: WireEvent;
}

/** Steps not yet acknowledged, by attempt and sequence number; kept on this device until the server has them. */
export interface OutboxStore {
  /** false: the browser refuses storage, steps live as long as the page */ isKept: boolean;
  /** oldest first */ load: (attempt: string) => Promise<WaitingStep[]>;
  add: (attempt: string, from: number, events: readonly WireEvent[]) => Promise<void>;
  /** forgets all below `next` */ acknowledge: (attempt: string, next: number) => Promise<void>;
  /** Steps that can never be stored leave the way free; they are kept apart, with why. */
  setAside: (attempt: string, why: string) => Promise<void>;
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
}

const all = Number.MAX_SAFE_INTEGER;

export async function openOutboxStore(): Promise<OutboxStore> {
  const database: IDBPDatabase<Stored> = await openDB<Stored>('coldbench', 1, {
    upgrade: (fresh) => {
      fresh.createObjectStore('steps', { keyPath: ['attempt', 'sequence'] });
      fresh.createObjectStore('set-aside', { autoIncrement: true });
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
  };
}

const withoutAttempt = ({ sequence, event }: Row): WaitingStep => ({ sequence, event });

/** For a browser that refuses storage: steps live as long as the page. */
export function memoryOutboxStore(): OutboxStore {
  let rows: Row[] = [];
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
  };
}
