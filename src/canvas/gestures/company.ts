/** What goes along when one selected thing is dragged: the other selected parts and hardpoints, and the wire runs joined to them. */
import type { Craft } from '../../craft/craft.ts';
import { listed } from '../../craft/craft.ts';
import type { Place } from '../../craft/placeSchema.ts';
import { idsOf, type Selection } from '../../edit/selection.ts';
import { keyOf } from '../../scene/grip.ts';

export interface Company {
  readonly parts: readonly string[];
  readonly hardpoints: readonly string[];
  /** Keys of all that will look different: these and their wire runs. */
  readonly keys: ReadonlySet<string>;
}

/** Locked parts stay behind. */
export function companyOf(craft: Craft, selection: Selection): Company {
  const parts = idsOf(selection, 'part').filter((id) => !craft.parts.byId[id]!.locked);
  const hardpoints = idsOf(selection, 'hardpoint');
  const wires = listed(craft.wires).filter(({ from, to }) =>
    [from, to].some((end) => end.kind === 'part' && parts.includes(end.part)),
  );
  const keys = new Set([
    ...parts.map((id) => keyOf('part', id)),
    ...hardpoints.map((id) => keyOf('hardpoint', id)),
    ...wires.map(({ id }) => keyOf('wire', id)),
  ]);
  return { parts, hardpoints, keys };
}

export const sizeOf = ({ parts, hardpoints }: Company): number => parts.length + hardpoints.length;

export const placesOf = (craft: Craft, { parts, hardpoints }: Company): Place[] => [
  ...parts.map((id) => craft.parts.byId[id]!.place),
  ...hardpoints.map((id) => craft.hardpoints.byId[id]!.place),
];
