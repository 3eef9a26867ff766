/** A linear program being written: columns and rows by number, with what each column adds to the sums of the craft. */
import type { Column, LinearProblem, LinearRow, Term } from '../../numeric/linearProgram/problem.ts';
import { NO_SHARE, plus, type Share } from './share.ts';

/** Masses in grams, moments in gram-metres: the solver's tolerances are then far below anything that can be weighed. */
export const GRAMS = 1000;

export class Draft {
  readonly columns: Column[] = [];
  readonly rows: LinearRow[] = [];
  /** What one unit of a column adds. */
  readonly effects: { readonly column: number; readonly share: Share }[] = [];
  /** What is there whatever is decided. */
  rest: Share = NO_SHARE;

  /** Its number. A column whose bounds meet is a constant, whole or not. */
  column(name: string, lower: number, upper: number, integer = false): number {
    const whole = integer && lower < upper;
    return this.columns.push({ name, lower, upper, cost: 0, integer: whole }) - 1;
  }

  row(name: string, terms: readonly Term[], lower: number, upper: number): number {
    return this.rows.push({ name, lower, upper, terms }) - 1;
  }

  atMost(name: string, terms: readonly Term[], upper: number): number {
    return this.row(name, terms, Number.NEGATIVE_INFINITY, upper);
  }

  /** x between lower and upper when `taken` is 1, and 0 when it is 0. */
  betweenWhen(name: string, column: number, taken: number, lower: number, upper: number): void {
    this.atMost(
      `${name} to`,
      [
        [column, 1],
        [taken, -upper],
      ],
      0,
    );
    this.atMost(
      `${name} from`,
      [
        [column, -1],
        [taken, lower],
      ],
      0,
    );
  }

  /** A column in grams no smaller than |Σ terms + constant| in kilograms. */
  sizeOf(name: string, terms: readonly Term[], constant: number): number {
    const column = this.column(`size of ${name}`, 0, Number.POSITIVE_INFINITY);
    for (const sign of [1, -1]) {
      const signed = terms.map(([j, a]): Term => [j, sign * a * GRAMS]);
      this.atMost(`size of ${name}`, [...signed, [column, -1]], -sign * constant * GRAMS);
    }
    return column;
  }

  adds(column: number, share: Share): void {
    this.effects.push({ column, share });
  }

  addsAlways(share: Share): void {
    this.rest = plus(this.rest, share);
  }

  problem(): LinearProblem {
    return { columns: this.columns, rows: this.rows };
  }
}
