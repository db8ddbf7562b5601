import { randomUUID } from 'node:crypto';
import { v5 as nameUuid } from 'uuid';
import type { RecordedEvent } from '../../shared/bench/event.ts';
import type { AccountStore } from '../accounts/account.ts';
import type { AttemptRules } from '../attempts/attempt-rules.ts';
import type { AttemptStore } from '../attempts/attempt.ts';
import type { OvenLibrary } from '../ovens/oven-library.ts';
import type { ScenarioStore } from '../scenarios/scenario.ts';
import type { Recording } from './recording.ts';

export interface SeedAttemptsDeps {
  accounts: AccountStore;
  scenarios: ScenarioStore;
  attempts: AttemptStore;
  rules: AttemptRules;
  ovens: OvenLibrary;
  clock: () => Date;
}

/** ms between two demo attempts, the newest last */
const apart = 26 * 60 * 60 * 1000;

/**
 * Puts recorded attempts into the demo organisation, as if each had been worked and handed in on an
 * earlier day. Those that are there stay; one that was broken off is gone on with. Answers how many were put there.
 */
export async function seedAttempts(
  deps: SeedAttemptsDeps,
  organisation: string,
  recordings: readonly Recording[],
): Promise<number> {
  const now = deps.clock().getTime();
  let put = 0;
  for (const [index, recording] of recordings.entries()) {
    const startedAt = new Date(now - (recordings.length - index) * apart);
    if (await seedAttempt(deps, organisation, recording, startedAt)) put += 1;
  }
  return put;
}

async function seedAttempt(
  { accounts, scenarios, attempts, rules, ovens }: SeedAttemptsDeps,
  organisation: string,
  { email, job, seed, events }: Recording,
  startedAt: Date,
): Promise<boolean> {
  const id = nameUuid(`${email} ${job}`, organisation);
  const known = await attempts.find(id);
  if (known?.handedInAt) return false;
  const person = await accounts.findByEmail(email);
  const scenario = await scenarios.findByOrigin(organisation, job);
  const published = scenario && (await scenarios.findPublished(organisation, scenario.id));
  const oven = published && ovens.find(published.content.oven);
  if (!person || !published || !oven) {
    throw new Error(`the demonstration lacks what the recording of ${job} by ${email} needs`);
  }
  const { content } = published;
  const setup = rules.setUp(oven.definition, content, seed);
  const recorded = events.map((event, sequence): RecordedEvent => {
    const at = new Date(startedAt.getTime() + event.benchMs);
    return { ...event, sequence, recordedAt: at.toISOString() };
  });
  const [first, ...rest] = recorded;
  const last = recorded.at(-1);
  if (!first || !last) return false;
  const attempt = {
    id,
    owner: { person: person.id, organisation, visitor: null },
    scenario: published.scenario,
    scenarioVersion: published.versionId,
    seed,
    content,
    engineVersion: rules.engineVersion,
    startedAt,
    first,
    state: rules.fold(setup, [first], null),
  };
  if (!known) await attempts.create(attempt);
  await attempts.withLocked(id, (locked) =>
    locked.advance({
      events: rest,
      writer: randomUUID(),
      benchMs: last.benchMs,
      handedIn: { at: new Date(last.recordedAt), debrief: rules.assess(setup, recorded) },
      checkpoint: null,
    }),
  );
  return true;
}
