import type { Role } from '../../shared/contracts/fields.ts';

export interface PersonLine {
  id: string;
  name: string;
  email: string;
  role: Role;
  joinedAt: Date;
  /** in this organisation, trials left out */ attempts: number;
}

export type RoleChange =
  { kind: 'changed'; person: PersonLine } | { kind: 'last-administrator' } | { kind: 'not-found' };

export interface PeopleStore {
  list: (organisation: string) => Promise<PersonLine[]>;
  /** refuses to leave an organisation without an administrator, also when two changes meet */
  changeRole: (organisation: string, person: string, role: Role) => Promise<RoleChange>;
}
