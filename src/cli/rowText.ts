/** Rows of the report as text for the terminal. */
import type { Row } from '../report/row.ts';
import { decimalsFor, formatNumber, formatQuantity } from '../units/format.ts';
import { type Quantity, type UnitSystem, unitOf } from '../units/units.ts';

/** A spread this much finer than the last digit usually shown says nothing more. */
const FINEST = 3;

/** "157.1 g", "157.1 ± 2.4 g"; "none" where there is no value. */
export function rowText({ value, uncertainty, quantity }: Row, units: UnitSystem): string {
  if (value === null) return 'none';
  const unit = unitOf(quantity, units);
  const spread = (uncertainty ?? 0) / unit.si;
  const decimals = decimalsFor(spread, unit.digits);
  if (spread === 0 || decimals > unit.digits + FINEST) return quantityText(value, quantity, units);
  const band = `${formatNumber(unit.toDisplay(value), decimals)} ± ${formatNumber(spread, decimals)}`;
  if (unit.symbol === '°') return band.replace(' ±', '° ±').concat('°');
  return unit.symbol ? `${band} ${unit.symbol}` : band;
}

export const quantityText = (si: number, quantity: Quantity, units: UnitSystem): string =>
  formatQuantity(si, quantity, units);
