import { inPackages, npmCommand } from './dependencies.mjs';

/** @typedef {'postgresql' | 'chromium' | 'ngspice'} Program by the name of its Debian package */

/**
 * @typedef {object} Step
 * @property {string} name as it is asked for: `npm test -- unit db`
 * @property {'check' | 'tests' | 'build'} kind a check counts as one, tests count each
 * @property {readonly Program[]} needs
 * @property {() => { command: string, args: string[] }} commandOf
 */

/**
 * @param {string} name
 * @param {readonly string[]} script below node_modules
 * @param {readonly string[]} args
 * @returns {Step}
 */
function check(name, script, args) {
  const commandOf = () => ({ command: process.execPath, args: [inPackages(...script), ...args] });
  return { name, kind: 'check', needs: [], commandOf };
}

/**
 * @param {string} name of a Vitest project
 * @param {readonly Program[]} needs
 * @returns {Step}
 */
function tests(name, needs) {
  const args = [inPackages('vitest', 'vitest.mjs'), 'run', '--project', name, '--allowOnly=false'];
  return { name, kind: 'tests', needs, commandOf: () => ({ command: process.execPath, args }) };
}

/** @type {Step} */
const walls = {
  name: 'walls',
  kind: 'check',
  needs: [],
  commandOf: () => {
    const { command, args } = npmCommand();
    return { command, args: [...args, 'run', '--silent', 'walls'] };
  },
};

/** @type {readonly Step[]} */
export const allSteps = [
  check('types', ['typescript', 'bin', 'tsc'], ['-b']),
  check('lint', ['eslint', 'bin', 'eslint.js'], ['.', '--max-warnings', '0']),
  walls,
  check('format', ['prettier', 'bin', 'prettier.cjs'], ['--check', '.']),
  tests('unit', ['ngspice']),
  tests('client', []),
  tests('db', ['postgresql', 'ngspice']),
  { ...check('build', [], []), kind: 'build' },
  tests('e2e', ['postgresql', 'chromium', 'ngspice']),
];

/**
 * The steps asked for in the order in which they run; all when none is named. The end-to-end tests
 * bring the build with them.
 * @param {readonly string[]} names
 * @returns {{ ok: true, steps: Step[] } | { ok: false, fault: string }}
 */
export function selectSteps(names) {
  const known = allSteps.map(({ name }) => name);
  const unknown = names.filter((name) => !known.includes(name));
  if (unknown.length > 0) {
    return {
      ok: false,
      fault: `No step is called ${unknown.join(', ')}; there are ${known.join(', ')}.`,
    };
  }
  if (names.length === 0) return { ok: true, steps: [...allSteps] };
  const wanted = names.includes('e2e') ? [...names, 'build'] : names;
  return { ok: true, steps: allSteps.filter(({ name }) => wanted.includes(name)) };
}
