import { useFormContext, useWatch } from 'react-hook-form';
import { faultsOf } from '../../../../shared/oven/check-faults.ts';
import type { FaultKind } from '../../../../shared/oven/fault.ts';
import { homes } from '../../../../shared/oven/misplaced-leads.ts';
import type { OvenDefinition } from '../../../../shared/oven/oven.ts';
import { terminalsOf } from '../../../../shared/oven/targets.ts';
import type { ScenarioContent } from '../../../../shared/scenario/scenario.ts';
import { Button } from '../../../components/button.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { usualValues } from '../usual-values.ts';
import { QuantityField } from './quantity-field.tsx';

/** No `values` at all where a fault has none: the form compares by what is there. */
const valuesOf = (kind: FaultKind | undefined): { values?: Record<string, number> } => {
  const values = usualValues(kind);
  return values ? { values } : {};
};

const blankIsAbsent = (chosen: string | undefined): string | undefined => chosen || undefined;

const othersFor = (definition: OvenDefinition, what: 'terminal' | 'lead end'): string[] =>
  what === 'terminal'
    ? terminalsOf(definition).map(({ ref }) => ref)
    : [...homes(definition).keys()];

interface Props {
  index: number;
  definition: OvenDefinition;
  onRemove: () => void;
}

/** One fault: where it is, what it is, and how bad. */
export const FaultRow = ({ index, definition, onRemove }: Props) => {
  const { register, setValue, clearErrors, formState } = useFormContext<ScenarioContent>();
  const applied = useWatch<ScenarioContent, `faults.${number}`>({ name: `faults.${index}` });
  const kinds = faultsOf(definition, applied.on) ?? [];
  const kind = kinds.find(({ id }) => id === applied.fault);
  const errors = formState.errors.faults?.[index];
  const isShownBefore = formState.isSubmitted;

  const put = (on: string, chosen: FaultKind | undefined): void => {
    clearErrors(`faults.${index}`);
    setValue(
      `faults.${index}`,
      { on, fault: chosen?.id ?? '', ...valuesOf(chosen) },
      { shouldDirty: true, shouldValidate: isShownBefore },
    );
  };

  const faulty = definition.parts.filter(({ ref }) => faultsOf(definition, ref)?.length);
  return (
    <fieldset className="grid gap-4 rounded-md border border-line bg-sheet p-4">
      <legend className="px-1 font-semibold">Fault {index + 1}</legend>
      <SelectField
        label="Part or lead"
        error={errors?.on?.message}
        {...register(`faults.${index}.on`)}
        onChange={({ target }) => put(target.value, undefined)}
      >
        <option value="">choose</option>
        <optgroup label="Parts">
          {faulty.map(({ ref, name }) => (
            <option key={ref} value={ref}>
              {ref}, {name}
            </option>
          ))}
        </optgroup>
        <optgroup label="Leads">
          {definition.leads.map(({ ref, name, ends }) => (
            <option key={ref} value={ref}>
              {ref}, {name} ({ends.join(' to ')})
            </option>
          ))}
        </optgroup>
      </SelectField>
      <SelectField
        label="What is wrong"
        hint={kind?.description}
        error={errors?.fault?.message}
        {...register(`faults.${index}.fault`)}
        onChange={({ target }) =>
          put(
            applied.on,
            kinds.find(({ id }) => id === target.value),
          )
        }
      >
        <option value="">{kinds.length === 0 ? 'choose the part or lead first' : 'choose'}</option>
        {kinds.map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </SelectField>
      {Object.entries(kind?.parameters ?? {}).map(([name, limits]) => (
        <QuantityField
          key={`${applied.on}-${applied.fault}-${name}`}
          name={`faults.${index}.values.${name}`}
          limits={limits}
        />
      ))}
      {kind?.other ? (
        <SelectField
          label={kind.other === 'terminal' ? 'Put on' : 'Swapped with'}
          error={errors?.other?.message}
          {...register(`faults.${index}.other`, { setValueAs: blankIsAbsent })}
        >
          <option value="">the nearest on the same part</option>
          {othersFor(definition, kind.other).map((ref) => (
            <option key={ref} value={ref}>
              {ref}
            </option>
          ))}
        </SelectField>
      ) : null}
      {kind?.look ? <p className="text-sm text-ink-2">Seen from close: {kind.look}</p> : null}
      <div>
        <Button isSmall onClick={onRemove}>
          Remove fault {index + 1}
        </Button>
      </div>
    </fieldset>
  );
};
