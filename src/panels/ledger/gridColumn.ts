/** What a table of the ledger is made of. */
import type { ReactNode } from 'react';
import type { UnitSystem } from '../../units/units.ts';
import type { Commit } from '../commit.ts';
import type { Leave } from '../fields/useDraft.ts';

export interface GridItem {
  readonly id: string;
  /** As it is called to a screen reader. */
  readonly name: string;
}

/** What the field in an opened cell is given. */
export interface CellProps<R> {
  readonly row: R;
  readonly units: UnitSystem;
  readonly commit: Commit;
  /** The key that opened the cell, if it was typed. */
  readonly startWith: string | undefined;
  onLeave(how: Leave): void;
}

export interface GridColumn<R extends GridItem> {
  readonly key: string;
  readonly title: string;
  /** em it needs at least; all columns widen in proportion where there is room. */
  readonly width: number;
  /** Gives way where the table is narrow, the lowest first; what it says stands in the inspector too. */
  readonly yields?: number;
  readonly numeric?: boolean;
  sortBy(row: R): string | number;
  text(row: R, units: UnitSystem): string;
  /** The field that opens in place; a column without one is for reading. */
  readonly field?: (props: CellProps<R>) => ReactNode;
  /** A cell that is a button: what it does, and whether it is pressed. */
  readonly press?: {
    readonly label: (row: R) => string;
    readonly pressed: (row: R) => boolean;
    readonly run: (row: R, commit: Commit) => void;
  };
}

export const widthOf = <R extends GridItem>(columns: readonly GridColumn<R>[]): number =>
  columns.reduce((sum, { width }) => sum + width, 0);

/** The columns that fit side by side into so many em; those that never yield stay however narrow it is. */
export function fitting<R extends GridItem>(
  columns: readonly GridColumn<R>[],
  room: number,
): readonly GridColumn<R>[] {
  const yielding = columns.filter((column) => column.yields !== undefined);
  yielding.sort((a, b) => a.yields! - b.yields!);
  let shown = columns;
  for (const next of yielding) {
    if (widthOf(shown) <= room) break;
    shown = shown.filter((column) => column !== next);
  }
  return shown;
}
