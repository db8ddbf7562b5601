import type { ReactNode } from 'react';

interface Props {
  title: string;
  /** what to do about it */ children: ReactNode;
  action?: ReactNode;
}

export const EmptyState = ({ title, children, action }: Props) => (
  <div className="grid justify-items-start gap-3 rounded-md border border-dashed border-edge bg-sheet px-5 py-6">
    <p className="text-lg font-bold">{title}</p>
    <div className="max-w-[60ch] text-ink-2">{children}</div>
    {action}
  </div>
);
