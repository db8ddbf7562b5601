import { randomUUID } from 'node:crypto';
import { beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { attemptRules } from '../../../server/attempts/attempt-rules.ts';
import type { OvenLibrary } from '../../../server/ovens/oven-library.ts';
import type { WireEvent } from '../../../shared/bench/event.ts';
import { openDesk, visitor, type Desk } from '../../support/server-attempts.ts';
import { readAllOvens } from '../../support/server-content.ts';

let ovens: OvenLibrary;
let desk: Desk;

beforeAll(async () => {
  ovens = await readAllOvens();
});

beforeEach(async () => {
  desk = await openDesk(ovens);
});

/** The door opened and a verdict: two commands that cost no circuit. */
const begin = (): WireEvent[] => [...desk.hands.does('OpenDoor', {}), ...judge()];

const judge = (): WireEvent[] => desk.hands.does('GiveVerdict', { part: 'V1', verdict: 'good' });

const stored = async () => (await desk.store.eventsOf(desk.attempt.id)).map(({ type }) => type);

describe('taking events', () => {
  test('answers the next sequence number and stores them with their numbers', async () => {
    const events = begin();
    expect(await desk.send(1, events)).toEqual({ ok: true, value: { next: 1 + events.length } });
    const all = await desk.store.eventsOf(desk.attempt.id);
    expect(all.slice(1)).toEqual(
      events.map((event, index) => ({
        ...event,
        sequence: index + 1,
        recordedAt: '2026-01-05T08:30:00.000Z',
      })),
    );
    expect(await desk.store.find(desk.attempt.id)).toMatchObject({
      benchMs: desk.hands.state().benchMs,
      writer: desk.writer,
    });
  });

  test('a batch sent again is dropped and answered the same', async () => {
    const events = begin();
    const first = await desk.send(1, events);
    expect(await desk.send(1, events)).toEqual(first);
    expect(await stored()).toHaveLength(1 + events.length);
  });

  test('of a batch that is half known only the new half is added', async () => {
    const both = begin();
    await desk.send(1, both.slice(0, 1));
    expect(await desk.send(1, both)).toEqual({ ok: true, value: { next: 3 } });
    expect(await stored()).toEqual(['AttemptBegan', 'DoorOpened', 'VerdictGiven']);
  });

  test('a gap is refused and the expected number named', async () => {
    expect(await desk.send(2, begin())).toMatchObject({
      ok: false,
      problem: { code: 'sequence-gap', expected: 1 },
    });
    expect(await stored()).toEqual(['AttemptBegan']);
  });

  test('a different event at a known number is another writer’s', async () => {
    const events = begin();
    await desk.send(1, events);
    const other = events.map((event) => ({ ...event, benchMs: event.benchMs + 1 }));
    expect(await desk.send(1, other)).toMatchObject({
      ok: false,
      problem: { code: 'another-writer', epoch: 0 },
    });
    expect(await stored()).toHaveLength(1 + events.length);
  });

  test('nobody but the owner may append, or learns that there is something', async () => {
    const caller = { member: null, visitor: 'd'.repeat(64) };
    expect(await desk.send(1, begin(), { caller })).toMatchObject({
      problem: { code: 'not-found' },
    });
    const nowhere = await desk.append.append(visitor, randomUUID(), {
      writer: desk.writer,
      epoch: 0,
      from: 1,
      events: elsewhere(),
    });
    expect(nowhere).toMatchObject({ problem: { code: 'not-found' } });
  });
});

const elsewhere = (): WireEvent[] => [{ type: 'DoorOpened', version: 1, data: {}, benchMs: 1 }];

describe('judging events', () => {
  test('an unknown type is named with its place in the batch', async () => {
    const made: WireEvent = { type: 'LeadInvented', version: 1, data: {}, benchMs: 60_000 };
    const events = [...begin(), made];
    const index = events.length - 1;
    const outcome = await desk.send(1, events);
    expect(outcome).toMatchObject({
      ok: false,
      problem: { code: 'cannot-have-happened', errors: [{ path: `events.${index}` }] },
    });
    if (outcome.ok) throw new Error('it was taken');
    expect(outcome.problem.detail).toContain(`Event ${index} of the batch, LeadInvented`);
    expect(await stored()).toEqual(['AttemptBegan']);
  });

  test('the place counts from the front of the batch, also when its front was known', async () => {
    const known = begin();
    await desk.send(1, known);
    const data = { part: 'Z9', verdict: 'good' };
    const never: WireEvent = { type: 'VerdictGiven', version: 1, data, benchMs: 9e4 };
    expect(await desk.send(1, [...known, never])).toMatchObject({
      problem: {
        code: 'cannot-have-happened',
        errors: [{ path: expect.stringMatching(`^events.${known.length}`) }],
      },
    });
  });

  test('faulty data are named by their path', async () => {
    const odd: WireEvent = { type: 'LeadLifted', version: 1, data: { end: 7 }, benchMs: 9e4 };
    expect(await desk.send(1, [...begin(), odd])).toMatchObject({
      problem: { code: 'cannot-have-happened', errors: [{ path: 'events.2.data.end' }] },
    });
  });

  test.each([1e300, 3_600_001])(
    'bench time that cannot have come yet is refused: %d ms',
    async (benchMs) => {
      // Desk and attempt begin at the same moment: an hour's grace, and nothing was waited for.
      const early: WireEvent = { type: 'DoorOpened', version: 1, data: {}, benchMs };
      expect(await desk.send(1, [early])).toMatchObject({
        ok: false,
        problem: {
          code: 'cannot-have-happened',
          detail: expect.stringContaining('further ahead than time can have passed'),
          errors: [{ path: 'events.0.benchMs' }],
        },
      });
      expect(await stored()).toEqual(['AttemptBegan']);
    },
  );

  test('waits carry bench time as far as they say, in this batch or before', async () => {
    const waits = Array.from({ length: 12 }, () =>
      desk.hands.does('Wait', { ms: 600_000 }, 600),
    ).flat();
    expect(await desk.send(1, waits)).toMatchObject({ ok: true });
    const last = waits.at(-1)?.benchMs ?? 0;
    expect(last).toBe(7_200_000);
    const later = (benchMs: number): WireEvent[] => [
      { type: 'DoorOpened', version: 1, data: {}, benchMs },
    ];
    expect(await desk.send(13, later(last + 3_600_001))).toMatchObject({
      problem: { code: 'cannot-have-happened' },
    });
    expect(await desk.send(13, later(last + 3_600_000))).toMatchObject({ ok: true });
  });

  test('a reading that the circuit does not give is refused', async () => {
    const events = begin();
    desk.hands.does('SetMeter', { setting: 'ohms-200' });
    desk.hands.does('PlaceProbe', { probe: 'red', target: 'BAT.pos' });
    desk.hands.does('PlaceProbe', { probe: 'black', target: 'BAT.pos' });
    desk.hands.does('TakeReading', {});
    const rest = desk.hands.events().slice(1 + events.length);
    await desk.send(1, events);
    const forged = rest.map((event) =>
      event.type === 'ReadingTaken'
        ? { ...event, data: { ...event.data, display: '88.8' } }
        : event,
    );
    const from = 1 + events.length;
    expect(await desk.send(from, forged)).toMatchObject({
      problem: { code: 'cannot-have-happened' },
    });
    expect(await desk.send(from, rest)).toMatchObject({ ok: true });
  });

  test('another process goes on where this one stopped', async () => {
    const events = begin();
    await desk.send(1, events);
    const more = judge();
    const sent = await desk.send(1 + events.length, more, { service: desk.another() });
    expect(sent).toMatchObject({ ok: true });
  });

  test('what another process stored in between is not forgotten here', async () => {
    const other = desk.another();
    await desk.send(1, begin());
    await desk.send(3, desk.hands.does('CloseDoor', {}), { service: other });
    const again = desk.hands.does('OpenDoor', {});
    expect(await desk.send(4, again)).toEqual({ ok: true, value: { next: 5 } });
  });

  test('after a hundred events there is a checkpoint, and it is what all events fold to', async () => {
    const events = begin();
    while (events.length < 110) {
      events.push(...judge());
    }
    await desk.send(1, events.slice(0, 60));
    await desk.send(61, events.slice(60));
    const checkpoint = await desk.store.withLocked(desk.attempt.id, ({ newestCheckpoint }) =>
      newestCheckpoint(attemptRules.engineVersion),
    );
    expect(checkpoint?.sequence).toBe(110);
    const setup = attemptRules.setUp(desk.hands.setup.oven.definition, desk.attempt.content, 417);
    const all = await desk.store.eventsOf(desk.attempt.id);
    expect(checkpoint?.state).toEqual(attemptRules.fold(setup, all, null));
  });
});

describe('who writes', () => {
  test('the first to append is the writer, another tab is refused with the epoch', async () => {
    const events = begin();
    await desk.send(1, events);
    expect(await desk.send(1, events, { writer: randomUUID() })).toMatchObject({
      problem: { code: 'another-writer', epoch: 0 },
    });
  });

  test('taking over raises the epoch; what the old tab sends is refused', async () => {
    const events = begin();
    await desk.send(1, events);
    const tab = randomUUID();
    const taken = await desk.append.takeOver(visitor, desk.attempt.id, tab);
    expect(taken).toEqual({ ok: true, value: { epoch: 1, next: 1 + events.length } });
    const more = judge();
    const from = 1 + events.length;
    const refusal = { problem: { code: 'another-writer', epoch: 1 } };
    expect(await desk.send(from, more)).toMatchObject(refusal);
    expect(await desk.send(from, more, { epoch: 1 })).toMatchObject(refusal);
    expect(await desk.send(from, more, { epoch: 2, writer: tab })).toMatchObject(refusal);
    expect(await desk.send(from, more, { epoch: 1, writer: tab })).toMatchObject({ ok: true });
  });

  test('asking again for what one has changes nothing', async () => {
    const take = () => desk.append.takeOver(visitor, desk.attempt.id, desk.writer);
    const first = await take();
    expect(first).toEqual({ ok: true, value: { epoch: 1, next: 1 } });
    expect(await take()).toEqual(first);
  });

  test('only the owner can take over', async () => {
    const stranger = { member: null, visitor: null };
    expect(await desk.append.takeOver(stranger, desk.attempt.id, desk.writer)).toMatchObject({
      problem: { code: 'not-found' },
    });
  });
});

describe('handing in', () => {
  async function handIn(): Promise<WireEvent[]> {
    const events = begin();
    events.push(...desk.hands.does('StateCause', { causes: [{ on: 'D1', fault: 'shorted' }] }));
    events.push(...desk.hands.does('HandIn', {}));
    expect(await desk.send(1, events)).toMatchObject({ ok: true });
    return events;
  }

  test('closes the attempt and stores the debrief of all its events', async () => {
    const events = await handIn();
    const record = await desk.store.find(desk.attempt.id);
    expect(record).toMatchObject({
      status: 'handed in',
      handedInAt: new Date('2026-01-05T08:30:00Z'),
      next: 1 + events.length,
      debrief: { isCauseFound: true, faults: [{ on: 'D1', fault: 'shorted' }] },
    });
    const all = await desk.store.eventsOf(desk.attempt.id);
    expect(record?.debrief).toEqual(attemptRules.assess(desk.hands.setup, all));
  });

  test('the batch that closed it may come again, nothing else may', async () => {
    const events = await handIn();
    expect(await desk.send(1, events)).toMatchObject({ ok: true });
    const late: WireEvent = { type: 'CoverFitted', version: 1, data: {}, benchMs: 9e5 };
    const closed = { problem: { code: 'attempt-closed' } };
    expect(await desk.send(1 + events.length, [late])).toMatchObject(closed);
    expect(await desk.send(1, [...events, late])).toMatchObject(closed);
    expect(await desk.append.takeOver(visitor, desk.attempt.id, randomUUID())).toMatchObject(
      closed,
    );
  });

  test('what comes after handing in within one batch cannot have happened', async () => {
    const events = begin();
    events.push(...judge());
    events.push(...desk.hands.does('HandIn', {}));
    events.push({ type: 'CoverFitted', version: 1, data: {}, benchMs: 9e5 });
    expect(await desk.send(1, events)).toMatchObject({ problem: { code: 'cannot-have-happened' } });
    expect(await stored()).toEqual(['AttemptBegan']);
  });
});

test('while judging breaks nothing is acknowledged, and the next try succeeds', async () => {
  let isFailing = true;
  const rules = {
    ...attemptRules,
    verify: (...args: Parameters<typeof attemptRules.verify>) => {
      if (isFailing) throw new Error('lost in the middle');
      return attemptRules.verify(...args);
    },
  };
  desk = await openDesk(ovens, { rules });
  const events = begin();
  await expect(desk.send(1, events)).rejects.toThrow('lost in the middle');
  isFailing = false;
  expect(await desk.send(1, events)).toMatchObject({ ok: true });
});
