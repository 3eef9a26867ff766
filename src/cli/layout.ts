/** Text laid out for a terminal of 80 columns. */

export const COLUMNS = 80;

// biome-ignore lint/suspicious/noControlCharactersInRegex: names in a file must not steer the terminal
const CONTROL = /[\u0000-\u001f\u007f-\u009f\u2028\u2029]+/g;

/** One line without control characters, its minus a hyphen, so that it can be searched and copied into a sum. */
export const oneLine = (text: string): string => text.replace(CONTROL, ' ').replaceAll('\u2212', '-');

const lengthOf = (text: string): number => [...text].length;

/** Cut to a width, the cut marked. */
export const fitted = (text: string, width: number): string =>
  lengthOf(text) <= width ? text : `${[...text].slice(0, width - 1).join('')}…`;

/** To the left edge of its column, or to the right. */
export const left = (text: string, width: number): string => {
  const cut = fitted(text, width);
  return cut + ' '.repeat(width - lengthOf(cut));
};
export const right = (text: string, width: number): string => {
  const cut = fitted(text, width);
  return ' '.repeat(width - lengthOf(cut)) + cut;
};

/** Broken at spaces into lines no wider than the terminal; a word too long for a line is broken where it must be. */
export function wrapped(text: string, indent = 0): string[] {
  const room = COLUMNS - indent;
  const lines: string[] = [];
  let line = '';
  for (const word of oneLine(text)
    .split(' ')
    .flatMap((each) => chunks(each, room))) {
    if (line && lengthOf(line) + 1 + lengthOf(word) > room) {
      lines.push(line);
      line = word;
    } else line = line ? `${line} ${word}` : word;
  }
  if (line) lines.push(line);
  return lines.map((each) => ' '.repeat(indent) + each);
}

function chunks(word: string, room: number): string[] {
  const letters = [...word];
  return Array.from({ length: Math.ceil(letters.length / room) }, (_, i) =>
    letters.slice(i * room, (i + 1) * room).join(''),
  );
}
