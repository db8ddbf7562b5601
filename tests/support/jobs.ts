import { readFileSync, readdirSync } from 'node:fs';
import { makeSetup, type Setup } from '../../shared/bench/setup.ts';
import type { OvenDefinition } from '../../shared/oven/oven.ts';
import { scenarioContent, type ScenarioContent } from '../../shared/scenario/scenario.ts';

export interface Job {
  /** file name in `scenarios/jobs` */ job: string;
  content: ScenarioContent;
}

const folder = 'scenarios/jobs';

/** Every published practice job. */
export const jobs: readonly Job[] = readdirSync(folder).map((file) => ({
  job: file.replace('.json', ''),
  content: scenarioContent.parse(JSON.parse(readFileSync(`${folder}/${file}`, 'utf8'))),
}));

/** A job on the oven that `seed` draws. */
export function jobSetup(job: string, definition: OvenDefinition, seed: number): Setup {
  const found = jobs.find((one) => one.job === job);
  if (!found) throw new Error(`no job ${job}`);
  return makeSetup({ ...found.content, definition, seed });
}
