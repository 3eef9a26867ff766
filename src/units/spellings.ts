/** How people write units at a keyboard: any case, m2 or m^2 for m², factors joined by a dot, a space or nothing. */
import type { UnitSymbol } from './scales.ts';
import { type Quantity, typedUnitsOf, type Unit } from './units.ts';

export interface Spelling {
  readonly unit: Unit;
  /** Matches the unit at the start of a text, when nothing that belongs to a longer word follows. */
  readonly pattern: RegExp;
}

const OTHER_SPELLINGS: Partial<Record<UnitSymbol, readonly string[]>> = {
  in: ['"', '″', 'inch', 'inches'],
  ft: ["'", '′', 'foot', 'feet'],
  lb: ['lbs'],
  mbar: ['mb'],
  '°': ['deg'],
  '°C': ['C', 'degC'],
  '°F': ['F', 'degF'],
  kn: ['kt'],
};

const known = new Map<Quantity, Spelling[]>();

/** The spellings a quantity takes, longest first so that "inHg" is not read as "in". */
export function spellingsOf(quantity: Quantity): Spelling[] {
  const before = known.get(quantity);
  if (before) return before;
  const pairs = typedUnitsOf(quantity)
    .filter(({ symbol }) => symbol !== '')
    .flatMap((unit) => [unit.symbol, ...(OTHER_SPELLINGS[unit.symbol] ?? [])].map((text) => ({ unit, text })))
    .sort((a, b) => b.text.length - a.text.length);
  const spellings = pairs.map(({ unit, text }) => ({ unit, pattern: patternOf(text) }));
  known.set(quantity, spellings);
  return spellings;
}

function patternOf(text: string): RegExp {
  const letters = [...text].filter((letter) => letter !== '·').map(letterPattern);
  return new RegExp(`^${letters.join('[\\s·*^]*')}(?!\\p{L}|[°%/])`, 'iu');
}

function letterPattern(letter: string): string {
  if (letter === '²' || letter === '₂') return `[2${letter}]`;
  if (letter === '³') return '[3³]';
  return letter === '/' ? '\\/' : letter;
}
