import type { ReactNode } from 'react';

export interface TagRow {
  label: string;
  value: ReactNode;
}

interface Props {
  /** the customer's own words, without quotation marks */ complaint: string;
  rows: readonly TagRow[];
}

/** The job ticket: a yellow workshop tag with an eyelet. It is the same in both themes, as paper is. */
export const JobTag = ({ complaint, rows }: Props) => (
  <section
    aria-label="Job ticket"
    className="tag-paper relative bg-tag px-4 pt-11 pb-4 text-tag-ink"
  >
    <span
      aria-hidden
      className="absolute top-3 left-1/2 size-6 -translate-x-1/2 rounded-full border-4 border-eyelet bg-paper"
    />
    <blockquote className="mb-3 text-lg leading-snug font-semibold">
      <q>{complaint}</q>
    </blockquote>
    <dl className="grid grid-cols-[84px_1fr] gap-x-3 gap-y-1.5">
      {rows.map(({ label, value }) => (
        <div key={label} className="col-span-2 grid grid-cols-subgrid">
          <dt className="pt-0.5 font-mono text-xs text-tag-ink-2">{label}</dt>
          <dd className="text-sm font-semibold">{value}</dd>
        </div>
      ))}
    </dl>
  </section>
);
