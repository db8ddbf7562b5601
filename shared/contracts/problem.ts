import { z } from 'zod';

/** Stable codes of RFC 9457 problem details; `type` is `urn:coldbench:problem:<code>`. */
export const problemCode = z.enum([
  'bad-request',
  'malformed-json',
  'invalid-fields',
  'too-large',
  'not-signed-in',
  'wrong-credentials',
  'not-allowed',
  'cross-site',
  'not-found',
  'method-not-allowed',
  'email-taken',
  'sequence-gap',
  'another-writer',
  'attempt-closed',
  'cannot-have-happened',
  'not-handed-in',
  'scenario-not-published',
  'scenario-unchanged',
  'too-many-requests',
  'database-away',
  'internal',
]);
export type ProblemCode = z.infer<typeof problemCode>;

export const problemDetails = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  /** one sentence for the person, naming what was wrong */ detail: z.string(),
  code: problemCode,
  /** fields at fault: JSON paths and what is wrong with each */
  errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
  /** on `sequence-gap`: the sequence number the record expects next */ expected: z
    .int()
    .optional(),
  /** on `another-writer`: the epoch now in force */ epoch: z.int().optional(),
});
export type ProblemDetails = z.infer<typeof problemDetails>;
