import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { Failure } from './failure.mjs';
import { findOnPath } from './project.mjs';
import { say } from './say.mjs';

const clusterSettings = '/etc/postgresql-common/createcluster.conf';

/** Whether packages come from apt-get here. */
export function hasApt() {
  return findOnPath(['apt-get']) !== null;
}

/**
 * Debian's settings for new clusters, changed so that installing the package makes none: Coldbench
 * makes its own, and a second one would hold port 5432 for nothing.
 * @param {string} text the file as it is, '' when there is none
 */
export function withoutMainCluster(text) {
  const others = text.split('\n').filter((line) => !/^\s*create_main_cluster\s*=/.test(line));
  const kept = others.join('\n').replace(/\n*$/, '');
  return `${kept === '' ? '' : `${kept}\n`}create_main_cluster = false\n`;
}

/**
 * @param {import('./children.mjs').Children} children
 * @throws {Failure} when apt-get fails
 */
export async function installPostgres(children) {
  const text = existsSync(clusterSettings) ? readFileSync(clusterSettings, 'utf8') : '';
  mkdirSync(dirname(clusterSettings), { recursive: true });
  writeFileSync(clusterSettings, withoutMainCluster(text));
  await installPackages(children, ['postgresql']);
}

/**
 * Installs Debian packages; needs root.
 * @param {import('./children.mjs').Children} children
 * @param {readonly string[]} names
 * @throws {Failure} when apt-get fails
 */
export async function installPackages(children, names) {
  say(`Installing with apt-get: ${names.join(', ')}.`);
  const keep = ['-o', 'Dpkg::Options::=--force-confdef', '-o', 'Dpkg::Options::=--force-confold'];
  const install = ['install', '-y', '-q', '--no-install-recommends', ...keep];
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive', UCF_FORCE_CONFFOLD: '1' };
  // One list that cannot be fetched need not matter: whether the packages are there decides.
  await children.run('apt-get', ['update', '-q'], { env, output: 'capture' });
  /** @type {[string[], import('./children.mjs').ChildOptions['stopBy']][]} */
  const steps = [
    [[...install, '--download-only', ...names], 'SIGTERM'],
    // Left to finish when the launcher is stopped: dpkg cut off half way needs repair by hand.
    [[...install, '--no-download', ...names], 'wait'],
  ];
  for (const [args, stopBy] of steps) {
    const { code, output } = await children.run('apt-get', args, {
      ...{ env, stopBy, stopWithin: 300_000, output: 'capture' },
    });
    if (code === 0) continue;
    process.stderr.write(output);
    throw new Failure(`apt-get could not install ${names.join(', ')} (exit code ${code}).`);
  }
}
