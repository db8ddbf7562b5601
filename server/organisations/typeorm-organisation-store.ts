import { randomUUID } from 'node:crypto';
import type { DataSource } from 'typeorm';
import { PersonEntity } from '../accounts/person.entity.ts';
import { MembershipEntity } from './membership.entity.ts';
import { OrganisationEntity } from './organisation.entity.ts';
import type { FirstPerson, OrganisationStore } from './organisation.ts';

/** Organisations in PostgreSQL. */
export class TypeormOrganisationStore implements OrganisationStore {
  readonly #database: DataSource;

  constructor(database: DataSource) {
    this.#database = database;
  }

  practice = async (name: string, at: Date): Promise<string> => {
    const { manager } = this.#database;
    const known = await manager.findOneBy(OrganisationEntity, { isPractice: true });
    if (known) return known.id;
    const id = randomUUID();
    await manager.insert(OrganisationEntity, { id, name, isPractice: true, createdAt: at });
    return id;
  };

  isEmpty = async (): Promise<boolean> => !(await this.#database.manager.exists(PersonEntity));

  found = (name: string, people: readonly FirstPerson[], at: Date): Promise<string> =>
    this.#database.transaction(async (manager) => {
      const organisationId = randomUUID();
      await manager.insert(OrganisationEntity, { id: organisationId, name, createdAt: at });
      for (const { role, ...person } of people) {
        const personId = randomUUID();
        await manager.insert(PersonEntity, { id: personId, ...person, createdAt: at });
        await manager.insert(MembershipEntity, { personId, organisationId, role, joinedAt: at });
      }
      return organisationId;
    });
}
