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

/** "Atrium camera craft" → atrium-camera-craft.json; craft file and table of parts are called alike. */
export function fileName(name: string, extension: string): string {
  const plain = name
    .normalize('NFKD')
    .toLowerCase()
    .replace(/[\u0300-\u036f]/g, '')
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 60);
  return `${plain || 'craft'}.${extension}`;
}
