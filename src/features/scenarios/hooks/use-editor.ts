import { useNavigate } from 'react-router-dom';
import type { Problem } from '../../../api/problem.ts';
import type { Scenario } from '../../../../shared/contracts/scenarios.ts';
import type { ScenarioContent } from '../../../../shared/scenario/scenario.ts';
import { useStartAttempt } from '../../jobs/api/use-start-attempt.ts';
import { useKeepScenario } from '../api/use-keep-scenario.ts';
import { usePublishScenario } from '../api/use-publish-scenario.ts';
import { useDraftForm } from './use-draft-form.ts';
import { useLeaveGuard } from './use-leave-guard.ts';

/** What the server found wrong, at the fields it names: `draft.title` is the form's `title`. */
const fieldErrors = (problem: Problem): { path: string; message: string }[] =>
  problem.errors.map(({ path, message }) => ({ path: path.replace(/^draft\./, ''), message }));

interface Input {
  /** null: not saved yet */ scenario: Scenario | null;
  start: ScenarioContent;
  onCreated: (id: string) => void;
}

/**
 * The form of one scenario and what can be done with it. Trying and publishing save first, so that what
 * is tried is what is on the screen.
 */
export const useEditor = ({ scenario, start, onCreated }: Input) => {
  const navigate = useNavigate();
  const keep = useKeepScenario();
  const publish = usePublishScenario();
  const trial = useStartAttempt();
  const form = useDraftForm(start);
  const { isDirty } = form.formState;
  const { blocker, letLeave } = useLeaveGuard(isDirty);

  const show = (problem: Problem): void => {
    for (const { path, message } of fieldErrors(problem))
      form.setError(path as keyof ScenarioContent, { type: 'server', message });
  };

  const kept = (draft: ScenarioContent, { id }: Scenario): void => {
    // What was typed while it was being saved stays, and counts as unsaved.
    form.reset(draft, { keepValues: true });
    if (scenario !== null) return;
    letLeave();
    onCreated(id);
  };

  /** Saves when there is something to save; `then` gets the scenario's id. */
  const saved = (then: (id: string) => void) =>
    form.handleSubmit((draft) => {
      publish.reset();
      trial.reset();
      keep.reset();
      if (scenario !== null && !isDirty) {
        then(scenario.id);
        return;
      }
      keep.mutate(
        { id: scenario?.id ?? null, draft },
        {
          onSuccess: (answer) => {
            kept(draft, answer);
            then(answer.id);
          },
          onError: show,
        },
      );
    });

  const goToBench = ({ id }: { id: string }): void => {
    letLeave();
    void navigate(`/bench/${id}`);
  };

  return {
    form,
    blocker,
    keep,
    publish,
    trial,
    isDirty,
    save: saved(() => undefined),
    tryIt: saved((id) => trial.mutate({ scenario: id, isTrial: true }, { onSuccess: goToBench })),
    publishIt: saved((id) => publish.mutate(id)),
  };
};
