import { spawnSync } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import { setTimeout as pause } from 'node:timers/promises';
import { codeOf } from './failure.mjs';

/**
 * A process as it can be found again later. A number alone will not do: after a crash or a restart
 * of the machine the same number belongs to another program.
 * @typedef {{ pid: number, identity: string }} ProcessRecord
 */

const hasProc = existsSync('/proc/self/stat');

/**
 * What tells this process from every other that had or will have its number: the time it started
 * at and the boot it started in. Null when there is no such process.
 * @param {number} pid
 * @returns {string | null}
 */
export function identify(pid) {
  if (!hasProc) return ask(pid, 'lstart=');
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    const [state, startTicks] = [fields[0], fields[19]];
    if (state === 'Z') return null;
    return `${startTicks} ${readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim()}`;
  } catch {
    return null;
  }
}

/**
 * The command line of a process, or null when there is no such process.
 * @param {number} pid
 * @returns {string | null}
 */
export function commandOf(pid) {
  if (!hasProc) return ask(pid, 'command=');
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0').join(' ').trim();
  } catch {
    return null;
  }
}

/**
 * @param {number} pid
 * @returns {ProcessRecord}
 */
export function recordOf(pid) {
  return { pid, identity: identify(pid) ?? '' };
}

/**
 * Whether the recorded process itself, not a later one with its number, is still running.
 * @param {ProcessRecord} record
 */
export function isRunning(record) {
  return record.identity !== '' && identify(record.pid) === record.identity;
}

/**
 * Sends a signal; a process that is gone already, or only waits to be collected, is no error.
 * @param {number} pid a negative number means the whole process group
 * @param {NodeJS.Signals} signal
 */
export function sendSignal(pid, signal) {
  try {
    process.kill(pid, signal);
  } catch (error) {
    if (!['ESRCH', 'EPERM'].includes(codeOf(error))) throw error;
  }
}

/**
 * Waits until the recorded process is gone.
 * @param {ProcessRecord} record
 * @param {number} within milliseconds
 * @returns {Promise<boolean>} false when it is still there
 */
export async function isGoneWithin(record, within) {
  for (const end = performance.now() + within; performance.now() < end; await pause(50)) {
    if (!isRunning(record)) return true;
  }
  return !isRunning(record);
}

/**
 * @param {number} pid
 * @param {string} column
 */
function ask(pid, column) {
  const answer = spawnSync('ps', ['-o', column, '-p', String(pid)], { encoding: 'utf8' });
  return answer.status === 0 ? answer.stdout.trim() || null : null;
}
