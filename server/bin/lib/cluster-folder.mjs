import { createHash } from 'node:crypto';
import { chmodSync, chownSync, mkdirSync, realpathSync, statSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { canEnter } from './account.mjs';
import { codeOf, Failure } from './failure.mjs';
import { say } from './say.mjs';

/** Where clusters go whose user cannot enter the project's folder. */
const elsewhere = '/var/lib/coldbench';

/**
 * The folder elsewhere that belongs to this data folder alone.
 * @param {string} data
 */
export function folderElsewhere(data) {
  const digest = createHash('sha256').update(realpathSync(data)).digest('hex');
  return join(elsewhere, digest.slice(0, 12));
}

/**
 * The folder of one cluster, its password and its log; made when missing, 0700, owned by the user
 * that PostgreSQL runs as.
 * @param {string} data the data folder, which must exist
 * @param {string} name 'postgres' for the lasting one, 'test-…' for a test run's
 * @param {import('./account.mjs').Account} account
 * @returns {string}
 * @throws {Failure} when it belongs to somebody else
 */
export function prepareClusterFolder(data, name, account) {
  const inside = join(data, name);
  if (canEnter(dirname(inside), account) && isPrepared(inside, account)) return inside;
  const outside = join(folderElsewhere(data), name);
  say(`PostgreSQL's user cannot use ${data}: the cluster is in ${outside}.`);
  mkdirSync(dirname(outside), { recursive: true });
  for (const folder of [elsewhere, folderElsewhere(data), dirname(outside)]) {
    chmodSync(folder, 0o711);
  }
  if (isPrepared(outside, account)) return outside;
  throw new Failure(`Cannot give ${outside} to PostgreSQL's user.`);
}

/**
 * @param {string} folder
 * @param {import('./account.mjs').Account} account
 * @returns {boolean} false when the file system does not let it be given away
 */
function isPrepared(folder, { uid, gid }) {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const owner = uid ?? process.getuid?.();
  if (uid !== undefined && gid !== undefined && statSync(folder).uid === process.getuid?.()) {
    try {
      chownSync(folder, uid, gid);
    } catch (error) {
      if (codeOf(error) === 'EPERM') return false;
      throw error;
    }
  }
  if (statSync(folder).uid === owner) return true;
  throw new Failure(
    `${folder} belongs to another user: start as the user who made it, or choose another folder with COLDBENCH_DATA.`,
  );
}
