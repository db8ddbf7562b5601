import { isDeepStrictEqual } from 'node:util';
import type { PracticeJob } from './read-jobs.ts';
import type { ScenarioRecord, ScenarioStore } from './scenario.ts';

async function bringUpToDate(
  store: ScenarioStore,
  organisation: string,
  { origin, content }: PracticeJob,
  at: Date,
): Promise<ScenarioRecord> {
  const known = await store.findByOrigin(organisation, origin);
  if (!known) return store.create({ organisation, origin, draft: content, at });
  if (!isDeepStrictEqual(known.draft, content)) {
    await store.saveDraft(organisation, known.id, content, at);
  }
  return known;
}

/**
 * Publishes jobs read from files as scenarios of an organisation. A job that is there already gets
 * a new version if its file changed, and nothing happens otherwise. The jobs have been checked.
 */
export async function publishJobs(
  store: ScenarioStore,
  organisation: string,
  jobs: readonly PracticeJob[],
  at: Date,
): Promise<void> {
  for (const job of jobs) {
    const scenario = await bringUpToDate(store, organisation, job, at);
    await store.publish({ organisation, scenario: scenario.id, by: null, at, check: () => [] });
  }
}
