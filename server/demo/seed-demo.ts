import type { AccountStore } from '../accounts/account.ts';
import type { Passwords } from '../accounts/passwords.ts';
import type { OrganisationStore } from '../organisations/organisation.ts';
import { publishJobs } from '../scenarios/publish-jobs.ts';
import type { PracticeJob } from '../scenarios/read-jobs.ts';
import type { ScenarioStore } from '../scenarios/scenario.ts';
import type { DemoAccounts } from './demo-accounts.ts';

export interface DemoDeps {
  accounts: AccountStore;
  organisations: OrganisationStore;
  scenarios: ScenarioStore;
  passwords: Passwords;
  clock: () => Date;
}

/**
 * Fills a database without people with the demonstration organisation: its accounts, and its own
 * copies of the practice jobs, for its instructor to change. Goes on where an earlier start was
 * broken off. Answers the organisation's id; null when the people in the database are others.
 */
export async function seedDemo(
  deps: DemoDeps,
  { organisation, password, accounts }: DemoAccounts,
  jobs: readonly PracticeJob[],
): Promise<string | null> {
  const { organisations, scenarios, passwords, clock } = deps;
  const id = (await organisations.isEmpty())
    ? await organisations.found(
        organisation,
        people(accounts, await passwords.hash(password)),
        clock(),
      )
    : await findDemo(deps.accounts, { organisation, email: accounts[0]?.email ?? '' });
  if (id === null) return null;
  // Jobs that are there are the instructor's own by now.
  const published = await Promise.all(
    jobs.map(async ({ origin }) => {
      const known = await scenarios.findByOrigin(id, origin);
      return known !== null && (await scenarios.findPublished(id, known.id)) !== null;
    }),
  );
  await publishJobs(
    scenarios,
    id,
    jobs.filter((_, at) => !published[at]),
    clock(),
  );
  return id;
}

const people = (accounts: DemoAccounts['accounts'], passwordHash: string) =>
  accounts.map((account) => ({ ...account, passwordHash }));

async function findDemo(
  store: AccountStore,
  demo: { organisation: string; email: string },
): Promise<string | null> {
  const person = await store.findByEmail(demo.email);
  const memberships = person ? await store.membershipsOf(person.id) : [];
  return (
    memberships.find(({ organisation }) => organisation.name === demo.organisation)?.organisation
      .id ?? null
  );
}
