import { useQuery } from '@tanstack/react-query';
import { signedInQuery } from './signed-in-query.ts';

/** `isAsked` false: takes what is known already and asks nobody. */
export const useSignedIn = (isAsked = true) => useQuery({ ...signedInQuery, enabled: isAsked });
