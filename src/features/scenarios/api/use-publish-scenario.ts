import { useMutation, useQueryClient } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { publishScenario } from '../../../../shared/contracts/scenarios.ts';

export const usePublishScenario = () => {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: async (id: string) =>
      (await call(publishScenario, { params: { scenario: id } })).scenario,
    onSuccess: async (scenario) => {
      queries.setQueryData(['scenarios', scenario.id], scenario);
      await queries.invalidateQueries({ queryKey: ['scenarios'], exact: true });
      await queries.invalidateQueries({ queryKey: ['jobs'] });
    },
  });
};
