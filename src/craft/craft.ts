/** A craft in memory: as in the file, but with lists keyed by id so that an edit touches one entry. */
import type { Load } from './planningSchema.ts';
import type { CraftFile, Hardpoint, Part, WireRun } from './schema.ts';

/** Entries by id, and the order in which the builder wants to see them. Each id stands once in both. */
export interface Keyed<T> {
  byId: Record<string, T>;
  order: string[];
}

export interface Craft extends Omit<CraftFile, 'steelyard' | 'parts' | 'wires' | 'hardpoints' | 'loads'> {
  parts: Keyed<Part>;
  wires: Keyed<WireRun>;
  hardpoints: Keyed<Hardpoint>;
  loads: Keyed<Load>;
}

export const keyed = <T extends { id: string }>(items: readonly T[]): Keyed<T> => ({
  byId: Object.fromEntries(items.map((item) => [item.id, item])),
  order: items.map((item) => item.id),
});

/** The entries in order. */
export const listed = <T>(items: Keyed<T>): T[] => items.order.map((id) => items.byId[id]!);

export const craftOf = ({ steelyard: _, ...file }: CraftFile): Craft => ({
  ...file,
  parts: keyed(file.parts),
  wires: keyed(file.wires),
  hardpoints: keyed(file.hardpoints),
  loads: keyed(file.loads),
});

/** The hardpoint on which the least lead is worked out. */
export const leadHardpoint = (craft: Craft): Hardpoint => craft.hardpoints.byId[craft.leadAt]!;
