/**
 * The hull shape after its tail end or its waist was dragged. Forms given by length and diameter take the asked
 * value as it is. A parallel middle takes up the length while it lasts; then nose and tail shrink in proportion. A
 * measured hull stretches along its stations; measured by tape, and all flat patterns, it grows in proportion, for
 * neither a tape nor film stretches one way only. Widening a pattern widens its panels and keeps the meridian.
 */
import type { HullShape } from '../craft/hullSchema.ts';

type ShapeOf<K extends HullShape['kind']> = Extract<HullShape, { kind: K }>;

const LEAST_LENGTH = 0.1;
const LEAST_DIAMETER = 0.05;
/** Well inside what the craft file holds, so that tape lengths, girths and flat widths stay inside it too. */
const GREATEST_LENGTH = 30;
const GREATEST_DIAMETER = 15;
const LEAST_PIECE = 0.02;

const tidy = (value: number): number => Math.round(value * 1e9) / 1e9;
const clamp = (value: number, low: number, high: number): number => Math.min(high, Math.max(low, value));

/** The shape at a wanted length, given the length it has now, m. */
export function withLength(shape: HullShape, now: number, wanted: number): HullShape {
  const length = clamp(wanted, LEAST_LENGTH, GREATEST_LENGTH);
  const ratio = length / now;
  switch (shape.kind) {
    case 'spheroid':
    case 'naca4':
    case 'series58':
      return { ...shape, length: tidy(length) };
    case 'twoSpheroid':
      return withAftEnd(shape, length);
    case 'myring':
      return myringOf(shape, length);
    case 'cylinder':
      return cylinderOf(shape, length);
    case 'offsets':
      return offsetsOf(shape, ratio, shape.along === 'tape' ? ratio : 1);
    case 'gores':
    case 'twoSheet':
      return patternOf(shape, ratio, ratio);
    case 'roundTwoSheet':
      return { ...shape, flatDiameter: tidy(shape.flatDiameter * ratio) };
  }
}

/** The shape at a wanted greatest diameter (height), given the one it has now, m. */
export function withDiameter(shape: HullShape, now: number, wanted: number): HullShape {
  const diameter = clamp(wanted, LEAST_DIAMETER, GREATEST_DIAMETER);
  const ratio = diameter / now;
  switch (shape.kind) {
    case 'offsets':
      return offsetsOf(shape, 1, ratio);
    case 'gores':
    case 'twoSheet':
      return patternOf(shape, 1, ratio);
    case 'roundTwoSheet':
      return { ...shape, flatDiameter: tidy(shape.flatDiameter * ratio) };
    default:
      return { ...shape, diameter: tidy(diameter) };
  }
}

function withAftEnd(shape: ShapeOf<'twoSpheroid'>, length: number): HullShape {
  const aftLength = length - shape.foreLength;
  if (aftLength >= LEAST_PIECE) return { ...shape, aftLength: tidy(aftLength) };
  return { ...shape, foreLength: tidy(length - LEAST_PIECE), aftLength: LEAST_PIECE };
}

function myringOf(shape: ShapeOf<'myring'>, length: number): HullShape {
  const ends = shape.noseLength - shape.noseOffset + shape.tailLength - shape.tailOffset;
  if (length >= ends) return { ...shape, middleLength: tidy(length - ends) };
  const ratio = length / ends;
  return {
    ...shape,
    middleLength: 0,
    noseLength: tidy(shape.noseLength * ratio),
    noseOffset: tidy(shape.noseOffset * ratio),
    tailLength: tidy(shape.tailLength * ratio),
    tailOffset: tidy(shape.tailOffset * ratio),
  };
}

function cylinderOf(shape: ShapeOf<'cylinder'>, length: number): HullShape {
  // The length of a flat end is not used.
  const nose = shape.noseEnd === 'flat' ? 0 : shape.noseLength;
  const tail = shape.tailEnd === 'flat' ? 0 : shape.tailLength;
  if (length >= nose + tail) return { ...shape, middleLength: tidy(length - nose - tail) };
  const ratio = length / (nose + tail);
  return {
    ...shape,
    middleLength: 0,
    noseLength: tidy(shape.noseLength * ratio),
    tailLength: tidy(shape.tailLength * ratio),
  };
}

const offsetsOf = (shape: ShapeOf<'offsets'>, along: number, across: number): HullShape => ({
  ...shape,
  rows: shape.rows.map(({ at, size }) => ({ at: tidy(at * along), size: tidy(size * across) })),
});

const patternOf = (
  shape: ShapeOf<'gores'> | ShapeOf<'twoSheet'>,
  along: number,
  across: number,
): HullShape => ({
  ...shape,
  rows: shape.rows.map(({ tape, width }) => ({ tape: tidy(tape * along), width: tidy(width * across) })),
});
