/** The samples that come with the program, each fetched only when it is wanted. */
import { blankCraft } from '../craft/blank.ts';
import type { Craft } from '../craft/craft.ts';
import { parse } from '../craft/parse.ts';
import type { SampleEntry } from '../panels/CraftsDialog.tsx';

const files = import.meta.glob<string>('../../samples/*.json', { query: '?raw', import: 'default' });

/** The craft that a first visit opens on. */
const FIRST = 'museum-atrium';

const nameIn = (path: string): string =>
  path
    .split('/')
    .at(-1)!
    .replace(/\.json$/, '');

/** The text of a sample's craft file. */
export const sampleText = (name: string): Promise<string> =>
  files[`../../samples/${name}.json`]?.() ?? Promise.reject(new Error(`There is no sample ${name}.`));

/** Every sample with the first sentence of its notes. */
export async function sampleEntries(): Promise<SampleEntry[]> {
  const entries = await Promise.all(Object.keys(files).map((path) => sampleEntry(nameIn(path))));
  return entries.flat();
}

async function sampleEntry(id: string): Promise<SampleEntry[]> {
  const parsed = await sampleText(id).then(parse, () => null);
  return parsed?.ok ? [{ id, name: parsed.craft.name, note: firstSentence(parsed.craft.notes) }] : [];
}

export const firstSentence = (text: string): string => /^.*?[.!?](?=\s|$)/s.exec(text)?.[0] ?? text;

/** Without its sample, a first visit opens on an empty hull. */
export async function firstSample(): Promise<Craft> {
  const parsed = await sampleText(FIRST).then(parse, () => null);
  return parsed?.ok ? parsed.craft : blankCraft('New craft', { kind: 'spheroid', length: 3, diameter: 1 }, 3);
}
