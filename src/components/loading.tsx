interface Props {
  /** "the jobs" */ what: string;
  rows?: number;
}

/** Grey rows where the answer will stand; says in words what is on its way. */
export const Loading = ({ what, rows = 4 }: Props) => (
  <div role="status" className="grid gap-3">
    <span className="text-ink-2">Loading {what}.</span>
    {Array.from({ length: rows }, (_, row) => (
      <span aria-hidden key={row} className="h-9 animate-pulse rounded-md bg-line" />
    ))}
  </div>
);
