import type { Express, Request, Response } from 'express';
import type { Outcome } from '../outcome.ts';
import type { ApiRoute } from './api-route.ts';
import { nobody, type Caller } from './caller.ts';
import { CookieJar } from './cookie-jar.ts';
import { makeRateLimits } from './rate-limits.ts';
import { sendProblem } from './send-problem.ts';

export interface MountOptions {
  /** who sent the request, by its cookies */
  identify: (cookies: CookieJar) => Promise<Caller>;
  /** parse our own answers too: in tests and development a wrong one is a fault, not a surprise */
  isStrict: boolean;
}

/** Our own answer does not keep the contract: a bug. */
class WrongAnswer extends Error {
  override name = 'WrongAnswer';
}

function checkAnswer(route: ApiRoute, outcome: Outcome<unknown>): void {
  if (!outcome.ok) return;
  const parsed = route.endpoint.response.safeParse(outcome.value);
  if (parsed.success) return;
  const { method, path } = route.endpoint;
  throw new WrongAnswer(`${method} ${path} answers against its contract: ${parsed.error.message}`);
}

async function serve(
  route: ApiRoute,
  options: MountOptions,
  request: Request,
  response: Response,
): Promise<void> {
  const cookies = new CookieJar(request, response);
  const caller = route.policy === 'open' ? nobody : await options.identify(cookies);
  const takesBody = route.endpoint.method !== 'GET';
  const outcome = await route.run({
    params: request.params,
    query: request.query,
    body: takesBody && request.body !== undefined ? (request.body as unknown) : {},
    caller,
    cookies,
  });
  if (options.isStrict) checkAnswer(route, outcome);
  if (outcome.ok) response.json(outcome.value);
  else sendProblem(response, outcome.problem);
}

function methodsByPath(routes: readonly ApiRoute[]): Map<string, string[]> {
  const methods = new Map<string, string[]>();
  for (const { endpoint } of routes) {
    methods.set(endpoint.path, [...(methods.get(endpoint.path) ?? []), endpoint.method]);
  }
  return methods;
}

/** Mounts the table of routes, then 405 for their paths and 404 for every other path under /api. */
export function mountRoutes(
  app: Express,
  routes: readonly ApiRoute[],
  options: MountOptions,
): void {
  const limits = makeRateLimits();
  for (const route of routes) {
    const { method, path } = route.endpoint;
    const verb = method.toLowerCase() as Lowercase<typeof method>;
    const limiters = route.limit === null ? [] : limits[route.limit];
    app[verb](path, ...limiters, (request: Request, response: Response) =>
      serve(route, options, request, response),
    );
  }
  for (const [path, methods] of methodsByPath(routes)) {
    app.all(path, (request, response) => {
      response.set('Allow', methods.join(', '));
      sendProblem(response, {
        code: 'method-not-allowed',
        detail: `${request.method} is not possible here, only ${methods.join(' and ')}.`,
      });
    });
  }
  app.all('/api{/*path}', (_request, response) =>
    sendProblem(response, { code: 'not-found', detail: 'There is nothing at this address.' }),
  );
}
