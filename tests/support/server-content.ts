import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { OvenLibrary } from '../../server/ovens/oven-library.ts';
import { readOvens } from '../../server/ovens/read-ovens.ts';
import { findProjectRoot } from '../../server/project-root.ts';
import { scenarioContent, type ScenarioContent } from '../../shared/scenario/scenario.ts';

export const root = findProjectRoot();

const file = join(root, 'scenarios', 'jobs', 'loud-hum-no-heat.json');

/** A shorted diode in the LC-28, which has not run for days: nothing is charged, so time passes quickly. */
export const hum: ScenarioContent = {
  ...scenarioContent.parse(JSON.parse(readFileSync(file, 'utf8'))),
  lastRunSecondsAgo: null,
};

/** The ovens of the project; a bad file fails the test. */
export const readAllOvens = (): Promise<OvenLibrary> =>
  readOvens(join(root, 'scenarios', 'ovens'), (bad, mistakes) => {
    throw new Error(`${bad}: ${JSON.stringify(mistakes)}`);
  });
