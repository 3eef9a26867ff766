/** What measured rows and flat patterns must satisfy before a curve is laid through them. */
import { type Infeasible, infeasible } from '../../numeric/outcome.ts';
import { say } from '../../units/sentence.ts';

export interface Row {
  /** Station or tape distance, m. */
  readonly at: number;
  /** Diameter, girth or width, m. */
  readonly size: number;
}

/** What the rows are called in the sentences: "station", "diameter", … */
export interface RowWords {
  readonly at: string;
  readonly size: string;
}

/** Closer together, two rows are one measurement. */
const LEAST_STEP = 1e-4;

/** Why no curve can go through the rows, or undefined. */
export function rowsFault(rows: readonly Row[], words: RowWords): Infeasible | undefined {
  const first = rows[0]!;
  if (first.at !== 0)
    return infeasible(
      `The first row stands at ${words.at} ${say(first.at, 'length')}; the form begins at 0.`,
      `Add a row at ${words.at} 0, with ${words.size} 0 where the end is pointed or rounded.`,
    );
  for (let i = 1; i < rows.length; i += 1) {
    if (!(rows[i]!.at >= rows[i - 1]!.at + LEAST_STEP))
      return infeasible(
        `Row ${i + 1} stands at ${words.at} ${say(rows[i]!.at, 'length')}, not beyond row ${i} at ${say(rows[i - 1]!.at, 'length')}.`,
        'Each row must stand farther aft than the one before, by 0.1 mm or more.',
      );
    if (i + 1 < rows.length && !(rows[i]!.size > 0))
      return infeasible(
        `Row ${i + 1} has ${words.size} 0 between the ends, which cuts the hull in two.`,
        `Only the first and the last row may have ${words.size} 0.`,
      );
  }
  return undefined;
}
