/**
 * One hull form turned into another: length and greatest diameter are kept as far as both forms have them, so that
 * trying a form does not lose the hull.
 *
 *   Forms given by rows begin as the spheroid of that length and diameter. What a flat pattern is when inflated is
 *   taken here from its outline alone: r = girth / 2π, dx = √(ds² − dr²); a first guess, which the builder then mends.
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

const ROUND_SHRINK = 0.7627;
const ROWS = 21;
const GORES = 8;

const clamp = (value: number, least: number, most: number): number => Math.min(most, Math.max(least, value));
/** To a hundredth of a millimetre: nobody measures a hull finer, and files stay short. */
const tidy = (value: number): number => Math.round(value * 1e5) / 1e5 + 0;

/** `previous` itself when it already is of that kind. */
export function shapeAs(kind: ShapeKind, previous: HullShape): HullShape {
  if (previous.kind === kind) return previous;
  const { length, diameter } = extentOf(previous);
  return FORMS[kind]({
    length: tidy(clamp(length, 0.05, LIMITS.length)),
    diameter: tidy(clamp(diameter, 0.02, LIMITS.length)),
  });
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

const FORMS: Readonly<Record<ShapeKind, (extent: Extent) => HullShape>> = {
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
  offsets: (extent) => ({
    kind: 'offsets',
    along: 'station',
    across: 'diameter',
    rows: spheroidRows(extent).map(({ station, diameter }) => ({ at: tidy(station), size: tidy(diameter) })),
  }),
  gores: (extent) => ({ kind: 'gores', count: GORES, rows: pattern(extent, GORES) }),
  twoSheet: (extent) => ({ kind: 'twoSheet', rows: pattern(extent, 2) }),
  roundTwoSheet: ({ length }) => ({
    kind: 'roundTwoSheet',
    flatDiameter: tidy(clamp(length / ROUND_SHRINK, 0.05, LIMITS.length)),
    stance: 'lying',
  }),
};

/** A spheroid's section by section, closer together towards the tips. */
const spheroidRows = ({ length, diameter }: Extent) =>
  Array.from({ length: ROWS }, (_, i) => {
    const turn = (Math.PI * i) / (ROWS - 1);
    const edge = i === 0 || i === ROWS - 1;
    return { station: (length * (1 - Math.cos(turn))) / 2, diameter: edge ? 0 : diameter * Math.sin(turn) };
  });

/** The flat pattern of that spheroid in so many equal pieces, each as wide as its share of the girth; smaller where it would not fit in a craft file. */
function pattern(extent: Extent, pieces: number): PatternRow[] {
  let tape = 0;
  const rows = spheroidRows(extent).map((row, i, all) => {
    const before = all[i - 1] ?? row;
    tape += Math.hypot(row.station - before.station, (row.diameter - before.diameter) / 2);
    return { tape, width: (Math.PI * row.diameter) / pieces };
  });
  const scale = Math.min(1, LIMITS.length / Math.max(tape, ...rows.map(({ width }) => width)));
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
