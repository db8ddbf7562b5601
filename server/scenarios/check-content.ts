import { checkFaults } from '../../shared/oven/check-faults.ts';
import type { ScenarioContent } from '../../shared/scenario/scenario.ts';
import type { OvenLibrary } from '../ovens/oven-library.ts';
import type { Mistake } from '../ovens/read-json-folder.ts';

/** What of a scenario its oven does not allow: an unknown oven, unknown parts, faults and values. Paths start in the content. */
export function checkContent(content: ScenarioContent, ovens: OvenLibrary): Mistake[] {
  const oven = ovens.find(content.oven);
  if (!oven) return [{ path: 'oven', message: `unknown oven ${content.oven}` }];
  return checkFaults(oven.definition, content.faults);
}
