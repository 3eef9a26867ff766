/**
 * What an entry field holds and reads: a number, or a plain sum of them, with or without a unit.
 *
 *   sum  = term { ["+" | "−"] term }      term = number [unit]
 *
 * A sum without units is in the unit of the field; with one unit, at the end, it is in that unit; otherwise every
 * term carries its own. A sign may be left out after a unit: "5 ft 3 in". The decimal sign is a point or a comma.
 */
import { spellingsOf } from './spellings.ts';
import { type Quantity, typedUnitsOf, type Unit, type UnitSystem, unitOf, wordOf } from './units.ts';

export type Parsed =
  | { readonly ok: true /** SI. */; readonly value: number }
  | { readonly ok: false /** What was found and what is allowed. */; readonly message: string };

/**
 * The number alone, as a field shows it for editing: every digit that was typed, no padding; `parseQuantity` reads
 * it back. Ten significant digits, so that 0.1 kg is 100 g and not 100.00000000000001. '' when there is no value.
 */
export function formatEntry(si: number, quantity: Quantity, system: UnitSystem): string {
  const shown = unitOf(quantity, system).toDisplay(si);
  return Number.isFinite(shown) ? String(Number(shown.toPrecision(10)) + 0) : '';
}

/** `text` in the unit of the field, or in one it names, as SI. */
export function parseQuantity(text: string, quantity: Quantity, system: UnitSystem): Parsed {
  const terms = readTerms(text, quantity);
  const total = typeof terms === 'string' ? terms : addTerms(terms, unitOf(quantity, system), quantity);
  if (typeof total === 'string') return refuse(text, quantity, total);
  return Number.isFinite(total) ? { ok: true, value: total } : refuse(text, quantity, 'too large a number');
}

function refuse(text: string, quantity: Quantity, why: string): Parsed {
  const found = text.trim() === '' ? 'Nothing entered' : foundText(text.trim(), why);
  const units = typedUnitsOf(quantity).flatMap(({ symbol }) => (symbol === '' ? [] : [symbol]));
  const allowed = units.length > 0 ? `a number, in ${units.join(', ')}` : 'a plain number';
  return { ok: false, message: `${found}. Enter ${wordOf(quantity)}: ${allowed}.` };
}

/** When the whole of it is at fault, it is named once. */
const foundText = (text: string, why: string): string =>
  why.startsWith(`“${text}” `) ? why : `Found “${text}”: ${why}`;

interface Term {
  readonly value: number;
  readonly unit: Unit | null;
}

const NUMBER = /^([+-]?)\s*((?:\d+(?:[.,]\d*)?|[.,]\d+)(?:e[+-]?\d+)?)\s*/i;
/** 1,234: the comma may stand for thousands or for the decimal point, and a guess could be wrong a thousandfold. */
const DOUBTFUL = /^[1-9]\d{0,2},\d{3}$/;

/** The terms, or what is wrong with them. */
function readTerms(text: string, quantity: Quantity): Term[] | string {
  const terms: Term[] = [];
  let rest = text.replaceAll('\u2212', '-').trim();
  let sign = 1;
  do {
    const [whole, signText, number] = NUMBER.exec(rest) ?? [];
    if (whole === undefined || number === undefined) return `“${rest}” is not a number`;
    if (terms.at(-1)?.unit === null && !signText) return `“${rest}” follows without a sign`;
    if (DOUBTFUL.test(number))
      return `${number.replace(',', '.')} and ${number.replace(',', '')} are both possible`;
    // "−5 ft 3 in" is one negative length, so a sign holds until the next one.
    if (signText) sign = signText === '-' ? -1 : 1;
    rest = rest.slice(whole.length);
    const named = unitAtStart(rest, quantity);
    rest = rest.slice(named.length).trimStart();
    if (!named.unit && /^[^+\-\d.,]/.test(rest)) return `“${rest}” is not a unit for ${wordOf(quantity)}`;
    terms.push({ value: sign * Number(number.replace(',', '.')), unit: named.unit });
  } while (rest !== '');
  return terms;
}

function unitAtStart(rest: string, quantity: Quantity): { unit: Unit | null; length: number } {
  for (const { unit, pattern } of spellingsOf(quantity)) {
    const match = pattern.exec(rest);
    if (match) return { unit, length: match[0].length };
  }
  return { unit: null, length: 0 };
}

/** The SI sum, or what is wrong with it. */
function addTerms(terms: readonly Term[], fieldUnit: Unit, quantity: Quantity): number | string {
  const named = terms.filter((term) => term.unit !== null).length;
  const lastUnit = terms.at(-1)!.unit;
  if (named === 0 || (named === 1 && lastUnit)) {
    // Summed before it is converted: 20 + 5 °C is 25 °C, not two temperatures above absolute zero.
    return (lastUnit ?? fieldUnit).fromDisplay(terms.reduce((total, term) => total + term.value, 0));
  }
  if (named < terms.length) return 'some terms have a unit and some have none';
  if (quantity === 'temperature') return 'temperatures do not add up';
  return terms.reduce((total, term) => total + term.unit!.fromDisplay(term.value), 0);
}
