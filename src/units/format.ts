/** Numbers as people read them: the decimals their uncertainty deserves, a true minus sign, never "−0" or "NaN". */
import { type Quantity, type UnitSystem, unitOf } from './units.ts';

export interface NumberStyle {
  /** Hyphen for the minus sign and for a missing value, for terminals and spreadsheets. Default false. */
  readonly ascii?: boolean;
}

export interface QuantityStyle extends NumberStyle {
  /** Standard uncertainty of the value, SI, in the unit of the quantity. It decides the decimals when > 0. */
  readonly uncertainty?: number;
}

const MINUS = '\u2212';
const MISSING = '–';
const MOST_DECIMALS = 12;

/**
 * Fixed decimals; negative ones round to tens, hundreds, … A value that is not finite shows as "–". Zero has no
 * sign, nor has what rounds to it.
 */
export function formatNumber(value: number, decimals: number, style: NumberStyle = {}): string {
  if (!Number.isFinite(value)) return style.ascii ? '-' : MISSING;
  const size = sizeText(Math.abs(value), decimals);
  if (value >= 0 || Number(size) === 0) return size;
  return (style.ascii ? '-' : MINUS) + size;
}

function sizeText(size: number, decimals: number): string {
  if (decimals >= 0) return size.toFixed(Math.min(decimals, MOST_DECIMALS));
  const step = 10 ** -decimals;
  return Math.min(Math.round(size / step) * step, Number.MAX_VALUE).toFixed(0);
}

/** "157.1 g", "6.2°", "−3.0 °C": an SI value in the unit of the system. */
export function formatQuantity(
  si: number,
  quantity: Quantity,
  system: UnitSystem,
  style: QuantityStyle = {},
): string {
  const unit = unitOf(quantity, system);
  const { uncertainty } = style;
  const decimals = uncertainty ? decimalsFor(uncertainty / unit.si, unit.digits) : unit.digits;
  const shown = unit.toDisplay(si);
  const number = formatNumber(shown, decimals, style);
  if (unit.symbol === '' || !Number.isFinite(shown)) return number;
  return unit.symbol === '°' ? `${number}°` : `${number} ${unit.symbol}`;
}

/**
 * Decimals at which a standard uncertainty shows two significant digits (JCGM 100:2008, 7.2.6); `otherwise` when it
 * is not a positive number.
 */
export function decimalsFor(uncertainty: number, otherwise: number): number {
  if (!(uncertainty > 0) || !Number.isFinite(uncertainty)) return otherwise;
  // Rounded first, since 0.0996 becomes 0.10 and so deserves one decimal less.
  const exponent = Number(uncertainty.toExponential(1).split('e')[1]);
  return Math.min(1 - exponent, MOST_DECIMALS);
}
