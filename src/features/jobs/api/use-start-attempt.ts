import { useMutation, useQueryClient } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { startAttempt } from '../../../../shared/contracts/attempts.ts';

export interface Start {
  scenario: string;
  /** an instructor tries the draft */ isTrial?: boolean;
}

export const useStartAttempt = () => {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: async (body: Start) => (await call(startAttempt, { body })).attempt,
    onSuccess: async () => {
      await queries.invalidateQueries({ queryKey: ['own-attempts'] });
      await queries.invalidateQueries({ queryKey: ['jobs'] });
    },
  });
};
