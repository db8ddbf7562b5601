import type { ReactNode } from 'react';

/** Safety colours only for what they mean: a good result, a caution, a faulty or dangerous one. */
export type BadgeKind = 'safe' | 'caution' | 'danger' | 'plain';

const kinds: Record<BadgeKind, string> = {
  safe: 'bg-safe-tint text-safe',
  caution: 'bg-caution text-on-caution',
  danger: 'bg-danger-tint text-danger',
  plain: 'bg-paper text-ink-2 border-line',
};

export const Badge = ({ kind, children }: { kind: BadgeKind; children: ReactNode }) => (
  <span
    className={`inline-block rounded border border-transparent px-2 py-0.5 font-mono text-xs font-semibold whitespace-nowrap ${kinds[kind]}`}
  >
    {children}
  </span>
);
