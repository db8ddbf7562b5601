import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { id, instant, none, role } from './fields.ts';

export const person = z.strictObject({
  id,
  name: z.string(),
  email: z.string(),
  role,
  joinedAt: instant,
  attempts: z.int(),
});
export type Person = z.infer<typeof person>;

export const listPeople = endpoint({
  method: 'GET',
  path: '/api/people',
  params: none,
  query: none,
  body: none,
  response: z.strictObject({ people: z.array(person) }),
});

export const changeRole = endpoint({
  method: 'PATCH',
  path: '/api/people/:person',
  params: z.strictObject({ person: id }),
  query: none,
  body: z.strictObject({ role }),
  response: z.strictObject({ person }),
});
