import { useState } from 'react';
import { FormProvider } from 'react-hook-form';
import type { Scenario } from '../../../../shared/contracts/scenarios.ts';
import type { ScenarioContent } from '../../../../shared/scenario/scenario.ts';
import { Button } from '../../../components/button.tsx';
import { Ask } from '../../../components/ask.tsx';
import { useEditor } from '../hooks/use-editor.ts';
import { BenchFields } from './bench-fields.tsx';
import { FaultsField } from './faults-field.tsx';
import { JobFields, type OvenChoice } from './job-fields.tsx';
import { LeaveGuard } from './leave-guard.tsx';
import { SaveState } from './save-state.tsx';
import { TicketFields } from './ticket-fields.tsx';
import { ToldApart } from './told-apart.tsx';

interface Props {
  /** null: not saved yet */ scenario: Scenario | null;
  start: ScenarioContent;
  ovens: readonly OvenChoice[];
  onCreated: (id: string) => void;
}

export const Editor = ({ scenario, start, ovens, onCreated }: Props) => {
  const editor = useEditor({ scenario, start, onCreated });
  const [isAsking, setIsAsking] = useState(false);
  const version = (scenario?.published ?? 0) + 1;
  const isBusy = editor.keep.isPending || editor.publish.isPending || editor.trial.isPending;
  return (
    <FormProvider {...editor.form}>
      <form
        noValidate
        onSubmit={(event) => void editor.save(event)}
        className="grid gap-10"
        aria-label="Scenario"
      >
        <JobFields ovens={ovens} />
        <TicketFields />
        <FaultsField />
        <BenchFields />
        <ToldApart />
        <div className="sticky bottom-0 z-10 -mx-4 flex flex-wrap items-center justify-between gap-x-6 gap-y-2 border-t border-edge bg-paper px-4 py-3">
          <SaveState editor={editor} scenario={scenario} />
          <div className="flex flex-wrap gap-2">
            <Button type="submit" look="main" busy={editor.keep.isPending && 'Saving'}>
              Save draft
            </Button>
            <Button busy={isBusy && 'Try it'} onClick={() => void editor.tryIt()}>
              Try it
            </Button>
            <Button
              busy={
                editor.publish.isPending ? 'Publishing' : isBusy && `Publish version ${version}`
              }
              onClick={() => setIsAsking(true)}
            >
              Publish version {version}
            </Button>
          </div>
        </div>
      </form>
      {isAsking ? (
        <Ask
          title={`Publish version ${version}?`}
          confirm={`Publish version ${version}`}
          cancel="Not yet"
          onConfirm={() => {
            setIsAsking(false);
            void editor.publishIt();
          }}
          onCancel={() => setIsAsking(false)}
        >
          <p>
            The draft is saved first. A published version never changes: new attempts get it,
            attempts already begun keep theirs.
          </p>
        </Ask>
      ) : null}
      <LeaveGuard blocker={editor.blocker} />
    </FormProvider>
  );
};
