import { join } from 'node:path';
import { scenarioContent, type ScenarioContent } from '../../shared/scenario/scenario.ts';
import type { OvenLibrary } from '../ovens/oven-library.ts';
import { readJsonFolder, type OnBadFile } from '../ovens/read-json-folder.ts';
import { checkContent } from './check-content.ts';

export interface PracticeJob {
  /** name of the file: what ties the scenario in the database to it */ origin: string;
  content: ScenarioContent;
}

/** Reads the practice jobs. A bad one is told with every mistake and left out. */
export async function readJobs(
  folder: string,
  ovens: OvenLibrary,
  onBadFile: OnBadFile,
): Promise<PracticeJob[]> {
  const files = await readJsonFolder(folder, onBadFile);
  return files.flatMap(({ name, content }) => {
    const parsed = scenarioContent.safeParse(content);
    const mistakes = parsed.success
      ? checkContent(parsed.data, ovens)
      : parsed.error.issues.map(({ path, message }) => ({ path: path.join('.'), message }));
    if (parsed.success && mistakes.length === 0) return [{ origin: name, content: parsed.data }];
    onBadFile(join(folder, `${name}.json`), mistakes);
    return [];
  });
}
