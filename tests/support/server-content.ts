import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { findProjectRoot } from '../../server/project-root.ts';
import { scenarioContent, type ScenarioContent } from '../../shared/scenario/scenario.ts';

export const root = findProjectRoot();

const file = join(root, 'scenarios', 'jobs', 'loud-hum-no-heat.json');

/** A shorted diode in the LC-28. */
export const hum: ScenarioContent = scenarioContent.parse(JSON.parse(readFileSync(file, 'utf8')));
