import { existsSync, readFileSync } from 'node:fs';
import { basename, join } from 'node:path';
import { Failure } from './failure.mjs';
import { inProject, projectFolder } from './project.mjs';
import { say, since } from './say.mjs';

/**
 * @typedef {object} LockedPackage
 * @property {string} [version]
 * @property {string} [integrity]
 * @property {boolean} [optional] npm leaves it out where it does not fit the machine
 * @property {boolean} [devOptional]
 * @property {boolean} [peer]
 * @typedef {{ packages?: Record<string, LockedPackage> }} PackageLock
 */

/**
 * The first package in which what is installed differs from the lock, or null.
 * @param {PackageLock} wanted package-lock.json
 * @param {PackageLock} installed node_modules/.package-lock.json, which npm writes last of all
 * @returns {string | null} its path, 'node_modules/vite'
 */
export function firstDifference(wanted, installed) {
  const [want, have] = [wanted.packages ?? {}, installed.packages ?? {}];
  for (const [path, { version, integrity, optional, devOptional }] of Object.entries(want)) {
    if (path === '') continue;
    const found = have[path];
    if (found === undefined && (optional === true || devOptional === true)) continue;
    if (found?.version !== version || found?.integrity !== integrity) return path;
  }
  return Object.keys(have).find((path) => want[path] === undefined) ?? null;
}

/**
 * Installs what the lock names unless exactly that is there.
 * @param {import('./children.mjs').Children} children
 * @throws {Failure} when npm fails
 */
export async function requireDependencies(children) {
  const reason = reasonToInstall();
  if (reason === null) return;
  const start = performance.now();
  say(`Installing the packages of package-lock.json (${reason}).`);
  const { command, args } = npmCommand();
  const { code } = await children.run(command, [...args, 'ci', '--include=dev'], {
    cwd: projectFolder,
    // npm would roll back for a while first; half an installation is seen and made whole next time.
    stopBy: 'SIGKILL',
  });
  if (code !== 0) throw new Failure(`npm ci failed (exit code ${code}).`);
  say(`Packages installed in ${since(start)}.`);
}

/** @returns {string | null} */
function reasonToInstall() {
  const record = inProject('node_modules', '.package-lock.json');
  if (!existsSync(record)) return 'none are there';
  const installed = JSON.parse(readFileSync(record, 'utf8'));
  const path = firstDifference(
    JSON.parse(readFileSync(inProject('package-lock.json'), 'utf8')),
    installed,
  );
  if (path !== null) return `${path} differs`;
  const lost = Object.keys(installed.packages).find((each) => !existsSync(inProject(each)));
  return lost === undefined ? null : `${lost} is gone`;
}

/**
 * The npm that runs this script, or the one on PATH when none does.
 * @returns {{ command: string, args: string[] }}
 */
export function npmCommand() {
  const script = process.env['npm_execpath'] ?? '';
  if (basename(script) !== 'npm-cli.js') return { command: 'npm', args: [] };
  return { command: process.execPath, args: [script] };
}

/**
 * The script behind a command of an installed package, to be run by Node itself.
 * @param {...string} parts 'vite', 'bin', 'vite.js'
 */
export function inPackages(...parts) {
  return join(projectFolder, 'node_modules', ...parts);
}
