/** What stands in the corner during a drag: where the thing is, what it does, and how the craft floats now. */
import type { Place } from '../craft/placeSchema.ts';
import { formatQuantity } from '../units/format.ts';
import type { Grip } from './grip.ts';
import { insideLines } from './insideLines.ts';
import { type Geometry, geometryOf, rowValue, type Subject, type UnitSystem } from './subject.ts';
import { thrustReadout } from './thrustWords.ts';
import { floatWords, heelWords, momentWords, nameOfGrip, pitchWords } from './words.ts';

export interface Readout {
  /** The name of the thing. */
  readonly title: string;
  readonly lines: readonly string[];
}

const KEEL = Math.PI;

/** In the side view. Null when what is held is nowhere. */
export function sideReadout(subject: Subject, held: Grip): Readout | null {
  if (held.kind === 'thrust') return thrustReadout(subject, held.id, held.way);
  const geometry = geometryOf(subject.assessment);
  const about = geometry && aboutHeld(subject, geometry, held);
  if (!about) return null;
  return {
    title: nameOfGrip(subject.craft, held),
    lines: [...about, floatWords(subject.assessment, subject.units)],
  };
}

function aboutHeld(
  subject: Subject,
  geometry: Geometry,
  held: Exclude<Grip, { kind: 'thrust' }>,
): string[] | null {
  switch (held.kind) {
    case 'part':
      return aboutPart(subject, geometry, held.id, held.copy);
    case 'hardpoint':
      return aboutHardpoint(subject, geometry, held.id);
    case 'support':
      return aboutSupport(subject, geometry);
    case 'wire':
      return null;
    case 'wireEnd':
      return aboutWire(subject, geometry, held.id);
    case 'hull':
      return aboutHull(subject, geometry);
  }
}

function aboutPart(subject: Subject, geometry: Geometry, id: string, copy: number): string[] | null {
  const { craft, units } = subject;
  const { hull, cb, pieces, beam } = geometry;
  const piece = pieces.find((each) => each.part === id && each.copy === copy);
  const part = craft.parts.byId[id];
  if (!piece || !part) return null;
  const bar = beam.find((each) => each.kind === 'part' && each.id === id);
  const moment = bar ? [momentWords(bar.mass, bar.station - cb[0], units)] : [];
  const inside = insideLines(subject, geometry, { kind: 'part', id });
  return [...whereWords(units, hull, part.place, piece.middle[0]), ...moment, ...inside];
}

function whereWords(units: UnitSystem, hull: Geometry['hull'], place: Place, station: number): string[] {
  const length = (value: number) => formatQuantity(value, 'length', units);
  const clock = place.kind === 'skin' ? place.clock : KEEL;
  const along = `station ${length(station)} · tape ${length(hull.tapeAt(station, clock))}`;
  if (place.kind === 'keel')
    return [along, `${formatQuantity(place.drop, 'smallLength', units)} below the keel`];
  if (place.kind === 'skin') return [along, `clock angle ${formatQuantity(place.clock, 'angle', units)}`];
  return [along];
}

function aboutHardpoint(
  { craft, assessment, units }: Subject,
  { hull, hardpoints }: Geometry,
  id: string,
): string[] | null {
  const at = hardpoints.find(({ hardpoint }) => hardpoint === id)?.at;
  const hardpoint = craft.hardpoints.byId[id];
  if (!at || !hardpoint) return null;
  const lead = craft.leadAt === id ? rowValue(assessment, 'lead.mass') : null;
  const leadWords = lead === null ? [] : [`${formatQuantity(lead, 'mass', units)} of lead here levels it`];
  return [...whereWords(units, hull, hardpoint.place, at[0]), ...leadWords];
}

function aboutSupport({ craft, units, assessment }: Subject, { hull, support }: Geometry): string[] | null {
  if (!support || !craft.support) return null;
  const pitch = rowValue(assessment, 'support.pitch');
  const held = pitch === null ? [] : [`held here: ${pitchWords(pitch, units)}`];
  return [...whereWords(units, hull, craft.support, support[0]), ...held];
}

function aboutWire({ units }: Subject, { wires }: Geometry, id: string): string[] | null {
  const wire = wires.find((each) => each.wire === id);
  if (!wire) return null;
  return [
    `${formatQuantity(wire.length, 'length', units)} long, ${formatQuantity(wire.mass, 'mass', units)}`,
  ];
}

function aboutHull({ assessment, units }: Subject, { hull }: Geometry): string[] {
  const length = (value: number) => formatQuantity(value, 'length', units);
  const size = `${length(hull.length)} long · ${length(hull.height)} across`;
  const lift = rowValue(assessment, 'lift.gross');
  return [size, ...(lift === null ? [] : [`lifts ${formatQuantity(lift, 'mass', units)}`])];
}

/** In the front view: the side of it that can be seen there, and the heel. */
export function frontReadout({ craft, assessment, units }: Subject, held: Grip): Readout | null {
  const place = placeOf(craft, held);
  if (!place) return null;
  const heel = heelWords(rowValue(assessment, 'float.heel'), units);
  const lines = [...acrossWords(units, place), heel === 'even' ? 'floats even' : `heels ${heel}`];
  return { title: nameOfGrip(craft, held), lines };
}

function placeOf({ parts, hardpoints }: Subject['craft'], held: Grip): Place | null {
  if (held.kind === 'part') return parts.byId[held.id]?.place ?? null;
  return held.kind === 'hardpoint' ? (hardpoints.byId[held.id]?.place ?? null) : null;
}

function acrossWords(units: UnitSystem, place: Place): string[] {
  const small = (value: number) => formatQuantity(Math.abs(value), 'smallLength', units);
  switch (place.kind) {
    case 'skin':
      return [`clock angle ${formatQuantity(place.clock, 'angle', units)}`];
    case 'keel':
      return [`${small(place.drop)} below the keel`];
    case 'axis':
      return ['on the axis'];
    case 'free':
      return [
        `${small(place.y)} to ${place.y < 0 ? 'port' : 'starboard'}`,
        `${small(place.z)} ${place.z < 0 ? 'below' : 'above'} the axis`,
      ];
  }
}
