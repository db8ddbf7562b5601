import type { Job, Scenario, ScenarioSummary } from '../../shared/contracts/scenarios.ts';
import type { Oven } from '../ovens/oven-library.ts';
import type { OwnResult, PublishedScenario, ScenarioLine, ScenarioRecord } from './scenario.ts';

export const presentScenario = (scenario: ScenarioRecord): Scenario => ({
  id: scenario.id,
  number: scenario.number,
  draft: scenario.draft,
  published: scenario.published,
  hasUnpublishedChanges: scenario.hasUnpublishedChanges,
  updatedAt: scenario.updatedAt.toISOString(),
});

export const presentLine = (line: ScenarioLine): ScenarioSummary => ({
  id: line.id,
  number: line.number,
  title: line.draft.title,
  oven: line.draft.oven,
  symptom: line.draft.symptom,
  level: line.draft.level,
  published: line.published,
  hasUnpublishedChanges: line.hasUnpublishedChanges,
  updatedAt: line.updatedAt.toISOString(),
  attempts: line.attempts,
});

/** What a trainee may know of a job: each field is named here, so a new one in the content stays hidden until somebody decides. */
export function presentJob(
  { scenario, version, number, content }: PublishedScenario,
  { definition }: Oven,
  own: OwnResult | undefined,
): Job {
  const { id, maker, model, supply } = definition;
  return {
    scenario,
    version,
    number,
    title: content.title,
    oven: { id, maker, model, supply: `${supply.volts} V ${supply.hertz} Hz` },
    symptom: content.symptom,
    level: content.level,
    condition: content.condition,
    ticket: content.ticket,
    attempts: own?.attempts ?? 0,
    best: own?.best ?? null,
  };
}
