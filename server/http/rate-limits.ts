import type { Request, RequestHandler, Response } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import { z } from 'zod';
import type { RateLimit } from './api-route.ts';
import { sendProblem } from './send-problem.ts';

const minutes = 60_000;

/** An address may stand for a whole school, so an e-mail address has its own, tighter counter. */
const addressOf = (request: Request): string => ipKeyGenerator(request.ip ?? 'unknown');

const named = z.object({ email: z.string().max(254) });

function addressAndEmail(request: Request): string {
  const parsed = named.safeParse(request.body);
  const email = parsed.success ? parsed.data.email.trim().toLowerCase() : '';
  return `${addressOf(request)} ${email}`;
}

const tooMany = (_request: Request, response: Response): void =>
  sendProblem(response, {
    code: 'too-many-requests',
    detail: 'Too many attempts. Wait some minutes before the next.',
  });

const counter = (limit: number, more: Parameters<typeof rateLimit>[0] = {}): RequestHandler =>
  rateLimit({
    windowMs: 10 * minutes,
    limit,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    handler: tooMany,
    keyGenerator: addressOf,
    ...more,
  });

/** Fresh counters for one app. Judgement, no source: a person mistypes ten times, a class of 30 signs in at once. */
export function makeRateLimits(): Readonly<Record<RateLimit, readonly RequestHandler[]>> {
  return {
    'sign-in': [
      counter(200, { skipSuccessfulRequests: true }),
      counter(10, { skipSuccessfulRequests: true, keyGenerator: addressAndEmail }),
    ],
    'sign-up': [counter(60)],
    visit: [counter(300)],
  };
}
