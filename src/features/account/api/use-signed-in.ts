import { useQuery } from '@tanstack/react-query';
import { signedInQuery } from './signed-in-query.ts';

export const useSignedIn = () => useQuery(signedInQuery);
