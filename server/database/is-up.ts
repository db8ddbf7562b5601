import { setTimeout as pause } from 'node:timers/promises';
import type { Database } from './data-source.ts';

/** ms: longer than any healthy database takes, shorter than anybody waits */
const patience = 2_000;

/** Whether the database answers a query now. */
export async function isDatabaseUp(database: Database): Promise<boolean> {
  const asked = database.query('SELECT 1').then(
    () => true,
    () => false,
  );
  return Promise.race([asked, pause(patience, false, { ref: false })]);
}
