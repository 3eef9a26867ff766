/** Which column each cell of a table's first row heads, and in which unit. */
import { type ColumnKey, columnOf, PART_COLUMNS, type PartColumn } from './columns.ts';
import { isUnit } from './quantityCell.ts';

export interface Head {
  readonly column: PartColumn;
  /** '' when it names none. */
  readonly unit: string;
  /** The cell as it stands, for messages. */
  readonly text: string;
}

export type HeadReading =
  | Head
  | {
      readonly text: string /** A known column in a unit that is none of its own. */;
      readonly badUnit: boolean;
    };

/** Without heads a table is taken to be name, mass, station, kind. */
const USUAL: readonly ColumnKey[] = ['name', 'mass', 'station', 'kind'];

export const usualHeads = (): Head[] =>
  USUAL.map((key) => ({ column: columnOf(key), unit: '', text: columnOf(key).head }));

/** The longest names first, so that "mass tolerance" is not read as a mass in "tolerance". */
const NAMES = PART_COLUMNS.flatMap((column) =>
  [column.head, ...column.also].map((name) => ({ name, column })),
).sort((a, b) => b.name.length - a.name.length);

export function readHead(text: string): HeadReading {
  const plain = text.trim().toLowerCase();
  for (const { name, column } of NAMES) {
    const rest = plain.startsWith(name) ? plain.slice(name.length) : null;
    if (rest === null || !/^$|^[\s([/,]/.test(rest)) continue;
    const unit = unitIn(rest);
    if (unit === '' || (column.quantity && isUnit(unit, column.quantity))) return { column, unit, text };
    if (column.quantity) return { text, badUnit: true };
  }
  return { text, badUnit: false };
}

/** "(g)", "of one piece [g]", " g", "/g" → "g". */
const unitIn = (rest: string): string =>
  (/[([]([^)\]]*)[)\]]$/.exec(rest)?.[1] ?? rest.replace(/^[\s/,]+/, '')).trim();

/** Two cells that head known columns make a row of heads; a part may well be called "Weight". */
export const isHeadRow = (heads: readonly HeadReading[]): boolean =>
  heads.filter((head) => 'column' in head || head.badUnit).length >= 2;
