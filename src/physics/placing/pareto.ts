/** The choices that nothing beats: for none of them another is no worse in everything and better in something. */

/** One list of figures a choice, each the better the smaller; as good as equal figures are to be equal. */
export const unbeaten = (choices: readonly (readonly number[])[]): boolean[] =>
  choices.map((choice) => !choices.some((other) => beats(other, choice)));

export const beats = (a: readonly number[], b: readonly number[]): boolean =>
  a.every((figure, i) => figure <= b[i]!) && a.some((figure, i) => figure < b[i]!);
