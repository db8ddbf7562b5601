import {
  createColumnHelper,
  createSortedRowModel,
  rowSortingFeature,
  tableFeatures,
  useTable,
} from '@tanstack/react-table';
import { useMemo } from 'react';
import type { Column } from './column.ts';
import type { Sort } from './use-sort-in-url.ts';

const features = tableFeatures({ rowSortingFeature, sortedRowModel: createSortedRowModel() });

const compare = (a: unknown, b: unknown): number =>
  typeof a === 'number' && typeof b === 'number'
    ? a - b
    : String(a).localeCompare(String(b), 'en', { numeric: true, sensitivity: 'base' });

const tableColumns = <Row extends object>(columns: readonly Column<Row>[]) => {
  const helper = createColumnHelper<typeof features, Row>();
  return helper.columns(
    columns.map(({ id, value }) =>
      helper.accessor((row) => value(row) ?? undefined, {
        id,
        sortUndefined: 'last',
        sortFn: (a, b, column) => compare(a.getValue(column), b.getValue(column)),
      }),
    ),
  );
};

/** The rows in the order asked for. `columns` and `rows` must be stable between renders. */
export const useSortedTable = <Row extends object>(
  columns: readonly Column<Row>[],
  rows: readonly Row[],
  sort: Sort,
): Row[] => {
  const known = useMemo(() => tableColumns(columns), [columns]);
  const data = useMemo(() => [...rows], [rows]);
  const sorting = useMemo(
    () =>
      columns.some(({ id }) => id === sort.column)
        ? [{ id: sort.column, desc: sort.isDescending }]
        : [],
    [columns, sort.column, sort.isDescending],
  );
  const table = useTable({ features, columns: known, data, state: { sorting } });
  return table.getRowModel().rows.map((row) => row.original);
};
