import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { requireBuild } from './build.mjs';
import { Stopping } from './children.mjs';
import { Failure, reasonOf } from './failure.mjs';
import { projectFolder } from './project.mjs';
import { say, since } from './say.mjs';
import { countTests, summaryLine } from './test-count.mjs';

// Vitest cannot stop a test that never gives the processor back; a run must end all the same.
const stepWithin = 30 * 60_000;

/** @typedef {import('./test-count.mjs').Count} Count */
/** @typedef {import('./test-steps.mjs').Step} Step */

/**
 * Runs one step and says what came of it. A step that fails does not keep the next from running.
 * @param {import('./children.mjs').Children} children
 * @param {Step} step
 * @param {{ env: NodeJS.ProcessEnv, folder: string, fault: string }} options folder for reports;
 *   a fault not '' says why the step cannot be run at all
 * @returns {Promise<Count>}
 */
export async function runStep(children, step, { env, folder, fault }) {
  const begin = performance.now();
  say(`\n== ${step.name}`);
  const count = fault === '' ? await countStep(children, step, env, folder) : notRun(step, fault);
  for (const note of count.notes) say(note);
  say(`== ${step.name}: ${summaryLine(count)} in ${since(begin)}`);
  return count;
}

/**
 * @param {import('./children.mjs').Children} children
 * @param {Step} step
 * @param {NodeJS.ProcessEnv} env
 * @param {string} folder
 * @returns {Promise<Count>}
 */
async function countStep(children, step, env, folder) {
  switch (step.kind) {
    case 'build':
      return build(children, step);
    case 'check':
      return countCheck(step, await runCommand(children, step, [], env));
    case 'tests': {
      const file = join(folder, `${step.name}.json`);
      const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${file}`];
      const code = await runCommand(children, step, reporters, env);
      const report = existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : null;
      return countTests(step.name, report, code);
    }
  }
}

/**
 * @param {import('./children.mjs').Children} children
 * @param {Step} step
 * @param {readonly string[]} more arguments
 * @param {NodeJS.ProcessEnv} env
 */
async function runCommand(children, step, more, env) {
  const { command, args } = step.commandOf();
  const child = children.start(command, [...args, ...more], { cwd: projectFolder, env });
  const timer = setTimeout(() => {
    say(`${step.name}: stopped, because it did not end within ${stepWithin / 60_000} minutes`);
    void child.stop();
  }, stepWithin);
  const { code } = await child.ended;
  clearTimeout(timer);
  // A server or a worker that a test forgot must not meet the next step.
  await child.stop();
  if (children.isStopping()) throw new Stopping();
  return code;
}

/**
 * @param {import('./children.mjs').Children} children
 * @param {Step} step
 * @returns {Promise<Count>}
 */
async function build(children, step) {
  try {
    await requireBuild(children);
    return countCheck(step, 0);
  } catch (error) {
    if (error instanceof Stopping || !(error instanceof Failure)) throw error;
    return notRun(step, reasonOf(error));
  }
}

/**
 * @param {Step} step
 * @param {number} code
 * @returns {Count}
 */
function countCheck({ name }, code) {
  if (code === 0) return { passed: 1, failed: 0, notes: [] };
  return { passed: 0, failed: 1, notes: [`${name}: exit code ${code}`] };
}

/**
 * @param {Step} step
 * @param {string} fault
 * @returns {Count}
 */
function notRun({ name }, fault) {
  return { passed: 0, failed: 1, notes: [`${name}: ${fault}`] };
}
