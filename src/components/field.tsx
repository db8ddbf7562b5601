import { useId, type ReactNode } from 'react';

export interface FieldProps {
  label: string;
  /** what to put in, when the label alone does not say it */ hint?: ReactNode;
  error?: string | undefined;
}

interface Control {
  id: string;
  'aria-invalid': true | undefined;
  'aria-describedby': string | undefined;
}

type Props = FieldProps & { children: (control: Control) => ReactNode };

/** Label above, hint, control, and its error directly beside it. */
export const Field = ({ label, hint, error, children }: Props) => {
  const id = useId();
  const described = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ');
  return (
    <div className="grid gap-1">
      <label htmlFor={id} className="justify-self-start font-semibold">
        {label}
      </label>
      {hint ? (
        <p id={`${id}-hint`} className="text-sm text-ink-2">
          {hint}
        </p>
      ) : null}
      {children({
        id,
        'aria-invalid': error ? true : undefined,
        'aria-describedby': described || undefined,
      })}
      {error ? (
        <p id={`${id}-error`} className="text-sm font-semibold text-danger">
          {error}
        </p>
      ) : null}
    </div>
  );
};
