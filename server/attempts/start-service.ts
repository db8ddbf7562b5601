import { randomUUID } from 'node:crypto';
import type { Attempt } from '../../shared/contracts/attempts.ts';
import type { ScenarioContent } from '../../shared/scenario/scenario.ts';
import { newSecret, secretHash } from '../accounts/secret-hash.ts';
import type { Caller, Member, SignedInCaller } from '../http/caller.ts';
import { done, refused, type Outcome } from '../outcome.ts';
import type { PublishedScenario, ScenarioStore } from '../scenarios/scenario.ts';
import type { AttemptRecord, AttemptStore, Owner } from './attempt.ts';
import type { BenchKeeper } from './bench-keeper.ts';
import type { Judge } from './judge.ts';
import { presentAttempt } from './present-attempt.ts';

export interface Visit {
  attempt: Attempt;
  /** a token this browser must keep; null: it has one, or a session */ token: string | null;
}

interface Start {
  scenario: string;
  /** null: a trial of the draft */ versionId: string | null;
  content: ScenarioContent;
}

export interface StartServiceDeps {
  attempts: AttemptStore;
  scenarios: ScenarioStore;
  judge: Judge;
  /** of the rules that judge */ engineVersion: number;
  benches: BenchKeeper;
  clock: () => Date;
  /** a whole number from 0 to 2^31 - 1 */ drawSeed: () => number;
}

const ownerOf = ({ person, organisation }: Member): Owner => ({
  person: person.id,
  organisation: organisation.id,
  visitor: null,
});

const startOf = ({ scenario, versionId, content }: PublishedScenario): Start => ({
  scenario,
  versionId,
  content,
});

/** Starts attempts: of trainees, of instructors who try their own draft, of visitors. */
export class StartService {
  readonly #deps: StartServiceDeps;

  constructor(deps: StartServiceDeps) {
    this.#deps = deps;
  }

  async start(
    caller: SignedInCaller,
    scenario: string,
    isTrial: boolean,
  ): Promise<Outcome<{ attempt: Attempt }>> {
    const { member } = caller;
    const start = isTrial
      ? await this.#draft(member, scenario)
      : await this.#newestVersion(member, scenario);
    if (!start.ok) return start;
    const begun = await this.#begin(ownerOf(member), start.value);
    return begun.ok ? done({ attempt: presentAttempt(begun.value, caller) }) : begun;
  }

  /** Goes on with the attempt this browser holds, or starts the first practice job. */
  async visit(caller: Caller): Promise<Outcome<Visit>> {
    const [practice] = await this.#deps.scenarios.listPractice();
    if (!practice) return refused('not-found', 'There is no practice job yet.');
    if (caller.member) {
      const owner = ownerOf(caller.member);
      return this.#resume(caller, owner, practice, practice.scenario, null);
    }
    const token = caller.visitor === null ? newSecret() : null;
    const visitor = token === null ? caller.visitor : secretHash(token);
    const owner: Owner = { person: null, organisation: null, visitor: visitor ?? '' };
    return this.#resume({ ...caller, visitor }, owner, practice, null, token);
  }

  async #resume(
    caller: Caller,
    owner: Owner,
    practice: PublishedScenario,
    scenario: string | null,
    token: string | null,
  ): Promise<Outcome<Visit>> {
    const open = await this.#deps.attempts.openOf(owner, scenario);
    const begun = open ? done(open) : await this.#begin(owner, startOf(practice));
    return begun.ok ? done({ attempt: presentAttempt(begun.value, caller), token }) : begun;
  }

  async #draft(member: Member, id: string): Promise<Outcome<Start>> {
    if (member.role !== 'instructor') {
      return refused('not-allowed', 'Only instructors can try a draft.');
    }
    const scenario = await this.#deps.scenarios.find(member.organisation.id, id);
    if (!scenario) return refused('not-found', 'There is no such scenario.');
    return done({ scenario: id, versionId: null, content: scenario.draft });
  }

  async #newestVersion(member: Member, id: string): Promise<Outcome<Start>> {
    const { scenarios } = this.#deps;
    const published = await scenarios.findPublished(member.organisation.id, id);
    if (published) return done(startOf(published));
    const isOwn = (await scenarios.find(member.organisation.id, id)) !== null;
    if (!isOwn) return refused('not-found', 'There is no such job.');
    return refused('scenario-not-published', 'This scenario has not been published yet.');
  }

  async #begin(owner: Owner, start: Start): Promise<Outcome<AttemptRecord>> {
    const { judge, engineVersion, benches, attempts, clock, drawSeed } = this.#deps;
    const { content, scenario, versionId } = start;
    const seed = drawSeed();
    const bench = benches.setUp({ content, seed });
    if (!bench) return refused('not-found', `The oven ${content.oven} is not available.`);
    const { event, state } = await judge.begin(bench);
    const startedAt = clock();
    const record = await attempts.create({
      id: randomUUID(),
      owner,
      scenario,
      scenarioVersion: versionId,
      seed,
      content,
      engineVersion,
      startedAt,
      first: { ...event, sequence: 0, recordedAt: startedAt.toISOString() },
      state,
    });
    benches.keep(record.id, record.next, { ...bench, state });
    return done(record);
  }
}
