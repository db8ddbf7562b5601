import { z } from 'zod';
import { debrief } from '../assessment/debrief.ts';
import { recordedEvent, wireEvent } from '../bench/event.ts';
import { scenarioContent } from '../scenario/scenario.ts';
import { endpoint } from './endpoint.ts';
import { id, instant, none } from './fields.ts';

export const attemptStatus = z.enum(['on the bench', 'handed in']);

export const attemptSummary = z.strictObject({
  id,
  scenario: id.nullable(),
  version: z.int(),
  title: z.string(),
  person: z.strictObject({ id, name: z.string() }).nullable(),
  status: attemptStatus,
  isTrial: z.boolean(),
  startedAt: instant,
  handedInAt: instant.nullable(),
  benchMs: z.number(),
  events: z.int(),
  /** 0 to 100; null until handed in */ score: z.number().nullable(),
  outcome: z.string().nullable(),
});
export type AttemptSummary = z.infer<typeof attemptSummary>;

/** All that the bench needs to go on where the attempt stands. */
export const attempt = attemptSummary.extend({
  number: z.int(),
  seed: z.int(),
  content: scenarioContent,
  epoch: z.int(),
  /** the next sequence number */ next: z.int(),
  /** the reader may append: it is theirs and still on the bench */ isOwn: z.boolean(),
});
export type Attempt = z.infer<typeof attempt>;

const attemptParams = z.strictObject({ attempt: id });

/** Starts an attempt at the newest published version, or at the draft when an instructor tries their own. */
export const startAttempt = endpoint({
  method: 'POST',
  path: '/api/attempts',
  params: none,
  query: none,
  body: z.strictObject({ scenario: id, isTrial: z.boolean().optional() }),
  response: z.strictObject({ attempt }),
});

/** A visitor's attempt: goes on with the one this browser holds, or starts one. */
export const startVisit = endpoint({
  method: 'POST',
  path: '/api/try',
  params: none,
  query: none,
  body: none,
  response: z.strictObject({ attempt }),
});

export const listOwnAttempts = endpoint({
  method: 'GET',
  path: '/api/attempts',
  params: none,
  query: z.strictObject({ scenario: id.optional() }),
  body: none,
  response: z.strictObject({ attempts: z.array(attemptSummary) }),
});

export const listForReview = endpoint({
  method: 'GET',
  path: '/api/review',
  params: none,
  query: none,
  body: none,
  response: z.strictObject({ attempts: z.array(attemptSummary) }),
});

export const getAttempt = endpoint({
  method: 'GET',
  path: '/api/attempts/:attempt',
  params: attemptParams,
  query: none,
  body: none,
  response: z.strictObject({ attempt }),
});

export const getEvents = endpoint({
  method: 'GET',
  path: '/api/attempts/:attempt/events',
  params: attemptParams,
  query: none,
  body: none,
  response: z.strictObject({ events: z.array(recordedEvent) }),
});

/** Stored before acknowledged; known sequence numbers are compared and dropped. */
export const appendEvents = endpoint({
  method: 'POST',
  path: '/api/attempts/:attempt/events',
  params: attemptParams,
  query: none,
  body: z.strictObject({
    /** the tab that writes */ writer: id,
    epoch: z.int(),
    /** sequence number of the first event */ from: z.int().min(1),
    events: z.array(wireEvent).min(1).max(200),
  }),
  response: z.strictObject({ next: z.int() }),
});

/** Makes this tab the writer; every other one reads only from then on. */
export const takeOver = endpoint({
  method: 'POST',
  path: '/api/attempts/:attempt/take-over',
  params: attemptParams,
  query: none,
  body: z.strictObject({ writer: id }),
  response: z.strictObject({ epoch: z.int(), next: z.int() }),
});

export const getDebrief = endpoint({
  method: 'GET',
  path: '/api/attempts/:attempt/debrief',
  params: attemptParams,
  query: none,
  body: none,
  response: z.strictObject({ debrief }),
});
