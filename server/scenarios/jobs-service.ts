import type { Job } from '../../shared/contracts/scenarios.ts';
import type { Member } from '../http/caller.ts';
import { done, refused, type Outcome } from '../outcome.ts';
import type { OvenLibrary } from '../ovens/oven-library.ts';
import { presentJob } from './present-scenario.ts';
import type { ScenarioStore } from './scenario.ts';

/** The jobs a person can start. One whose oven could not be read at start is left out. */
export class JobsService {
  readonly #store: ScenarioStore;
  readonly #ovens: OvenLibrary;

  constructor(store: ScenarioStore, ovens: OvenLibrary) {
    this.#store = store;
    this.#ovens = ovens;
  }

  async list(member: Member): Promise<Outcome<{ jobs: Job[] }>> {
    const [published, own] = await Promise.all([
      this.#store.listPublished(member.organisation.id),
      this.#store.ownResults(member.person.id, member.organisation.id),
    ]);
    const results = new Map(own.map((result) => [result.scenario, result]));
    const jobs = published.flatMap((scenario) => {
      const oven = this.#ovens.find(scenario.content.oven);
      return oven ? [presentJob(scenario, oven, results.get(scenario.scenario))] : [];
    });
    return done({ jobs });
  }

  async get(member: Member, id: string): Promise<Outcome<{ job: Job }>> {
    const organisation = member.organisation.id;
    const [published, own] = await Promise.all([
      this.#store.findPublished(organisation, id),
      this.#store.ownResults(member.person.id, organisation),
    ]);
    const oven = published && this.#ovens.find(published.content.oven);
    if (!published || !oven) return refused('not-found', 'There is no such job.');
    const result = own.find(({ scenario }) => scenario === id);
    return done({ job: presentJob(published, oven, result) });
  }
}
