import { useQuery } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { getJob } from '../../../../shared/contracts/scenarios.ts';

export const useJob = (scenario: string) =>
  useQuery({
    queryKey: ['jobs', scenario],
    queryFn: async ({ signal }) => (await call(getJob, { params: { scenario }, signal })).job,
  });
