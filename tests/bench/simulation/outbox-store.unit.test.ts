import 'fake-indexeddb/auto';
import { IDBFactory } from 'fake-indexeddb';
import { describe, expect, it, beforeEach } from 'vitest';
import {
  memoryOutboxStore,
  openOutboxStore,
  type OutboxStore,
} from '../../../src/simulation/outbox-store.ts';
import { untouched } from '../../../shared/bench/fold.ts';
import { setupWith } from '../../support/bench.ts';
import { step } from './events.ts';

const stores: [string, () => Promise<OutboxStore>][] = [
  ['in memory', () => Promise.resolve(memoryOutboxStore())],
  ['in IndexedDB', openOutboxStore],
];

beforeEach(() => {
  globalThis.indexedDB = new IDBFactory();
});

describe.each(stores)('steps kept %s', (_name, open) => {
  it('come back in order, by attempt', async () => {
    const store = await open();
    await store.add('a', 7, [step('CordPulled', 1), step('CoverRemoved', 2)]);
    await store.add('b', 1, [step('DoorOpened', 3)]);
    await store.add('a', 9, [step('DoorClosed', 4)]);
    expect((await store.load('a')).map(({ sequence, event }) => [sequence, event.type])).toEqual([
      [7, 'CordPulled'],
      [8, 'CoverRemoved'],
      [9, 'DoorClosed'],
    ]);
  });

  it('are forgotten below what is acknowledged, and no others', async () => {
    const store = await open();
    await store.add('a', 7, [step('CordPulled', 1), step('CoverRemoved', 2)]);
    await store.add('b', 1, [step('DoorOpened', 3)]);
    await store.acknowledge('a', 8);
    expect((await store.load('a')).map(({ sequence }) => sequence)).toEqual([8]);
    expect(await store.load('b')).toHaveLength(1);
  });

  it('leave the way free when they are set aside', async () => {
    const store = await open();
    await store.add('a', 7, [step('CordPulled', 1)]);
    await store.setAside('a', 'the record went on elsewhere');
    expect(await store.load('a')).toEqual([]);
    await store.add('a', 7, [step('DoorOpened', 2)]);
    expect((await store.load('a')).map(({ event }) => event.type)).toEqual(['DoorOpened']);
  });

  it('have the newest checkpoint of each attempt beside them', async () => {
    const store = await open();
    const state = untouched(setupWith());
    expect(await store.checkpoint('a')).toBeNull();
    const checkpoint = { engine: 1, sequence: 7, last: step('CordPulled', 1), state };
    await store.keepCheckpoint('a', checkpoint);
    await store.keepCheckpoint('a', { ...checkpoint, sequence: 9 });
    expect(await store.checkpoint('a')).toMatchObject({ sequence: 9, state });
    expect(await store.checkpoint('b')).toBeNull();
  });
});

it('keeps what was set aside, with why, when the browser was closed meanwhile', async () => {
  const first = await openOutboxStore();
  await first.add('a', 7, [step('CordPulled', 1)]);
  await first.setAside('a', 'because');
  await first.add('a', 7, [step('DoorOpened', 2)]);
  const again = await openOutboxStore();
  expect(await again.load('a')).toHaveLength(1);
  const rows = await new Promise<unknown[]>((resolve, reject) => {
    const request = indexedDB.open('coldbench');
    request.onsuccess = () => {
      const all = request.result.transaction('set-aside').objectStore('set-aside').getAll();
      all.onsuccess = () => resolve(all.result);
      all.onerror = () => reject(all.error ?? new Error('unread'));
    };
  });
  expect(rows).toEqual([
    expect.objectContaining({
      attempt: 'a',
      why: 'because',
      steps: [{ sequence: 7, event: step('CordPulled', 1) }],
    }),
  ]);
});
