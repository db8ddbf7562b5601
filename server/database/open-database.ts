import { setTimeout as pause } from 'node:timers/promises';
import type { Logger } from 'pino';
import type { Database } from './data-source.ts';
import { isDatabaseAway } from './database-problem.ts';

/** ms */
const patience = 60_000;
const between = 500;

/**
 * Connects and brings the schema up to date, all migrations in one transaction. Waits a minute for
 * a database that is still starting.
 * @throws whatever the database says when it does not answer by then, or refuses for good
 */
export async function openDatabase(database: Database, log: Logger): Promise<void> {
  for (const end = Date.now() + patience; ; await pause(between)) {
    try {
      await database.initialize();
      break;
    } catch (error) {
      if (!isDatabaseAway(error) || Date.now() > end) throw error;
      log.warn('the database does not answer yet');
    }
  }
  const migrations = await database.runMigrations();
  for (const { name } of migrations)
    log.info({ migration: name }, 'the schema was brought up to date');
}
