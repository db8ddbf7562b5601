import { useMutation, useQueryClient } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { createScenario, saveScenario } from '../../../../shared/contracts/scenarios.ts';
import type { ScenarioContent } from '../../../../shared/scenario/scenario.ts';

/** Saves a draft: at its own scenario, or as a new one when there is none yet. */
export const useKeepScenario = () => {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: async ({ id, draft }: { id: string | null; draft: ScenarioContent }) =>
      id === null
        ? (await call(createScenario, { body: { draft } })).scenario
        : (await call(saveScenario, { params: { scenario: id }, body: { draft } })).scenario,
    onSuccess: async (scenario) => {
      queries.setQueryData(['scenarios', scenario.id], scenario);
      await queries.invalidateQueries({ queryKey: ['scenarios'], exact: true });
    },
  });
};
