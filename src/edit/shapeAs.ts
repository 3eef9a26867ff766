/**
 * One hull form turned into another: length and greatest diameter are kept as far as both forms have them, so that
 * trying a form does not lose the hull.
 *
 *   Forms given by rows trace the outline of the hull as it is; without one, the spheroid of that length and diameter.
 *   What a flat pattern is when inflated is taken here from its rows alone: r = girth / 2π, dx = √(ds² − dr²); a first
 *   guess, which the builder then mends.
 *   Round two-sheet balloon: inflated diameter 0.7627 of the flat one (Paulsen 1994, The American Mathematical Monthly
 *   101, 953; the figure from memory).
 */
import type { HullShape, ShapeKind } from '../craft/hullSchema.ts';
import { LIMITS } from '../craft/quantities.ts';

export interface Extent {
  /** Nose tip to tail tip, m. */
  readonly length: number;
  /** Greatest diameter, m. */
  readonly diameter: number;
}

/** The outline of a hull along its keel, m. */
export interface Outline {
  /** Tape distance of the tail tip. */
  readonly tape: number;
  radius(station: number): number;
  stationAt(tape: number): number;
}

const ROUND_SHRINK = 0.7627;
const ROWS = 21;
const GORES = 8;

const clamp = (value: number, least: number, most: number): number => Math.min(most, Math.max(least, value));
/** To a hundredth of a millimetre: nobody measures a hull finer, and files stay short. */
const tidy = (value: number): number => Math.round(value * 1e5) / 1e5 + 0;

/** `previous` itself when it already is of that kind. */
export function shapeAs(kind: ShapeKind, previous: HullShape, outline: Outline | null = null): HullShape {
  if (previous.kind === kind) return previous;
  const found = extentOf(previous);
  const extent = {
    length: tidy(clamp(found.length, 0.05, LIMITS.length)),
    diameter: tidy(clamp(found.diameter, 0.02, LIMITS.length)),
  };
  return FORMS[kind](extent, outline ? traced(outline) : spheroidSections(extent));
}

/** Length and greatest diameter of a form, m; of flat patterns roughly, see above. */
export function extentOf(shape: HullShape): Extent {
  switch (shape.kind) {
    case 'spheroid':
    case 'naca4':
    case 'series58':
      return { length: shape.length, diameter: shape.diameter };
    case 'twoSpheroid':
      return { length: shape.foreLength + shape.aftLength, diameter: shape.diameter };
    case 'myring':
      return {
        length:
          shape.noseLength + shape.middleLength + shape.tailLength - shape.noseOffset - shape.tailOffset,
        diameter: shape.diameter,
      };
    case 'cylinder':
      return { length: shape.noseLength + shape.middleLength + shape.tailLength, diameter: shape.diameter };
    case 'offsets':
      return offsetsExtent(shape);
    case 'gores':
      return outlineExtent(shape.rows, shape.count / Math.PI);
    case 'twoSheet':
      return outlineExtent(shape.rows, 2 / Math.PI);
    case 'roundTwoSheet':
      return { length: ROUND_SHRINK * shape.flatDiameter, diameter: ROUND_SHRINK * shape.flatDiameter };
  }
}

function offsetsExtent({ along, across, rows }: Extract<HullShape, { kind: 'offsets' }>): Extent {
  const perDiameter = across === 'girth' ? 1 / Math.PI : 1;
  if (along === 'tape') {
    const asPattern = rows.map(({ at, size }) => ({ tape: at, width: size }));
    return outlineExtent(asPattern, perDiameter);
  }
  return {
    length: rows.at(-1)!.at - rows[0]!.at,
    diameter: perDiameter * Math.max(...rows.map(({ size }) => size)),
  };
}

interface PatternRow {
  readonly tape: number;
  readonly width: number;
}

/** Extent of a surface of revolution of which tape distance and (in proportion) diameter are known. */
function outlineExtent(rows: readonly PatternRow[], diameterPerWidth: number): Extent {
  const length = rows.slice(1).reduce((sum, row, i) => {
    const before = rows[i]!;
    const along = row.tape - before.tape;
    const out = (diameterPerWidth * (row.width - before.width)) / 2;
    return sum + Math.sqrt(Math.max(0, along ** 2 - out ** 2));
  }, 0);
  return { length, diameter: diameterPerWidth * Math.max(...rows.map(({ width }) => width)) };
}

const FORMS: Readonly<Record<ShapeKind, (extent: Extent, sections: readonly Section[]) => HullShape>> = {
  spheroid: (extent) => ({ kind: 'spheroid', ...extent }),
  twoSpheroid: ({ length, diameter }) => ({
    kind: 'twoSpheroid',
    foreLength: length / 2,
    aftLength: length / 2,
    diameter,
  }),
  naca4: (extent) => ({ kind: 'naca4', ...extent, tail: 'closed' }),
  // A middling body of the series: widest at 0.4, a blunt nose, a finer tail.
  series58: (extent) => ({
    kind: 'series58',
    ...extent,
    widest: 0.4,
    noseRadius: 0.5,
    tailRadius: 0.1,
    prismatic: 0.65,
  }),
  myring: ({ length, diameter }) => ({
    kind: 'myring',
    noseLength: tidy(0.25 * length),
    middleLength: tidy(length - tidy(0.25 * length) - tidy(0.5 * length)),
    tailLength: tidy(0.5 * length),
    diameter,
    nosePower: 2,
    tailAngle: Math.PI / 9,
    noseOffset: 0,
    tailOffset: 0,
  }),
  cylinder: ({ length, diameter }) => {
    const end = tidy(Math.min(diameter, length / 2.5));
    const middleLength = tidy(length - 2 * end);
    return {
      kind: 'cylinder',
      diameter,
      noseEnd: 'ellipsoid',
      noseLength: end,
      middleLength,
      tailEnd: 'ellipsoid',
      tailLength: end,
    };
  },
  offsets: (_, sections) => ({
    kind: 'offsets',
    along: 'station',
    across: 'diameter',
    rows: sections.map(({ station, diameter }) => ({ at: tidy(station), size: tidy(diameter) })),
  }),
  gores: (_, sections) => ({ kind: 'gores', count: GORES, rows: pattern(sections, GORES) }),
  twoSheet: (_, sections) => ({ kind: 'twoSheet', rows: pattern(sections, 2) }),
  roundTwoSheet: ({ length }) => ({
    kind: 'roundTwoSheet',
    flatDiameter: tidy(clamp(length / ROUND_SHRINK, 0.05, LIMITS.length)),
    stance: 'lying',
  }),
};

interface Section {
  readonly station: number;
  readonly tape: number;
  readonly diameter: number;
}

/** From 0 to 1, closer together towards the ends, where outlines bend. */
const SPACING = Array.from({ length: ROWS }, (_, i) => (1 - Math.cos((Math.PI * i) / (ROWS - 1))) / 2);

const traced = ({ tape, radius, stationAt }: Outline): Section[] =>
  SPACING.map((share) => {
    const station = stationAt(share * tape);
    const tip = share === 0 || share === 1;
    return { station, tape: share * tape, diameter: tip ? 0 : 2 * radius(station) };
  });

function spheroidSections({ length, diameter }: Extent): Section[] {
  let [tape, x, r] = [0, 0, 0];
  return SPACING.map((share) => {
    const station = share * length;
    const radius = diameter * Math.sqrt(share * (1 - share));
    tape += Math.hypot(station - x, radius - r);
    [x, r] = [station, radius];
    return { station, tape, diameter: 2 * radius };
  });
}

/** The flat pattern in so many equal pieces, each as wide as its share of the girth; smaller where it would not fit in a craft file. */
function pattern(sections: readonly Section[], pieces: number): PatternRow[] {
  const rows = sections.map(({ tape, diameter }) => ({ tape, width: (Math.PI * diameter) / pieces }));
  const scale = Math.min(1, LIMITS.length / Math.max(...rows.flatMap(({ tape, width }) => [tape, width])));
  return rows.map((row) => ({ tape: tidy(scale * row.tape), width: tidy(scale * row.width) }));
}

/** The rows with one more after `index`, half way to the next; after the last, as far on again. */
export function withRowAfter<T extends Readonly<Record<string, number>>>(
  rows: readonly T[],
  index: number,
): T[] {
  const here = rows[index]!;
  const next = rows[index + 1];
  const before = rows[index - 1] ?? here;
  const between = Object.fromEntries(
    Object.entries(here).map(([key, value]) => [
      key,
      next ? tidy((value + next[key]!) / 2) : tidy(Math.max(0, 2 * value - before[key]!)),
    ]),
  ) as T;
  return rows.toSpliced(index + 1, 0, between);
}
