import { z } from 'zod';
import { appliedFault } from '../oven/fault.ts';

export const skillName = z.enum([
  'make safe',
  'isolate',
  'measure',
  'reason',
  'repair and verify',
  'record',
]);
export type SkillName = z.infer<typeof skillName>;

/** A mark gained or lost, and the event that earned it. */
export const mark = z.strictObject({
  points: z.number(),
  /** one sentence, second person */ why: z.string(),
  /** sequence of the event in the attempt; null: what was never done */ sequence: z
    .int()
    .nullable(),
});
export type Mark = z.infer<typeof mark>;

export const skillResult = z.strictObject({
  skill: skillName,
  /** 0 to 100; null: this attempt gave nothing to judge it by */ score: z.number().nullable(),
  marks: z.array(mark),
});
export type SkillResult = z.infer<typeof skillResult>;

export const debrief = z.strictObject({
  /** one sentence */ outcome: z.string(),
  isCauseFound: z.boolean(),
  isSafe: z.boolean(),
  score: z.number(),
  skills: z.array(skillResult),
  /** what was truly wrong */ faults: z.array(appliedFault),
});
export type Debrief = z.infer<typeof debrief>;
