import { accessSync, chmodSync, constants, existsSync, mkdirSync, statSync } from 'node:fs';
import { dirname } from 'node:path';
import { Failure, reasonOf } from './failure.mjs';

/**
 * Makes the data folder when it is missing. Others may pass through it, since PostgreSQL can run
 * as a user of its own, but not list it.
 * @param {string} folder
 * @throws {Failure} when it cannot be made or used
 */
export function prepareDataFolder(folder) {
  if (existsSync(folder) && !statSync(folder).isDirectory()) {
    throw new Failure(`The data folder ${folder} is a file.`);
  }
  try {
    if (!existsSync(folder)) {
      makeFolder(folder);
      chmodSync(folder, 0o711);
    }
    accessSync(folder, constants.R_OK | constants.W_OK | constants.X_OK);
  } catch (error) {
    throw new Failure(`Cannot use the data folder ${folder}: ${reasonOf(error)}.`);
  }
}

/**
 * Node's own recursive form never returns below a folder such as /proc, where nothing can be made.
 * @param {string} folder
 */
function makeFolder(folder) {
  const parent = dirname(folder);
  if (!existsSync(parent)) makeFolder(parent);
  mkdirSync(folder);
}
