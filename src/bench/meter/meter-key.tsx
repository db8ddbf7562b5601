import type { ReactNode } from 'react';

interface Props {
  /** in full, for whoever hears it */ name: string;
  /** one of the settings: whether it is the one in use; undefined: a key that does something once */
  isOn?: boolean;
  onPress: () => void;
  className?: string;
  children: ReactNode;
}

export const MeterKey = ({ name, isOn, onPress, className = '', children }: Props) => (
  <button
    type="button"
    aria-label={name}
    aria-pressed={isOn}
    onClick={onPress}
    className={`flex h-[26px] min-w-[30px] items-center justify-center rounded-[5px] border font-mono text-xs font-semibold tracking-tight focus-visible:outline-white ${
      isOn
        ? 'border-eyelet bg-caution text-on-caution'
        : 'border-bench-line bg-mat-deep text-bench-ink hover:border-bench-ink-2'
    } ${className}`}
  >
    {children}
  </button>
);
