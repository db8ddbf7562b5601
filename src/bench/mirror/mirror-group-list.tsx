import { memo } from 'react';
import type { MirrorEntry, MirrorGroup } from './mirror-entries.ts';

interface Props {
  group: MirrorGroup;
  /** the one entry that the tab key reaches */ stop: string | null;
  onActivate: (entry: MirrorEntry) => void;
  onFocus: (entry: MirrorEntry) => void;
}

const MirrorButton = memo(function MirrorButton(props: {
  entry: MirrorEntry;
  isStop: boolean;
  onActivate: (entry: MirrorEntry) => void;
  onFocus: (entry: MirrorEntry) => void;
}) {
  const { entry, isStop, onActivate, onFocus } = props;
  return (
    <button
      type="button"
      data-mirror={entry.ref}
      aria-label={entry.name}
      tabIndex={isStop ? 0 : -1}
      onClick={() => onActivate(entry)}
      onFocus={() => onFocus(entry)}
      className="grid min-h-8 w-full grid-cols-[58px_1fr] items-center gap-2 rounded border border-bench-line px-2 py-1 text-left text-sm hover:border-bench-ink-2"
    >
      <span className="font-mono text-xs font-semibold text-caution">{entry.ref}</span>
      <span>{entry.short}</span>
    </button>
  );
});

export const MirrorGroupList = ({ group, stop, onActivate, onFocus }: Props) => (
  <div role="group" aria-label={group.title} className="grid gap-1">
    <p aria-hidden className="text-xs text-bench-ink-2">
      {group.title}
    </p>
    {group.entries.map((entry) => (
      <MirrorButton
        key={entry.ref}
        entry={entry}
        isStop={entry.ref === stop}
        onActivate={onActivate}
        onFocus={onFocus}
      />
    ))}
  </div>
);
