import type { Request, RequestHandler } from 'express';
import { sendProblem } from './send-problem.ts';

const safeMethods = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Whether a browser sent this from our own pages. `Sec-Fetch-Site` says so (Fetch Metadata Request
 * Headers, W3C); a browser without it sends `Origin`; a client that sends neither is no browser and
 * carries no cookie of a person who did not mean it.
 */
function isFromHere(request: Request): boolean {
  const site = request.get('Sec-Fetch-Site');
  if (site !== undefined) return site === 'same-origin' || site === 'none';
  const origin = request.get('Origin');
  if (origin === undefined) return true;
  return URL.canParse(origin) && new URL(origin).host === request.get('Host');
}

/** Refuses every change that another site's page asked for. */
export const refuseCrossSite: RequestHandler = (request, response, next) => {
  if (safeMethods.has(request.method) || isFromHere(request)) return next();
  sendProblem(response, {
    code: 'cross-site',
    detail: 'This change was asked for by a page of another site.',
  });
};
