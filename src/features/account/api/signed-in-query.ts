import { queryOptions } from '@tanstack/react-query';
import { rememberSignedIn } from '../signed-in-before.ts';

/**
 * Who is signed in here; null: nobody. Changes only by signing in, out or switching, so it is never
 * asked again by itself: an open form must not vanish because a session ran out. The question is a
 * chunk of its own, for the first page of a newcomer asks nothing.
 */
export const signedInQuery = queryOptions({
  queryKey: ['signed-in'],
  queryFn: async ({ signal }) => {
    const { askWhoIsSignedIn } = await import('./ask-who-is-signed-in.ts');
    const signedIn = await askWhoIsSignedIn(signal);
    rememberSignedIn(signedIn !== null);
    return signedIn;
  },
  staleTime: Infinity,
});
