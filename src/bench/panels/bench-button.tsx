import type { ComponentProps } from 'react';

type Props = Omit<ComponentProps<'button'>, 'className'> & {
  /** the one to press next */ isMain?: boolean;
  className?: string;
};

/** A button on the mat or the dock. */
export const BenchButton = ({ isMain = false, className = '', ...button }: Props) => (
  <button
    type="button"
    {...button}
    className={`flex min-h-8 items-center justify-center gap-1.5 rounded-md border px-2.5 text-sm font-semibold whitespace-nowrap ${
      isMain
        ? 'border-transparent bg-act text-on-act hover:brightness-110'
        : 'border-bench-line bg-mat-deep text-bench-ink hover:border-bench-ink-2 aria-pressed:border-caution aria-expanded:border-bench-ink-2'
    } ${className}`}
  />
);
