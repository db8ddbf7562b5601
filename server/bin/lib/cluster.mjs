import { randomBytes } from 'node:crypto';
import { chownSync, existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { Failure } from './failure.mjs';
import { makeCluster } from './initdb.mjs';
import { loopback } from './ports.mjs';
import { postgresEnv } from './postgres-env.mjs';
import { startPostmaster } from './postmaster.mjs';

/** The one role of a private cluster; it may make databases. */
const role = 'coldbench';

/**
 * @typedef {object} ClusterOptions
 * @property {string} folder from prepareClusterFolder
 * @property {import('./account.mjs').Account} account
 * @property {import('./postgres-programs.mjs').Programs[]} programs at least one, newest first
 * @property {boolean} isLasting false for a test run's: nothing is flushed to the disk
 *
 * @typedef {object} Cluster
 * @property {(database: string) => string} urlOf
 * @property {import('./children.mjs').Child} postmaster
 */

/**
 * Makes the cluster when it is missing and starts it.
 * @param {import('./children.mjs').Children} children
 * @param {ClusterOptions} options
 * @returns {Promise<Cluster>}
 * @throws {Failure} when PostgreSQL refuses; the line names its log
 */
export async function startCluster(children, options) {
  const { folder, account, isLasting } = options;
  const data = join(folder, 'cluster');
  const password = requirePassword(join(folder, 'password'), account);
  const programs = programsFor(data, options.programs);
  if (!existsSync(data)) {
    await makeCluster(children, { folder, role, account, programs, isLasting });
  }
  const quick = ['fsync=off', 'full_page_writes=off', 'synchronous_commit=off'];
  const { port, postmaster } = await startPostmaster(children, {
    ...{ data, programs, account, log: join(folder, 'postgres.log') },
    extra: isLasting ? [] : quick,
  });
  /** @param {string} database */
  const urlOf = (database) => `postgres://${role}:${password}@${loopback}:${port}/${database}`;
  return { postmaster, urlOf };
}

/**
 * Made once; safe in a URL as it is.
 * @param {string} file
 * @param {import('./account.mjs').Account} account initdb reads it as that user
 */
function requirePassword(file, { uid, gid }) {
  if (!existsSync(file)) {
    writeFileSync(`${file}.new`, randomBytes(24).toString('base64url'), { mode: 0o600 });
    if (uid !== undefined && gid !== undefined) chownSync(`${file}.new`, uid, gid);
    renameSync(`${file}.new`, file);
  }
  return readFileSync(file, 'utf8').trim();
}

/**
 * A cluster runs under the major version that made it and under no other.
 * @param {string} data
 * @param {import('./postgres-programs.mjs').Programs[]} programs
 */
function programsFor(data, programs) {
  const record = join(data, 'PG_VERSION');
  const major = existsSync(record) ? Number(readFileSync(record, 'utf8')) : programs[0]?.major;
  const found = programs.find((each) => each.major === major);
  if (found !== undefined) return found;
  throw new Failure(
    `The cluster in ${data} needs PostgreSQL ${major}, which is not installed: install it, or move that folder away to begin with an empty database.`,
  );
}

/**
 * Makes a database in the cluster unless it is there.
 * @param {import('./children.mjs').Children} children
 * @param {Cluster} cluster
 * @param {ClusterOptions} options
 * @param {string} database
 * @throws {Failure} when that fails
 */
export async function requireDatabaseIn(children, cluster, options, database) {
  const url = new URL(cluster.urlOf('postgres'));
  // The password goes by the environment: every user can read a command line.
  const env = { ...postgresEnv(), PGPASSWORD: url.password };
  url.password = '';
  const psql = join(programsFor(join(options.folder, 'cluster'), options.programs).folder, 'psql');
  /** @param {string} statement */
  const ask = async (statement) => {
    const { code, output } = await children.run(
      psql,
      ['-X', '-A', '-t', '-v', 'ON_ERROR_STOP=1', '-d', url.href, '-c', statement],
      { ...options.account, cwd: '/', env, output: 'capture' },
    );
    if (code !== 0) throw new Failure(`The private PostgreSQL did not answer: ${output.trim()}`);
    return output.trim();
  };
  const found = await ask(`SELECT datname FROM pg_database WHERE datname = '${database}'`);
  if (found !== database) await ask(`CREATE DATABASE ${database}`);
}
