import type { Role } from '../../shared/contracts/fields.ts';

export interface FirstPerson {
  name: string;
  /** in lower case */ email: string;
  passwordHash: string;
  role: Role;
}

export interface OrganisationStore {
  /** the built-in organisation of practice jobs, made if it is not there yet */
  practice: (name: string, at: Date) => Promise<string>;
  /** nobody has an account yet */
  isEmpty: () => Promise<boolean>;
  /** an organisation with its first people, all or nothing; answers its id */
  found: (name: string, people: readonly FirstPerson[], at: Date) => Promise<string>;
}
