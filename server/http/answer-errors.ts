import type { ErrorRequestHandler } from 'express';
import type { Logger } from 'pino';
import { errorProblem } from './error-problem.ts';
import { sendProblem } from './send-problem.ts';

/** Errors that nobody expected: what they say goes to the log, never into the answer. */
export const answerErrors =
  (log: Logger): ErrorRequestHandler =>
  (error: unknown, request, response, next) => {
    const { problem, isBug } = errorProblem(error, String(request.id));
    if (isBug) log.error({ err: error, request: request.id }, 'a request failed');
    else if (problem.code === 'database-away') {
      log.warn({ request: request.id, reason: String(error) }, 'the database is away');
    }
    if (response.headersSent) return next(error);
    sendProblem(response, problem);
  };
