/** Hands a text to the browser as a file. */

/** The byte order mark tells spreadsheets that the text is UTF-8. */
export function download(name: string, type: string, text: string): void {
  const url = URL.createObjectURL(new Blob(['\uFEFF', text], { type: `${type};charset=utf-8` }));
  const link = document.createElement('a');
  link.href = url;
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(url), 60_000);
}

/** A file name from the name of a craft, without what file systems dislike. */
export const fileName = (name: string, extension: string): string =>
  `${name.replace(/[^\p{L}\p{N} _-]+/gu, '').trim() || 'craft'}.${extension}`;
