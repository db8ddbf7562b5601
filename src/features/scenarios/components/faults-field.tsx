import { useFieldArray, useFormContext, useWatch } from 'react-hook-form';
import type { ScenarioContent } from '../../../../shared/scenario/scenario.ts';
import { Button } from '../../../components/button.tsx';
import { Failed } from '../../../components/failed.tsx';
import { Loading } from '../../../components/loading.tsx';
import { useOven } from '../../ovens/api/use-oven.ts';
import { FaultRow } from './fault-row.tsx';

const most = 6;

export const FaultsField = () => {
  const { control, formState } = useFormContext<ScenarioContent>();
  const { fields, append, remove } = useFieldArray({ control, name: 'faults' });
  const oven = useOven(useWatch<ScenarioContent, 'oven'>({ name: 'oven' }));
  const error = formState.errors.faults?.root?.message ?? formState.errors.faults?.message;
  return (
    <section aria-labelledby="faults" className="grid gap-4">
      <h2 id="faults" className="text-xl font-bold">
        Faults
      </h2>
      <p className="text-ink-2">
        Up to {most}. A scenario without a fault is a healthy oven: a fair test too.
      </p>
      {oven.isError ? (
        <Failed
          what="The parts of this oven"
          problem={oven.error}
          retry={() => void oven.refetch()}
        />
      ) : oven.isPending ? (
        <Loading what="the parts of this oven" rows={2} />
      ) : (
        fields.map((field, index) => (
          <FaultRow
            key={field.id}
            index={index}
            definition={oven.data.definition}
            onRemove={() => remove(index)}
          />
        ))
      )}
      {error ? <p className="text-sm font-semibold text-danger">{error}</p> : null}
      {fields.length < most && oven.isSuccess ? (
        <div>
          <Button onClick={() => append({ on: '', fault: '' })}>Add a fault</Button>
        </div>
      ) : null}
    </section>
  );
};
