/**
 * The entries of the catalogue that a search means: those that hold every word typed somewhere in name, kind or note; when
 * there are none, those that hold any of them. Best first: a whole word of name or kind says more than a piece of one, and
 * that more than one in the note.
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
  const scored = ofKind
    .map((entry) => ({ entry, scores: words.map((word) => scoreOf(entry, word)) }))
    .sort((a, b) => sum(b.scores) - sum(a.scores));
  const all = scored.filter(({ scores }) => scores.every((score) => score > 0));
  const any = scored.filter(({ scores }) => scores.some((score) => score > 0));
  return (all.length > 0 ? all : any).map(({ entry }) => entry);
}

const sum = (scores: readonly number[]): number => scores.reduce((total, each) => total + each, 0);

function scoreOf({ name, kind, note }: PartEntry, word: string): number {
  const called = `${name} ${PART_WORDS[kind]}`.toLowerCase();
  if (called.split(/[^\p{L}\p{N}]+/u).includes(word)) return 3;
  if (called.includes(word)) return 2;
  return note.toLowerCase().includes(word) ? 1 : 0;
}
