import { queryOptions } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { whoAmI } from '../../../../shared/contracts/accounts.ts';

/**
 * Who is signed in here; null: nobody. Changes only by signing in, out or switching, so it is never
 * asked again by itself: an open form must not vanish because a session ran out.
 */
export const signedInQuery = queryOptions({
  queryKey: ['signed-in'],
  queryFn: async ({ signal }) => (await call(whoAmI, { signal })).signedIn,
  staleTime: Infinity,
});
