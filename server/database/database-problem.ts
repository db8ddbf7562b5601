import { z } from 'zod';
import type { Problem } from '../outcome.ts';

const away: Problem = {
  code: 'database-away',
  detail: 'The database does not answer at the moment; try again shortly.',
};

const unstorable: Problem = {
  code: 'invalid-fields',
  detail: 'A value of the request cannot be stored.',
};

/** Errors of the socket below PostgreSQL's protocol. */
const socketCodes = new Set([
  'ECONNREFUSED',
  'ECONNRESET',
  'EPIPE',
  'ETIMEDOUT',
  'ENOTFOUND',
  'EAI_AGAIN',
  'EHOSTUNREACH',
]);

/** The driver and its pool give these no code at all, so their texts are the only sign (pg 8.23, pg-pool). */
const driverTexts = [
  'Connection terminated',
  'timeout exceeded when trying to connect',
  'Client has encountered a connection error and is not queryable',
  'Client was closed and is not queryable',
  'Query read timeout',
];

const coded = z.object({ code: z.string() });

/** The SQLSTATE or socket code of an error, looked for in what it wraps as well. */
export function sqlState(error: unknown): string | null {
  for (const one of causes(error)) {
    const parsed = coded.safeParse(one);
    if (parsed.success) return parsed.data.code;
  }
  return null;
}

function* causes(error: unknown): Generator<Error> {
  let next = error;
  for (let depth = 0; depth < 5 && next instanceof Error; depth += 1) {
    yield next;
    next = 'driverError' in next ? next.driverError : next.cause;
  }
}

/**
 * Whether PostgreSQL could not be reached or refused work for reasons that pass by themselves.
 * Classes 08 (connection), 53 (resources), 57 (operator intervention, also statement timeouts),
 * 40 (rolled back by a deadlock or conflict): PostgreSQL documentation, appendix A.
 */
export function isDatabaseAway(error: unknown): boolean {
  const code = sqlState(error);
  if (code !== null && (socketCodes.has(code) || /^(08|53|57|40)/.test(code))) return true;
  if (isReleasedRunner(error)) return true;
  return [...causes(error)].some((one) => driverTexts.some((text) => one.message.startsWith(text)));
}

/** TypeORM releases the runner when its connection breaks; the next query of the transaction then fails so. */
const isReleasedRunner = (error: unknown): boolean =>
  error instanceof Error && error.name === 'QueryRunnerAlreadyReleasedError';

/** The problem a database error stands for; null when it is a bug of ours. Class 22: data exceptions. */
export function databaseProblem(error: unknown): Problem | null {
  if (isDatabaseAway(error)) return away;
  if (sqlState(error)?.startsWith('22')) return unstorable;
  return null;
}

/** Whether a unique constraint of this name refused the row (SQLSTATE 23505). */
export function isTaken(error: unknown, constraint: string): boolean {
  if (sqlState(error) !== '23505') return false;
  return [...causes(error)].some((one) => 'constraint' in one && one.constraint === constraint);
}
