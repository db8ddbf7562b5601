import { useQuery } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { listPeople } from '../../../../shared/contracts/people.ts';

export const usePeople = () =>
  useQuery({
    queryKey: ['people'],
    queryFn: async ({ signal }) => (await call(listPeople, { signal })).people,
  });
