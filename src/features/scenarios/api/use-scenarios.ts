import { useQuery } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { listScenarios } from '../../../../shared/contracts/scenarios.ts';

export const useScenarios = () =>
  useQuery({
    queryKey: ['scenarios'],
    queryFn: async ({ signal }) => (await call(listScenarios, { signal })).scenarios,
  });
