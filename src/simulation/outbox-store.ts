import { openDB } from 'idb';
import type { IDBPDatabase } from 'idb';
import type { WireEvent } from '../../shared/bench/event.ts';

/** Steps not yet acknowledged, by attempt and sequence number; kept on this device until the server has them. */
export interface OutboxStore {
  /** oldest first */ load: (attempt: string) => Promise<{ sequence: number; event: WireEvent }[]>;
  add: (attempt: string, from: number, events: readonly WireEvent[]) => Promise<void>;
  /** forgets all below `next` */ acknowledge: (attempt: string, next: number) => Promise<void>;
}

const storeName = 'steps';

interface Row {
  attempt: string;
  sequence: number;
  event: WireEvent;
}

export async function openOutboxStore(): Promise<OutboxStore> {
  const database: IDBPDatabase = await openDB('coldbench', 1, {
    upgrade: (fresh) => {
      fresh.createObjectStore(storeName, { keyPath: ['attempt', 'sequence'] });
    },
  });
  const below = (attempt: string, next: number): IDBKeyRange =>
    IDBKeyRange.bound([attempt, 0], [attempt, next], false, true);
  return {
    load: async (attempt) => {
      const rows = (await database.getAll(
        storeName,
        below(attempt, Number.MAX_SAFE_INTEGER),
      )) as Row[];
      return rows.map(({ sequence, event }) => ({ sequence, event }));
    },
    add: async (attempt, from, events) => {
      const work = database.transaction(storeName, 'readwrite');
      for (const [i, event] of events.entries()) {
        await work.store.put({ attempt, sequence: from + i, event } satisfies Row);
      }
      await work.done;
    },
    acknowledge: async (attempt, next) => {
      await database.delete(storeName, below(attempt, next));
    },
  };
}

/** For a browser that refuses storage: steps live as long as the page. */
export function memoryOutboxStore(): OutboxStore {
  let rows: Row[] = [];
  return {
    load: (attempt) => Promise.resolve(rows.filter((row) => row.attempt === attempt)),
    add: (attempt, from, events) => {
      rows = [...rows, ...events.map((event, i) => ({ attempt, sequence: from + i, event }))];
      return Promise.resolve();
    },
    acknowledge: (attempt, next) => {
      rows = rows.filter((row) => row.attempt !== attempt || row.sequence >= next);
      return Promise.resolve();
    },
  };
}
