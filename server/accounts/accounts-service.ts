import type { z } from 'zod';
import type { signInFields, signUpFields } from '../../shared/contracts/accounts.ts';
import type { Caller, Member } from '../http/caller.ts';
import { done, refused, type Outcome } from '../outcome.ts';
import type { AccountStore, SessionStore } from './account.ts';
import { memberOf } from './identify.ts';
import type { Passwords } from './passwords.ts';

export interface SignedUp {
  member: Member;
  keptAttempt: string | null;
}

const wrongCredentials = refused(
  'wrong-credentials',
  'No account has this e-mail address and password.',
);

/** Signing in, up and out. Each sign-in opens a new session and ends the one the browser came with. */
export class AccountsService {
  readonly #accounts: AccountStore;
  readonly #sessions: SessionStore;
  readonly #passwords: Passwords;
  readonly #clock: () => Date;

  constructor(
    accounts: AccountStore,
    sessions: SessionStore,
    passwords: Passwords,
    clock: () => Date,
  ) {
    this.#accounts = accounts;
    this.#sessions = sessions;
    this.#passwords = passwords;
    this.#clock = clock;
  }

  async signIn(caller: Caller, fields: z.output<typeof signInFields>): Promise<Outcome<Member>> {
    const account = await this.#accounts.findByEmail(fields.email);
    const fits = await this.#passwords.fits(fields.password, account?.passwordHash ?? null);
    if (!account || !fits) return wrongCredentials;
    const [membership] = await this.#accounts.membershipsOf(account.id);
    if (!membership) return refused('not-allowed', 'This account belongs to no organisation.');
    return done(await this.#open(caller, account.id, membership.organisation.id));
  }

  async signUp(caller: Caller, fields: z.output<typeof signUpFields>): Promise<Outcome<SignedUp>> {
    const passwordHash = await this.#passwords.hash(fields.password);
    const created = await this.#accounts.create({
      name: fields.name,
      email: fields.email,
      passwordHash,
      organisation: `${fields.name}'s bench`,
      visitor: caller.visitor,
      at: this.#clock(),
    });
    if (created.kind === 'email-taken') {
      return refused('email-taken', 'There is an account with this e-mail address already.', {
        errors: [{ path: 'email', message: 'in use already' }],
      });
    }
    const member = await this.#open(caller, created.person, created.organisation);
    return done({ member, keptAttempt: created.keptAttempt });
  }

  async signOut(caller: Caller): Promise<void> {
    if (caller.member) await this.#sessions.close(caller.member.sessionId);
  }

  async workIn(member: Member, organisation: string): Promise<Outcome<Member>> {
    const membership = member.memberships.find((one) => one.organisation.id === organisation);
    if (!membership) return refused('not-found', 'You belong to no such organisation.');
    await this.#sessions.workIn(member.sessionId, organisation);
    return done({ ...member, ...membership });
  }

  async #open(caller: Caller, person: string, organisation: string): Promise<Member> {
    await this.signOut(caller);
    const id = await this.#sessions.open(person, organisation);
    const opened = await memberOf(id, this.#sessions, this.#accounts);
    if (!opened) throw new Error('a session is gone right after it was opened');
    return opened.member;
  }
}
