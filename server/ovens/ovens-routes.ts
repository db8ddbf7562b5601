import { getOven, listOvens } from '../../shared/contracts/ovens.ts';
import { route, type ApiRoute } from '../http/api-route.ts';
import { done, refused } from '../outcome.ts';
import type { OvenLibrary } from './oven-library.ts';

/** Ovens are the same for everybody and hold no secret: no fault is in them. */
export function ovensRoutes(ovens: OvenLibrary): ApiRoute[] {
  return [
    route(listOvens, 'open', async () =>
      done({
        ovens: ovens.list().map(({ definition: { id, maker, model } }) => ({ id, maker, model })),
      }),
    ),
    route(getOven, 'open', async ({ params }) => {
      const oven = ovens.find(params.oven);
      return oven ? done(oven) : refused('not-found', `There is no oven ${params.oven}.`);
    }),
  ];
}
