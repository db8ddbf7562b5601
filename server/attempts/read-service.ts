import type { Debrief } from '../../shared/assessment/debrief.ts';
import type { RecordedEvent } from '../../shared/bench/event.ts';
import type { Attempt, AttemptSummary } from '../../shared/contracts/attempts.ts';
import type { Caller, Member } from '../http/caller.ts';
import { done, refused, type Outcome } from '../outcome.ts';
import { unknownAttempt } from './append-service.ts';
import { canRead } from './attempt-access.ts';
import type { AttemptRecord, AttemptStore } from './attempt.ts';
import { presentAttempt, presentLine } from './present-attempt.ts';

type Lines = Outcome<{ attempts: AttemptSummary[] }>;

/** Attempts read again: by who made them, and by the reviewers of the organisation. */
export class ReadService {
  readonly #attempts: AttemptStore;

  constructor(attempts: AttemptStore) {
    this.#attempts = attempts;
  }

  async listOwn({ person, organisation }: Member, scenario?: string): Promise<Lines> {
    const lines = await this.#attempts.listOwn(person.id, organisation.id, scenario);
    return done({ attempts: lines.map(presentLine) });
  }

  async listForReview({ person, organisation }: Member): Promise<Lines> {
    const lines = await this.#attempts.listOfOrganisation(organisation.id, person.id);
    return done({ attempts: lines.map(presentLine) });
  }

  async get(caller: Caller, id: string): Promise<Outcome<{ attempt: Attempt }>> {
    const found = await this.#find(caller, id);
    return found.ok ? done({ attempt: presentAttempt(found.value, caller) }) : found;
  }

  async events(caller: Caller, id: string): Promise<Outcome<{ events: RecordedEvent[] }>> {
    const found = await this.#find(caller, id);
    return found.ok ? done({ events: await this.#attempts.eventsOf(id) }) : found;
  }

  async debrief(caller: Caller, id: string): Promise<Outcome<{ debrief: Debrief }>> {
    const found = await this.#find(caller, id);
    if (!found.ok) return found;
    const { debrief } = found.value;
    if (debrief) return done({ debrief });
    return refused('not-handed-in', 'The debrief comes after the job is handed in.');
  }

  async #find(caller: Caller, id: string): Promise<Outcome<AttemptRecord>> {
    const record = await this.#attempts.find(id);
    return record && canRead(caller, record) ? done(record) : unknownAttempt;
  }
}
