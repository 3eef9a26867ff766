/** Conversion at the edges: the core is SI throughout, the screen and the keyboard are metric or imperial. */
import { QUANTITIES, type Quantity, type QuantityKind } from './quantities.ts';
import { SCALES, type Scale, type UnitSymbol } from './scales.ts';

export type { Quantity } from './quantities.ts';

export type UnitSystem = 'metric' | 'imperial';

export interface Unit {
  readonly symbol: UnitSymbol;
  /** Size of one unit in SI: what an uncertainty or a step converts by, free of a temperature's zero. */
  readonly si: number;
  /** Decimals when no uncertainty decides. */
  readonly digits: number;
  toDisplay(si: number): number;
  fromDisplay(shown: number): number;
}

/** The unit in which a quantity is shown and typed. */
export function unitOf(quantity: Quantity, system: UnitSystem): Unit {
  const { symbol, digits } = QUANTITIES[quantity][system];
  return unitNamed(quantity, symbol, digits);
}

/** The unit's symbol in files and JSON: 'kg', 'm', 'rad', 'K', 'Pa'…; '' for a plain number. */
export const siSymbolOf = (quantity: Quantity): UnitSymbol => QUANTITIES[quantity].si;

/** What the quantity is called in a message: "a mass". */
export const wordOf = (quantity: Quantity): string => QUANTITIES[quantity].word;

/** Every unit in which the quantity may be typed, the shown ones first. */
export function typedUnitsOf(quantity: Quantity): Unit[] {
  const { metric, imperial, si, also }: QuantityKind = QUANTITIES[quantity];
  const symbols = new Set<UnitSymbol>([metric.symbol, imperial.symbol, si, ...also]);
  return [...symbols].map((symbol) => unitNamed(quantity, symbol, metric.digits));
}

function unitNamed(quantity: Quantity, symbol: UnitSymbol, digits: number): Unit {
  const { si, zero }: Scale = SCALES[symbol];
  // A step of 1 °C is 1 K: only a temperature itself has the scale's zero.
  const origin = quantity === 'temperatureDifference' ? 0 : zero;
  return {
    symbol,
    si,
    digits,
    toDisplay: (value) => (value - origin) / si,
    fromDisplay: (value) => origin + value * si,
  };
}
