import { ArrowDown, ArrowUp, ArrowUpDown } from 'lucide-react';
import type { Sort } from './use-sort-in-url.ts';

interface Props {
  id: string;
  header: string;
  isNumber: boolean;
  sort: Sort;
  onSort: (sort: Sort) => void;
}

export const SortHeader = ({ id, header, isNumber, sort, onSort }: Props) => {
  const isSorted = sort.column === id;
  const Icon = isSorted ? (sort.isDescending ? ArrowDown : ArrowUp) : ArrowUpDown;
  return (
    <th
      role="columnheader"
      scope="col"
      aria-sort={isSorted ? (sort.isDescending ? 'descending' : 'ascending') : undefined}
      className={`px-3 py-1 font-semibold ${isNumber ? 'text-right' : 'text-left'}`}
    >
      <button
        type="button"
        onClick={() => onSort({ column: id, isDescending: isSorted && !sort.isDescending })}
        className="inline-flex min-h-8 items-center gap-1 rounded text-left text-sm leading-tight font-semibold text-ink hover:text-act"
      >
        {header}
        <Icon
          aria-hidden
          size={14}
          className={`shrink-0 ${isSorted ? 'text-act' : 'text-ink-2'}`}
        />
      </button>
    </th>
  );
};
