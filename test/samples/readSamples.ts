/** Every file of `samples/`, as it stands on the disk. */
import { readdirSync, readFileSync } from 'node:fs';
import type { Craft } from '../../src/craft/craft.ts';
import { parse } from '../../src/craft/parse.ts';
import { problemText } from '../../src/craft/problem.ts';

const folder = new URL('../../samples/', import.meta.url);

export interface Sample {
  readonly name: string;
  readonly text: string;
}

export const samples: readonly Sample[] = readdirSync(folder)
  .filter((file) => file.endsWith('.json'))
  .sort()
  .map((file) => ({ name: file.replace(/\.json$/, ''), text: readFileSync(new URL(file, folder), 'utf8') }));

export const sampleText = (name: string): string => samples.find((sample) => sample.name === name)!.text;

/** Any JSON of a sample, to be changed at will. */
// biome-ignore lint/suspicious/noExplicitAny: tests reach into files that are wrong on purpose
export const sampleJson = (name: string): any => JSON.parse(sampleText(name));

/** The craft of a text that ought to be a craft file. */
export function craftFrom(text: string): Craft {
  const parsed = parse(text);
  if (!parsed.ok) throw new Error(parsed.problems.map(problemText).join('\n'));
  return parsed.craft;
}

export const sampleCraft = (name: string): Craft => craftFrom(sampleText(name));
