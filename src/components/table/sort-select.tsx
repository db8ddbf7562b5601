import { controlClasses } from '../control-classes.ts';
import { Field } from '../field.tsx';
import type { Column } from './column.ts';
import type { Sort } from './use-sort-in-url.ts';

interface Props<Row> {
  columns: readonly Column<Row>[];
  sort: Sort;
  onSort: (sort: Sort) => void;
}

/** On a narrow screen the rows stand as blocks without a head row; the order is chosen here. */
export const SortSelect = <Row,>({ columns, sort, onSort }: Props<Row>) => (
  <div className="md:hidden">
    <Field label="Sort by">
      {(control) => (
        <select
          {...control}
          className={controlClasses}
          value={`${sort.isDescending ? '-' : ''}${sort.column}`}
          onChange={({ target: { value } }) =>
            onSort({ column: value.replace(/^-/, ''), isDescending: value.startsWith('-') })
          }
        >
          {columns.flatMap(({ id, header }) => [
            <option key={id} value={id}>
              {header}, lowest or A first
            </option>,
            <option key={`-${id}`} value={`-${id}`}>
              {header}, highest or Z first
            </option>,
          ])}
        </select>
      )}
    </Field>
  </div>
);
