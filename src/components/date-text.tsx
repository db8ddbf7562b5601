const format = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short' });

/** A moment on the wall clock of whoever reads it. */
export const DateText = ({ at }: { at: string }) => (
  <time dateTime={at} className="whitespace-nowrap tabular-nums">
    {format.format(new Date(at))}
  </time>
);
