import { readFile, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { perform, type Step } from '../../shared/bench/perform.ts';
import { makeSetup } from '../../shared/bench/setup.ts';
import { ovenDefinition } from '../../shared/oven/oven.ts';
import { scenarioContent } from '../../shared/scenario/scenario.ts';
import { demoAttempts } from '../demo/attempts.ts';
import { experts } from '../demo/experts/experts.ts';
import type { Recording } from '../demo/recording.ts';
import { findProjectRoot } from '../project-root.ts';

// npm run record-demo [-- JOB...]: does the written-down attempts of the demo and of the experts on the
// bench, all or those on some jobs, and keeps what the circuit gave.
const scenarios = join(findProjectRoot(), 'scenarios');
const read = async (...path: string[]): Promise<unknown> =>
  JSON.parse(await readFile(join(scenarios, ...path), 'utf8'));

/** Does the steps and writes what happened; `file` below the scenarios' folder. */
async function record(
  work: Omit<Recording, 'schemaVersion' | 'events'>,
  steps: readonly Step[],
  ...file: string[]
) {
  const { job, seed } = work;
  const content = scenarioContent.parse(await read('jobs', `${job}.json`));
  const definition = ovenDefinition.parse(await read('ovens', `${content.oven}.json`));
  const setup = makeSetup({ ...content, definition, seed });
  const performed = perform(setup, steps);
  if (!performed.ok) throw new Error(`${job}, step ${performed.step}: ${performed.message}`);
  const recording: Recording = { schemaVersion: 1, ...work, events: performed.events };
  await writeFile(join(scenarios, ...file), `${JSON.stringify(recording, null, 1)}\n`);
  process.stdout.write(`${job}: ${performed.events.length} events\n`);
}

const asked = process.argv.slice(2);
const isAsked = (job: string): boolean => asked.length === 0 || asked.includes(job);

for (const [index, { steps, ...work }] of demoAttempts.entries())
  if (isAsked(work.job)) await record(work, steps, 'recordings', `${index + 1}-${work.job}.json`);
for (const { steps, ...work } of experts)
  if (isAsked(work.job))
    await record({ ...work, email: 'an expert' }, steps, 'expert-recordings', `${work.job}.json`);
