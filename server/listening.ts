import type { Server } from 'node:http';
import type { Express } from 'express';
import type { Logger } from 'pino';

/** @throws when the port is taken or the address is not ours */
export const listen = (app: Express, port: number, host: string): Promise<Server> =>
  new Promise((resolve, reject) => {
    const server = app.listen(port, host, (error?: Error) => {
      if (error) reject(error);
      else resolve(server);
    });
  });

/** ms that requests under way may still take */
const patience = 10_000;

/** On SIGTERM or SIGINT takes no new request, lets those under way finish, then leaves the database. */
export function stopOnSignal(server: Server, leave: () => Promise<void>, log: Logger): void {
  let isStopping = false;
  const stop = (signal: NodeJS.Signals): void => {
    if (isStopping) return;
    isStopping = true;
    log.info({ signal }, 'Coldbench stops');
    setTimeout(() => server.closeAllConnections(), patience).unref();
    server.close(() => {
      leave().then(
        () => process.exit(0),
        (error: unknown) => {
          log.error({ err: error }, 'the database was not left cleanly');
          process.exit(1);
        },
      );
    });
    server.closeIdleConnections();
  };
  process.on('SIGTERM', stop);
  process.on('SIGINT', stop);
}
