import express, { type Request, type RequestHandler } from 'express';
import { sendProblem } from './send-problem.ts';

const hasBody = (request: Request): boolean =>
  request.headers['transfer-encoding'] !== undefined ||
  Number(request.headers['content-length'] ?? 0) > 0;

/** A form of another site can send text and forms without asking; JSON it cannot. */
const jsonOnly: RequestHandler = (request, response, next) => {
  if (!hasBody(request) || request.is('application/json')) return next();
  sendProblem(response, {
    code: 'bad-request',
    detail: 'The body must be JSON, sent with Content-Type: application/json.',
  });
};

/** Reads bodies of at most 1 MB. `strict` is off: what is JSON but no object is for the schema to refuse. */
export const readJson: readonly RequestHandler[] = [
  jsonOnly,
  express.json({ limit: '1mb', strict: false, type: 'application/json' }),
];
