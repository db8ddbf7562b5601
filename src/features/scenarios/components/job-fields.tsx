import { useFormContext } from 'react-hook-form';
import { symptom, type ScenarioContent } from '../../../../shared/scenario/scenario.ts';
import { SelectField } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { levelName } from '../../jobs/level-name.ts';

export interface OvenChoice {
  id: string;
  maker: string;
  model: string;
}

export const JobFields = ({ ovens }: { ovens: readonly OvenChoice[] }) => {
  const { register, formState } = useFormContext<ScenarioContent>();
  const { errors } = formState;
  return (
    <section aria-labelledby="job" className="grid gap-4">
      <h2 id="job" className="text-xl font-bold">
        Job
      </h2>
      <TextField
        label="Title"
        hint="As it stands in the job list. It must not give the fault away."
        error={errors.title?.message}
        {...register('title')}
      />
      <SelectField label="Oven" error={errors.oven?.message} {...register('oven')}>
        {ovens.map(({ id, maker, model }) => (
          <option key={id} value={id}>
            {maker} {model}
          </option>
        ))}
      </SelectField>
      <SelectField label="Symptom" error={errors.symptom?.message} {...register('symptom')}>
        {symptom.options.map((name) => (
          <option key={name}>{name}</option>
        ))}
      </SelectField>
      <SelectField
        label="Level"
        error={errors.level?.message}
        {...register('level', { valueAsNumber: true })}
      >
        {[1, 2, 3, 4, 5].map((level) => (
          <option key={level} value={level}>
            {levelName(level)}
          </option>
        ))}
      </SelectField>
    </section>
  );
};
