import { useState } from 'react';
import { useBench } from '../../simulation/bench-context.ts';
import { BenchButton } from './bench-button.tsx';

interface Props {
  end: string;
  text: string;
  onDone: () => void;
}

/** The text of a lead's tag. */
export const LabelForm = ({ end, text: before, onDone }: Props) => {
  const run = useBench((store) => store.run);
  const [text, setText] = useState(before);
  return (
    <form
      className="grid gap-2"
      onSubmit={(event) => {
        event.preventDefault();
        if (run({ type: 'LabelLead', data: { end, text } })) onDone();
      }}
    >
      <label className="grid gap-1 text-sm">
        Text on the tag of {end}
        <input
          autoFocus
          required
          maxLength={16}
          value={text}
          onChange={(event) => setText(event.target.value)}
          className="min-h-9 rounded border border-bench-ink-2 bg-tag px-2 font-mono text-[16px] font-semibold text-tag-ink"
        />
      </label>
      <div className="flex gap-2">
        <BenchButton type="submit" isMain>
          Label {end}
        </BenchButton>
        <BenchButton onClick={onDone}>Back</BenchButton>
      </div>
    </form>
  );
};
