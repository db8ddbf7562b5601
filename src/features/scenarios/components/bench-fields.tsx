import { useFormContext, useWatch } from 'react-hook-form';
import { condition, meterId, type ScenarioContent } from '../../../../shared/scenario/scenario.ts';
import { meterById } from '../../../../shared/instruments/meters.ts';
import { SelectField } from '../../../components/select-field.tsx';
import { conditionText } from '../../jobs/condition-text.ts';
import { LastRunField } from './last-run-field.tsx';

export const BenchFields = () => {
  const { register, formState } = useFormContext<ScenarioContent>();
  const { errors } = formState;
  const chosen = useWatch<ScenarioContent, 'condition'>({ name: 'condition' });
  return (
    <section aria-labelledby="bench" className="grid gap-4">
      <h2 id="bench" className="text-xl font-bold">
        On the bench
      </h2>
      <SelectField
        label="Condition"
        hint={conditionText(chosen)}
        error={errors.condition?.message}
        {...register('condition')}
      >
        {condition.options.map((name) => (
          <option key={name}>{name}</option>
        ))}
      </SelectField>
      <SelectField label="Meter" error={errors.meter?.message} {...register('meter')}>
        {meterId.options.map((id) => (
          <option key={id} value={id}>
            {meterById(id).name}
          </option>
        ))}
      </SelectField>
      <LastRunField />
    </section>
  );
};
