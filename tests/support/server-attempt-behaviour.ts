import { randomUUID } from 'node:crypto';
import { beforeAll, expect, test } from 'vitest';
import type { AttemptStore, NewAttempt, Owner } from '../../server/attempts/attempt.ts';
import type { Debrief } from '../../shared/assessment/debrief.ts';
import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { RecordedEvent } from '../../shared/bench/event.ts';
import type { ScenarioContent } from '../../shared/scenario/scenario.ts';

/** A store and rows that exist around it. */
export interface Surroundings {
  store: AttemptStore;
  content: ScenarioContent;
  scenario: string;
  otherScenario: string;
  versionId: string;
  otherVersionId: string;
  tom: { id: string; name: string };
  iris: { id: string; name: string };
  organisation: string;
}

const state: BenchState = {
  benchMs: 0,
  skippedMs: 0,
  isCordIn: true,
  isCoverOn: true,
  isDisplayLit: false,
  runsByItself: false,
  oven: {
    faults: [],
    leadEnds: { 'W1/a': 'C1.1', 'W1/b': null },
    isDoorClosed: true,
    pressed: [],
    opened: [],
    energised: [],
    cleaned: [],
  },
  labels: { 'W1/a': 'Ω' },
  probes: { red: 'C1.1', black: null },
  holds: { red: 'handle', black: 'handle' },
  meter: { setting: 'off', relative: null, isDestroyed: false, lag: 1e-9 },
  discharge: { clip: null, tip: null },
  battery: { neg: null, oneK: null },
  storage: { voltages: { 'C1:c': -2.1e3 }, currents: {} },
  replaced: [],
  inspected: [],
  sheet: { readings: [], verdicts: {}, causes: [], report: { repair: '', customer: '' } },
  runs: [],
  hazards: [],
  isHandedIn: false,
  wayBack: null,
};

const debrief: Debrief = {
  outcome: 'You found the cause.',
  isCauseFound: true,
  isSafe: true,
  score: 87,
  skills: [{ skill: 'measure', score: null, marks: [{ points: -5, why: 'Why.', sequence: 3 }] }],
  faults: [{ on: 'D1', fault: 'shorted' }],
};

const at = (minute: number): Date => new Date(Date.UTC(2026, 0, 5, 8, minute));

const event = (sequence: number, data: Record<string, unknown> = {}): RecordedEvent => ({
  sequence,
  type: 'LeadLifted',
  version: 1,
  data,
  benchMs: sequence * 1000.125,
  recordedAt: at(sequence).toISOString(),
});

/** What every store of attempts must do. */
export function attemptStoreBehaviour(open: () => Promise<Surroundings>): void {
  let around: Surroundings;
  let minute = 0;

  beforeAll(async () => {
    around = await open();
  });

  const ownerOf = (person: { id: string }): Owner => ({
    person: person.id,
    organisation: around.organisation,
    visitor: null,
  });

  const begin = (more: Partial<NewAttempt> = {}) =>
    around.store.create({
      id: randomUUID(),
      owner: ownerOf(around.tom),
      scenario: around.scenario,
      scenarioVersion: around.versionId,
      seed: 2 ** 31 - 1,
      content: around.content,
      engineVersion: 1,
      startedAt: at((minute += 1)),
      first: event(0, { seed: 7 }),
      state,
      ...more,
    });

  const advance = (id: string, from: number, count: number, more: object = {}) =>
    around.store.withLocked(id, ({ advance: go }) => {
      const events = Array.from({ length: count }, (_, index) => event(from + index));
      const writer = around.iris.id;
      return go({ events, writer, benchMs: 5000, handedIn: null, checkpoint: null, ...more });
    });

  test('a new attempt is found as it was stored, with its first event', async () => {
    const created = await begin();
    expect(created).toMatchObject({
      owner: { person: around.tom.id, organisation: around.organisation, visitor: null },
      personName: around.tom.name,
      scenario: around.scenario,
      version: 1,
      isTrial: false,
      title: around.content.title,
      seed: 2 ** 31 - 1,
      content: around.content,
      engineVersion: 1,
      status: 'on the bench',
      startedAt: at(minute),
      handedInAt: null,
      epoch: 0,
      writer: null,
      next: 1,
      score: null,
      outcome: null,
      debrief: null,
    });
    expect(await around.store.find(created.id)).toEqual(created);
    expect(await around.store.eventsOf(created.id)).toEqual([event(0, { seed: 7 })]);
  });

  test('what is not there is null, and locking it does no work', async () => {
    const id = randomUUID();
    expect(await around.store.find(id)).toBeNull();
    expect(await around.store.eventsOf(id)).toEqual([]);
    const answer = await around.store.withLocked(id, () => Promise.reject(new Error('worked')));
    expect(answer).toBeNull();
  });

  test('advancing adds the events and moves the attempt on', async () => {
    const { id } = await begin();
    await advance(id, 1, 3);
    expect(await around.store.find(id)).toMatchObject({
      next: 4,
      benchMs: 5000,
      writer: around.iris.id,
      status: 'on the bench',
    });
    const events = await around.store.eventsOf(id);
    expect(events.map(({ sequence }) => sequence)).toEqual([0, 1, 2, 3]);
    const later = await around.store.withLocked(id, ({ eventsFrom }) => eventsFrom(2));
    expect(later).toEqual([event(2), event(3)]);
  });

  test('data of events come back as they went in', async () => {
    const { id } = await begin();
    const data = { a: 1.5e-12, b: [1, 'Ω', null, { c: true }], d: -0.1, e: 12345678901234 };
    await around.store.withLocked(id, ({ advance: go }) =>
      go({
        events: [event(1, data)],
        writer: around.iris.id,
        benchMs: 1,
        handedIn: null,
        checkpoint: null,
      }),
    );
    expect((await around.store.eventsOf(id))[1]?.data).toEqual(data);
  });

  test('the newest checkpoint is given, the first one is there from the beginning', async () => {
    const { id } = await begin();
    const newest = (engine = 1) =>
      around.store.withLocked(id, ({ newestCheckpoint }) => newestCheckpoint(engine));
    expect(await newest()).toEqual({ sequence: 0, state });
    const later = { ...state, benchMs: 5000, isCordIn: false };
    await advance(id, 1, 2, { checkpoint: { sequence: 2, engineVersion: 1, state: later } });
    expect(await newest()).toEqual({ sequence: 2, state: later });
    expect(await newest(2)).toBeNull();
  });

  test('handing in closes it and keeps the debrief', async () => {
    const { id } = await begin();
    await advance(id, 1, 1, { handedIn: { at: at(59), debrief } });
    expect(await around.store.find(id)).toMatchObject({
      status: 'handed in',
      handedInAt: at(59),
      debrief,
      score: 87,
      outcome: 'You found the cause.',
    });
  });

  test('when the work fails nothing of it stays', async () => {
    const { id } = await begin();
    const failed = around.store.withLocked(id, async ({ advance: go, takeOver }) => {
      await takeOver(around.iris.id, 9);
      await go({
        events: [event(1)],
        writer: around.iris.id,
        benchMs: 1,
        handedIn: null,
        checkpoint: { sequence: 1, engineVersion: 1, state },
      });
      throw new Error('judged wrongly');
    });
    await expect(failed).rejects.toThrow('judged wrongly');
    expect(await around.store.find(id)).toMatchObject({ next: 1, epoch: 0, writer: null });
    expect(await around.store.eventsOf(id)).toHaveLength(1);
  });

  test('works on one attempt take turns, works on two do not wait for each other', async () => {
    const [one, two] = [await begin(), await begin()];
    const order: string[] = [];
    let release = (): void => undefined;
    const gate = new Promise<void>((resolve) => (release = resolve));
    const first = around.store.withLocked(one.id, async () => {
      order.push('first begins');
      await gate;
      order.push('first ends');
    });
    await expect.poll(() => order).toEqual(['first begins']);
    const second = around.store.withLocked(one.id, async ({ attempt }) => {
      order.push(`second sees ${attempt.next}`);
    });
    await around.store.withLocked(two.id, async () => {
      order.push('other');
    });
    release();
    await Promise.all([first, second]);
    expect(order).toEqual(['first begins', 'other', 'first ends', 'second sees 1']);
  });

  test('taking over sets writer and epoch', async () => {
    const { id } = await begin();
    await around.store.withLocked(id, ({ takeOver }) => takeOver(around.tom.id, 4));
    expect(await around.store.find(id)).toMatchObject({ writer: around.tom.id, epoch: 4 });
  });

  test('own attempts: the newest first, of all scenarios or one, of this organisation alone', async () => {
    const owner = ownerOf(around.iris);
    const a = await begin({ owner });
    const b = await begin({
      owner,
      scenario: around.otherScenario,
      scenarioVersion: around.otherVersionId,
    });
    const trial = await begin({ owner, scenarioVersion: null });
    const ids = async (scenario?: string) =>
      (await around.store.listOwn(around.iris.id, around.organisation, scenario)).map(
        ({ id }) => id,
      );
    expect(await ids()).toEqual([trial.id, b.id, a.id]);
    expect(await ids(around.scenario)).toEqual([trial.id, a.id]);
    expect(await around.store.listOwn(around.iris.id, randomUUID())).toEqual([]);
  });

  test('an organisation sees all attempts but the trials of others', async () => {
    const trial = await begin({ owner: ownerOf(around.iris), scenarioVersion: null });
    const plain = await begin({ owner: ownerOf(around.iris) });
    const visit = await begin({
      owner: { person: null, organisation: null, visitor: 'a'.repeat(64) },
    });
    const seenBy = async (reader: string) =>
      (await around.store.listOfOrganisation(around.organisation, reader)).map(({ id }) => id);
    expect(await seenBy(around.iris.id)).toEqual(expect.arrayContaining([trial.id, plain.id]));
    expect(await seenBy(around.tom.id)).toContain(plain.id);
    expect(await seenBy(around.tom.id)).not.toContain(trial.id);
    expect(await seenBy(around.iris.id)).not.toContain(visit.id);
  });

  test('the open attempt of a visitor is the newest on the bench, and nobody else’s', async () => {
    const visitor: Owner = { person: null, organisation: null, visitor: 'b'.repeat(64) };
    expect(await around.store.openOf(visitor, null)).toBeNull();
    await begin({ owner: visitor });
    const newest = await begin({ owner: visitor });
    expect((await around.store.openOf(visitor, null))?.id).toBe(newest.id);
    expect(await around.store.openOf(visitor, around.otherScenario)).toBeNull();
    await advance(newest.id, 1, 1, { handedIn: { at: at(59), debrief } });
    expect((await around.store.openOf(visitor, null))?.id).not.toBe(newest.id);
  });
}
