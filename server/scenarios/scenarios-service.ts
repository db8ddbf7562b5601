import type { Scenario, ScenarioSummary } from '../../shared/contracts/scenarios.ts';
import type { ScenarioContent } from '../../shared/scenario/scenario.ts';
import type { Member } from '../http/caller.ts';
import { done, refused, type Outcome, type Refused } from '../outcome.ts';
import type { OvenLibrary } from '../ovens/oven-library.ts';
import type { Mistake } from '../ovens/read-json-folder.ts';
import { checkContent } from './check-content.ts';
import { presentLine, presentScenario } from './present-scenario.ts';
import type { ScenarioStore } from './scenario.ts';

const unknownScenario = refused('not-found', 'There is no such scenario.');

function refuseDraft(mistakes: readonly Mistake[]): Refused {
  const first = mistakes[0];
  return refused('invalid-fields', `The oven does not allow this: ${first?.message ?? ''}.`, {
    errors: mistakes.map(({ path, message }) => ({ path: `draft.${path}`, message })),
  });
}

/** The instructor's scenarios. Each call reaches the scenarios of the member's organisation alone. */
export class ScenariosService {
  readonly #store: ScenarioStore;
  readonly #ovens: OvenLibrary;
  readonly #clock: () => Date;

  constructor(store: ScenarioStore, ovens: OvenLibrary, clock: () => Date) {
    this.#store = store;
    this.#ovens = ovens;
    this.#clock = clock;
  }

  async list(member: Member): Promise<Outcome<{ scenarios: ScenarioSummary[] }>> {
    const lines = await this.#store.list(member.organisation.id);
    return done({ scenarios: lines.map(presentLine) });
  }

  async get(member: Member, id: string): Promise<Outcome<{ scenario: Scenario }>> {
    const scenario = await this.#store.find(member.organisation.id, id);
    return scenario ? done({ scenario: presentScenario(scenario) }) : unknownScenario;
  }

  async create(member: Member, draft: ScenarioContent): Promise<Outcome<{ scenario: Scenario }>> {
    const mistakes = checkContent(draft, this.#ovens);
    if (mistakes.length > 0) return refuseDraft(mistakes);
    const scenario = await this.#store.create({
      organisation: member.organisation.id,
      draft,
      origin: null,
      at: this.#clock(),
    });
    return done({ scenario: presentScenario(scenario) });
  }

  async save(
    member: Member,
    id: string,
    draft: ScenarioContent,
  ): Promise<Outcome<{ scenario: Scenario }>> {
    const organisation = member.organisation.id;
    if (!(await this.#store.find(organisation, id))) return unknownScenario;
    const mistakes = checkContent(draft, this.#ovens);
    if (mistakes.length > 0) return refuseDraft(mistakes);
    const scenario = await this.#store.saveDraft(organisation, id, draft, this.#clock());
    return scenario ? done({ scenario: presentScenario(scenario) }) : unknownScenario;
  }

  async publish(member: Member, id: string): Promise<Outcome<{ scenario: Scenario }>> {
    const published = await this.#store.publish({
      organisation: member.organisation.id,
      scenario: id,
      by: member.person.id,
      at: this.#clock(),
      check: (draft) => checkContent(draft, this.#ovens),
    });
    switch (published.kind) {
      case 'published':
        return done({ scenario: presentScenario(published.scenario) });
      case 'unchanged':
        return refused('scenario-unchanged', 'Nothing changed since the newest version.');
      case 'refused':
        return refuseDraft(published.mistakes);
      case 'not-found':
        return unknownScenario;
    }
  }
}
