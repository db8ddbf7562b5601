import { useMemo } from 'react';
import { useBench } from '../../simulation/bench-context.ts';
import { openPoints, type Point } from './open-points.ts';

/** What is done and what is open on this bench. */
export function useOpenPoints(): Point[] {
  const definition = useBench(({ setup }) => setup.oven.definition);
  const state = useBench((store) => store.state);
  const events = useBench((store) => store.events);
  return useMemo(() => openPoints(definition, state, events), [definition, state, events]);
}
