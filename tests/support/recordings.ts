import { readFileSync, readdirSync } from 'node:fs';
import type { WireEvent } from '../../shared/bench/event.ts';
import type { Setup } from '../../shared/bench/setup.ts';
import { scenarioContent } from '../../shared/scenario/scenario.ts';
import { recording } from '../../server/demo/recording.ts';
import { setupWith } from './bench.ts';

const scenarios = new URL('../../scenarios/', import.meta.url);
const read = (path: string): unknown => JSON.parse(readFileSync(new URL(path, scenarios), 'utf8'));

export interface Played {
  file: string;
  job: string;
  setup: Setup;
  events: readonly WireEvent[];
}

/** Every recorded attempt with the setup it was worked on. */
export const recordings: readonly Played[] = readdirSync(new URL('recordings/', scenarios)).map(
  (file) => {
    const { job, seed, events } = recording.parse(read(`recordings/${file}`));
    const content = scenarioContent.parse(read(`jobs/${job}.json`));
    const { faults, meter, lastRunSecondsAgo } = content;
    return { file, job, events, setup: setupWith(faults, { seed, meter, lastRunSecondsAgo }) };
  },
);

export const recordingOf = (job: string): Played => {
  const found = recordings.find((one) => one.job === job);
  if (!found) throw new Error(`no recording of ${job}`);
  return found;
};
