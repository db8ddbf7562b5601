import type { Caller, Member } from '../http/caller.ts';
import type { CookieJar } from '../http/cookie-jar.ts';
import type { AccountStore, SessionStore } from './account.ts';
import { secretHash } from './secret-hash.ts';
import { sessionCookie, sessionMaxAge, visitorCookie } from './session-cookie.ts';

/** The member of a session; a role is looked up each time, so a change holds from the next request on. */
export async function memberOf(
  sessionId: string,
  sessions: SessionStore,
  accounts: AccountStore,
): Promise<{ member: Member; isRenewed: boolean } | null> {
  const session = await sessions.read(sessionId);
  if (!session) return null;
  const memberships = await accounts.membershipsOf(session.person.id);
  const membership =
    memberships.find(({ organisation }) => organisation.id === session.organisation) ??
    memberships[0];
  if (!membership) return null;
  const { person, isRenewed } = session;
  return { member: { sessionId, person, ...membership, memberships }, isRenewed };
}

/** Finds out who sent a request by the cookies it carries, and prolongs a session that is in use. */
export const makeIdentify =
  (sessions: SessionStore, accounts: AccountStore) =>
  async (cookies: CookieJar): Promise<Caller> => {
    const sessionId = cookies.read(sessionCookie);
    const visitor = cookies.read(visitorCookie);
    const found = sessionId ? await memberOf(sessionId, sessions, accounts) : null;
    if (found?.isRenewed) cookies.set(sessionCookie, found.member.sessionId, sessionMaxAge);
    return { member: found?.member ?? null, visitor: visitor ? secretHash(visitor) : null };
  };
