/**
 * The choices that nothing beats: for none of them another is no worse in everything and better in something.
 *
 * One list of figures a choice, each the better the smaller. Figures no more than `apart` from each other count as equal.
 * Taken so, three choices could each beat the next in a ring: one that beats is therefore also the better by the sum.
 */

/** As good as equal figures are to be equal, or within `apart`. */
export const unbeaten = (choices: readonly (readonly number[])[], apart = 0): boolean[] =>
  choices.map((choice) => !choices.some((other) => beats(other, choice, apart)));

export function beats(a: readonly number[], b: readonly number[], apart = 0): boolean {
  const gains = a.map((figure, i) => gain(figure, b[i]!));
  return (
    gains.every((each) => each >= -apart) &&
    gains.some((each) => each > apart) &&
    gains.reduce((sum, each) => sum + each, 0) > 0
  );
}

export const equals = (a: readonly number[], b: readonly number[], apart: number): boolean =>
  a.every((figure, i) => Math.abs(gain(figure, b[i]!)) <= apart);

/** Of two that have none neither gains. */
const gain = (a: number, b: number): number => (a === b ? 0 : b - a);
