import { closeSync, openSync, renameSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { Failure } from './failure.mjs';
import { lastWordsIn } from './log-file.mjs';
import { postgresEnv } from './postgres-env.mjs';

/**
 * Makes an empty cluster in `<folder>/cluster`. It grows under another name: one that was cut off
 * half way must not be taken for a whole one.
 * @param {import('./children.mjs').Children} children
 * @param {object} options
 * @param {string} options.folder holds the file `password` as well
 * @param {string} options.role the superuser
 * @param {import('./account.mjs').Account} options.account
 * @param {import('./postgres-programs.mjs').Programs} options.programs
 * @param {boolean} options.isLasting
 * @throws {Failure} when initdb fails
 */
export async function makeCluster(children, { folder, role, account, programs, isLasting }) {
  const made = join(folder, 'cluster.new');
  const log = join(folder, 'initdb.log');
  rmSync(made, { recursive: true, force: true });
  const locale = process.platform === 'darwin' ? 'en_US.UTF-8' : 'C.UTF-8';
  const args = [
    ...['--pgdata', made, '--username', role, '--pwfile', join(folder, 'password')],
    ...['--auth=scram-sha-256', '--encoding=UTF8', `--locale=${locale}`],
    ...(isLasting ? [] : ['--no-sync']),
  ];
  const lines = openSync(log, 'w');
  const { code } = await children.run(join(programs.folder, 'initdb'), args, {
    ...{ ...account, cwd: '/', env: postgresEnv(), output: { stdout: lines, stderr: lines } },
  });
  closeSync(lines);
  if (code !== 0) {
    throw new Failure(`PostgreSQL could not make its cluster (${log}): ${lastWordsIn(log)}`);
  }
  renameSync(made, join(folder, 'cluster'));
}
