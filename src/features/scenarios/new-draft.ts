import type { ScenarioContent } from '../../../shared/scenario/scenario.ts';

/** Where a new scenario starts: an oven with nothing wrong and an empty ticket. */
export const newDraft = (oven: string): ScenarioContent => ({
  schemaVersion: 1,
  title: '',
  oven,
  symptom: 'dead, no display',
  level: 1,
  faults: [],
  ticket: { complaint: '', history: '', seenAtSite: '', age: '' },
  condition: 'guided',
  meter: 'manual-2000',
  lastRunSecondsAgo: null,
});
