import { closeSync, existsSync, openSync, readFileSync, renameSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { Failure } from './failure.mjs';
import { lastWordsIn } from './log-file.mjs';
import { freePort, loopback } from './ports.mjs';
import { postgresEnv } from './postgres-env.mjs';
import { commandOf } from './processes.mjs';

// Recovery after a crash replays the write-ahead log first, which can take its time.
const readyWithin = 120_000;

/**
 * @typedef {object} PostmasterOptions
 * @property {string} data the cluster
 * @property {string} log
 * @property {import('./postgres-programs.mjs').Programs} programs
 * @property {import('./account.mjs').Account} account
 * @property {readonly string[]} extra settings, 'fsync=off'
 */

/**
 * Starts PostgreSQL on a free port of the loopback address, with no socket file, and waits until it
 * accepts connections.
 * @param {import('./children.mjs').Children} children
 * @param {PostmasterOptions} options
 * @returns {Promise<{ port: number, postmaster: import('./children.mjs').Child }>}
 * @throws {Failure} when it runs already or will not start
 */
export async function startPostmaster(children, options) {
  clearStaleRecord(options.data);
  if (existsSync(options.log)) renameSync(options.log, `${options.log}.before`);
  // Another program may take the free port first; three in a row will not.
  for (let left = 3; left > 0; left -= 1) {
    const port = await freePort();
    const postmaster = spawnPostmaster(children, options, port);
    if (await isReady(postmaster, options.data)) return { port, postmaster };
    await postmaster.stop();
    if (!readFileSync(options.log, 'utf8').includes('Address already in use')) break;
  }
  throw new Failure(`PostgreSQL did not start (${options.log}): ${lastWordsIn(options.log)}`);
}

/**
 * @param {import('./children.mjs').Children} children
 * @param {PostmasterOptions} options
 * @param {number} port
 */
function spawnPostmaster(children, { data, log, programs, account, extra }, port) {
  const all = [
    ...[`listen_addresses=${loopback}`, `port=${port}`, 'unix_socket_directories='],
    ...extra,
  ];
  const lines = openSync(log, 'a');
  const postmaster = children.start(
    join(programs.folder, 'postgres'),
    ['-D', data, ...all.flatMap((setting) => ['-c', setting])],
    {
      ...{ ...account, cwd: '/', env: postgresEnv(), output: { stdout: lines, stderr: lines } },
      // SIGINT to the postmaster is its fast shutdown.
      ...{ stopBy: 'SIGINT', stopWithin: 30_000, isAlone: true },
    },
  );
  closeSync(lines);
  return postmaster;
}

/**
 * @param {import('./children.mjs').Child} postmaster
 * @param {string} data
 */
async function isReady(postmaster, data) {
  let hasEnded = false;
  void postmaster.ended.then(() => (hasEnded = true));
  for (const end = performance.now() + readyWithin; performance.now() < end; await pause(30)) {
    if (hasEnded) return false;
    const { pid, state } = readRecord(data);
    if (pid === postmaster.pid && state === 'ready') return true;
  }
  return false;
}

/**
 * The file that PostgreSQL keeps while it runs: its process number in line 1, its state in line 8.
 * @param {string} data
 */
function readRecord(data) {
  const file = join(data, 'postmaster.pid');
  const lines = existsSync(file) ? readFileSync(file, 'utf8').split('\n') : [];
  return { pid: Number(lines[0] ?? 0), state: (lines[7] ?? '').trim() };
}

/**
 * After a crash the record names a process that is gone, or one of another program that got the
 * same number since; PostgreSQL itself would refuse to start in the second case.
 * @param {string} data
 * @throws {Failure} when it is PostgreSQL indeed, on this cluster
 */
function clearStaleRecord(data) {
  const { pid } = readRecord(data);
  if (pid <= 0) return;
  const command = commandOf(pid) ?? '';
  if (command.includes('postgres') && command.includes(data)) {
    throw new Failure(
      `PostgreSQL already runs on ${data} (process ${pid}), and this start did not begin it: stop it with 'kill -INT ${pid}'.`,
    );
  }
  rmSync(join(data, 'postmaster.pid'), { force: true });
}
