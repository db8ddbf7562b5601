import { isDeepStrictEqual } from 'node:util';
import type { z } from 'zod';
import type { Debrief } from '../../shared/assessment/debrief.ts';
import type { RecordedEvent, WireEvent } from '../../shared/bench/event.ts';
import type { Verified } from '../../shared/bench/verify.ts';
import type { appendEvents } from '../../shared/contracts/attempts.ts';
import type { Caller } from '../http/caller.ts';
import { done, refused, type Outcome, type Refused } from '../outcome.ts';
import { aheadOfClock } from './ahead-of-clock.ts';
import { isOwner } from './attempt-access.ts';
import type { AttemptState, AttemptStore, LockedAttempt } from './attempt.ts';
import type { Bench, BenchKeeper } from './bench-keeper.ts';
import type { Judge } from './judge.ts';

export type Batch = z.output<typeof appendEvents.body>;

/** Events between two checkpoints. */
const checkpointEvery = 100;

export const unknownAttempt = refused('not-found', 'There is no such attempt.');

const anotherWriter = (epoch: number): Refused =>
  refused('another-writer', 'Another tab writes this attempt.', { epoch });

const attemptClosed = refused('attempt-closed', 'The attempt is handed in; nothing can be added.');

const isSame = (a: WireEvent, b: WireEvent): boolean =>
  a.type === b.type &&
  a.version === b.version &&
  a.benchMs === b.benchMs &&
  isDeepStrictEqual(a.data, b.data);

/** What is stored is what came; what came twice is dropped, what came differently is refused. */
async function newEvents(locked: LockedAttempt, batch: Batch): Promise<Outcome<WireEvent[]>> {
  const { next, epoch } = locked.attempt;
  if (batch.from > next) {
    return refused('sequence-gap', `Events from ${next} on are missing.`, { expected: next });
  }
  const known = batch.from < next ? await locked.eventsFrom(batch.from) : [];
  const repeated = batch.events.slice(0, known.length);
  const isKnown = repeated.every((event, index) => {
    const stored = known[index];
    return stored !== undefined && isSame(event, stored);
  });
  return isKnown ? done(batch.events.slice(known.length)) : anotherWriter(epoch);
}

function refuseEvents(
  why: Pick<Exclude<Verified, { ok: true }>, 'index' | 'message' | 'path'>,
  events: readonly WireEvent[],
  skipped: number,
): Refused {
  const index = skipped + why.index;
  const type = events[why.index]?.type ?? '';
  const inside = why.path === undefined ? '' : `.${why.path}`;
  const detail = `Event ${index} of the batch, ${type}: ${why.message}`;
  return refused('cannot-have-happened', detail, {
    errors: [{ path: `events.${index}${inside}`, message: why.message }],
  });
}

interface Appended {
  next: number;
  /** null: nothing was new */ bench: Bench | null;
}

export interface AppendServiceDeps {
  attempts: AttemptStore;
  judge: Judge;
  /** of the rules that judge */ engineVersion: number;
  benches: BenchKeeper;
  clock: () => Date;
}

/** Takes events into the record: stored and judged first, acknowledged after. */
export class AppendService {
  readonly #store: AttemptStore;
  readonly #judge: Judge;
  readonly #engineVersion: number;
  readonly #benches: BenchKeeper;
  readonly #clock: () => Date;

  constructor({ attempts, judge, engineVersion, benches, clock }: AppendServiceDeps) {
    this.#store = attempts;
    this.#judge = judge;
    this.#engineVersion = engineVersion;
    this.#benches = benches;
    this.#clock = clock;
  }

  /** Appends a batch; the answer comes after COMMIT. */
  async append(caller: Caller, id: string, batch: Batch): Promise<Outcome<{ next: number }>> {
    const outcome = await this.#store.withLocked(id, (locked) =>
      this.#appendLocked(caller, locked, batch),
    );
    if (!outcome) return unknownAttempt;
    if (!outcome.ok) return outcome;
    const { next, bench } = outcome.value;
    if (bench) this.#benches.keep(id, next, bench);
    return done({ next });
  }

  /** Makes a tab the writer. Asked twice by the same tab it changes nothing. */
  async takeOver(
    caller: Caller,
    id: string,
    writer: string,
  ): Promise<Outcome<{ epoch: number; next: number }>> {
    const outcome = await this.#store.withLocked(
      id,
      async ({ attempt, takeOver }): Promise<Outcome<{ epoch: number; next: number }>> => {
        if (!isOwner(caller, attempt.owner)) return unknownAttempt;
        if (attempt.status === 'handed in') return attemptClosed;
        const { epoch, next } = attempt;
        if (attempt.writer === writer) return done({ epoch, next });
        await takeOver(writer, epoch + 1);
        return done({ epoch: epoch + 1, next });
      },
    );
    return outcome ?? unknownAttempt;
  }

  async #appendLocked(
    caller: Caller,
    locked: LockedAttempt,
    batch: Batch,
  ): Promise<Outcome<Appended>> {
    const { attempt } = locked;
    if (!isOwner(caller, attempt.owner)) return unknownAttempt;
    const isWriter = attempt.writer === null || attempt.writer === batch.writer;
    if (!isWriter || batch.epoch !== attempt.epoch) return anotherWriter(attempt.epoch);
    const fresh = await newEvents(locked, batch);
    if (!fresh.ok) return fresh;
    if (fresh.value.length === 0) return done({ next: attempt.next, bench: null });
    if (attempt.status === 'handed in') return attemptClosed;
    return this.#judgeAndStore(locked, batch, fresh.value);
  }

  async #judgeAndStore(
    locked: LockedAttempt,
    batch: Batch,
    events: readonly WireEvent[],
  ): Promise<Outcome<Appended>> {
    const { attempt } = locked;
    const bench = await this.#benches.standing(locked);
    if (!bench) return refused('not-found', `The oven ${attempt.content.oven} is not available.`);
    const at = this.#clock();
    const known = batch.events.length - events.length;
    const early = aheadOfClock(bench.state, events, at.getTime() - attempt.startedAt.getTime());
    if (early) return refuseEvents({ ...early, path: 'benchMs' }, events, known);
    const verified = await this.#judge.verify(bench, bench.state, events);
    if (!verified.ok) return refuseEvents(verified, events, known);
    const recorded = record(events, attempt.next, at);
    const next = attempt.next + events.length;
    const isHandedIn = verified.state.isHandedIn;
    await locked.advance({
      events: recorded,
      writer: batch.writer,
      benchMs: verified.state.benchMs,
      handedIn: isHandedIn ? { at, debrief: await this.#assess(locked, bench, recorded) } : null,
      checkpoint: isCheckpointDue(attempt, next)
        ? {
            sequence: next - 1,
            engineVersion: this.#engineVersion,
            state: verified.state,
          }
        : null,
    });
    return done({ next, bench: { ...bench, state: verified.state } });
  }

  async #assess(
    locked: LockedAttempt,
    bench: Bench,
    recorded: readonly RecordedEvent[],
  ): Promise<Debrief> {
    const earlier = await locked.eventsFrom(0);
    return this.#judge.assess(bench, [...earlier, ...recorded]);
  }
}

const record = (events: readonly WireEvent[], from: number, at: Date): RecordedEvent[] =>
  events.map((event, index) => ({
    ...event,
    sequence: from + index,
    recordedAt: at.toISOString(),
  }));

const isCheckpointDue = ({ next: before }: AttemptState, next: number): boolean =>
  Math.floor(before / checkpointEvery) < Math.floor(next / checkpointEvery);
