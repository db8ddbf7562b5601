import { useQuery } from '@tanstack/react-query';
import type { RecordedEvent } from '../../../../shared/bench/event.ts';
import type { Attempt } from '../../../../shared/contracts/attempts.ts';
import type { OvenDefinition } from '../../../../shared/oven/oven.ts';
import { askReasoning, canReason } from '../../../simulation/ask-reasoning.ts';

/** The faults left after each reading of an attempt, computed on a thread of its own. */
export const useStepCurve = (
  attempt: Attempt,
  definition: OvenDefinition | undefined,
  events: readonly RecordedEvent[] | undefined,
) =>
  useQuery({
    queryKey: ['attempts', attempt.id, 'step curve'],
    enabled: canReason() && definition !== undefined && events !== undefined,
    queryFn: ({ signal }) =>
      askReasoning<'step curve'>(
        {
          kind: 'step curve',
          definition: definition as OvenDefinition,
          meter: attempt.content.meter,
          events: events ?? [],
        },
        signal,
      ),
    staleTime: Infinity,
    retry: false,
  });
