import { z } from 'zod';
import { jobTicket, condition, scenarioContent, symptom } from '../scenario/scenario.ts';
import { endpoint } from './endpoint.ts';
import { id, instant, none } from './fields.ts';

/** What a trainee may know of a job before and while doing it: never the faults. */
export const job = z.strictObject({
  scenario: id,
  version: z.int(),
  number: z.int(),
  title: z.string(),
  oven: z.strictObject({
    id: z.string(),
    maker: z.string(),
    model: z.string(),
    supply: z.string(),
  }),
  symptom,
  level: z.int(),
  condition,
  ticket: jobTicket,
  /** own attempts at any version */ attempts: z.int(),
  best: z.number().nullable(),
});
export type Job = z.infer<typeof job>;

export const listJobs = endpoint({
  method: 'GET',
  path: '/api/jobs',
  params: none,
  query: none,
  body: none,
  response: z.strictObject({ jobs: z.array(job) }),
});

export const getJob = endpoint({
  method: 'GET',
  path: '/api/jobs/:scenario',
  params: z.strictObject({ scenario: id }),
  query: none,
  body: none,
  response: z.strictObject({ job }),
});

export const scenarioSummary = z.strictObject({
  id,
  number: z.int(),
  title: z.string(),
  oven: z.string(),
  symptom,
  level: z.int(),
  /** newest published version; null: never published */ published: z.int().nullable(),
  hasUnpublishedChanges: z.boolean(),
  updatedAt: instant,
  attempts: z.int(),
});
export type ScenarioSummary = z.infer<typeof scenarioSummary>;

export const scenario = z.strictObject({
  id,
  number: z.int(),
  draft: scenarioContent,
  published: z.int().nullable(),
  hasUnpublishedChanges: z.boolean(),
  updatedAt: instant,
});
export type Scenario = z.infer<typeof scenario>;

export const listScenarios = endpoint({
  method: 'GET',
  path: '/api/scenarios',
  params: none,
  query: none,
  body: none,
  response: z.strictObject({ scenarios: z.array(scenarioSummary) }),
});

export const createScenario = endpoint({
  method: 'POST',
  path: '/api/scenarios',
  params: none,
  query: none,
  body: z.strictObject({ draft: scenarioContent }),
  response: z.strictObject({ scenario }),
});

const scenarioParams = z.strictObject({ scenario: id });

export const getScenario = endpoint({
  method: 'GET',
  path: '/api/scenarios/:scenario',
  params: scenarioParams,
  query: none,
  body: none,
  response: z.strictObject({ scenario }),
});

export const saveScenario = endpoint({
  method: 'PUT',
  path: '/api/scenarios/:scenario',
  params: scenarioParams,
  query: none,
  body: z.strictObject({ draft: scenarioContent }),
  response: z.strictObject({ scenario }),
});

/** The draft becomes the next numbered version, unchangeable from then on. */
export const publishScenario = endpoint({
  method: 'POST',
  path: '/api/scenarios/:scenario/publish',
  params: scenarioParams,
  query: none,
  body: none,
  response: z.strictObject({ scenario }),
});
