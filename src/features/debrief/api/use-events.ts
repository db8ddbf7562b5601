import { useQuery } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { getEvents } from '../../../../shared/contracts/attempts.ts';

export const useEvents = (attempt: string) =>
  useQuery({
    queryKey: ['attempts', attempt, 'events'],
    queryFn: async ({ signal }) => (await call(getEvents, { params: { attempt }, signal })).events,
  });
