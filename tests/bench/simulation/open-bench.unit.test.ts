import { describe, expect, it, vi } from 'vitest';
import type { WireEvent } from '../../../shared/bench/event.ts';
import { engineVersion } from '../../../shared/bench/setup.ts';
import type { Attempt } from '../../../shared/contracts/attempts.ts';
import type { BenchServer } from '../../../src/simulation/bench-server.ts';
import {
  openBench,
  type OpenBenchOptions,
  type OpenedBench,
} from '../../../src/simulation/open-bench.ts';
import { sameThread } from '../../../src/simulation/bench-thread.ts';
import { memoryOutboxStore } from '../../../src/simulation/outbox-store.ts';
import type { Sent } from '../../../src/simulation/step-queue.ts';
import type { WriterLock } from '../../../src/simulation/writer-lock.ts';
import { handsOn, recorded, setupWith } from '../../support/bench.ts';
import { attempt as anAttempt, contents, layout, oven } from '../../support/client-fixtures.ts';

const content = { ...contents[0], lastRunSecondsAgo: null };
const attempt: Attempt = anAttempt({ status: 'on the bench', handedInAt: null, content });
const setup = setupWith(content.faults, {
  seed: attempt.seed,
  lastRunSecondsAgo: content.lastRunSecondsAgo,
  meter: content.meter,
});

/** A record of four steps: begun, door open, a verdict, door closed. */
const record = ((): WireEvent[] => {
  const hands = handsOn(setup);
  hands.does('OpenDoor', {});
  hands.does('GiveVerdict', { part: 'F1', verdict: 'good' });
  hands.does('CloseDoor', {});
  return [...hands.events()];
})();

function withServer(more: { known?: number; about?: Partial<Attempt>; sent?: Sent } = {}) {
  const known = record.slice(0, more.known ?? record.length);
  const sent: { epoch: number; from: number; events: readonly WireEvent[] }[] = [];
  const server: BenchServer = {
    attempt: () => Promise.resolve({ ...attempt, ...more.about }),
    events: () => Promise.resolve(recorded(known)),
    oven: () => Promise.resolve({ definition: oven, layout }),
    takeOver: vi.fn(() => Promise.resolve({ epoch: 7, next: known.length })),
    send: (_id, _writer, epoch) => (from, events) => {
      sent.push({ epoch, from, events });
      return Promise.resolve(more.sent ?? { kind: 'stored', next: from + events.length });
    },
  };
  return { server, sent };
}

const lock = (): WriterLock => ({ lost: new Promise(() => undefined), release: () => undefined });

const open = async (options: Partial<OpenBenchOptions> & Pick<OpenBenchOptions, 'server'>) =>
  openBench({
    attempt: attempt.id,
    writer: attempt.id,
    store: memoryOutboxStore(),
    lock: () => Promise.resolve(lock()),
    thread: sameThread,
    realNow: () => 0,
    now: () => 5000,
    ...options,
  });

const opened = async (options: Parameters<typeof open>[0]): Promise<OpenedBench> => {
  const found = await open(options);
  if (found.kind !== 'open') throw new Error('not opened');
  return found;
};

describe('opening a bench', () => {
  it('goes on where the record stands, at the bench time of its last step', async () => {
    const { server, sent } = withServer();
    const { bench } = await opened({ server });
    const { state, clock, save, events } = bench.getState();
    expect(state.oven.isDoorClosed).toBe(true);
    expect(state.sheet.verdicts).toEqual({ F1: 'good' });
    expect(clock.now()).toBe(record.at(-1)?.benchMs);
    expect(events).toEqual(record);
    expect(save).toEqual({ kind: 'saved', at: Date.parse('2026-01-05T08:00:00.000Z') });
    expect(sent).toEqual([]);
  });

  it('takes over, then puts steps kept on this device on the bench and sends them again', async () => {
    const { server, sent } = withServer({ known: 2 });
    const store = memoryOutboxStore();
    await store.add(attempt.id, 1, record.slice(1));
    const { bench, outbox } = await opened({ server, store });
    expect(bench.getState().state.sheet.verdicts).toEqual({ F1: 'good' });
    await outbox?.flush();
    expect(sent).toEqual([{ epoch: 7, from: 2, events: record.slice(2) }]);
    expect(await store.load(attempt.id)).toEqual([]);
    expect(bench.getState().save).toEqual({ kind: 'saved', at: 5000 });
  });

  it('folds from the checkpoint kept on this device, and only if it belongs to this record', async () => {
    const { server } = withServer();
    const store = memoryOutboxStore();
    const half = await opened({ server: withServer({ known: 2 }).server, store });
    const state = { ...half.bench.getState().state, inspected: ['C1'] };
    const [, last] = record;
    if (!last) throw new Error('no step');
    await store.keepCheckpoint(attempt.id, { engine: engineVersion, sequence: 2, last, state });
    // The mark that only the checkpoint has shows that it was used.
    expect((await opened({ server, store })).bench.getState().state.inspected).toEqual(['C1']);
    await store.keepCheckpoint(attempt.id, {
      engine: engineVersion,
      sequence: 2,
      last: { ...last, benchMs: last.benchMs + 1 },
      state,
    });
    expect((await opened({ server, store })).bench.getState().state.inspected).toEqual([]);
    await store.keepCheckpoint(attempt.id, { engine: 0, sequence: 2, last, state });
    expect((await opened({ server, store })).bench.getState().state.inspected).toEqual([]);
  });

  it('keeps a checkpoint once the server has many more steps', async () => {
    const { server } = withServer();
    const store = memoryOutboxStore();
    const { bench, outbox } = await opened({ server, store });
    for (let i = 0; i < 30; i += 1)
      bench.getState().run({ type: i % 2 ? 'CloseDoor' : 'OpenDoor', data: {} }, 20_000 + i);
    await outbox?.flush();
    await outbox?.flush();
    const kept = await store.checkpoint(attempt.id);
    expect(kept?.sequence).toBe(record.length + 30);
    expect(kept?.state).toEqual(bench.getState().state);
  });

  it('sets steps aside that do not follow from the record, and says why', async () => {
    const { server, sent } = withServer();
    const store = memoryOutboxStore();
    await store.add(attempt.id, 2, [{ type: 'DoorClosed', version: 1, data: {}, benchMs: 1 }]);
    const found = await opened({ server, store });
    expect(found.setAside).toMatch(/another device/);
    expect(await store.load(attempt.id)).toEqual([]);
    expect(sent).toEqual([]);
    expect(found.bench.getState().run({ type: 'OpenDoor', data: {} }, 20_000)).toBe(true);
  });

  it('keeps a step that the rules do not allow, takes no more, and goes on when it is set aside', async () => {
    const { server } = withServer({ known: 3 });
    const store = memoryOutboxStore();
    // The cord is in: the cover cannot have come off.
    const impossible = { type: 'CoverRemoved', version: 1 as const, data: {}, benchMs: 60_000 };
    await store.add(attempt.id, 3, [impossible]);
    const found = await opened({ server, store });
    const { save, run } = found.bench.getState();
    expect(save).toMatchObject({ kind: 'refused', steps: 1 });
    expect(run({ type: 'CloseDoor', data: {} })).toBe(false);
    expect(found.bench.getState().notice).toMatchObject({ kind: 'refusal' });
    expect(await store.load(attempt.id)).toHaveLength(1);
    await found.setStepsAside();
    const again = await opened({ server, store });
    expect(again.bench.getState().events).toEqual(record.slice(0, 3));
    expect(again.bench.getState().run({ type: 'CloseDoor', data: {} })).toBe(true);
  });

  it('only reads while another tab has the lock: no take-over, no sending', async () => {
    const { server, sent } = withServer();
    const { bench, outbox } = await opened({ server, lock: () => Promise.resolve(null) });
    expect(outbox).toBeNull();
    expect(server.takeOver).not.toHaveBeenCalled();
    expect(bench.getState().save.kind).toBe('read-only');
    expect(bench.getState().run({ type: 'OpenDoor', data: {} })).toBe(false);
    expect(bench.getState().state.oven.isDoorClosed).toBe(true);
    expect(sent).toEqual([]);
  });

  it('only reads from the moment on at which the lock is lost', async () => {
    const { server } = withServer();
    let lose = (): void => undefined;
    const lost = new Promise<void>((resolve) => {
      lose = resolve;
    });
    const { bench } = await opened({
      server,
      lock: () => Promise.resolve({ lost, release: () => undefined }),
    });
    expect(bench.getState().run({ type: 'OpenDoor', data: {} })).toBe(true);
    lose();
    await lost;
    await Promise.resolve();
    expect(bench.getState().save.kind).toBe('read-only');
    expect(bench.getState().run({ type: 'CloseDoor', data: {} })).toBe(false);
  });

  it.each<Partial<Attempt>>([{ status: 'handed in' }, { isOwn: false }])(
    'is closed for an attempt with %o',
    async (about) => {
      const { server } = withServer({ about });
      expect((await open({ server })).kind).toBe('closed');
      expect(server.takeOver).not.toHaveBeenCalled();
    },
  );

  it('gives the lock back when the record cannot be read', async () => {
    const { server } = withServer();
    const release = vi.fn();
    const failing = { ...server, events: () => Promise.reject(new Error('away')) };
    const taken = { lost: new Promise<void>(() => undefined), release };
    await expect(open({ server: failing, lock: () => Promise.resolve(taken) })).rejects.toThrow(
      'away',
    );
    expect(release).toHaveBeenCalledOnce();
  });
});
