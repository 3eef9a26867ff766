/** The entries of the catalogue that a search means: every word typed stands somewhere in name, kind or note. */
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
  return entries.filter((entry) => {
    const text = `${entry.name} ${PART_WORDS[entry.kind]} ${entry.note}`.toLowerCase();
    return (kind === null || entry.kind === kind) && words.every((word) => text.includes(word));
  });
}
