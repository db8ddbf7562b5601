import { useQuery } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { listJobs } from '../../../../shared/contracts/scenarios.ts';

export const useJobs = () =>
  useQuery({
    queryKey: ['jobs'],
    queryFn: async ({ signal }) => (await call(listJobs, { signal })).jobs,
  });
