import { readFile, readdir } from 'node:fs/promises';
import { join } from 'node:path';

export interface Mistake {
  path: string;
  message: string;
}

export interface JsonFile {
  /** name without `.json` */ name: string;
  content: unknown;
}

/** Told which file cannot be used, and every reason. */
export type OnBadFile = (file: string, mistakes: readonly Mistake[]) => void;

const isAbsent = (error: unknown): boolean =>
  error instanceof Error && 'code' in error && error.code === 'ENOENT';

async function namesIn(folder: string): Promise<string[]> {
  try {
    return (await readdir(folder)).filter((name) => name.endsWith('.json')).sort();
  } catch (error) {
    if (isAbsent(error)) return [];
    throw error;
  }
}

/** All JSON files of a folder, in the order of their names. A file that is no JSON is told and left out; a folder that is not there is empty. */
export async function readJsonFolder(folder: string, onBadFile: OnBadFile): Promise<JsonFile[]> {
  const files: JsonFile[] = [];
  for (const name of await namesIn(folder)) {
    const text = await readFile(join(folder, name), 'utf8');
    try {
      files.push({ name: name.slice(0, -'.json'.length), content: JSON.parse(text) as unknown });
    } catch (error) {
      const message = error instanceof Error ? error.message : 'is not JSON';
      onBadFile(join(folder, name), [{ path: '', message }]);
    }
  }
  return files;
}
