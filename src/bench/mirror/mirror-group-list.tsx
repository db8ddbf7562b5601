import { memo } from 'react';
import type { MirrorGroup } from './mirror-entries.ts';

interface ButtonProps {
  /** what the list above finds it by, on a click or a focus */ target: string;
  name: string;
  short: string;
  isStop: boolean;
}

/** Words alone, so that a change on the bench touches only the buttons that say something new. */
const MirrorButton = memo(function MirrorButton({ target, name, short, isStop }: ButtonProps) {
  return (
    <button
      type="button"
      data-mirror={target}
      aria-label={name}
      tabIndex={isStop ? 0 : -1}
      className="grid min-h-8 w-full grid-cols-[58px_1fr] items-center gap-2 rounded border border-bench-line px-2 py-1 text-left text-sm hover:border-bench-ink-2"
    >
      <span className="font-mono text-xs font-semibold text-caution">{target}</span>
      <span>{short}</span>
    </button>
  );
});

interface Props {
  group: MirrorGroup;
  /** the one entry that the tab key reaches */ stop: string | null;
}

export const MirrorGroupList = ({ group, stop }: Props) => (
  <div role="group" aria-label={group.title} className="grid gap-1">
    <p aria-hidden className="text-xs text-bench-ink-2">
      {group.title}
    </p>
    {group.entries.map(({ ref, name, short }) => (
      <MirrorButton key={ref} target={ref} name={name} short={short} isStop={ref === stop} />
    ))}
  </div>
);
