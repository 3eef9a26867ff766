/** What fields show, read and say; pure, so that it can be tested without a page. */
import type { Problem } from '../../craft/problem.ts';
import { formatEntry, parseQuantity } from '../../units/entry.ts';
import { type Quantity, type UnitSystem, unitOf } from '../../units/units.ts';

export type Read<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false /** What was found and what is allowed. */; readonly message: string };

/**
 * Unpadded, with `more` decimals than the quantity is usually shown with: with two a typed value comes back as typed
 * and a dragged one stays short; what only follows from others needs none.
 */
export function entryText(si: number, quantity: Quantity, units: UnitSystem, more = 2): string {
  const full = formatEntry(si, quantity, units);
  return full === '' ? '' : String(Number(Number(full).toFixed(unitOf(quantity, units).digits + more)));
}

/** The typed SI value without the last digit of binary dust, so that 35.7 g is kept as 0.0357 and not 0.035700000000000003. Angles keep it, so that 180° is π. */
export function readEntry(text: string, quantity: Quantity, units: UnitSystem): Read<number> {
  const parsed = parseQuantity(text, quantity, units);
  if (!parsed.ok || quantity === 'angle') return parsed;
  return { ok: true, value: Number(parsed.value.toPrecision(15)) };
}

/** The same where there need be no value: null for nothing typed. */
export const readOptional = (text: string, quantity: Quantity, units: UnitSystem): Read<number | null> =>
  text.trim() === '' ? { ok: true, value: null } : readEntry(text, quantity, units);

/** A whole number as typed. */
export function readCount(text: string): Read<number> {
  const plain = text.trim();
  return /^\d{1,9}$/.test(plain)
    ? { ok: true, value: Number(plain) }
    : { ok: false, message: `Found ${plain ? `“${plain}”` : 'nothing'}; allowed: a whole number.` };
}

/** What one press of an arrow key changes, in the unit shown: 1 mm of a metric length, else ten times the last digit usually shown. */
function stepOf(quantity: Quantity, units: UnitSystem): number {
  const { digits } = unitOf(quantity, units);
  const fine = units === 'metric' && (quantity === 'length' || quantity === 'smallLength');
  return 10 ** (fine ? -digits : 1 - digits);
}

/** The SI value so many steps on, on a round number of the unit shown. */
export function stepped(si: number, steps: number, quantity: Quantity, units: UnitSystem): number {
  const unit = unitOf(quantity, units);
  const shown = unit.toDisplay(si) + steps * stepOf(quantity, units);
  const next = unit.fromDisplay(Number(shown.toPrecision(10)));
  return quantity === 'angle' ? next : Number(next.toPrecision(15));
}

const NUMBER = String.raw`(-?[\d.]+(?:e[+-]?\d+)?)`;
const BOUND = new RegExp(`^(at least|at most|more than|less than) ${NUMBER}$`);
/** Another field is the bound: "at most targets.heaviness.most (0.02 kg)". */
const FIELD_BOUND = new RegExp(`^(at least|at most) \\S+ \\(${NUMBER} \\S+\\)$`);
const RANGE = new RegExp(`^(an? \\w+ from) ${NUMBER} to ${NUMBER} \\S+$`);

/** What the gate allows, its bounds put in the unit the builder reads. */
export function allowedText(allowed: string, quantity: Quantity | null, units: UnitSystem): string {
  if (!quantity) return allowed;
  const shown = (si: string | undefined) => boundText(Number(si), quantity, units);
  const range = RANGE.exec(allowed);
  if (range) return `${range[1]} ${shown(range[2])} to ${shown(range[3])}`;
  const bound = BOUND.exec(allowed) ?? FIELD_BOUND.exec(allowed);
  return bound ? `${bound[1]} ${shown(bound[2])}` : allowed;
}

function boundText(si: number, quantity: Quantity, units: UnitSystem): string {
  const { symbol } = unitOf(quantity, units);
  const number = entryText(si, quantity, units);
  return `${number}${symbol === '°' || symbol === '' ? symbol : ` ${symbol}`}`;
}

/** One sentence on what the gate refused: names the field, what was typed, what is allowed. */
export function problemSentence(
  label: string,
  typed: string,
  problem: Problem,
  quantity: Quantity | null,
  units: UnitSystem,
): string {
  return `${label}: found “${typed.trim()}”; allowed: ${allowedText(problem.allowed, quantity, units)}.`;
}
