import { useState } from 'react';
import { TextField } from '../../../components/text-field.tsx';

interface Props {
  value: string;
  onChange: (text: string) => void;
}

/**
 * The search word. The address follows in a transition, later than the key stroke, so the box shows
 * what was typed until it is left.
 */
export const SearchField = ({ value, onChange }: Props) => {
  const [typed, setTyped] = useState<string | null>(null);
  return (
    <TextField
      label="Search"
      type="search"
      placeholder="title, oven, complaint"
      value={typed ?? value}
      onChange={({ target }) => {
        setTyped(target.value);
        onChange(target.value);
      }}
      onBlur={() => setTyped(null)}
    />
  );
};
