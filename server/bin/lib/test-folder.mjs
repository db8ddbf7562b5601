import { existsSync, readdirSync, rmSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { folderElsewhere } from './cluster-folder.mjs';
import { prepareDataFolder } from './data-folder.mjs';
import { readLock, stopOrphans, takeLock } from './lock.mjs';
import { isRunning } from './processes.mjs';

/**
 * Makes the folder of one test run, `test-<process>` in the data folder, and clears away those of
 * runs that were killed.
 * @param {import('./launch.mjs').Launch} launch
 * @param {string} data
 * @returns {Promise<string>} its name
 */
export async function openTestFolder({ children, atEnd }, data) {
  for (const name of readdirSync(data).filter((each) => /^test-\d+$/.test(each))) {
    await clearAbandoned(data, name);
  }
  const name = `test-${process.pid}`;
  const about = { command: 'npm test', address: join(data, name) };
  atEnd(() => remove(data, name));
  prepareDataFolder(join(data, name));
  atEnd(await takeLock(lockOf(data, name), about, children));
  return name;
}

/**
 * @param {string} data
 * @param {string} name
 */
function lockOf(data, name) {
  return join(data, name, 'launcher.lock');
}

/**
 * @param {string} data
 * @param {string} name
 */
async function clearAbandoned(data, name) {
  const lock = readLock(lockOf(data, name));
  if (lock === null && Date.now() - statSync(join(data, name)).mtimeMs < 60_000) return;
  if (lock !== null && isRunning(lock)) return;
  if (lock !== null) await stopOrphans(lock);
  remove(data, name);
}

/**
 * @param {string} data
 * @param {string} name
 */
function remove(data, name) {
  for (const parent of [data, folderElsewhere(data)]) {
    const folder = join(parent, name);
    if (existsSync(folder)) rmSync(folder, { recursive: true, force: true });
  }
}
