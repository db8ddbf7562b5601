import { randomUUID } from 'node:crypto';
import { AppendService } from '../../server/attempts/append-service.ts';
import { attemptRules, type AttemptRules } from '../../server/attempts/attempt-rules.ts';
import type { AttemptRecord, AttemptStore } from '../../server/attempts/attempt.ts';
import { BenchKeeper } from '../../server/attempts/bench-keeper.ts';
import { directJudge } from '../../server/attempts/judge.ts';
import type { Caller } from '../../server/http/caller.ts';
import type { OvenLibrary } from '../../server/ovens/oven-library.ts';
import type { WireEvent } from '../../shared/bench/event.ts';
import { handsOn, setupWith, type Hands } from './bench.ts';
import { hum } from './server-content.ts';
import { MemoryAttempts } from './server-memory-attempts.ts';

export const visitorHash = 'c'.repeat(64);
export const visitor: Caller = { member: null, visitor: visitorHash };

/** Hands on the bench that an attempt at `hum` with this seed begins with. */
export const handsAtHum = (seed: number): Hands =>
  handsOn(
    setupWith(hum.faults, { seed, meter: hum.meter, lastRunSecondsAgo: hum.lastRunSecondsAgo }),
  );

export interface Desk {
  store: AttemptStore;
  attempt: AttemptRecord;
  hands: Hands;
  /** of the tab */ writer: string;
  /** another process on the same store */ another: () => AppendService;
  append: AppendService;
  send: (
    from: number,
    events: readonly WireEvent[],
    more?: { writer?: string; epoch?: number; service?: AppendService; caller?: Caller },
  ) => ReturnType<AppendService['append']>;
}

/** A visitor's attempt in memory, begun by the real rules, and someone's hands on its bench. */
export async function openDesk(
  ovens: OvenLibrary,
  { rules = attemptRules, seed = 417 }: { rules?: AttemptRules; seed?: number } = {},
): Promise<Desk> {
  const store = new MemoryAttempts();
  const clock = () => new Date('2026-01-05T08:30:00Z');
  const service = () =>
    new AppendService({
      attempts: store,
      judge: directJudge(rules),
      engineVersion: rules.engineVersion,
      benches: new BenchKeeper(rules, ovens),
      clock,
    });
  const append = service();
  const hands = handsAtHum(seed);
  const [first] = hands.events();
  if (!first) throw new Error('an attempt begins with an event');
  const attempt = await store.create({
    id: randomUUID(),
    owner: { person: null, organisation: null, visitor: visitorHash },
    scenario: randomUUID(),
    scenarioVersion: randomUUID(),
    seed,
    content: hum,
    engineVersion: rules.engineVersion,
    startedAt: clock(),
    first: { ...first, sequence: 0, recordedAt: clock().toISOString() },
    state: hands.state(),
  });
  const writer = randomUUID();
  return {
    store,
    attempt,
    hands,
    writer,
    append,
    another: service,
    send: (from, events, more = {}) =>
      (more.service ?? append).append(more.caller ?? visitor, attempt.id, {
        writer: more.writer ?? writer,
        epoch: more.epoch ?? 0,
        from,
        events: [...events],
      }),
  };
}
