import { useQuery } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { listOwnAttempts } from '../../../../shared/contracts/attempts.ts';

/** One's own attempts, newest first as the server gives them; at one scenario, or at all. */
export const useOwnAttempts = (scenario?: string) =>
  useQuery({
    queryKey: ['own-attempts', scenario ?? 'all'],
    queryFn: async ({ signal }) =>
      (await call(listOwnAttempts, { query: { scenario }, signal })).attempts,
  });
