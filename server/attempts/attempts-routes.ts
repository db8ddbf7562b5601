import {
  appendEvents,
  getAttempt,
  getDebrief,
  getEvents,
  listForReview,
  listOwnAttempts,
  startAttempt,
  startVisit,
  takeOver,
} from '../../shared/contracts/attempts.ts';
import { visitorCookie, visitorMaxAge } from '../accounts/session-cookie.ts';
import { route, type ApiRoute } from '../http/api-route.ts';
import { done } from '../outcome.ts';
import type { AppendService } from './append-service.ts';
import type { ReadService } from './read-service.ts';
import type { StartService } from './start-service.ts';

export interface AttemptServices {
  start: StartService;
  read: ReadService;
  append: AppendService;
}

export function attemptsRoutes({ start, read, append }: AttemptServices): ApiRoute[] {
  return [
    route(startAttempt, 'member', ({ caller, body }) =>
      start.start(caller, body.scenario, body.isTrial ?? false),
    ),
    route(
      startVisit,
      'public',
      async ({ caller, cookies }) => {
        const visit = await start.visit(caller);
        if (!visit.ok) return visit;
        const { attempt, token } = visit.value;
        if (token !== null) cookies.set(visitorCookie, token, visitorMaxAge);
        return done({ attempt });
      },
      'visit',
    ),
    route(listOwnAttempts, 'member', ({ caller, query }) =>
      read.listOwn(caller.member, query.scenario),
    ),
    route(listForReview, 'reviewer', ({ caller }) => read.listForReview(caller.member)),
    route(getAttempt, 'visitor', ({ caller, params }) => read.get(caller, params.attempt)),
    route(getEvents, 'visitor', ({ caller, params }) => read.events(caller, params.attempt)),
    route(appendEvents, 'visitor', ({ caller, params, body }) =>
      append.append(caller, params.attempt, body),
    ),
    route(takeOver, 'visitor', ({ caller, params, body }) =>
      append.takeOver(caller, params.attempt, body.writer),
    ),
    route(getDebrief, 'visitor', ({ caller, params }) => read.debrief(caller, params.attempt)),
  ];
}
