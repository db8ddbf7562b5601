import type { ComponentProps } from 'react';
import { controlClasses } from './control-classes.ts';
import { Field, type FieldProps } from './field.tsx';

type Props = FieldProps & Omit<ComponentProps<'textarea'>, 'id' | 'className'>;

export const TextArea = ({ label, hint, error, ...area }: Props) => (
  <Field label={label} hint={hint} error={error}>
    {(control) => <textarea rows={3} {...area} {...control} className={controlClasses} />}
  </Field>
);
