import { signIn, signOut, signUp, whoAmI, workIn } from '../../shared/contracts/accounts.ts';
import { route, type ApiRoute } from '../http/api-route.ts';
import { done } from '../outcome.ts';
import type { AccountsService } from './accounts-service.ts';
import { presentMember } from './present-member.ts';
import { sessionCookie, sessionMaxAge, visitorCookie } from './session-cookie.ts';

export function accountsRoutes(accounts: AccountsService): ApiRoute[] {
  return [
    route(whoAmI, 'public', async ({ caller }) =>
      done({ signedIn: caller.member && presentMember(caller.member) }),
    ),
    route(
      signIn,
      'public',
      async ({ caller, body, cookies }) => {
        const outcome = await accounts.signIn(caller, body);
        if (!outcome.ok) return outcome;
        cookies.set(sessionCookie, outcome.value.sessionId, sessionMaxAge);
        return done({ signedIn: presentMember(outcome.value) });
      },
      'sign-in',
    ),
    route(
      signUp,
      'public',
      async ({ caller, body, cookies }) => {
        const outcome = await accounts.signUp(caller, body);
        if (!outcome.ok) return outcome;
        const { member, keptAttempt } = outcome.value;
        cookies.set(sessionCookie, member.sessionId, sessionMaxAge);
        cookies.clear(visitorCookie);
        return done({ signedIn: presentMember(member), keptAttempt });
      },
      'sign-up',
    ),
    route(signOut, 'public', async ({ caller, cookies }) => {
      await accounts.signOut(caller);
      cookies.clear(sessionCookie);
      return done({});
    }),
    route(workIn, 'member', async ({ caller, body }) => {
      const outcome = await accounts.workIn(caller.member, body.organisation);
      return outcome.ok ? done({ signedIn: presentMember(outcome.value) }) : outcome;
    }),
  ];
}
