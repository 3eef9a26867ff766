/** The words for what a craft file names by key. */
import { SHAPE_KINDS, type ShapeKind } from '../craft/hullSchema.ts';
import { PLACE_KINDS, type PlaceKind } from '../craft/placeSchema.ts';
import { type Copies, MASS_SOURCES, type MassSource, PART_KINDS, type PartKind } from '../craft/schema.ts';

export const PART_WORDS: Readonly<Record<PartKind, string>> = {
  thruster: 'Thruster',
  gondola: 'Gondola',
  battery: 'Battery',
  fin: 'Fin',
  controller: 'Controller',
  servo: 'Servo',
  camera: 'Camera',
  sensor: 'Sensor',
  load: 'Useful load',
  ballast: 'Ballast',
  fitting: 'Fitting',
};

export const SOURCE_WORDS: Readonly<Record<MassSource, string>> = {
  catalogue: 'Catalogue',
  estimated: 'Estimated',
  weighed: 'Weighed',
};

export const PLACE_WORDS: Readonly<Record<PlaceKind, string>> = {
  skin: 'On the skin',
  keel: 'Below the keel',
  axis: 'On the axis',
  free: 'Free',
};

export const COPIES_WORDS: Readonly<Record<Copies['kind'], string>> = {
  together: 'Together',
  pair: 'Port–starboard pair',
  ring: 'Ring round the axis',
};

export const SHAPE_WORDS: Readonly<Record<ShapeKind, string>> = {
  spheroid: 'Spheroid',
  twoSpheroid: 'Two half-spheroids',
  naca4: 'NACA 4-digit thickness form',
  series58: 'Series 58',
  myring: 'Myring form',
  cylinder: 'Cylinder with shaped ends',
  offsets: 'Measured offsets',
  gores: 'Equal gores',
  twoSheet: 'Two flat sheets',
  roundTwoSheet: 'Round two-sheet balloon',
};

export interface Choice<T extends string> {
  readonly value: T;
  readonly label: string;
}

/** The choices of a select, in the order of the keys. */
export const choicesOf = <T extends string>(
  keys: readonly T[],
  words: Readonly<Record<T, string>>,
): Choice<T>[] => keys.map((value) => ({ value, label: words[value] }));

export const PART_CHOICES = choicesOf(PART_KINDS, PART_WORDS);
export const SOURCE_CHOICES = choicesOf(MASS_SOURCES, SOURCE_WORDS);
export const PLACE_CHOICES = choicesOf(PLACE_KINDS, PLACE_WORDS);
export const COPIES_CHOICES = choicesOf(['together', 'pair', 'ring'], COPIES_WORDS);
export const SHAPE_CHOICES = choicesOf(SHAPE_KINDS, SHAPE_WORDS);
