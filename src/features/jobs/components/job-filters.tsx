import { symptom } from '../../../../shared/scenario/scenario.ts';
import { SelectField } from '../../../components/select-field.tsx';
import type { FilterName } from '../hooks/use-job-filters.ts';
import { levelName } from '../level-name.ts';
import { SearchField } from './search-field.tsx';

interface Props {
  values: Record<FilterName, string>;
  set: (name: FilterName, value: string) => void;
}

export const JobFilters = ({ values, set }: Props) => (
  <div role="search" className="grid gap-3 sm:grid-cols-[1.2fr_1.2fr_0.8fr]">
    <SearchField value={values.text} onChange={(text) => set('text', text)} />
    <SelectField
      label="Symptom"
      value={values.symptom}
      onChange={(event) => set('symptom', event.target.value)}
    >
      <option value="">any</option>
      {symptom.options.map((name) => (
        <option key={name}>{name}</option>
      ))}
    </SelectField>
    <SelectField
      label="Level"
      value={values.level}
      onChange={(event) => set('level', event.target.value)}
    >
      <option value="">any</option>
      {[1, 2, 3, 4, 5].map((level) => (
        <option key={level} value={level}>
          {levelName(level)}
        </option>
      ))}
    </SelectField>
  </div>
);
