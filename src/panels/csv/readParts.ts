/** Parts from a table: one written by Steelyard, or pasted from any spreadsheet. Pure; nothing is added here. */
import type { Place } from '../../craft/placeSchema.ts';
import type { PartFields } from '../../edit/edits/parts.ts';
import { type UnitSystem, unitOf } from '../../units/units.ts';
import { type Head, type HeadReading, isHeadRow, readHead, usualHeads } from './heads.ts';
import { readPartRow } from './readPartRow.ts';
import { type TableRow, tableOf } from './table.ts';

export interface CellProblem {
  /** Row of the text, from 1; the row of heads counts. */
  readonly row: number;
  /** Head of the column. */
  readonly column: string;
  readonly found: string;
  readonly allowed: string;
}

export interface AssumedUnit {
  readonly column: string;
  readonly unit: string;
}

export interface PartsReading {
  /** From the rows without a problem. */
  readonly good: readonly PartFields[];
  /** How many rows hold a part, good or not. */
  readonly rows: number;
  readonly problems: readonly CellProblem[];
  /** Heads of columns that mean nothing here. */
  readonly ignored: readonly string[];
  /** Columns of numbers that name no unit, and the unit they were taken in. */
  readonly assumed: readonly AssumedUnit[];
}

/** `home`: where a part without a place goes. */
export function readParts(text: string, units: UnitSystem, home: Place): PartsReading {
  const [first, ...rest] = tableOf(text);
  if (!first) return { good: [], rows: 0, problems: [], ignored: [], assumed: [] };
  const readings = first.cells.map(readHead);
  if (!isHeadRow(readings)) return readBody([first, ...rest], usualHeads(), units, home);
  const problems = headProblems(first.number, readings);
  const ignored = readings.flatMap((head) =>
    'column' in head || head.badUnit || head.text === '' ? [] : [head.text],
  );
  if (problems.length > 0) return { good: [], rows: rest.length, problems, ignored, assumed: [] };
  const heads = readings.map((head) => ('column' in head ? head : null));
  return { ...readBody(rest, heads, units, home), ignored };
}

function headProblems(row: number, readings: readonly HeadReading[]): CellProblem[] {
  const keys = readings.flatMap((head) => ('column' in head ? [head.column.key] : []));
  const badUnits = readings
    .filter((head) => 'badUnit' in head && head.badUnit)
    .map(({ text }) => ({
      row,
      column: text,
      found: `“${text}”`,
      allowed: 'a column in a unit of its quantity',
    }));
  const twice = readings.flatMap((head, i) =>
    'column' in head &&
    keys.indexOf(head.column.key) < readings.slice(0, i).filter((each) => 'column' in each).length
      ? [{ row, column: head.text, found: 'the same column again', allowed: 'each column once' }]
      : [],
  );
  const noMass =
    keys.includes('mass') || badUnits.length > 0
      ? []
      : [{ row, column: 'mass', found: 'no such column', allowed: 'a table with a column of masses' }];
  return [...badUnits, ...twice, ...noMass];
}

function readBody(
  rows: readonly TableRow[],
  heads: readonly (Head | null)[],
  units: UnitSystem,
  home: Place,
): PartsReading {
  const readings = rows.map(({ number, cells }) => ({ number, ...readPartRow(cells, heads, units, home) }));
  return {
    good: readings.flatMap(({ part }) => (part ? [part] : [])),
    rows: rows.length,
    problems: readings.flatMap(({ number, faults }) => faults.map((fault) => ({ row: number, ...fault }))),
    ignored: [],
    assumed: assumedUnits(rows, heads, units),
  };
}

/** A cell may still name its own unit, as "700 mm". */
const assumedUnits = (
  rows: readonly TableRow[],
  heads: readonly (Head | null)[],
  units: UnitSystem,
): AssumedUnit[] =>
  heads.flatMap((head, i) => {
    const bare = rows.some(({ cells }) => /^[^\p{L}°"'″′%]*\d[^\p{L}°"'″′%]*$/u.test(cells[i] ?? ''));
    return head?.column.quantity && head.unit === '' && bare
      ? [{ column: head.text, unit: unitOf(head.column.quantity, units).symbol }]
      : [];
  });
