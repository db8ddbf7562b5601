import { useQueryClient } from '@tanstack/react-query';
import type { SignedIn } from '../../../../shared/contracts/accounts.ts';
import { rememberSignedIn } from '../signed-in-before.ts';
import { signedInQuery } from './signed-in-query.ts';

/** Drops all that was fetched for someone else, or for another organisation, before the new one is known. */
export const useChangeOfPerson = () => {
  const queries = useQueryClient();
  return (signedIn: SignedIn | null): void => {
    queries.removeQueries({
      predicate: ({ queryKey }) => queryKey[0] !== signedInQuery.queryKey[0],
    });
    queries.setQueryData(signedInQuery.queryKey, signedIn);
    rememberSignedIn(signedIn !== null);
  };
};
