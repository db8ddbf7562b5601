import { existsSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The folder of package.json above this file, be it source or built. */
export function findProjectRoot(from: string = fileURLToPath(import.meta.url)): string {
  const folder = dirname(from);
  if (existsSync(join(folder, 'package.json'))) return folder;
  if (folder === dirname(folder)) throw new Error('no package.json above the server');
  return findProjectRoot(folder);
}
