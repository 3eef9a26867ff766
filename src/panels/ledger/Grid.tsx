/** A table of parts, wire runs or hardpoints: sort by head, pick rows, edit in place, all of it by keyboard too. */
import {
  type CSSProperties,
  type KeyboardEvent,
  useCallback,
  useEffect,
  useLayoutEffect,
  useMemo,
  useRef,
  useState,
} from 'react';
import { isSelected, type Selectable } from '../../edit/selection.ts';
import { useCommit } from '../commit.ts';
import { useEditor } from '../editor.ts';
import type { Fresh } from './adding.ts';
import { type CellAt, cellFrom } from './cellKeys.ts';
import { GridHead } from './GridHead.tsx';
import { GridRow } from './GridRow.tsx';
import { fitting, type GridColumn, type GridItem, widthOf } from './gridColumn.ts';
import { keptOrder, nextSort, type Sort, sortedIds } from './order.ts';
import { type PickKeys, picked } from './pick.ts';

export interface GridProps<R extends GridItem> {
  /** What is in it: "Parts". */
  readonly label: string;
  readonly kind: Selectable['kind'];
  readonly rows: readonly R[];
  /** The same array every time, so that rows can be memoised. */
  readonly columns: readonly GridColumn<R>[];
  /** What stands there when there are no rows. */
  readonly empty: string;
  /** A row just added, whose first field opens. */
  readonly fresh?: Fresh;
  /** Makes the order shown the order of the craft. */
  onKeepOrder?: (ids: readonly string[]) => void;
}

export function Grid<R extends GridItem>({
  label,
  kind,
  rows,
  columns: all,
  empty,
  fresh,
  onKeepOrder,
}: GridProps<R>) {
  const { session, selection, dragging, units, several } = useEditor();
  const commit = useCommit();
  const [sort, setSort] = useState<Sort | null>(null);
  const [focus, setFocus] = useState<CellAt | null>(null);
  const table = useRef<HTMLDivElement>(null);
  const columns = useFitting(table, all);
  const order = useOrder(sortedIds(rows, columns, sort), dragging);
  const shown = useRef(order);
  shown.current = order;
  const pick = useCallback(
    (id: string, keys: PickKeys) =>
      session.select(
        picked(session.getState().selection, kind, id, shown.current, {
          ...keys,
          toggle: keys.toggle || (several && !keys.extend),
        }),
      ),
    [session, kind, several],
  );
  const onCellFocus = useCallback((id: string, key: string) => setFocus({ id, key }), []);
  useSelectedInView(table, kind);
  const byId = new Map(rows.map((row) => [row.id, row]));
  const active: CellAt | null =
    focus && byId.has(focus.id) && columns.some(({ key }) => key === focus.key)
      ? focus
      : order[0] === undefined
        ? null
        : { id: order[0], key: columns[0]!.key };
  const onKeyDown = (event: KeyboardEvent<HTMLDivElement>) => {
    const at = cellOf(event.target);
    if (!at || event.altKey) return;
    const keys = { toggle: event.ctrlKey || event.metaKey, extend: event.shiftKey };
    const next = cellFrom(at, event.key, keys.toggle, { ids: order, keys: columns.map(({ key }) => key) });
    if (!next && event.key !== ' ') return;
    event.preventDefault();
    event.stopPropagation();
    if (!next) return pick(at.id, { toggle: !keys.extend, extend: keys.extend });
    focusCell(table.current, next);
    if (next.id !== at.id && !keys.toggle) pick(next.id, keys);
  };
  return (
    <>
      {sort && onKeepOrder && (
        <p className="keep-order">
          Shown by {all.find(({ key }) => key === sort.key)!.title.toLowerCase()}.
          <button
            type="button"
            onClick={() => {
              onKeepOrder(order);
              setSort(null);
            }}
          >
            Keep this order
          </button>
        </p>
      )}
      <div
        className="grid"
        role="grid"
        aria-label={label}
        aria-multiselectable
        style={{ '--columns': tracks(columns), minWidth: `${widthOf(columns)}em` } as CSSProperties}
        ref={table}
        onKeyDown={onKeyDown}
      >
        <GridHead columns={columns} sort={sort} onSort={(key) => setSort(nextSort(sort, key))} />
        <div role="rowgroup">
          {order.map((id) => (
            <GridRow
              key={id}
              row={byId.get(id)!}
              columns={columns}
              units={units}
              commit={commit}
              several={several}
              selected={isSelected(selection, { kind, id })}
              active={active?.id === id ? active.key : null}
              onFresh={fresh?.id === id ? fresh.opened : null}
              onPick={pick}
              onCellFocus={onCellFocus}
            />
          ))}
        </div>
      </div>
      {order.length === 0 && <p className="aside">{empty}</p>}
    </>
  );
}

/** Columns as CSS grid tracks: each at least its width, and wider in proportion where there is room. */
const tracks = <R extends GridItem>(columns: readonly GridColumn<R>[]): string =>
  columns.map(({ width }) => `minmax(${width}em, ${width}fr)`).join(' ');

/** The columns for which there is room; the same array as long as they are the same. */
function useFitting<R extends GridItem>(
  table: { readonly current: HTMLElement | null },
  all: readonly GridColumn<R>[],
): readonly GridColumn<R>[] {
  const [room, setRoom] = useState(Number.POSITIVE_INFINITY);
  useLayoutEffect(() => {
    const pane = table.current!.parentElement!;
    const look = () => setRoom(pane.clientWidth / Number.parseFloat(getComputedStyle(pane).fontSize));
    look();
    const observer = new ResizeObserver(look);
    observer.observe(pane);
    return () => observer.disconnect();
  }, [table]);
  const shown = fitting(all, room);
  const keys = shown.map(({ key }) => key).join();
  // biome-ignore lint/correctness/useExhaustiveDependencies: the keys tell whether they are the same columns
  return useMemo(() => shown, [all, keys]);
}

/** While something is dragged rows keep their places, so that none jumps about under the eye. */
function useOrder(ids: readonly string[], dragging: boolean): readonly string[] {
  const before = useRef(ids);
  const order = dragging ? keptOrder(before.current, ids) : ids;
  before.current = order;
  return order;
}

/** What is picked in the drawing comes into view here. */
function useSelectedInView(table: { readonly current: HTMLElement | null }, kind: Selectable['kind']): void {
  const { selection } = useEditor();
  const last = selection.at(-1);
  const id = last?.kind === kind ? last.id : null;
  useEffect(() => {
    if (id !== null) table.current?.querySelector(`[data-row="${id}"]`)?.scrollIntoView({ block: 'nearest' });
  }, [table, id]);
}

/** The cell that has the focus itself, not a field inside one. */
function cellOf(target: EventTarget): CellAt | null {
  const { cell } = (target as HTMLElement).dataset;
  const id = (target as HTMLElement).parentElement?.dataset.row;
  return cell === undefined || id === undefined ? null : { id, key: cell };
}

const focusCell = (table: HTMLElement | null, { id, key }: CellAt): void =>
  table?.querySelector<HTMLElement>(`[data-row="${id}"] > [data-cell="${key}"]`)?.focus();
