import { z } from 'zod';
import { databaseProblem } from '../database/database-problem.ts';
import type { Problem } from '../outcome.ts';

const requestError = z.object({ status: z.int().min(400).max(499), type: z.string().optional() });

/** Express and its body reader throw errors with a 4xx status for requests they cannot read. */
function requestProblem(error: unknown): Problem | null {
  const parsed = requestError.safeParse(error);
  if (!parsed.success) return null;
  const { type, status } = parsed.data;
  if (type === 'entity.parse.failed') {
    return { code: 'malformed-json', detail: 'The body of the request is not valid JSON.' };
  }
  if (status === 413) return { code: 'too-large', detail: 'The body is larger than 1 MB.' };
  if (status === 415) {
    return {
      code: 'bad-request',
      detail: 'The body must be JSON in UTF-8, without an odd encoding.',
    };
  }
  return { code: 'bad-request', detail: 'The request cannot be read.' };
}

/**
 * What to answer after an error was thrown. `isBug` says that it is ours and belongs in the log
 * as an error. Nothing of the error itself reaches the answer.
 */
export function errorProblem(
  error: unknown,
  requestId: string,
): { problem: Problem; isBug: boolean } {
  const problem = requestProblem(error) ?? databaseProblem(error);
  if (problem) return { problem, isBug: false };
  return {
    problem: {
      code: 'internal',
      detail: `Something went wrong on our side; it is in our log as ${requestId}.`,
    },
    isBug: true,
  };
}
