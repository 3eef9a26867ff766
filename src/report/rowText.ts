/** Rows of the report as text in the builder's units. */

import { decimalsFor, formatNumber, formatQuantity } from '../units/format.ts';
import { inUnits } from '../units/sentence.ts';
import { type Quantity, type UnitSystem, unitOf } from '../units/units.ts';
import type { Row } from './row.ts';
import { insignificant } from './rows.ts';

/** The row with its sentence in the builder's units. */
export const readRow = (row: Row, units: UnitSystem): Row =>
  row.why.includes('{') ? { ...row, why: inUnits(row.why, units) } : row;

/** "157.1 g", "157.1 ± 2.4 g"; "none" where there is no value. */
export function rowText(row: Row, units: UnitSystem): string {
  if (row.value === null) return 'none';
  return row.uncertainty && !isDust(row.uncertainty, row.quantity, units)
    ? uncertainText(row.value, row.uncertainty, row.quantity, units)
    : formatQuantity(row.value, row.quantity, units);
}

/**
 * Below half of the last digit usually shown all that is shown is certain: more digits would claim more than the sums are
 * good for, or be rounding of the arithmetic, as for the side of a craft that is alike on both.
 */
const isDust = (uncertainty: number, quantity: Quantity, units: UnitSystem): boolean => {
  const { si, digits } = unitOf(quantity, units);
  return uncertainty / si < 10 ** -digits / 2;
};

function uncertainText(value: number, uncertainty: number, quantity: Quantity, units: UnitSystem): string {
  const unit = unitOf(quantity, units);
  const decimals = decimalsFor(uncertainty / unit.si, unit.digits);
  const number = formatNumber(unit.toDisplay(value), decimals);
  const spread = formatNumber(uncertainty / unit.si, decimals);
  if (unit.symbol === '°') return `${number}° ± ${spread}°`;
  return `${number} ± ${spread} ${unit.symbol}`.trimEnd();
}

/** A figure without its sign, and the word for its side where it has one; none for as good as zero. */
export function figureText(
  row: Row,
  [below, above]: readonly [string, string],
  units: UnitSystem,
): { figure: string; side: string } {
  if (row.value === null || !above) return { figure: rowText(row, units), side: '' };
  const figure = rowText({ ...row, value: Math.abs(row.value) }, units);
  const side = insignificant(row.value, row.quantity) ? '' : row.value < 0 ? below : above;
  return { figure, side };
}
