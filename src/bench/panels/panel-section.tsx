import { useId, type ReactNode } from 'react';

interface Props {
  title: string;
  aside?: ReactNode;
  children: ReactNode;
}

/** One titled stretch of a column. */
export const PanelSection = ({ title, aside, children }: Props) => {
  const id = useId();
  return (
    <section aria-labelledby={id} className="grid gap-2">
      <div className="flex items-baseline justify-between gap-2">
        <h2 id={id} className="font-mono text-xs font-semibold text-ink-2">
          {title}
        </h2>
        {aside}
      </div>
      {children}
    </section>
  );
};
