import { LuciaSessionStore } from './accounts/lucia-session-store.ts';
import { TypeormAccountStore } from './accounts/typeorm-account-store.ts';
import { TypeormAttemptStore } from './attempts/typeorm-attempt-store.ts';
import type { Database } from './database/data-source.ts';
import { TypeormOrganisationStore } from './organisations/typeorm-organisation-store.ts';
import { TypeormPeopleStore } from './organisations/typeorm-people-store.ts';
import { TypeormScenarioStore } from './scenarios/typeorm-scenario-store.ts';

/** Every store on one database, which must be open. */
export const makeStores = (database: Database) => ({
  accounts: new TypeormAccountStore(database),
  sessions: new LuciaSessionStore(database),
  organisations: new TypeormOrganisationStore(database),
  people: new TypeormPeopleStore(database),
  scenarios: new TypeormScenarioStore(database),
  attempts: new TypeormAttemptStore(database),
});

export type Stores = ReturnType<typeof makeStores>;
