/** The heads of a table; each sorts by its column. */
import type { GridColumn, GridItem } from './gridColumn.ts';
import type { Sort } from './order.ts';

export interface GridHeadProps<R extends GridItem> {
  readonly columns: readonly GridColumn<R>[];
  readonly sort: Sort | null;
  onSort(key: string): void;
}

export function GridHead<R extends GridItem>({ columns, sort, onSort }: GridHeadProps<R>) {
  return (
    <div role="rowgroup" className="grid-head">
      <div role="row">
        {columns.map(({ key, title, numeric }) => (
          <div
            key={key}
            role="columnheader"
            className={numeric ? 'number' : undefined}
            aria-sort={sort?.key === key ? (sort.descending ? 'descending' : 'ascending') : 'none'}
          >
            <button type="button" onClick={() => onSort(key)}>
              {title}
              <span aria-hidden="true">{sort?.key === key ? (sort.descending ? ' ↓' : ' ↑') : ''}</span>
            </button>
          </div>
        ))}
      </div>
    </div>
  );
}
