import { skipToken, useQuery } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { getScenario } from '../../../../shared/contracts/scenarios.ts';

/** One scenario to edit; null: none yet. Never fetched again by itself: the form on the screen is newer. */
export const useScenario = (scenario: string | null) =>
  useQuery({
    queryKey: ['scenarios', scenario],
    queryFn:
      scenario === null
        ? skipToken
        : async ({ signal }) =>
            (await call(getScenario, { params: { scenario }, signal })).scenario,
    staleTime: Infinity,
  });
