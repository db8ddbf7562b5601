import express, { type Express } from 'express';
import type { Logger } from 'pino';
import type { AccountStore, SessionStore } from './accounts/account.ts';
import { makeIdentify } from './accounts/identify.ts';
import type { Env } from './env.ts';
import { answerErrors } from './http/answer-errors.ts';
import type { ApiRoute } from './http/api-route.ts';
import { serveClient } from './http/client-files.ts';
import { refuseCrossSite } from './http/cross-site.ts';
import { readJson } from './http/json-body.ts';
import { mountRoutes } from './http/mount-routes.ts';
import { requestLog } from './http/request-log.ts';
import { securityHeaders } from './http/security-headers.ts';
import { sendProblem } from './http/send-problem.ts';
import { makeRoutes, type RouteDeps } from './routes.ts';

export interface AppDeps extends RouteDeps {
  accounts: AccountStore;
  sessions: SessionStore;
  log: Logger;
  mode: Env['mode'];
  trustedProxies: number;
  /** the built client; null: served by somebody else */ clientFolder: string | null;
}

/** The whole server but its socket. `routes` is the table that was mounted. */
export function createApp(deps: AppDeps): { app: Express; routes: readonly ApiRoute[] } {
  const app = express();
  app.disable('x-powered-by');
  app.disable('etag');
  app.set('trust proxy', deps.trustedProxies);
  app.use(requestLog(deps.log));
  app.use(securityHeaders);
  app.use('/api', (_request, response, next) => {
    response.set('Cache-Control', 'no-store');
    next();
  });
  app.use('/api', refuseCrossSite, ...readJson);
  const routes = makeRoutes(deps);
  mountRoutes(app, routes, {
    identify: makeIdentify(deps.sessions, deps.accounts),
    isStrict: deps.mode !== 'production',
  });
  if (deps.clientFolder !== null) serveClient(app, deps.clientFolder);
  app.use((_request, response) =>
    sendProblem(response, { code: 'not-found', detail: 'There is nothing at this address.' }),
  );
  app.use(answerErrors(deps.log));
  return { app, routes };
}
