import { spawnSync } from 'node:child_process';
import { existsSync, readdirSync, realpathSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { isRoot } from './account.mjs';
import { hasApt, installPostgres } from './debian.mjs';
import { Failure } from './failure.mjs';
import { findOnPath } from './project.mjs';

export const oldestMajor = 15;

/** @typedef {{ folder: string, major: number }} Programs initdb, postgres and psql of one version */

const parents = [
  ['/usr/lib/postgresql', 'bin'],
  ['/Applications/Postgres.app/Contents/Versions', 'bin'],
  ['/opt/homebrew/opt', 'bin'],
  ['/usr/local/opt', 'bin'],
];

/**
 * The major version in what `initdb --version` prints, or null.
 * @param {string} text
 */
export function majorOf(text) {
  const found = /\(PostgreSQL\)\s+(\d+)/.exec(text)?.[1];
  return found === undefined ? null : Number(found);
}

/**
 * All versions installed that are new enough, the newest first.
 * @returns {Programs[]}
 */
export function findPrograms() {
  const onPath = findOnPath(['initdb']);
  const folders = new Set(onPath === null ? [] : [dirname(realpathSync(onPath))]);
  for (const [parent = '', below = ''] of parents) {
    if (!existsSync(parent)) continue;
    const names = readdirSync(parent).filter((name) => /^(postgresql@)?\d+$/.test(name));
    for (const name of names) folders.add(join(parent, name, below));
  }
  return [...folders].flatMap(programsIn).sort((a, b) => b.major - a.major);
}

/**
 * @param {string} folder
 * @returns {Programs[]}
 */
function programsIn(folder) {
  if (!['initdb', 'postgres', 'psql'].every((name) => existsSync(join(folder, name)))) return [];
  const answer = spawnSync(join(folder, 'initdb'), ['--version'], { encoding: 'utf8', cwd: '/' });
  const major = majorOf(answer.stdout ?? '');
  return major !== null && major >= oldestMajor ? [{ folder, major }] : [];
}

/**
 * PostgreSQL's programs, installed first when they are missing and this is root on Debian.
 * @param {import('./children.mjs').Children} children
 * @returns {Promise<Programs[]>} at least one
 * @throws {Failure} when there are none and they cannot be installed
 */
export async function requirePrograms(children) {
  const present = findPrograms();
  if (present.length > 0) return present;
  if (isRoot() && hasApt()) {
    await installPostgres(children);
    const installed = findPrograms();
    if (installed.length > 0) return installed;
  }
  throw new Failure(
    `PostgreSQL ${oldestMajor} or newer is not installed: 'sudo apt-get install postgresql' on Debian 12, 'brew install postgresql@17' on macOS, or give a running one in DATABASE_URL.`,
  );
}
