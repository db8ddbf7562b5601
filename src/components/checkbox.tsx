import type { ComponentProps } from 'react';

type Props = Omit<ComponentProps<'input'>, 'type' | 'className'> & { label: string };

export const Checkbox = ({ label, ...input }: Props) => (
  <label className="inline-flex min-h-6 items-center gap-2">
    <input type="checkbox" {...input} className="size-[18px] accent-act" />
    {label}
  </label>
);
