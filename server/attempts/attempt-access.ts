import type { Caller } from '../http/caller.ts';
import type { Owner } from './attempt.ts';

/** Whether the attempt is the caller's own. A person keeps theirs whichever organisation they work in at the moment, as long as they belong to it. */
export function isOwner(caller: Caller, owner: Owner): boolean {
  if (owner.visitor !== null) return owner.visitor === caller.visitor;
  const { member } = caller;
  if (!member || owner.person !== member.person.id) return false;
  return member.memberships.some(({ organisation }) => organisation.id === owner.organisation);
}

/** Whether the caller may see the attempt: their own, or as a reviewer any of their organisation but others' trials. */
export function canRead(caller: Caller, attempt: { owner: Owner; isTrial: boolean }): boolean {
  if (isOwner(caller, attempt.owner)) return true;
  const { member } = caller;
  if (!member || member.role === 'trainee' || attempt.isTrial) return false;
  return attempt.owner.organisation === member.organisation.id;
}
