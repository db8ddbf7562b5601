import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { inPackages } from './dependencies.mjs';
import { Failure } from './failure.mjs';
import { inProject, projectFolder } from './project.mjs';
import { say, since } from './say.mjs';

/** What the built server and client are made of, from the project's folder. */
const sources = [
  ...['src', 'shared', 'server', 'scenarios', 'public', 'index.html', 'package-lock.json'],
  ...['package.json', 'vite.config.ts', 'tailwind.config.ts', 'tsconfig.json'],
];
const record = inProject('dist', 'sources.sha256');
const products = [
  inProject('dist', 'server', 'main.js'),
  inProject('dist', 'client', 'index.html'),
];

/**
 * A digest of names and contents. Contents, not times: a fresh clone and a changed branch set the
 * times anew.
 * @param {Iterable<readonly [name: string, content: Uint8Array]>} files in a lasting order
 * @returns {string} hexadecimal SHA-256
 */
export function digestOf(files) {
  const hash = createHash('sha256');
  for (const [name, content] of files) {
    // The length keeps the end of one file apart from the beginning of the next.
    hash.update(`${name}\0${content.length}\0`).update(content);
  }
  return hash.digest('hex');
}

/** @returns {Generator<[string, Uint8Array]>} */
function* readSources() {
  for (const path of sources.flatMap(filesBelow)) yield [path, readFileSync(inProject(path))];
}

/**
 * @param {string} path from the project's folder; one that is missing counts as empty
 * @returns {string[]} ordered by name
 */
function filesBelow(path) {
  const found = statSync(inProject(path), { throwIfNoEntry: false });
  if (found === undefined) return [];
  if (!found.isDirectory()) return [path];
  const names = readdirSync(inProject(path)).sort();
  return names.flatMap((name) => filesBelow(join(path, name)));
}

/**
 * Builds the client and the server, unless the last build was made from the same sources.
 * @param {import('./children.mjs').Children} children
 * @throws {Failure} when the build fails; its own lines come first
 */
export async function requireBuild(children) {
  const digest = digestOf(readSources());
  const last = existsSync(record) ? readFileSync(record, 'utf8') : '';
  if (last === digest && products.every((file) => existsSync(file))) return;
  const start = performance.now();
  say('Building.');
  rmSync(record, { force: true });
  const env = { ...process.env, NODE_ENV: 'production' };
  for (const args of [[], ['--ssr', 'server/main.ts', '--outDir', 'dist/server']]) {
    const { code } = await children.run(
      process.execPath,
      [inPackages('vite', 'bin', 'vite.js'), 'build', '--logLevel', 'warn', ...args],
      { cwd: projectFolder, env },
    );
    if (code !== 0) throw new Failure(`The build failed (exit code ${code}).`);
  }
  writeFileSync(record, digest);
  say(`Built in ${since(start)}.`);
}
