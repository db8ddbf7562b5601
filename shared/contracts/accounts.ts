import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { email, id, newPassword, none, personName, role } from './fields.ts';

/** Who is signed in, and in which of their organisations they are working. */
export const signedIn = z.strictObject({
  person: z.strictObject({ id, name: personName, email: z.string() }),
  organisation: z.strictObject({ id, name: z.string() }),
  role,
  memberships: z.array(
    z.strictObject({ organisation: z.strictObject({ id, name: z.string() }), role }),
  ),
});
export type SignedIn = z.infer<typeof signedIn>;

export const whoAmI = endpoint({
  method: 'GET',
  path: '/api/me',
  params: none,
  query: none,
  body: none,
  response: z.strictObject({ signedIn: signedIn.nullable() }),
});

export const signInFields = z.strictObject({
  email,
  password: z.string().min(1, 'your password').max(128),
});
export const signIn = endpoint({
  method: 'POST',
  path: '/api/sign-in',
  params: none,
  query: none,
  body: signInFields,
  response: z.strictObject({ signedIn }),
});

/** Keeps the visitor's attempt, when the browser holds one. */
export const signUpFields = z.strictObject({ name: personName, email, password: newPassword });
export const signUp = endpoint({
  method: 'POST',
  path: '/api/sign-up',
  params: none,
  query: none,
  body: signUpFields,
  response: z.strictObject({ signedIn, keptAttempt: id.nullable() }),
});

export const signOut = endpoint({
  method: 'POST',
  path: '/api/sign-out',
  params: none,
  query: none,
  body: none,
  response: none,
});

export const workIn = endpoint({
  method: 'POST',
  path: '/api/me/organisation',
  params: none,
  query: none,
  body: z.strictObject({ organisation: id }),
  response: z.strictObject({ signedIn }),
});
