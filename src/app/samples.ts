/** The samples that come with the program, each fetched only when it is wanted. */
import { blankCraft } from '../craft/blank.ts';
import type { Craft } from '../craft/craft.ts';
import { parse } from '../craft/parse.ts';

const files = import.meta.glob<string>('../../samples/*.json', { query: '?raw', import: 'default' });

/** The craft that a first visit opens on. */
const FIRST = 'museum-atrium';

/** "museum-atrium", … in the order of the alphabet. */
export const sampleNames: readonly string[] = Object.keys(files).map((path) =>
  path
    .split('/')
    .at(-1)!
    .replace(/\.json$/, ''),
);

/** The text of a sample's craft file. */
export const sampleText = (name: string): Promise<string> =>
  files[`../../samples/${name}.json`]?.() ?? Promise.reject(new Error(`There is no sample ${name}.`));

/** Without its sample, a first visit opens on an empty hull. */
export async function firstSample(): Promise<Craft> {
  const parsed = await sampleText(FIRST).then(parse, () => null);
  return parsed?.ok ? parsed.craft : blankCraft('New craft', { kind: 'spheroid', length: 3, diameter: 1 }, 3);
}
