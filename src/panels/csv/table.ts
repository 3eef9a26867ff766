/** Text from a spreadsheet as cells: commas, semicolons or tabs between them, as found. */
import Papa from 'papaparse';

export interface TableRow {
  /** Where it stands in the text, the first row being 1. */
  readonly number: number;
  readonly cells: readonly string[];
}

/** The rows that hold anything, cells trimmed. */
export function tableOf(text: string): TableRow[] {
  const { data } = Papa.parse<string[]>(text.replace(/^\uFEFF/, ''), {
    delimiter: text.includes('\t') ? '\t' : '',
    delimitersToGuess: [',', ';'],
  });
  return data
    .map((cells, index) => ({ number: index + 1, cells: cells.map((cell) => cell.trim()) }))
    .filter(({ cells }) => cells.some((cell) => cell !== ''));
}

/** Rows as comma-separated text, one line each. */
export const csvText = (rows: readonly (readonly string[])[]): string =>
  `${Papa.unparse(rows as string[][], { newline: '\r\n' })}\r\n`;

/**
 * A spreadsheet runs a cell that begins like a formula; an apostrophe before it keeps it text. One more is put before
 * those that stand there already, so that reading takes exactly one away.
 */
export const textCell = (text: string): string => (/^'*[=+\-@]/.test(text) ? `'${text}` : text);
export const cellText = (cell: string): string => (/^''*[=+\-@]/.test(cell) ? cell.slice(1) : cell);
