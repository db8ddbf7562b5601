import request, { type Test } from 'supertest';
import { Passwords } from '../../server/accounts/passwords.ts';
import { createApp, type AppDeps } from '../../server/app.ts';
import { attemptRules } from '../../server/attempts/attempt-rules.ts';
import { directJudge } from '../../server/attempts/judge.ts';
import { makeDatabase, type Database } from '../../server/database/data-source.ts';
import { isDatabaseUp } from '../../server/database/is-up.ts';
import { openDatabase } from '../../server/database/open-database.ts';
import type { FirstPerson } from '../../server/organisations/organisation.ts';
import { publishJobs } from '../../server/scenarios/publish-jobs.ts';
import { makeStores, type Stores } from '../../server/stores.ts';
import { hum, readAllOvens } from './server-content.ts';
import { createDatabase, silent, type TestDatabase } from './database.ts';

export const password = 'a long enough password';

/** What attempts draw their oven from here; the same seed as `setupWith` of `bench.ts`. */
export const testSeed = 417;

const school: FirstPerson['role'][] = ['administrator', 'instructor', 'trainee', 'trainee'];
const names = { school: ['ada', 'iris', 'tom', 'mina'], foreign: ['olga', 'ines', 'timo', 'nils'] };
export type Name = 'ada' | 'iris' | 'tom' | 'mina' | 'olga' | 'ines' | 'timo' | 'nils';

export type Verb = 'get' | 'post' | 'put' | 'patch' | 'delete';

export interface TestServer {
  database: Database;
  raw: TestDatabase;
  stores: Stores;
  deps: AppDeps;
  app: ReturnType<typeof createApp>['app'];
  routes: ReturnType<typeof createApp>['routes'];
  /** ids of the two organisations and of the practice one */
  organisations: { school: string; foreign: string; practice: string };
  /** cookies by which requests are sent */ cookies: Readonly<Record<Name, string>>;
  personId: (name: Name) => Promise<string>;
  /** a request of somebody signed in, or of nobody */
  as: (name: Name | null, verb: Verb, path: string) => Test;
  close: () => Promise<void>;
}

export const emailOf = (name: string): string => `${name}@school.example`;

async function foundOrganisations(stores: Stores, passwordHash: string) {
  const people = (which: 'school' | 'foreign') =>
    names[which].map((name, index) => ({
      name,
      email: emailOf(name),
      passwordHash,
      role: school[index] ?? 'trainee',
    }));
  const at = new Date('2026-01-05T08:00:00Z');
  const practice = await stores.organisations.practice('Coldbench practice', at);
  await publishJobs(stores.scenarios, practice, [{ origin: 'loud-hum', content: hum }], at);
  return {
    school: await stores.organisations.found('North School', people('school'), at),
    foreign: await stores.organisations.found('Other School', people('foreign'), at),
    practice,
  };
}

async function openSession(stores: Stores, name: string): Promise<string> {
  const account = await stores.accounts.findByEmail(emailOf(name));
  const [membership] = account ? await stores.accounts.membershipsOf(account.id) : [];
  if (!account || !membership) throw new Error(`${name} has no account`);
  const id = await stores.sessions.open(account.id, membership.organisation.id);
  return `coldbench_session=${id}`;
}

/** The server on a database of its own: two schools of four people each, one practice job. */
export async function openTestServer(more: Partial<AppDeps> = {}): Promise<TestServer> {
  const raw = await createDatabase();
  const database = makeDatabase(raw.url, silent);
  await openDatabase(database, silent);
  const stores = makeStores(database);
  const passwords = new Passwords();
  const organisations = await foundOrganisations(stores, await passwords.hash(password));
  const deps: AppDeps = {
    ...stores,
    ovens: await readAllOvens(),
    passwords,
    rules: attemptRules,
    judge: directJudge(attemptRules),
    clock: () => new Date(),
    drawSeed: () => testSeed,
    isDatabaseUp: () => isDatabaseUp(database),
    log: silent,
    mode: 'test',
    trustedProxies: 0,
    clientFolder: null,
    ...more,
  };
  const { app, routes } = createApp(deps);
  const all = [...names.school, ...names.foreign] as Name[];
  const pairs = await Promise.all(all.map(async (name) => [name, await openSession(stores, name)]));
  const cookies = Object.fromEntries(pairs) as Record<Name, string>;
  return {
    database,
    raw,
    stores,
    deps,
    app,
    routes,
    organisations,
    cookies,
    personId: async (name) => (await stores.accounts.findByEmail(emailOf(name)))?.id ?? '',
    as: (name, verb, path) => {
      const sent = request(app)[verb](path);
      return name === null ? sent : sent.set('Cookie', cookies[name]);
    },
    close: async () => {
      await database.destroy();
      await raw.drop();
    },
  };
}
