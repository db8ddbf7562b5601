import type { Column } from './column.ts';
import { SortHeader } from './sort-header.tsx';
import { SortSelect } from './sort-select.tsx';
import { useSortedTable } from './use-sorted-table.ts';
import type { Sort } from './use-sort-in-url.ts';

interface Props<Row> {
  /** what the table lists, for people who hear it */ caption: string;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowId: (row: Row) => string;
  sort: Sort;
  onSort: (sort: Sort) => void;
}

const show = <Row,>(column: Column<Row>, row: Row) =>
  column.cell ? column.cell(row) : (column.value(row) ?? '–');

/** On a narrow screen the first cell heads the block and the others stand below it in two columns. */
const cellClasses = (isFirst: boolean, isNumber: boolean): string =>
  [
    'text-left font-normal md:table-cell md:px-3 md:py-2.5 md:align-middle',
    isFirst ? 'col-span-2 block' : 'block min-w-0',
    isNumber ? 'md:text-right md:font-mono md:text-sm' : '',
  ].join(' ');

const TableRow = <Row,>({ columns, row }: { columns: readonly Column<Row>[]; row: Row }) => (
  <tr
    role="row"
    className="grid grid-cols-2 gap-x-4 gap-y-2 border-b border-line px-3 py-3 last:border-b-0 md:table-row md:hover:bg-paper"
  >
    {columns.map((column, index) => {
      const isFirst = index === 0;
      const Cell = isFirst ? 'th' : 'td';
      return (
        <Cell
          key={column.id}
          role={isFirst ? 'rowheader' : 'cell'}
          scope={isFirst ? 'row' : undefined}
          className={cellClasses(isFirst, column.isNumber ?? false)}
        >
          {isFirst ? null : (
            <span aria-hidden className="block text-xs text-ink-2 md:hidden">
              {column.header}
            </span>
          )}
          <span className="min-w-0">{show(column, row)}</span>
        </Cell>
      );
    })}
  </tr>
);

/**
 * A table with a real head, sorted by it. Roles are written out because rows become blocks on a
 * narrow screen, and browsers drop table semantics with the table layout.
 */
export const DataTable = <Row extends object>(props: Props<Row>) => {
  const { caption, columns, rows, rowId, sort, onSort } = props;
  const sorted = useSortedTable(columns, rows, sort);
  return (
    <div className="grid gap-3">
      <SortSelect columns={columns} sort={sort} onSort={onSort} />
      <div className="overflow-x-auto rounded-md border border-line bg-sheet">
        <table role="table" className="block w-full border-collapse md:table">
          <caption className="sr-only">{caption}</caption>
          <thead role="rowgroup" className="hidden border-b border-edge md:table-header-group">
            <tr role="row">
              {columns.map(({ id, header, isNumber = false }) => (
                <SortHeader key={id} {...{ id, header, isNumber, sort, onSort }} />
              ))}
            </tr>
          </thead>
          <tbody role="rowgroup" className="block md:table-row-group">
            {sorted.map((row) => (
              <TableRow key={rowId(row)} columns={columns} row={row} />
            ))}
          </tbody>
        </table>
      </div>
    </div>
  );
};
