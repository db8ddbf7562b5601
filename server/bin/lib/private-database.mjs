import { postgresAccount } from './account.mjs';
import { prepareClusterFolder } from './cluster-folder.mjs';
import { requireDatabaseIn, startCluster } from './cluster.mjs';
import { requirePrograms } from './postgres-programs.mjs';
import { say, since } from './say.mjs';

/**
 * Starts a private cluster in the data folder and sees that it has the database.
 * @param {import('./children.mjs').Children} children
 * @param {{ data: string, name: string, database: string, isLasting: boolean }} options
 * @throws {import('./failure.mjs').Failure} when PostgreSQL is missing or refuses
 */
export async function startPrivateDatabase(children, { data, name, database, isLasting }) {
  const start = performance.now();
  const programs = await requirePrograms(children);
  const account = postgresAccount();
  const folder = prepareClusterFolder(data, name, account);
  const options = { folder, account, programs, isLasting };
  const cluster = await startCluster(children, options);
  if (database !== 'postgres') await requireDatabaseIn(children, cluster, options, database);
  say(`PostgreSQL started in ${since(start)}: ${folder}`);
  return { url: cluster.urlOf(database), folder, postmaster: cluster.postmaster };
}
