/** Which cells of one row have their field open, and how focus goes on from one to the next. */
import { type KeyboardEvent, useRef, useState } from 'react';
import type { Commit } from '../commit.ts';
import type { Leave } from '../fields/useDraft.ts';
import type { GridColumn, GridItem } from './gridColumn.ts';

/** By column, the key that opened the field. Several are open when one holds text that cannot be taken. */
type Opened = ReadonlyMap<string, string | undefined>;

export function useOpenCells<R extends GridItem>(row: R, columns: readonly GridColumn<R>[], commit: Commit) {
  const [opened, setOpened] = useState<Opened>(new Map());
  const line = useRef<HTMLTableRowElement>(null);
  /** The column whose field was left last, its text taken. */
  const left = useRef<string | null>(null);
  const open = (key: string, startWith?: string) => {
    const column = columns.find((each) => each.key === key)!;
    if (column.press) column.press.run(row, commit);
    else if (column.field) setOpened((before) => new Map(before).set(key, startWith));
  };
  const leave = (key: string, how: Leave) => {
    left.current = key;
    setOpened((before) => new Map([...before].filter(([each]) => each !== key)));
    if (how !== 'blur') line.current?.querySelector<HTMLElement>(`[data-cell="${key}"]`)?.focus();
  };
  /** Tab in an open field goes on to the next field of the row; text that cannot be taken holds it. */
  const onTab = (event: KeyboardEvent) => {
    const input = event.target as HTMLElement;
    const key = input.parentElement?.closest<HTMLElement>('[data-cell]')?.dataset.cell;
    const next = key && opened.has(key) ? fieldBeside(columns, key, event.shiftKey ? -1 : 1) : undefined;
    if (next === undefined) return;
    event.preventDefault();
    left.current = null;
    input.blur();
    if (left.current === key) open(next);
    else input.focus();
  };
  return { opened, open, leave, onTab, line };
}

function fieldBeside<R extends GridItem>(
  columns: readonly GridColumn<R>[],
  key: string,
  step: number,
): string | undefined {
  const keys = columns.filter(({ field }) => field).map((column) => column.key);
  return keys[keys.indexOf(key) + step];
}
