import { useState } from 'react';
import { useController } from 'react-hook-form';
import type { ScenarioContent } from '../../../../shared/scenario/scenario.ts';
import type { FaultKind } from '../../../../shared/oven/fault.ts';
import { TextField } from '../../../components/text-field.tsx';
import { limitsHint } from '../limits-hint.ts';
import { parseQuantity, quantityText } from '../quantity.ts';

interface Props {
  name: `faults.${number}.values.${string}`;
  limits: NonNullable<FaultKind['parameters']>[string];
}

/** A fault's value in its unit. What was typed stays as typed; the form holds the number it means. */
export const QuantityField = ({ name, limits }: Props) => {
  const {
    field: { ref: focusRef, value, onBlur, onChange },
    fieldState,
  } = useController<ScenarioContent, typeof name>({ name, defaultValue: limits.usual });
  const [typed, setTyped] = useState(() =>
    quantityText(typeof value === 'number' ? value : limits.usual),
  );
  const { name: label, unit } = limits;
  return (
    <TextField
      ref={focusRef}
      label={`${label.charAt(0).toUpperCase()}${label.slice(1)}${unit ? `, ${unit}` : ''}`}
      hint={<span className="font-mono text-xs">{limitsHint(limits)}</span>}
      inputMode="text"
      autoComplete="off"
      value={typed}
      onBlur={onBlur}
      onChange={({ target }) => {
        setTyped(target.value);
        onChange(parseQuantity(target.value));
      }}
      error={fieldState.error?.message}
    />
  );
};
