import { z } from 'zod';
import { appliedFault } from '../oven/fault.ts';

/** The complaint rows of the trade; a job is filed under one. The last five are for what has no display, or no complaint. */
export const symptom = z.enum([
  'dead, no display',
  'display, normal sounds, no heat',
  'loud hum, no heat',
  'fuse blows on start',
  'fuse blows on door opening',
  'no start on pressing start',
  'heats, lamp, fan or turntable dead',
  'intermittent cut-out',
  'arcing in cavity',
  'weak heat',
  'dead, nothing runs',
  'runs normally, no heat',
  'does not stop by itself',
  'no complaint, safety check',
]);

const line = (max: number) => z.string().trim().min(1).max(max);

export const jobTicket = z.strictObject({
  /** the customer's own words */ complaint: line(240),
  history: line(400),
  seenAtSite: line(400),
  age: line(80),
});

export const condition = z.enum(['guided', 'unaided', 'assessed']);
export const meterId = z.enum(['manual-2000', 'auto-6000']);

/** A job as its author writes it: oven, faults, ticket, conditions. */
export const scenarioContent = z.strictObject({
  schemaVersion: z.literal(1),
  title: line(90),
  oven: z.string().regex(/^[a-z0-9-]+$/),
  symptom,
  /** 1 first steps to 5 for experienced technicians */ level: z.int().min(1).max(5),
  faults: z.array(appliedFault).max(6),
  ticket: jobTicket,
  condition,
  meter: meterId,
  /** how long before the attempt the oven last ran, s; null: not for days */
  lastRunSecondsAgo: z.number().min(0).max(86_400).nullable(),
});

export type Symptom = z.infer<typeof symptom>;
export type Condition = z.infer<typeof condition>;
export type ScenarioContent = z.infer<typeof scenarioContent>;
