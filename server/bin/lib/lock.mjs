import { mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { codeOf, Failure } from './failure.mjs';
import { isGoneWithin, isRunning, recordOf, sendSignal } from './processes.mjs';
import { say } from './say.mjs';

/**
 * @typedef {object} Lock
 * @property {number} pid of the launcher
 * @property {string} identity
 * @property {string} command as the person typed it: 'npm start'
 * @property {string} address where it serves
 * @property {import('./children.mjs').ChildRecord[]} children what it runs at this moment
 */

/**
 * Makes this launcher the only one that uses a data folder. What a launcher that was killed left
 * running is stopped first.
 * @param {string} file the lock; its folder is made when missing
 * @param {{ command: string, address: string }} about
 * @param {import('./children.mjs').Children} children recorded in the lock from here on
 * @returns {Promise<() => void>} gives the lock back
 * @throws {Failure} when another launcher holds it
 */
export async function takeLock(file, about, children) {
  mkdirSync(dirname(file), { recursive: true });
  const own = { ...recordOf(process.pid), ...about };
  const text = () => JSON.stringify({ ...own, children: children.records() });
  while (!isCreated(file, text())) {
    const holder = readLock(file);
    if (holder !== null && isRunning(holder)) throw new Failure(inUse(holder));
    if (holder !== null) await stopOrphans(holder);
    rmSync(file, { force: true });
  }
  children.onChange(() => {
    // Renamed into place: a launcher killed in mid-write must leave a readable lock.
    writeFileSync(`${file}.new`, text());
    renameSync(`${file}.new`, file);
  });
  return () => {
    children.onChange(() => {});
    rmSync(file, { force: true });
  };
}

/**
 * @param {string} file
 * @returns {Lock | null} null when there is none or it was cut off while being made
 */
export function readLock(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return null;
  }
}

/**
 * Stops what a launcher that is gone had started, in the order in which it would have.
 * @param {Lock} lock
 * @throws {Failure} when something will not stop
 */
export async function stopOrphans(lock) {
  for (const orphan of [...lock.children].reverse()) {
    if (!isRunning(orphan)) continue;
    say(`Stopping process ${orphan.pid}, left over from an earlier ${lock.command}.`);
    const target = orphan.isAlone ? orphan.pid : -orphan.pid;
    sendSignal(target, orphan.stopBy);
    if (await isGoneWithin(orphan, 10_000)) continue;
    sendSignal(target, 'SIGKILL');
    if (await isGoneWithin(orphan, 5000)) continue;
    throw new Failure(`Process ${orphan.pid}, left over from an earlier start, does not stop.`);
  }
}

/** @param {Lock} holder */
function inUse({ command, pid, address }) {
  return `Coldbench already runs from this folder: ${command}, process ${pid}, ${address}. Stop it first.`;
}

/**
 * @param {string} file
 * @param {string} text
 */
function isCreated(file, text) {
  try {
    writeFileSync(file, text, { flag: 'wx' });
    return true;
  } catch (error) {
    if (codeOf(error) === 'EEXIST') return false;
    throw error;
  }
}
