import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import type { Role } from '../../shared/contracts/fields.ts';
import { AttemptEntity } from '../attempts/attempt.entity.ts';
import { isTaken } from '../database/database-problem.ts';
import type { Membership } from '../http/caller.ts';
import { MembershipEntity } from '../organisations/membership.entity.ts';
import { OrganisationEntity } from '../organisations/organisation.entity.ts';
import type { Account, AccountStore, Created, NewAccount } from './account.ts';
import { PersonEntity } from './person.entity.ts';

/** A visitor's attempts become the person's; answers the newest. */
async function keepAttempts(
  manager: EntityManager,
  visitor: string,
  person: string,
  organisation: string,
): Promise<string | null> {
  const newest = await manager.findOne(AttemptEntity, {
    where: { visitorTokenHash: visitor },
    order: { startedAt: 'DESC' },
  });
  await manager.update(
    AttemptEntity,
    { visitorTokenHash: visitor },
    { visitorTokenHash: null, personId: person, organisationId: organisation },
  );
  return newest?.id ?? null;
}

/** People, their organisations and roles in PostgreSQL. */
export class TypeormAccountStore implements AccountStore {
  readonly #database: DataSource;

  constructor(database: DataSource) {
    this.#database = database;
  }

  findByEmail = async (email: string): Promise<Account | null> => {
    const row = await this.#database.manager.findOneBy(PersonEntity, { email });
    return row && { id: row.id, name: row.name, email: row.email, passwordHash: row.passwordHash };
  };

  /** Asked with every request, hence plain SQL. */
  membershipsOf = async (personId: string): Promise<Membership[]> => {
    const rows = await this.#database.query<{ id: string; name: string; role: Role }[]>(
      `SELECT organisation.id, organisation.name, membership.role
         FROM membership JOIN organisation ON organisation.id = membership.organisation_id
        WHERE membership.person_id = $1
        ORDER BY membership.joined_at, organisation.id`,
      [personId],
    );
    return rows.map(({ id, name, role }) => ({ organisation: { id, name }, role }));
  };

  create = async (account: NewAccount): Promise<Created> => {
    try {
      return await this.#database.transaction((manager) => this.#insert(manager, account));
    } catch (error) {
      if (isTaken(error, 'person_email_key')) return { kind: 'email-taken' };
      throw error;
    }
  };

  async #insert(manager: EntityManager, account: NewAccount): Promise<Created> {
    const person = randomUUID();
    const organisation = randomUUID();
    const { name, email, passwordHash, at, visitor } = account;
    await manager.insert(PersonEntity, { id: person, name, email, passwordHash, createdAt: at });
    await manager.insert(OrganisationEntity, {
      id: organisation,
      name: account.organisation,
      createdAt: at,
    });
    await manager.insert(MembershipEntity, {
      personId: person,
      organisationId: organisation,
      role: 'trainee',
      joinedAt: at,
    });
    const keptAttempt =
      visitor === null ? null : await keepAttempts(manager, visitor, person, organisation);
    return { kind: 'created', person, organisation, keptAttempt };
  }
}
