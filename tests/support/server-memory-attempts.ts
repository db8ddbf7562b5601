import type {
  AttemptLine,
  AttemptRecord,
  AttemptStore,
  Checkpoint,
  LockedAttempt,
  Owner,
} from '../../server/attempts/attempt.ts';
import type { RecordedEvent } from '../../shared/bench/event.ts';

interface Kept {
  record: AttemptRecord;
  events: RecordedEvent[];
  checkpoints: Checkpoint[];
}

const isOf = (owner: Owner, other: Owner): boolean =>
  owner.person === other.person &&
  owner.organisation === other.organisation &&
  owner.visitor === other.visitor;

const newestFirst = (a: AttemptLine, b: AttemptLine): number =>
  b.startedAt.getTime() - a.startedAt.getTime() || a.id.localeCompare(b.id);

/** As after a journey through jsonb. */
const copy = <T>(value: T): T => structuredClone(value);

/** Attempts in memory: the same behaviour as in PostgreSQL, held to it by the same suite. `names` and `numbers` stand in for the other tables. */
export class MemoryAttempts implements AttemptStore {
  readonly #kept = new Map<string, Kept>();
  readonly #turns = new Map<string, Promise<unknown>>();
  readonly #names: Readonly<Record<string, string>>;
  readonly #versions: Readonly<Record<string, number>>;

  constructor(
    names: Readonly<Record<string, string>> = {},
    versions: Readonly<Record<string, number>> = {},
  ) {
    this.#names = names;
    this.#versions = versions;
  }

  create: AttemptStore['create'] = async (attempt) => {
    const { first, state, scenarioVersion, owner, ...pinned } = copy(attempt);
    const { engineVersion } = pinned;
    const record: AttemptRecord = {
      ...pinned,
      owner,
      personName: owner.person === null ? null : (this.#names[owner.person] ?? null),
      number: 1,
      version: scenarioVersion === null ? 0 : (this.#versions[scenarioVersion] ?? 1),
      isTrial: scenarioVersion === null,
      title: pinned.content.title,
      status: 'on the bench',
      handedInAt: null,
      benchMs: first.benchMs,
      next: first.sequence + 1,
      score: null,
      outcome: null,
      epoch: 0,
      writer: null,
      debrief: null,
    };
    const checkpoints = [{ sequence: first.sequence, engineVersion, state }];
    this.#kept.set(record.id, { record, events: [first], checkpoints });
    return copy(record);
  };

  find: AttemptStore['find'] = async (id) => copy(this.#kept.get(id)?.record ?? null);

  eventsOf: AttemptStore['eventsOf'] = async (id) => copy(this.#kept.get(id)?.events ?? []);

  listOwn: AttemptStore['listOwn'] = async (person, organisation, scenario) =>
    this.#lines(
      ({ owner, scenario: at }) =>
        owner.person === person &&
        owner.organisation === organisation &&
        (scenario === undefined || at === scenario),
    );

  listOfOrganisation: AttemptStore['listOfOrganisation'] = async (organisation, reader) =>
    this.#lines(
      ({ owner, isTrial }) =>
        owner.organisation === organisation && (!isTrial || owner.person === reader),
    );

  openOf: AttemptStore['openOf'] = async (owner, scenario) => {
    const [record] = this.#records(
      (one) =>
        isOf(one.owner, owner) &&
        one.status === 'on the bench' &&
        !one.isTrial &&
        (scenario === null || one.scenario === scenario),
    );
    return copy(record ?? null);
  };

  withLocked: AttemptStore['withLocked'] = async (id, work) => {
    const kept = this.#kept.get(id);
    if (!kept) return null;
    const turn = (this.#turns.get(id) ?? Promise.resolve()).then(() => this.#transact(kept, work));
    this.#turns.set(
      id,
      turn.catch(() => undefined),
    );
    return turn;
  };

  /** All or nothing: work goes on a copy that replaces the original at the end. */
  async #transact<T>(kept: Kept, work: (locked: LockedAttempt) => Promise<T>): Promise<T> {
    const draft = copy(kept);
    const { record } = draft;
    const answer = await work({
      attempt: copy(record),
      eventsFrom: async (sequence) =>
        copy(draft.events.filter((event) => event.sequence >= sequence)),
      newestCheckpoint: async (version) => {
        const found = draft.checkpoints.findLast((one) => one.engineVersion === version);
        return found ? copy({ sequence: found.sequence, state: found.state }) : null;
      },
      advance: async ({ events, writer, benchMs, handedIn, checkpoint }) => {
        draft.events.push(...copy([...events]));
        Object.assign(record, { writer, benchMs, next: record.next + events.length });
        if (checkpoint) draft.checkpoints.push(copy(checkpoint));
        if (!handedIn) return;
        const { at, debrief } = handedIn;
        const { score, outcome } = debrief;
        Object.assign(record, { status: 'handed in', handedInAt: at, debrief, score, outcome });
      },
      takeOver: async (writer, epoch) => {
        Object.assign(record, { writer, epoch });
      },
    });
    Object.assign(kept, draft);
    return answer;
  }

  #records(isWanted: (record: AttemptRecord) => boolean): AttemptRecord[] {
    return [...this.#kept.values()]
      .map(({ record }) => record)
      .filter(isWanted)
      .sort(newestFirst);
  }

  #lines(isWanted: (record: AttemptRecord) => boolean): AttemptLine[] {
    return this.#records(isWanted).map((record) => {
      const { seed: _s, content: _c, engineVersion: _v, epoch: _e, writer: _w, ...line } = record;
      const { debrief: _d, ...rest } = line;
      return copy(rest);
    });
  }
}
