/** A new craft from the few things that are asked for. Pure. */
import { blankCraft } from '../craft/blank.ts';
import type { ShapeKind } from '../craft/hullSchema.ts';
import { type Parsed, parseJson } from '../craft/parse.ts';
import type { Place, PlaceKind } from '../craft/placeSchema.ts';
import type { PartKind } from '../craft/schema.ts';
import { fileOf } from '../craft/serialize.ts';
import { addPart } from '../edit/edits/parts.ts';
import { run } from '../edit/history.ts';
import { shapeAs } from '../edit/shapeAs.ts';
import { blankPart } from './defaults.ts';

export interface FirstPart {
  readonly name: string;
  readonly kind: PartKind;
  readonly place: PlaceKind;
  /** kg; null means that there is no first part yet. */
  readonly mass: number | null;
  /** m; null means half the length. */
  readonly station: number | null;
}

export interface NewCraft {
  readonly name: string;
  /** m */
  readonly length: number;
  readonly diameter: number;
  readonly shape: ShapeKind;
  readonly part: FirstPart;
}

/** Through the loading gate, so that the problems name what is wrong. */
export function newCraft({ name, length, diameter, shape, part }: NewCraft): Parsed {
  const plain = blankCraft(name, { kind: 'spheroid', length, diameter }, length);
  const problems = parseJson(fileOf(plain));
  if (!problems.ok) return problems;
  const shaped = blankCraft(name, shapeAs(shape, plain.hull.shape), length);
  if (part.mass === null) return { ok: true, craft: shaped };
  const fields = {
    ...blankPart(placeAt(part.place, part.station ?? length / 2)),
    name: part.name,
    kind: part.kind,
    mass: part.mass,
  };
  return parseJson(fileOf(run(shaped, addPart(fields).recipe).craft));
}

/** On the skin it sits at the keel, until somebody says otherwise. */
function placeAt(kind: PlaceKind, station: number): Place {
  switch (kind) {
    case 'skin':
      return { kind, station, clock: Math.PI, standoff: 0 };
    case 'keel':
      return { kind, station, drop: 0 };
    case 'axis':
      return { kind, station };
    case 'free':
      return { kind, x: station, y: 0, z: 0 };
  }
}
