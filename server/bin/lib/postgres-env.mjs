/**
 * The environment of PostgreSQL's programs: variables such as PGPORT or PGDATA that somebody set
 * for another server must not lead them astray, and their messages are English everywhere.
 * @returns {NodeJS.ProcessEnv}
 */
export function postgresEnv() {
  const kept = Object.entries(process.env).filter(
    ([name]) => !name.startsWith('PG') && !name.startsWith('LC_') && !name.startsWith('npm_'),
  );
  return { ...Object.fromEntries(kept), LC_ALL: 'C', HOME: '/' };
}
