/** Rows of lengths pasted from a spreadsheet, with or without heads; a head may name the unit. */
import type { UnitSystem } from '../../units/units.ts';
import { isUnit, readCell } from './quantityCell.ts';
import { type TableRow, tableOf } from './table.ts';

export type NumberRows =
  | { readonly ok: true; readonly rows: Readonly<Record<string, number>>[] }
  | { readonly ok: false; readonly messages: readonly string[] };

interface Column {
  readonly key: string;
  readonly label: string;
}

/** Each row as an object with the keys of the columns, SI. */
export function readNumberRows(text: string, columns: readonly Column[], units: UnitSystem): NumberRows {
  const [first, ...rest] = tableOf(text);
  if (!first) return { ok: false, messages: ['Found no rows; allowed: one row a line.'] };
  const headed = first.cells.every((cell) => !/^[+\-\u2212]?[\d.,]/.test(cell));
  const columnUnits = columns.map((_, i) => (headed ? unitIn(first.cells[i] ?? '') : ''));
  const messages: string[] = [];
  const rows = (headed ? rest : [first, ...rest]).map((row) =>
    Object.fromEntries(
      columns.map(({ key, label }, i) => [key, readOne(row, i, label, columnUnits[i]!, units, messages)]),
    ),
  );
  return messages.length > 0 ? { ok: false, messages } : { ok: true, rows };
}

function readOne(
  { number, cells }: TableRow,
  index: number,
  label: string,
  unit: string,
  units: UnitSystem,
  messages: string[],
): number {
  const read = readCell(cells[index] ?? '', unit, 'length', units);
  if (read.ok) return read.value;
  messages.push(`Row ${number}, ${label.toLowerCase()}: ${read.message}`);
  return 0;
}

/** The unit at the end of a head: "Girth (mm)", "girth mm"; '' when it names none. */
function unitIn(head: string): string {
  const word = /([^\s()[\]/,]+)[)\]]?$/.exec(head)?.[1] ?? '';
  return isUnit(word, 'length') ? word : '';
}
