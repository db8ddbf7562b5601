import type { ComponentProps } from 'react';
import { controlClasses } from './control-classes.ts';
import { Field, type FieldProps } from './field.tsx';

type Props = FieldProps & Omit<ComponentProps<'input'>, 'id' | 'className'>;

export const TextField = ({ label, hint, error, ...input }: Props) => (
  <Field label={label} hint={hint} error={error}>
    {(control) => <input type="text" {...input} {...control} className={controlClasses} />}
  </Field>
);
