/** Scales that begin and end on round numbers of the unit a builder reads. */
import { formatNumber } from '../units/format.ts';
import { type Quantity, unitOf } from '../units/units.ts';
import type { UnitSystem } from './subject.ts';

export interface RoundScale {
  readonly low: number;
  readonly high: number;
  readonly labels: { readonly low: string; readonly high: string };
}

/** A scale that begins at nought is read at a glance; values that lie close together far from it would then look alike. */
const FROM_NOUGHT = 0.6;
/** Of a scale, in last digits usually shown: less would make mountains of rounding. */
const LEAST_SPAN = 10;

/** Round numbers that hold all the values, SI with labels in the builder's unit. */
export function scaleOf(values: readonly number[], quantity: Quantity, units: UnitSystem): RoundScale {
  const unit = unitOf(quantity, units);
  if (values.length === 0) return { low: 0, high: 1, labels: { low: '', high: unit.symbol } };
  const shown = values.map((value) => unit.toDisplay(value));
  const [least, most] = [Math.min(...shown), Math.max(...shown)];
  const from = least >= 0 && least < FROM_NOUGHT * most ? 0 : least;
  const step = roundUp(Math.max(most - from, LEAST_SPAN * 10 ** -unit.digits) / 3);
  const low = Math.floor(from / step + 1e-9) * step;
  const high = Math.max(Math.ceil(most / step - 1e-9) * step, low + step);
  const decimals = Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
  const number = (value: number) => formatNumber(value, decimals);
  return {
    low: unit.fromDisplay(low),
    high: unit.fromDisplay(high),
    labels: { low: number(low), high: `${number(high)}${unit.symbol && ` ${unit.symbol}`}` },
  };
}

/** 1, 2 or 5 times a power of ten, not below the least. */
export function roundUp(least: number): number {
  const power = 10 ** Math.floor(Math.log10(least));
  return power * ([1, 2, 5, 10].find((n) => n * power >= least * (1 - 1e-9)) ?? 10);
}
