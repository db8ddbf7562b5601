import { randomInt } from 'node:crypto';
import { existsSync } from 'node:fs';
import { availableParallelism } from 'node:os';
import { join } from 'node:path';
import { pino, type Logger } from 'pino';
import { Passwords } from './accounts/passwords.ts';
import { createApp } from './app.ts';
import { attemptRules } from './attempts/attempt-rules.ts';
import { directJudge } from './attempts/judge.ts';
import { JudgingThread } from './attempts/judging-thread.ts';
import { startJudge } from './attempts/start-judge.ts';
import { threadedJudge } from './attempts/threaded-judge.ts';
import { makeDatabase, type Database } from './database/data-source.ts';
import { isDatabaseUp } from './database/is-up.ts';
import { openDatabase } from './database/open-database.ts';
import { readEnv, type Env } from './env.ts';
import { listen, stopOnSignal } from './listening.ts';
import { prepare } from './prepare.ts';
import { findProjectRoot } from './project-root.ts';
import { makeStores, type Stores } from './stores.ts';

const clock = (): Date => new Date();
const hours = 3_600_000;

/** One core is left to the requests, and PostgreSQL needs one as well. */
const judges = Math.max(1, availableParallelism() - 2);

/** In development Vite serves the client. */
function clientFolder(root: string, env: Env, log: Logger): string | null {
  if (env.mode !== 'production') return null;
  const folder = join(root, 'dist', 'client');
  if (existsSync(join(folder, 'index.html'))) return folder;
  log.warn({ folder }, 'the client is not built: only the API is served');
  return null;
}

/** Expired sessions are refused anyway; this keeps the table short. */
function sweepSessions(stores: Stores, log: Logger): void {
  const sweep = (): void => {
    stores.sessions.deleteExpired().catch((error: unknown) => {
      log.warn({ reason: String(error) }, 'expired sessions were not deleted');
    });
  };
  sweep();
  setInterval(sweep, 6 * hours).unref();
}

async function start(env: Env, log: Logger, database: Database, entry: URL): Promise<void> {
  await openDatabase(database, log);
  const root = findProjectRoot();
  const stores = makeStores(database);
  const passwords = new Passwords();
  const threads = Array.from({ length: judges }, () => new JudgingThread(() => startJudge(entry)));
  const ovens = await prepare({ root, isSeeded: env.isSeeded, stores, passwords, clock, log });
  const { app } = createApp({
    ...stores,
    ovens,
    passwords,
    rules: attemptRules,
    judge: threadedJudge(directJudge(attemptRules), threads),
    clock,
    drawSeed: () => randomInt(2 ** 31),
    isDatabaseUp: () => isDatabaseUp(database),
    log,
    mode: env.mode,
    trustedProxies: env.trustedProxies,
    clientFolder: clientFolder(root, env, log),
  });
  const server = await listen(app, env.port, env.host);
  log.info({ address: server.address() }, 'Coldbench listens');
  sweepSessions(stores, log);
  stopOnSignal(server, () => database.destroy(), log);
}

/** Starts the server with these variables. `entry` is the file that a judging thread begins with. */
export async function startServer(environment: NodeJS.ProcessEnv, entry: URL): Promise<void> {
  const read = readEnv(environment);
  if (!read.ok) {
    const faults = read.faults.map((fault) => `  ${fault}\n`).join('');
    process.stderr.write(`Coldbench cannot start:\n${faults}`);
    process.exit(1);
  }
  const log = pino({ level: read.env.logLevel });
  try {
    await start(read.env, log, makeDatabase(read.env.databaseUrl, log), entry);
  } catch (error) {
    log.fatal({ err: error }, 'Coldbench cannot start');
    process.exit(1);
  }
}
