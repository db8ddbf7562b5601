import type { AccountStore, SessionStore } from './accounts/account.ts';
import { accountsRoutes } from './accounts/accounts-routes.ts';
import { AccountsService } from './accounts/accounts-service.ts';
import type { Passwords } from './accounts/passwords.ts';
import { AppendService } from './attempts/append-service.ts';
import type { AttemptRules } from './attempts/attempt-rules.ts';
import type { AttemptStore } from './attempts/attempt.ts';
import { attemptsRoutes } from './attempts/attempts-routes.ts';
import { BenchKeeper } from './attempts/bench-keeper.ts';
import type { Judge } from './attempts/judge.ts';
import { ReadService } from './attempts/read-service.ts';
import { StartService } from './attempts/start-service.ts';
import type { ApiRoute } from './http/api-route.ts';
import { healthRoutes } from './http/health-routes.ts';
import { peopleRoutes } from './organisations/people-routes.ts';
import type { PeopleStore } from './organisations/people.ts';
import type { OvenLibrary } from './ovens/oven-library.ts';
import { ovensRoutes } from './ovens/ovens-routes.ts';
import { JobsService } from './scenarios/jobs-service.ts';
import type { ScenarioStore } from './scenarios/scenario.ts';
import { scenariosRoutes } from './scenarios/scenarios-routes.ts';
import { ScenariosService } from './scenarios/scenarios-service.ts';

export interface RouteDeps {
  accounts: AccountStore;
  sessions: SessionStore;
  people: PeopleStore;
  scenarios: ScenarioStore;
  attempts: AttemptStore;
  ovens: OvenLibrary;
  passwords: Passwords;
  rules: AttemptRules;
  judge: Judge;
  clock: () => Date;
  drawSeed: () => number;
  isDatabaseUp: () => Promise<boolean>;
}

/** The table of all routes of the API. */
export function makeRoutes(deps: RouteDeps): ApiRoute[] {
  const { accounts, sessions, people, scenarios, attempts, ovens, passwords, rules, clock } = deps;
  const { engineVersion } = rules;
  const benches = new BenchKeeper(rules, ovens);
  return [
    ...healthRoutes(deps.isDatabaseUp),
    ...accountsRoutes(new AccountsService(accounts, sessions, passwords, clock)),
    ...ovensRoutes(ovens),
    ...scenariosRoutes(
      new ScenariosService(scenarios, ovens, clock),
      new JobsService(scenarios, ovens),
    ),
    ...attemptsRoutes({
      start: new StartService({ ...deps, engineVersion, benches }),
      read: new ReadService(attempts),
      append: new AppendService({ ...deps, engineVersion, benches }),
    }),
    ...peopleRoutes(people),
  ];
}
