import { join } from 'node:path';
import { prepareDataFolder } from './data-folder.mjs';
import { requireDependencies } from './dependencies.mjs';
import { Failure } from './failure.mjs';
import { takeLock } from './lock.mjs';
import { loopback, requireDatabase, requirePort } from './ports.mjs';
import { startPrivateDatabase } from './private-database.mjs';
import { projectFolder } from './project.mjs';
import { readSettings } from './settings.mjs';

/**
 * @typedef {object} Prepared
 * @property {import('./settings.mjs').Settings} settings
 * @property {string} databaseUrl
 * @property {Promise<string>} lost settles, with what to say, when the private cluster ends
 * @property {NodeJS.ProcessEnv} serverEnv what the server reads, but for PORT and NODE_ENV
 */

/**
 * All that has to be there before the server can start: readable variables, a data folder that
 * nobody else uses, free ports, the packages, a database that answers. What takes a moment is
 * looked at before what takes minutes.
 * @param {import('./launch.mjs').Launch} launch
 * @param {string} command as the person typed it
 * @param {(settings: import('./settings.mjs').Settings) => Record<string, number>} portsOf which
 *   ports must be free, by the variable that sets them
 * @returns {Promise<Prepared>}
 * @throws {Failure}
 */
export async function prepare({ children, atEnd }, command, portsOf) {
  const result = readSettings(process.env, projectFolder);
  if (!result.ok) throw new Failure(`${result.faults.join('; ')}.`);
  const { settings } = result;
  prepareDataFolder(settings.data);
  if (settings.database === null) {
    const about = { command, address: `http://${loopback}:${settings.port}` };
    atEnd(await takeLock(join(settings.data, 'launcher.lock'), about, children));
  } else {
    await requireDatabase(settings.database);
  }
  for (const [variable, port] of Object.entries(portsOf(settings))) {
    await requirePort(port, variable);
  }
  await requireDependencies(children);
  const { databaseUrl, lost } = await database(children, settings);
  const serverEnv = {
    ...process.env,
    ...{ DATABASE_URL: databaseUrl, HOST: loopback, COLDBENCH_DATA: settings.data },
    COLDBENCH_SEED: settings.isSeeded ? 'demo' : undefined,
  };
  return { settings, databaseUrl, lost, serverEnv };
}

/**
 * @param {import('./children.mjs').Children} children
 * @param {import('./settings.mjs').Settings} settings
 * @returns {Promise<{ databaseUrl: string, lost: Promise<string> }>}
 */
async function database(children, { data, database }) {
  if (database !== null) return { databaseUrl: database.href, lost: new Promise(() => {}) };
  const { url, folder, postmaster } = await startPrivateDatabase(children, {
    ...{ data, name: 'postgres', database: 'coldbench', isLasting: true },
  });
  const lost = postmaster.ended.then(
    () => `PostgreSQL ended by itself: see ${folder}/postgres.log.`,
  );
  return { databaseUrl: url, lost };
}
