/**
 * The entries of the catalogue that a search means: those that hold every word typed somewhere in name, kind or note. When
 * there are none, those that hold any of them, best first: a word in the name or the kind says more than one in the note.
 */
import type { PartEntry } from '../catalogue/schema.ts';
import type { PartKind } from '../craft/schema.ts';
import { PART_WORDS } from './words.ts';

/** `kind` null means all. */
export function foundParts(
  entries: readonly PartEntry[],
  search: string,
  kind: PartKind | null,
): PartEntry[] {
  const words = search.toLowerCase().split(/\s+/).filter(Boolean);
  const ofKind = entries.filter((entry) => kind === null || entry.kind === kind);
  const scored = ofKind.map((entry) => ({ entry, scores: words.map((word) => scoreOf(entry, word)) }));
  const all = scored.filter(({ scores }) => scores.every((score) => score > 0));
  if (all.length > 0) return all.map(({ entry }) => entry);
  const sum = (scores: readonly number[]) => scores.reduce((total, each) => total + each, 0);
  return scored
    .filter(({ scores }) => sum(scores) > 0)
    .sort((a, b) => sum(b.scores) - sum(a.scores))
    .map(({ entry }) => entry);
}

function scoreOf({ name, kind, note }: PartEntry, word: string): number {
  if (`${name} ${PART_WORDS[kind]}`.toLowerCase().includes(word)) return 2;
  return note.toLowerCase().includes(word) ? 1 : 0;
}
