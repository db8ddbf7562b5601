import { readFileSync, readdirSync } from 'node:fs';
import type { WireEvent } from '../../shared/bench/event.ts';
import { makeSetup, type Setup, type SetupInput } from '../../shared/bench/setup.ts';
import { scenarioContent } from '../../shared/scenario/scenario.ts';
import { recording } from '../../server/demo/recording.ts';
import { ovenDefinition } from '../../shared/oven/oven.ts';

const scenarios = new URL('../../scenarios/', import.meta.url);
const read = (path: string): unknown => JSON.parse(readFileSync(new URL(path, scenarios), 'utf8'));

export interface Played {
  file: string;
  job: string;
  input: SetupInput;
  setup: Setup;
  events: readonly WireEvent[];
}

/** Every recorded attempt with the setup it was worked on. */
export const recordings: readonly Played[] = readdirSync(new URL('recordings/', scenarios)).map(
  (file) => {
    const { job, seed, events } = recording.parse(read(`recordings/${file}`));
    const content = scenarioContent.parse(read(`jobs/${job}.json`));
    const input: SetupInput = {
      ...content,
      definition: ovenDefinition.parse(read(`ovens/${content.oven}.json`)),
      seed,
      condition: 'unaided',
    };
    return { file, job, events, input, setup: makeSetup(input) };
  },
);

export const recordingOf = (job: string): Played => {
  const found = recordings.find((one) => one.job === job);
  if (!found) throw new Error(`no recording of ${job}`);
  return found;
};
