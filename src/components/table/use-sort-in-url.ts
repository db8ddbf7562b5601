import { useSearchParams } from 'react-router-dom';

export interface Sort {
  column: string;
  isDescending: boolean;
}

const parse = (text: string): Sort =>
  text.startsWith('-')
    ? { column: text.slice(1), isDescending: true }
    : { column: text, isDescending: false };

/** The order of a table, kept in the address as `sort=level` or `sort=-level`. */
export const useSortInUrl = (usual: string) => {
  const [search, setSearch] = useSearchParams();
  const sort = parse(search.get('sort') ?? usual);
  const setSort = ({ column, isDescending }: Sort): void =>
    setSearch(
      (before) => {
        const next = new URLSearchParams(before);
        next.set('sort', `${isDescending ? '-' : ''}${column}`);
        return next;
      },
      { replace: true, preventScrollReset: true },
    );
  return [sort, setSort] as const;
};
