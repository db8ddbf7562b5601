import type { DataSource, EntityManager } from 'typeorm';
import type { Role } from '../../shared/contracts/fields.ts';
import { MembershipEntity } from './membership.entity.ts';
import type { PeopleStore, PersonLine, RoleChange } from './people.ts';

const sql = `
  SELECT person.id, person.name, person.email, membership.role,
         membership.joined_at AS "joinedAt",
         (SELECT count(*)::integer FROM attempt
           WHERE attempt.person_id = person.id
             AND attempt.organisation_id = membership.organisation_id
             AND attempt.scenario_version_id IS NOT NULL) AS attempts
    FROM membership JOIN person ON person.id = membership.person_id
   WHERE membership.organisation_id = $1 AND ($2::uuid IS NULL OR person.id = $2::uuid)
   ORDER BY person.name, person.id`;

const lines = (
  manager: EntityManager,
  organisation: string,
  person: string | null,
): Promise<PersonLine[]> => manager.query<PersonLine[]>(sql, [organisation, person]);

/** The people of an organisation in PostgreSQL. */
export class TypeormPeopleStore implements PeopleStore {
  readonly #database: DataSource;

  constructor(database: DataSource) {
    this.#database = database;
  }

  list = (organisation: string): Promise<PersonLine[]> =>
    lines(this.#database.manager, organisation, null);

  changeRole = (organisationId: string, personId: string, role: Role): Promise<RoleChange> =>
    this.#database.transaction(async (manager): Promise<RoleChange> => {
      // All administrators are locked in one order, so two who demote each other take turns.
      const memberships = await manager.find(MembershipEntity, {
        where: { organisationId },
        order: { personId: 'ASC' },
        lock: { mode: 'pessimistic_write' },
      });
      const membership = memberships.find((one) => one.personId === personId);
      if (!membership) return { kind: 'not-found' };
      const administrators = memberships.filter((one) => one.role === 'administrator');
      const isLast = administrators.length === 1 && administrators[0] === membership;
      if (isLast && role !== 'administrator') return { kind: 'last-administrator' };
      await manager.update(MembershipEntity, { organisationId, personId }, { role });
      const [person] = await lines(manager, organisationId, personId);
      return person ? { kind: 'changed', person } : { kind: 'not-found' };
    });
}
