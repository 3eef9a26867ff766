/** What is selected: parts, wire runs and hardpoints, in the order they were picked. */
import type { Craft } from '../craft/craft.ts';

export type Selectable = {
  readonly kind: 'part' | 'wire' | 'hardpoint';
  readonly id: string;
};

export type Selection = readonly Selectable[];

export const sameThing = (a: Selectable, b: Selectable): boolean => a.kind === b.kind && a.id === b.id;

export const isSelected = (selection: Selection, thing: Selectable): boolean =>
  selection.some((each) => sameThing(each, thing));

/** Adds the thing, or takes it out when it is in. */
export const toggled = (selection: Selection, thing: Selectable): Selection =>
  isSelected(selection, thing) ? selection.filter((each) => !sameThing(each, thing)) : [...selection, thing];

/** Ids of one kind. */
export const idsOf = (selection: Selection, kind: Selectable['kind']): string[] =>
  selection.filter((each) => each.kind === kind).map((each) => each.id);

const WORDS = { part: 'part', wire: 'wire run', hardpoint: 'hardpoint' } as const;

/** "Camera" of one thing, "3 parts" of several: for labels. */
export function called(craft: Craft, kind: Selectable['kind'], ids: readonly string[]): string {
  const [only] = ids;
  if (only === undefined || ids.length > 1) return `${ids.length} ${WORDS[kind]}s`;
  return craft[`${kind}s`].byId[only]?.name || WORDS[kind];
}

/** Without what the craft no longer has. */
export function pruned(selection: Selection, craft: Craft): Selection {
  const kept = selection.filter(({ kind, id }) => Object.hasOwn(craft[`${kind}s`].byId, id));
  return kept.length === selection.length ? selection : kept;
}
