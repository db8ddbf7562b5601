import type { Pool } from 'pg';
import type { DataSource } from 'typeorm';
import type { PostgresDriver } from 'typeorm/driver/postgres/PostgresDriver.js';

/** The pool that TypeORM itself uses, for what speaks to pg directly. Exists once the database is initialised. */
export function poolOf(database: DataSource): Pool {
  const { master } = database.driver as PostgresDriver;
  return master as Pool;
}
