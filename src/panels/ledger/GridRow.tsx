/** One row of a table. Cells show text; Enter, F2, typing or a second click opens the field of a cell in place. */
import { type KeyboardEvent, type MouseEvent, memo, type ReactNode, useEffect, useRef } from 'react';
import type { UnitSystem } from '../../units/units.ts';
import type { Commit } from '../commit.ts';
import { shallowEqual } from '../shallow.ts';
import type { GridColumn, GridItem } from './gridColumn.ts';
import type { PickKeys } from './pick.ts';
import { useOpenCells } from './useOpenCells.ts';

export interface GridRowProps<R extends GridItem> {
  readonly row: R;
  readonly columns: readonly GridColumn<R>[];
  readonly units: UnitSystem;
  readonly commit: Commit;
  readonly selected: boolean;
  /** Whether a click only picks, as it does with Ctrl. */
  readonly several: boolean;
  /** The column of the cell that Tab leads to, if it is in this row. */
  readonly active: string | null;
  /** Present in a row just added: its first field opens, and this is told so. */
  readonly onFresh: (() => void) | null;
  onPick(id: string, keys: PickKeys): void;
  onCellFocus(id: string, key: string): void;
}

function PlainGridRow<R extends GridItem>(props: GridRowProps<R>) {
  const { row, columns, units, commit, selected, active, onFresh } = props;
  const { opened, open, leave, onTab, line } = useOpenCells(row, columns, commit);
  // biome-ignore lint/correctness/useExhaustiveDependencies: once for a fresh row, however often it is drawn
  useEffect(() => {
    if (!onFresh) return;
    open(columns[0]!.key);
    onFresh();
  }, [onFresh]);
  /** The cell that was active and selected when the pointer went down: its click is the second. */
  const ready = useRef<string | null>(null);
  const onClick = (event: MouseEvent) => {
    const key = cellAt(event.target);
    if (key === null) return;
    const keys = { toggle: event.ctrlKey || event.metaKey, extend: event.shiftKey };
    if (ready.current === key && !props.several && !keys.toggle && !keys.extend) open(key);
    else props.onPick(row.id, keys);
  };
  const onKeyDown = (event: KeyboardEvent<HTMLDivElement>) => {
    if (event.key === 'Tab') return onTab(event);
    const key = cellAt(event.target);
    const startWith = openingText(event);
    if (key === null || startWith === null) return;
    event.preventDefault();
    event.stopPropagation();
    open(key, startWith);
  };
  return (
    <div
      role="row"
      ref={line}
      data-row={row.id}
      aria-selected={selected}
      onPointerDown={(event) => {
        ready.current = selected && active === cellAt(event.target) ? active : null;
      }}
      onClick={onClick}
      onKeyDown={onKeyDown}
    >
      {columns.map((column, index) => (
        <div
          key={column.key}
          role={index === 0 ? 'rowheader' : 'gridcell'}
          data-cell={column.key}
          className={
            [column.numeric && 'number', opened.has(column.key) && 'opened'].filter(Boolean).join(' ') ||
            undefined
          }
          tabIndex={active === column.key ? 0 : -1}
          onFocus={() => props.onCellFocus(row.id, column.key)}
        >
          {opened.has(column.key) && column.field
            ? column.field({
                row,
                units,
                commit,
                startWith: opened.get(column.key),
                onLeave: (how) => leave(column.key, how),
              })
            : cellContent(column, row, units, () => open(column.key))}
        </div>
      ))}
    </div>
  );
}

/** Rows are made afresh with every figure; one is drawn again only when something it shows has changed. */
export const GridRow = memo(PlainGridRow, sameProps) as typeof PlainGridRow;

function sameProps<R extends GridItem>(before: GridRowProps<R>, after: GridRowProps<R>): boolean {
  const { row, ...rest } = before;
  const { row: next, ...others } = after;
  return shallowEqual(row, next) && shallowEqual(rest, others);
}

function cellContent<R extends GridItem>(
  column: GridColumn<R>,
  row: R,
  units: UnitSystem,
  press: () => void,
): ReactNode {
  if (!column.press) return column.text(row, units);
  const pressed = column.press.pressed(row);
  return (
    <button
      type="button"
      tabIndex={-1}
      aria-label={column.press.label(row)}
      aria-pressed={pressed}
      onClick={press}
    >
      {pressed && <span aria-hidden="true">✓ </span>}
      {column.text(row, units)}
    </button>
  );
}

/** The column of the cell itself; null for what is inside one. */
const cellAt = (target: EventTarget): string | null => (target as HTMLElement).dataset.cell ?? null;

/** What a key puts into the field it opens: nothing for Enter and F2, itself when it is a letter; null when it opens none. */
function openingText({ key, ctrlKey, metaKey, altKey }: KeyboardEvent): string | undefined | null {
  if (ctrlKey || metaKey || altKey) return null;
  if (key === 'Enter' || key === 'F2') return undefined;
  return key.length === 1 && key !== ' ' ? key : null;
}
