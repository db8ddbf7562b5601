import { spawnSync } from 'node:child_process';
import { Failure } from './failure.mjs';

/**
 * @typedef {object} Account
 * @property {number | undefined} uid undefined: the user who started the launcher
 * @property {number | undefined} gid
 */

/** Whether the launcher runs as root. */
export function isRoot() {
  return process.getuid?.() === 0;
}

/**
 * The user that PostgreSQL's programs run as: PostgreSQL refuses to run as root, so root takes the
 * user `postgres`, which Debian's package makes.
 * @returns {Account}
 * @throws {Failure} when root has no such user
 */
export function postgresAccount() {
  if (!isRoot()) return { uid: undefined, gid: undefined };
  const uid = numberFrom(['-u', 'postgres']);
  const gid = numberFrom(['-g', 'postgres']);
  if (uid !== null && gid !== null) return { uid, gid };
  throw new Failure(
    "PostgreSQL does not run as root and there is no user 'postgres': useradd --system postgres, or start as another user.",
  );
}

/**
 * Whether that user can pass through a folder, asked of the system and not worked out from modes:
 * every folder above counts too.
 * @param {string} folder
 * @param {Account} account
 */
export function canEnter(folder, { uid, gid }) {
  const answer = spawnSync('/usr/bin/test', ['-x', folder], { uid, gid, cwd: '/' });
  return answer.status === 0;
}

/** @param {string[]} args */
function numberFrom(args) {
  const answer = spawnSync('id', args, { encoding: 'utf8' });
  return answer.status === 0 ? Number(answer.stdout) : null;
}
