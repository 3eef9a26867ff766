/** In which order a table shows its rows. Pure. */
import type { GridColumn, GridItem } from './gridColumn.ts';

export interface Sort {
  readonly key: string;
  readonly descending: boolean;
}

/** A click on a head: up, down, then the builder's own order again. */
export function nextSort(sort: Sort | null, key: string): Sort | null {
  if (sort?.key !== key) return { key, descending: false };
  return sort.descending ? null : { key, descending: true };
}

const words = new Intl.Collator('en', { numeric: true, sensitivity: 'base' });

/** Ids in the order to show; equals keep the order given. */
export function sortedIds<R extends GridItem>(
  rows: readonly R[],
  columns: readonly GridColumn<R>[],
  sort: Sort | null,
): string[] {
  const column = columns.find(({ key }) => key === sort?.key);
  if (!sort || !column) return rows.map(({ id }) => id);
  const keyed = rows.map((row) => ({ id: row.id, by: column.sortBy(row) }));
  const sign = sort.descending ? -1 : 1;
  return keyed.sort((a, b) => sign * compare(a.by, b.by)).map(({ id }) => id);
}

const compare = (a: string | number, b: string | number): number =>
  typeof a === 'number' && typeof b === 'number' ? a - b : words.compare(String(a), String(b));

/** The ids that still exist in the order they had, then those that came since. */
export function keptOrder(before: readonly string[], now: readonly string[]): string[] {
  const existing = new Set(now);
  const known = new Set(before);
  return [...before.filter((id) => existing.has(id)), ...now.filter((id) => !known.has(id))];
}
