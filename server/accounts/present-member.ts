import type { SignedIn } from '../../shared/contracts/accounts.ts';
import type { Member } from '../http/caller.ts';

export const presentMember = ({ person, organisation, role, memberships }: Member): SignedIn => ({
  person,
  organisation,
  role,
  memberships: [...memberships],
});
