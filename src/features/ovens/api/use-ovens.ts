import { useQuery } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { listOvens } from '../../../../shared/contracts/ovens.ts';

export const useOvens = () =>
  useQuery({
    queryKey: ['ovens'],
    queryFn: async ({ signal }) => (await call(listOvens, { signal })).ovens,
    staleTime: Infinity,
  });
