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
  /** em; all columns widen alike where there is room. */
  readonly width: number;
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
