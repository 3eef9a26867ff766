/**
 * Sentences with quantities in them, written once in SI and read in either system: the core says
 * `lift is short by ${say(0.012, 'mass')}`, and whoever shows it calls `inUnits`.
 */
import { formatQuantity } from './format.ts';
import type { Quantity, UnitSystem } from './units.ts';

/** A quantity inside a sentence: `{0.012 mass}`. */
export const say = (si: number, quantity: Quantity): string => `{${si} ${quantity}}`;

/** The sentence with every quantity in the unit of the system; "a" before it is "an" where it is read with a vowel. */
export const inUnits = (sentence: string, system: UnitSystem): string =>
  sentence.replace(
    /(\ba )?\{(-?[\d.]+(?:e[+-]\d+)?) (\w+)\}/g,
    (_, article = '', si: string, quantity: Quantity) => {
      const read = formatQuantity(Number(si), quantity, system);
      return `${article && EIGHT_ELEVEN_EIGHTEEN.test(read) ? 'an ' : article}${read}`;
    },
  );

const EIGHT_ELEVEN_EIGHTEEN = /^(8|1[18](?!\d))/;
