import 'reflect-metadata';
import type { Logger } from 'pino';
import { DataSource } from 'typeorm';
import { PersonEntity } from '../accounts/person.entity.ts';
import { SessionEntity } from '../accounts/session.entity.ts';
import { AttemptCheckpointEntity } from '../attempts/attempt-checkpoint.entity.ts';
import { AttemptEventEntity } from '../attempts/attempt-event.entity.ts';
import { AttemptEntity } from '../attempts/attempt.entity.ts';
import { MembershipEntity } from '../organisations/membership.entity.ts';
import { OrganisationEntity } from '../organisations/organisation.entity.ts';
import { ScenarioVersionEntity } from '../scenarios/scenario-version.entity.ts';
import { ScenarioEntity } from '../scenarios/scenario.entity.ts';
import { CreateTables1790000000000 } from './migrations/create-tables.ts';

export type Database = DataSource;

/** A client that carries no listener of ours takes Node down with its connection. */
interface LostConnection {
  on: (event: 'error', listener: (error: Error) => void) => void;
}

/** A pool of connections to PostgreSQL; not opened yet. The schema comes from migrations alone. */
export function makeDatabase(url: string, log: Logger): Database {
  const lost = (error: Error) => log.warn({ reason: error.message }, 'a database connection broke');
  return new DataSource({
    type: 'postgres',
    url,
    entities: [
      OrganisationEntity,
      PersonEntity,
      MembershipEntity,
      SessionEntity,
      ScenarioEntity,
      ScenarioVersionEntity,
      AttemptEntity,
      AttemptEventEntity,
      AttemptCheckpointEntity,
    ],
    migrations: [CreateTables1790000000000],
    migrationsTransactionMode: 'all',
    migrationsTableName: 'migration',
    synchronize: false,
    installExtensions: false,
    applicationName: 'coldbench',
    poolErrorHandler: lost,
    extra: {
      max: 12,
      connectionTimeoutMillis: 5_000,
      statement_timeout: 15_000,
      idle_in_transaction_session_timeout: 30_000,
      keepAlive: true,
      onConnect: (client: LostConnection) => client.on('error', lost),
    },
  });
}
