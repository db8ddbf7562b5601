import { useEffect, useState } from 'react';
import { Problem } from '../api/problem.ts';
import { benchServer } from './bench-server.ts';
import { benchThread } from './bench-thread.ts';
import { newWriterId } from './new-writer-id.ts';
import { openBench, type Opened } from './open-bench.ts';
import { memoryOutboxStore, openOutboxStore } from './outbox-store.ts';
import { lockAttempt, type WriterLock } from './writer-lock.ts';

export type BenchDoor =
  | { kind: 'loading' }
  | { kind: 'failed'; problem: Problem }
  | { kind: 'broken'; error: unknown }
  | Opened;

interface Opening {
  attempt: string;
  /** counts up with each try */ round: number;
  steal: boolean;
}

/** Opens an attempt and keeps it open while the page stands. `again` opens it anew, taking it over when told to. */
export function useOpenBench(attempt: string): {
  door: BenchDoor;
  again: (how: { steal: boolean }) => void;
} {
  const [how, setHow] = useState({ round: 0, steal: false });
  const [reached, setReached] = useState<{ opening: Opening; door: BenchDoor } | null>(null);
  const opening: Opening = { attempt, ...how };

  useEffect(() => {
    const here: Opening = { attempt, round: how.round, steal: how.steal };
    let isOver = false;
    let close = (): void => undefined;
    let release = (): void => undefined;
    const arrive = (door: BenchDoor): void => {
      if (door.kind === 'open') close = door.close;
      if (isOver) close();
      else setReached({ opening: here, door });
    };
    // Whoever has left already takes no lock, and gives one back that comes too late.
    const lock = async (): Promise<WriterLock | null> => {
      if (isOver) return null;
      const held = await lockAttempt(attempt, { steal: how.steal, locks: webLocks() });
      release = () => held?.release();
      if (isOver) release();
      return held;
    };
    open(attempt, lock).then(arrive, (error: unknown) =>
      arrive(
        error instanceof Problem ? { kind: 'failed', problem: error } : { kind: 'broken', error },
      ),
    );
    return () => {
      isOver = true;
      release();
      close();
    };
  }, [attempt, how]);

  const isHere =
    reached?.opening.attempt === opening.attempt && reached.opening.round === opening.round;
  return {
    door: isHere ? reached.door : { kind: 'loading' },
    again: ({ steal }) => setHow(({ round }) => ({ round: round + 1, steal })),
  };
}

/** Missing where a page is served without TLS. */
const webLocks = (): LockManager | undefined => navigator.locks as LockManager | undefined;

const open = async (attempt: string, lock: () => Promise<WriterLock | null>): Promise<Opened> =>
  openBench({
    attempt,
    writer: newWriterId(),
    server: benchServer,
    store: await openOutboxStore().catch(memoryOutboxStore),
    lock,
    thread: benchThread,
    realNow: () => performance.now(),
    now: () => Date.now(),
  });
