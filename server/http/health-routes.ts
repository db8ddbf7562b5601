import { health } from '../../shared/contracts/health.ts';
import { done } from '../outcome.ts';
import { route, type ApiRoute } from './api-route.ts';

/** Says that the server is up, and whether the database answers it. */
export function healthRoutes(isDatabaseUp: () => Promise<boolean>): ApiRoute[] {
  return [
    route(health, 'open', async () =>
      done({ status: 'up', database: (await isDatabaseUp()) ? 'up' : 'away' }),
    ),
  ];
}
