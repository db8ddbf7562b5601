import type { Response } from 'express';
import type { ProblemDetails } from '../../shared/contracts/problem.ts';
import type { Problem } from '../outcome.ts';
import { problemCatalogue } from './problem-catalogue.ts';

/** s: a restart of PostgreSQL takes about this long */
const databaseRetryAfter = 5;

/** Answers with problem details (RFC 9457). */
export function sendProblem(response: Response, problem: Problem): void {
  const { status, title } = problemCatalogue[problem.code];
  const details: ProblemDetails = {
    type: `urn:coldbench:problem:${problem.code}`,
    title,
    status,
    detail: problem.detail,
    code: problem.code,
    ...(problem.errors && { errors: problem.errors }),
    ...(problem.expected !== undefined && { expected: problem.expected }),
    ...(problem.epoch !== undefined && { epoch: problem.epoch }),
  };
  if (problem.code === 'database-away') response.set('Retry-After', String(databaseRetryAfter));
  response.status(status).type('application/problem+json').send(JSON.stringify(details));
}
