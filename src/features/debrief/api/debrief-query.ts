import { queryOptions } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { getDebrief } from '../../../../shared/contracts/attempts.ts';

/** The debrief of an attempt that was handed in: it never changes again. */
export const debriefQuery = (attempt: string) =>
  queryOptions({
    queryKey: ['attempts', attempt, 'debrief'],
    queryFn: async ({ signal }) =>
      (await call(getDebrief, { params: { attempt }, signal })).debrief,
    staleTime: Infinity,
  });
