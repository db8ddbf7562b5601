import type { Role } from '../../shared/contracts/fields.ts';
import { done, refused, type Outcome } from '../outcome.ts';
import type { Caller, SignedInCaller } from './caller.ts';

/**
 * Who may call a route. `open` asks nothing, not even who is calling, and so answers while the
 * database is away; `public` serves anybody but knows who they are; `visitor` wants a session or a
 * visitor's cookie; `reviewer` is an instructor or an administrator.
 */
export type Policy =
  'open' | 'public' | 'visitor' | 'member' | 'reviewer' | 'instructor' | 'administrator';

export type CallerOf<P extends Policy> = P extends 'open' | 'public' | 'visitor'
  ? Caller
  : SignedInCaller;

const roles: Readonly<Record<'reviewer' | 'instructor' | 'administrator', readonly Role[]>> = {
  reviewer: ['instructor', 'administrator'],
  instructor: ['instructor'],
  administrator: ['administrator'],
};

const notSignedIn = refused('not-signed-in', 'Sign in to go on.');

/** Lets the caller through or says why not; 401 asks for a sign-in, 403 would not be helped by one. */
export function admit<P extends Policy>(policy: P, caller: Caller): Outcome<CallerOf<P>>;
export function admit(policy: Policy, caller: Caller): Outcome<Caller> {
  switch (policy) {
    case 'open':
    case 'public':
      return done(caller);
    case 'visitor':
      return caller.member || caller.visitor !== null ? done(caller) : notSignedIn;
    case 'member':
      return caller.member ? done(caller) : notSignedIn;
    case 'reviewer':
    case 'instructor':
    case 'administrator': {
      if (!caller.member) return notSignedIn;
      if (roles[policy].includes(caller.member.role)) return done(caller);
      return refused('not-allowed', `This is for ${roles[policy].join('s and ')}s only.`);
    }
  }
}
