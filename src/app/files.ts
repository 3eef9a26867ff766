/** Craft files: chosen, dropped and saved. */
import type { Craft } from '../craft/craft.ts';
import { serialize } from '../craft/serialize.ts';
import { fileName } from '../panels/ledger/download.ts';

const MIME = 'application/json';

/** Lets the builder choose a file. Resolves to null when none was chosen. */
export function chooseFile(accept = `.json,${MIME}`): Promise<File | null> {
  const input = Object.assign(document.createElement('input'), { type: 'file', accept });
  return new Promise((resolve) => {
    input.addEventListener('change', () => resolve(input.files?.[0] ?? null));
    input.addEventListener('cancel', () => resolve(null));
    input.click();
  });
}

/** What a browser with the File System Access API offers; not all have it. */
interface SavePicker {
  showSaveFilePicker?(options: {
    suggestedName: string;
    types: { description: string; accept: Record<string, string[]> }[];
  }): Promise<FileSystemFileHandle>;
}

export type Saved = { readonly as: string } | 'cancelled';

/**
 * Saves the craft to a file: to `handle` if there is one, else where the builder says, else as a download. Rejects
 * when the file could not be written.
 */
export async function saveCraft(
  craft: Craft,
  handle: FileSystemFileHandle | null,
): Promise<{ saved: Saved; handle: FileSystemFileHandle | null }> {
  const text = serialize(craft);
  const { showSaveFilePicker } = window as SavePicker;
  if (!handle && !showSaveFilePicker)
    return { saved: download(text, fileName(craft.name, 'json')), handle: null };
  const chosen = handle ?? (await askWhere(craft, showSaveFilePicker!));
  if (!chosen) return { saved: 'cancelled', handle };
  await write(chosen, text);
  return { saved: { as: chosen.name }, handle: chosen };
}

async function askWhere(craft: Craft, pick: NonNullable<SavePicker['showSaveFilePicker']>) {
  const types = [{ description: 'Steelyard craft', accept: { [MIME]: ['.json'] } }];
  try {
    return await pick.call(window, { suggestedName: fileName(craft.name, 'json'), types });
  } catch (error) {
    if ((error as DOMException).name === 'AbortError') return null;
    throw error;
  }
}

async function write(handle: FileSystemFileHandle, text: string): Promise<void> {
  const stream = await handle.createWritable();
  await stream.write(text);
  await stream.close();
}

export function download(text: string, name: string, type = MIME): Saved {
  const url = URL.createObjectURL(new Blob([text], { type }));
  Object.assign(document.createElement('a'), { href: url, download: name }).click();
  setTimeout(() => URL.revokeObjectURL(url), 10_000);
  return { as: name };
}
