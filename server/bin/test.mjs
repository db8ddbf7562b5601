import { join } from 'node:path';
import { prepareDataFolder } from './lib/data-folder.mjs';
import { requireDependencies } from './lib/dependencies.mjs';
import { Failure, reasonOf } from './lib/failure.mjs';
import { launch } from './lib/launch.mjs';
import { freePort } from './lib/ports.mjs';
import { startPrivateDatabase } from './lib/private-database.mjs';
import { inProject, projectFolder } from './lib/project.mjs';
import { say } from './lib/say.mjs';
import { readSettings } from './lib/settings.mjs';
import { addCounts, summaryLine } from './lib/test-count.mjs';
import { openTestFolder } from './lib/test-folder.mjs';
import { findChromium, requireTestPrograms } from './lib/test-programs.mjs';
import { runStep } from './lib/test-run.mjs';
import { selectSteps } from './lib/test-steps.mjs';

/** @typedef {import('./lib/launch.mjs').Launch} Launch */

/**
 * @param {Launch} launched
 * @returns {Promise<import('./lib/launch.mjs').Outcome>}
 */
async function test(launched) {
  const { children } = launched;
  const selection = selectSteps(process.argv.slice(2));
  if (!selection.ok) throw new Failure(selection.fault);
  const { steps } = selection;
  const data = dataFolder();
  prepareDataFolder(data);
  const name = await openTestFolder(launched, data);
  await requireDependencies(children);
  const needs = steps.flatMap((step) => [...step.needs]);
  await requireTestPrograms(children, needs);
  const database = needs.includes('postgresql')
    ? await openDatabase(children, data, name)
    : { url: '', fault: '' };
  const env = await testEnv(database.url, join(data, name));
  const counts = [];
  let buildFault = '';
  for (const step of steps) {
    const ownFault = step.needs.includes('postgresql') ? database.fault : '';
    const fault = step.name === 'e2e' ? ownFault || buildFault : ownFault;
    const count = await runStep(children, step, { env, folder: join(data, name), fault });
    if (step.kind === 'build' && count.failed > 0) buildFault = 'there is no build to test';
    counts.push({ ...count, name: step.name });
  }
  return conclude(counts);
}

/**
 * @param {(import('./lib/test-count.mjs').Count & { name: string })[]} counts
 * @returns {import('./lib/launch.mjs').Outcome}
 */
function conclude(counts) {
  const total = addCounts(counts);
  say('');
  for (const count of counts) say(`${count.name.padEnd(7)} ${summaryLine(count)}`);
  for (const note of total.notes) say(note);
  return { code: total.failed === 0 ? 0 : 1, lastLine: summaryLine(total) };
}

/** Of the variables that steer `npm start` only the data folder counts for tests. */
function dataFolder() {
  const result = readSettings({ COLDBENCH_DATA: process.env['COLDBENCH_DATA'] }, projectFolder);
  if (!result.ok) throw new Failure(`${result.faults.join('; ')}.`);
  return result.settings.data;
}

/**
 * @param {import('./lib/children.mjs').Children} children
 * @param {string} data
 * @param {string} name
 * @returns {Promise<{ url: string, fault: string }>}
 */
async function openDatabase(children, data, name) {
  try {
    const options = { data, name: join(name, 'postgres'), database: 'postgres', isLasting: false };
    return { url: (await startPrivateDatabase(children, options)).url, fault: '' };
  } catch (error) {
    if (!(error instanceof Failure)) throw error;
    return { url: '', fault: reasonOf(error) };
  }
}

/**
 * What the tests may know. Variables meant for `npm start` are kept from them, lest a test meet
 * somebody's own database.
 * @param {string} databaseUrl
 * @param {string} folder
 * @returns {Promise<NodeJS.ProcessEnv>}
 */
async function testEnv(databaseUrl, folder) {
  const foreign = /^(DATABASE_URL|PORT|HOST|NODE_ENV|PG.*|COLDBENCH_.*)$/;
  const kept = Object.entries(process.env).filter(([name]) => !foreign.test(name));
  return {
    ...Object.fromEntries(kept),
    ...(databaseUrl === '' ? {} : { TEST_DATABASE_URL: databaseUrl }),
    COLDBENCH_E2E_SERVER: inProject('dist', 'server', 'main.js'),
    COLDBENCH_E2E_PORT: String(await freePort()),
    COLDBENCH_E2E_DATA: join(folder, 'e2e'),
    COLDBENCH_E2E_CHROMIUM: findChromium() ?? undefined,
  };
}

await launch(test, { signalCode: 130, failureLine: '0 passed, 1 failed' });
