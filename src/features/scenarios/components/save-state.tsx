import type { useEditor } from '../hooks/use-editor.ts';
import type { Scenario } from '../../../../shared/contracts/scenarios.ts';

interface Props {
  editor: ReturnType<typeof useEditor>;
  scenario: Scenario | null;
}

const mistakes = (count: number): string =>
  count === 1 ? 'one field needs another look' : `${count} fields need another look`;

const countErrors = (errors: object): number =>
  Object.values(errors).reduce<number>((sum, one: unknown) => {
    if (typeof one !== 'object' || one === null) return sum;
    return sum + ('message' in one && typeof one.message === 'string' ? 1 : countErrors(one));
  }, 0);

const trouble = ({ form, keep, publish, trial }: Props['editor']): string | null => {
  if (keep.error?.code === 'not-signed-in')
    return 'Not saved: you are signed out. Sign in in another tab, then save again.';
  if (keep.error) return `Not saved. ${keep.error.message}`;
  const count = countErrors(form.formState.errors);
  if (form.formState.isSubmitted && count > 0) return `Not saved: ${mistakes(count)}.`;
  if (publish.error) return `Saved, not published. ${publish.error.message}`;
  if (trial.error) return `Saved, but it could not be put on the bench. ${trial.error.message}`;
  return null;
};

const calm = ({ editor, scenario }: Props): string => {
  if (editor.keep.isPending) return 'Saving.';
  if (scenario === null) return 'Not saved yet.';
  if (editor.isDirty) return 'Unsaved changes.';
  if (scenario.published === null) return 'Saved as a draft. Not published.';
  return scenario.hasUnpublishedChanges
    ? `Saved. Version ${scenario.published} is published, this draft is newer.`
    : `Saved and published as version ${scenario.published}.`;
};

/** Where the draft stands, in one sentence. */
export const SaveState = (props: Props) => {
  const problem = trouble(props.editor);
  return (
    <p role="status" className={`min-w-0 ${problem ? 'font-semibold' : 'text-ink-2'}`}>
      {problem ?? calm(props)}
    </p>
  );
};
