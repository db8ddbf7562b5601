import { useQuery } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { listForReview } from '../../../../shared/contracts/attempts.ts';

export const useAttemptsForReview = () =>
  useQuery({
    queryKey: ['review'],
    queryFn: async ({ signal }) => (await call(listForReview, { signal })).attempts,
  });
