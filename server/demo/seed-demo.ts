import type { Passwords } from '../accounts/passwords.ts';
import type { OrganisationStore } from '../organisations/organisation.ts';
import { publishJobs } from '../scenarios/publish-jobs.ts';
import type { PracticeJob } from '../scenarios/read-jobs.ts';
import type { ScenarioStore } from '../scenarios/scenario.ts';
import type { DemoAccounts } from './demo-accounts.ts';

export interface DemoDeps {
  organisations: OrganisationStore;
  scenarios: ScenarioStore;
  passwords: Passwords;
  clock: () => Date;
}

/**
 * Fills a database without people with the demonstration organisation: its accounts, and its own
 * copies of the practice jobs, for its instructor to change. Answers the organisation's id; null when
 * there are people already.
 */
export async function seedDemo(
  deps: DemoDeps,
  { organisation, password, accounts }: DemoAccounts,
  jobs: readonly PracticeJob[],
): Promise<string | null> {
  const { organisations, scenarios, passwords, clock } = deps;
  if (!(await organisations.isEmpty())) return null;
  const passwordHash = await passwords.hash(password);
  const people = accounts.map((account) => ({ ...account, passwordHash }));
  const id = await organisations.found(organisation, people, clock());
  await publishJobs(scenarios, id, jobs, clock());
  return id;
}
