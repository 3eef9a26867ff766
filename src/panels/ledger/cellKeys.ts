/** Where the keys lead in a table. Pure. */
export interface CellAt {
  readonly id: string;
  readonly key: string;
}

export interface GridShape {
  /** Ids and column keys as shown. */
  readonly ids: readonly string[];
  readonly keys: readonly string[];
}

/** Rows that Page Up and Page Down go over. */
const PAGE = 10;

/** The cell to which a key leads from another, or null when the key means nothing here. Stops at the edges. */
export function cellFrom(at: CellAt, key: string, ctrl: boolean, { ids, keys }: GridShape): CellAt | null {
  const row = ids.indexOf(at.id);
  const column = keys.indexOf(at.key);
  const to = (nextRow: number, nextColumn: number): CellAt | null => {
    const id = ids[Math.min(ids.length - 1, Math.max(0, nextRow))];
    const name = keys[Math.min(keys.length - 1, Math.max(0, nextColumn))];
    return id === undefined || name === undefined ? null : { id, key: name };
  };
  switch (key) {
    case 'ArrowUp':
      return to(row - 1, column);
    case 'ArrowDown':
      return to(row + 1, column);
    case 'ArrowLeft':
      return to(row, column - 1);
    case 'ArrowRight':
      return to(row, column + 1);
    case 'PageUp':
      return to(row - PAGE, column);
    case 'PageDown':
      return to(row + PAGE, column);
    case 'Home':
      return to(ctrl ? 0 : row, 0);
    case 'End':
      return to(ctrl ? ids.length - 1 : row, keys.length - 1);
    default:
      return null;
  }
}
