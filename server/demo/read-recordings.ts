import { join } from 'node:path';
import { readJsonFolder, type OnBadFile } from '../ovens/read-json-folder.ts';
import { recording, type Recording } from './recording.ts';

/** The recorded attempts of the demonstration, in the order of their names. A bad one is told and left out. */
export async function readRecordings(root: string, onBadFile: OnBadFile): Promise<Recording[]> {
  const folder = join(root, 'scenarios', 'recordings');
  const files = await readJsonFolder(folder, onBadFile);
  return files.flatMap(({ name, content }) => {
    const parsed = recording.safeParse(content);
    if (parsed.success) return [parsed.data];
    const mistakes = parsed.error.issues.map(({ path, message }) => ({
      path: path.join('.'),
      message,
    }));
    onBadFile(join(folder, `${name}.json`), mistakes);
    return [];
  });
}
