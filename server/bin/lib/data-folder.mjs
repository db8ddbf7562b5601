import { accessSync, chmodSync, constants, existsSync, mkdirSync, statSync } from 'node:fs';
import { Failure, reasonOf } from './failure.mjs';

/**
 * Makes the data folder when it is missing. Others may pass through it, since PostgreSQL can run
 * as a user of its own, but not list it.
 * @param {string} folder
 * @throws {Failure} when it cannot be made or used
 */
export function prepareDataFolder(folder) {
  try {
    if (!existsSync(folder)) {
      mkdirSync(folder, { recursive: true });
      chmodSync(folder, 0o711);
    }
    accessSync(folder, constants.R_OK | constants.W_OK | constants.X_OK);
  } catch (error) {
    throw new Failure(`Cannot use the data folder ${folder}: ${reasonOf(error)}.`);
  }
  if (!statSync(folder).isDirectory()) throw new Failure(`The data folder ${folder} is a file.`);
}
