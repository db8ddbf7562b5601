import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
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
 * A digest of the names and contents of all files below these paths. Contents, not times: a fresh
 * clone and a changed branch set the times anew.
 * @param {string} root
 * @param {readonly string[]} paths from root; one that is missing counts as empty
 * @returns {string} hexadecimal SHA-256
 */
export function digestOf(root, paths) {
  const hash = createHash('sha256');
  for (const path of paths) {
    for (const file of filesBelow(root, path)) {
      const content = readFileSync(join(root, file));
      hash.update(`${file}\0${content.length}\0`).update(content);
    }
  }
  return hash.digest('hex');
}

/**
 * @param {string} root
 * @param {string} path
 * @returns {string[]} in an order of their own names alone
 */
function filesBelow(root, path) {
  const full = join(root, path);
  if (!existsSync(full)) return [];
  const entries = readEntries(full);
  if (entries === null) return [path];
  return entries.sort().flatMap((name) => filesBelow(root, join(path, name)));
}

/**
 * @param {string} folder
 * @returns {string[] | null} null when it is a file
 */
function readEntries(folder) {
  try {
    return readdirSync(folder);
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'ENOTDIR') return null;
    throw error;
  }
}

/**
 * Builds the client and the server, unless the last build was made from the same sources.
 * @param {import('./children.mjs').Children} children
 * @throws {Failure} when the build fails; its own lines come first
 */
export async function requireBuild(children) {
  const digest = digestOf(projectFolder, sources);
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
