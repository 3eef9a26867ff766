/** A table pasted onto the page, when no field is there to take it: it is looked at before its parts are added. */
import { tableOf } from '../panels/csv/table.ts';
import { inText } from './keyboard.ts';

/** Whether a text has rows of cells; a sentence or a craft file has none. */
export const isTable = (text: string): boolean =>
  !text.trimStart().startsWith('{') && tableOf(text).some(({ cells }) => cells.length > 1);

/** Starts taking pasted tables; returns how to stop. */
export function takePastes(take: (text: string) => void): () => void {
  const onPaste = (event: ClipboardEvent) => {
    if (inText(event.target) || document.querySelector('dialog[open]')) return;
    const text = event.clipboardData?.getData('text/plain') ?? '';
    if (!isTable(text)) return;
    event.preventDefault();
    take(text);
  };
  document.addEventListener('paste', onPaste);
  return () => document.removeEventListener('paste', onPaste);
}
