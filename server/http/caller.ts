import type { Role } from '../../shared/contracts/fields.ts';

export interface Membership {
  organisation: { id: string; name: string };
  role: Role;
}

/** A signed-in person at work in one of their organisations. */
export interface Member {
  sessionId: string;
  person: { id: string; name: string; email: string };
  organisation: { id: string; name: string };
  role: Role;
  memberships: readonly Membership[];
}

/** Whoever sent a request. A person who signed in during a visit is both. */
export interface Caller {
  member: Member | null;
  /** hash of the visitor token this browser holds */ visitor: string | null;
}

export interface SignedInCaller extends Caller {
  member: Member;
}

export const nobody: Caller = { member: null, visitor: null };
