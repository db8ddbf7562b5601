import { useQuery } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { getAttempt } from '../../../../shared/contracts/attempts.ts';

export const useAttempt = (attempt: string) =>
  useQuery({
    queryKey: ['attempts', attempt],
    queryFn: async ({ signal }) =>
      (await call(getAttempt, { params: { attempt }, signal })).attempt,
    // The bench appends to it: what was read a moment ago may be over.
    staleTime: 0,
  });
