import { existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The folder that holds package.json, without a slash at the end. */
export const projectFolder = fileURLToPath(new URL('../../..', import.meta.url)).replace(/\/$/, '');

/**
 * A path inside the project.
 * @param {...string} parts
 */
export function inProject(...parts) {
  return join(projectFolder, ...parts);
}

/**
 * The first of these programs that PATH leads to, or null.
 * @param {readonly string[]} names
 * @param {string} [path]
 * @returns {string | null}
 */
export function findOnPath(names, path = process.env['PATH'] ?? '') {
  const folders = path.split(delimiter).filter((folder) => folder !== '');
  for (const name of names) {
    const found = folders.map((folder) => join(folder, name)).find((file) => existsSync(file));
    if (found !== undefined) return found;
  }
  return null;
}
