import type { ComponentProps } from 'react';
import { controlClasses } from './control-classes.ts';
import { Field, type FieldProps } from './field.tsx';

type Props = FieldProps & Omit<ComponentProps<'select'>, 'id' | 'className'>;

/** The browser's own list: it works by touch, by keyboard and in forced colours as people expect. */
export const SelectField = ({ label, hint, error, ...select }: Props) => (
  <Field label={label} hint={hint} error={error}>
    {(control) => <select {...select} {...control} className={controlClasses} />}
  </Field>
);
