import { beforeEach, describe, expect, it, vi } from 'vitest';
import type { WireEvent } from '../../../shared/bench/event.ts';
import { memoryOutboxStore } from '../../../src/simulation/outbox-store.ts';
import { outbox } from '../../../src/simulation/outbox.ts';
import type { SaveState } from '../../../src/simulation/save-state.ts';
import type { Sent } from '../../../src/simulation/step-queue.ts';
import { decisions, step } from './events.ts';

interface Call {
  from: number;
  events: readonly WireEvent[];
}

/** A server that answers as told, one answer a call, then stores everything. */
function bench(answers: ((call: Call) => Sent)[] = [], waiting: WireEvent[][] = [], next = 1) {
  const calls: Call[] = [];
  const states: SaveState[] = [];
  const store = memoryOutboxStore();
  const stored = ({ from, events }: Call): Sent => ({ kind: 'stored', next: from + events.length });
  const box = outbox({
    attempt: 'a',
    next,
    waiting,
    store,
    send: (from, events) => {
      const call = { from, events };
      calls.push(call);
      return Promise.resolve((answers.shift() ?? stored)(call));
    },
    onState: (state) => states.push(state),
    now: () => 1000,
    retryMs: 50,
  });
  return { box, calls, states, store };
}

const away = (): Sent => ({ kind: 'away', why: 'no network' });
const last = (states: SaveState[]) => states.at(-1);

beforeEach(() => {
  vi.useFakeTimers();
  return () => vi.useRealTimers();
});

describe('sending', () => {
  it('says saving, then when it was saved, and forgets the steps only then', async () => {
    const { box, states, store, calls } = bench();
    box.add([step('CordPulled', 5)]);
    await vi.runAllTimersAsync();
    expect(calls).toEqual([{ from: 1, events: [step('CordPulled', 5)] }]);
    expect(states).toEqual([
      { kind: 'saving', steps: 1 },
      { kind: 'saved', at: 1000 },
    ]);
    expect(await store.load('a')).toEqual([]);
  });

  it('goes on in order while steps are added during a send', async () => {
    const { box, calls, states } = bench();
    box.add([step('CordPulled', 1)]);
    await Promise.resolve();
    box.add([step('CoverRemoved', 2)]);
    box.add([step('LeadLifted', 3), step('HazardHappened', 3)]);
    await vi.runAllTimersAsync();
    expect(calls.flatMap(({ events }) => events.map(({ type }) => type))).toEqual([
      'CordPulled',
      'CoverRemoved',
      'LeadLifted',
      'HazardHappened',
    ]);
    expect(calls.map(({ from, events }) => from + events.length).at(-1)).toBe(5);
    expect(last(states)?.kind).toBe('saved');
  });

  it('never splits a decision between batches, and never sends more than 200 events', async () => {
    const pair = [step('LeadLifted', 300), step('HazardHappened', 300)];
    const { box, calls } = bench([], [...decisions(199), pair, ...decisions(10, 400)]);
    await box.flush();
    expect(calls.map(({ events }) => events.length)).toEqual([199, 12]);
    expect(calls[1]?.events.slice(0, 2)).toEqual(pair);
  });

  it('leaves nothing behind that is added in the very moment the last answer is told', async () => {
    const { box, calls, states } = bench();
    let isAdded = false;
    const push = states.push.bind(states);
    states.push = (state) => {
      if (state.kind === 'saved' && !isAdded) {
        isAdded = true;
        box.add([step('DoorOpened', 9)]);
      }
      return push(state);
    };
    box.add([step('CordPulled', 1)]);
    await vi.runAllTimersAsync();
    expect(calls.map(({ from }) => from)).toEqual([1, 2]);
    expect(last(states)?.kind).toBe('saved');
  });
});

describe('when the server is away', () => {
  it('keeps the steps, says how many, and sends the very same batch again', async () => {
    const { box, calls, states, store } = bench([away, away]);
    box.add([step('CordPulled', 1)]);
    await vi.advanceTimersByTimeAsync(1);
    box.add([step('CoverRemoved', 2)]);
    expect(last(states)).toEqual({ kind: 'waiting', steps: 2, why: 'no network', isKept: false });
    expect(await store.load('a')).toHaveLength(2);
    await vi.runAllTimersAsync();
    expect(calls[0]?.events).toHaveLength(1);
    expect(calls[1]).toEqual(calls[0]);
    expect(calls[2]).toEqual(calls[0]);
    expect(calls[3]).toEqual({ from: 2, events: [step('CoverRemoved', 2)] });
    expect(last(states)?.kind).toBe('saved');
  });

  it('waits longer each time: 50, 100, 200 ms', async () => {
    const { box, calls } = bench([away, away, away]);
    box.add([step('CordPulled', 1)]);
    await vi.advanceTimersByTimeAsync(49);
    expect(calls).toHaveLength(1);
    await vi.advanceTimersByTimeAsync(2);
    expect(calls).toHaveLength(2);
    await vi.advanceTimersByTimeAsync(98);
    expect(calls).toHaveLength(2);
    await vi.advanceTimersByTimeAsync(3);
    expect(calls).toHaveLength(3);
  });

  it('tries at once when it is told to', async () => {
    const { box, calls, states } = bench([away]);
    box.add([step('CordPulled', 1)]);
    await vi.advanceTimersByTimeAsync(1);
    expect(await box.flush()).toEqual({ kind: 'saved', at: 1000 });
    expect(calls).toHaveLength(2);
    expect(last(states)?.kind).toBe('saved');
  });
});

describe('when the record stands elsewhere', () => {
  it('sends only the rest of a batch of which the server has the beginning', async () => {
    const { box, calls, states, store } = bench(
      [() => ({ kind: 'gap', expected: 3 })],
      decisions(4),
    );
    await store.add('a', 1, decisions(4).flat());
    await box.flush();
    expect(calls.map(({ from, events }) => [from, events.length])).toEqual([
      [1, 4],
      [3, 2],
    ]);
    expect(last(states)?.kind).toBe('saved');
    expect(await store.load('a')).toEqual([]);
  });

  it.each([1, 0, 9])('keeps everything and says so when it expects step %i', async (expected) => {
    const { box, calls, states, store } = bench([() => ({ kind: 'gap', expected })], decisions(2));
    await store.add('a', 1, decisions(2).flat());
    await box.flush();
    expect(last(states)).toMatchObject({ kind: 'refused', steps: 2 });
    await vi.runAllTimersAsync();
    expect(calls).toHaveLength(1);
    expect(await store.load('a')).toHaveLength(2);
  });

  it('stops when another tab writes', async () => {
    const { box, calls, states, store } = bench([
      () => ({ kind: 'another-writer', why: 'elsewhere' }),
    ]);
    box.add([step('CordPulled', 1)]);
    await vi.runAllTimersAsync();
    expect(last(states)).toEqual({ kind: 'read-only', why: 'elsewhere' });
    await box.flush();
    expect(calls).toHaveLength(1);
    expect(await store.load('a')).toHaveLength(1);
  });
});

describe('when the server refuses a step', () => {
  it('keeps every step on this device and sends no more', async () => {
    const { box, calls, states, store } = bench([() => ({ kind: 'refused', why: 'cannot be' })]);
    box.add([step('CordPulled', 1)]);
    await vi.runAllTimersAsync();
    box.add([step('CoverRemoved', 2)]);
    await vi.runAllTimersAsync();
    expect(states.at(-1)).toEqual({ kind: 'refused', steps: 1, why: 'cannot be' });
    expect(calls).toHaveLength(1);
    expect((await store.load('a')).map(({ sequence }) => sequence)).toEqual([1, 2]);
  });
});

it('sends nothing after it was stopped', async () => {
  const { box, calls } = bench([away]);
  box.add([step('CordPulled', 1)]);
  await vi.advanceTimersByTimeAsync(1);
  box.stop();
  await vi.runAllTimersAsync();
  expect(calls).toHaveLength(1);
});
