/** What a new thing is until the builder says otherwise. */
import type { PartEntry } from '../catalogue/schema.ts';
import { fixedThruster } from '../craft/firstFigures.ts';
import type { Place } from '../craft/placeSchema.ts';
import type { PartFields } from '../edit/edits/parts.ts';
import type { WireFields } from '../edit/edits/wires.ts';
import type { Assessment } from '../report/assessment.ts';

/** On the keel under the CB to the millimetre, where a weight tips nothing; at the nose while the hull cannot be formed. */
export const defaultPlace = ({ geometry }: Assessment): Place => ({
  kind: 'keel',
  station: geometry.status === 'solved' ? Number(geometry.hull.cbStation.toFixed(3)) : 0,
  drop: 0,
});

/** m; null while the hull cannot be formed. */
export const hullLengthOf = ({ geometry }: Assessment): number | null =>
  geometry.status === 'solved' ? geometry.hull.length : null;

export const blankPart = (place: Place): PartFields => ({
  kind: 'load',
  name: 'New part',
  mass: 0,
  massTolerance: 0,
  massSource: 'estimated',
  place,
  copies: { kind: 'together', count: 1 },
  size: { length: 0.05, width: 0.04, height: 0.03 },
  cgOffset: 0,
  locked: false,
  slide: null,
  thruster: null,
  fin: null,
  dragArea: null,
  notes: '',
});

export function partFrom(entry: PartEntry, place: Place): PartFields {
  const { name, kind, mass, massTolerance, size, thruster, fin } = entry;
  return {
    ...blankPart(place),
    name,
    kind,
    mass,
    massTolerance,
    massSource: 'catalogue',
    size: { ...size },
    thruster: thruster ? fixedThruster(thruster) : null,
    fin: fin ? { ...fin } : null,
  };
}

/** A pair of thin conductors along the keel, its ends loose. */
export const blankWire = (place: Place, massPerMetre: number): WireFields => ({
  name: 'New wire run',
  from: { kind: 'loose', place },
  to: { kind: 'loose', place },
  path: { kind: 'skin', clock: Math.PI },
  massPerMetre,
  conductors: 2,
  slack: 0.05,
  notes: '',
});
