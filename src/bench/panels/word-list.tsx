interface Props {
  name: string;
  lines: readonly { label: string; value: string }[];
}

/** What came of something, label by label; nothing while there is nothing to say. */
export const WordList = ({ name, lines }: Props) =>
  lines.length === 0 ? null : (
    <dl aria-label={name} className="grid gap-1 border-t border-bench-line pt-2 text-sm">
      {lines.map(({ label, value }) => (
        <div key={label} className="grid grid-cols-[84px_1fr]">
          <dt className="text-bench-ink-2">{label}</dt>
          <dd className="font-semibold">{value}</dd>
        </div>
      ))}
    </dl>
  );
