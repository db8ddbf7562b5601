import { NodePostgresAdapter } from '@lucia-auth/adapter-postgresql';
import { Lucia, TimeSpan, type Adapter } from 'lucia';
import type { DataSource } from 'typeorm';
import { poolOf } from '../database/pool.ts';
import type { OpenSession, SessionStore } from './account.ts';
import { secretHash } from './secret-hash.ts';
import { sessionDays } from './session-cookie.ts';
import { SessionEntity } from './session.entity.ts';

type Sessions = Lucia<{ organisation: string }, { name: string; email: string }>;

declare module 'lucia' {
  interface Register {
    Lucia: Sessions;
    DatabaseSessionAttributes: { organisation_id: string };
    DatabaseUserAttributes: { name: string; email: string };
  }
}

/** Lets an adapter see nothing but hashes of session ids. */
function hashing(adapter: Adapter): Adapter {
  return {
    getSessionAndUser: async (id) => {
      const [session, user] = await adapter.getSessionAndUser(secretHash(id));
      // Lucia goes on with the id it finds here, so it must be the one it asked with.
      return [session && { ...session, id }, user];
    },
    getUserSessions: (user) => adapter.getUserSessions(user),
    setSession: (session) => adapter.setSession({ ...session, id: secretHash(session.id) }),
    updateSessionExpiration: (id, expiresAt) =>
      adapter.updateSessionExpiration(secretHash(id), expiresAt),
    deleteSession: (id) => adapter.deleteSession(secretHash(id)),
    deleteUserSessions: (user) => adapter.deleteUserSessions(user),
    deleteExpiredSessions: () => adapter.deleteExpiredSessions(),
  };
}

/** Sessions by Lucia, on the connections TypeORM has opened. */
export class LuciaSessionStore implements SessionStore {
  readonly #database: DataSource;
  readonly #lucia: Sessions;

  /** @param database already initialised: the pool exists from then on */
  constructor(database: DataSource) {
    this.#database = database;
    const tables = { user: 'person', session: 'session' };
    this.#lucia = new Lucia(hashing(new NodePostgresAdapter(poolOf(database), tables)), {
      sessionExpiresIn: new TimeSpan(sessionDays, 'd'),
      getSessionAttributes: ({ organisation_id }) => ({ organisation: organisation_id }),
      getUserAttributes: ({ name, email }) => ({ name, email }),
    });
  }

  open = async (person: string, organisation: string): Promise<string> => {
    const session = await this.#lucia.createSession(person, { organisation_id: organisation });
    return session.id;
  };

  read = async (id: string): Promise<OpenSession | null> => {
    const { session, user } = await this.#lucia.validateSession(id);
    if (!session) return null;
    const { name, email } = user;
    return {
      id,
      person: { id: user.id, name, email },
      organisation: session.organisation,
      isRenewed: session.fresh,
    };
  };

  workIn = async (id: string, organisationId: string): Promise<void> => {
    await this.#database.manager.update(SessionEntity, secretHash(id), { organisationId });
  };

  close = (id: string): Promise<void> => this.#lucia.invalidateSession(id);

  deleteExpired = (): Promise<void> => this.#lucia.deleteExpiredSessions();
}
