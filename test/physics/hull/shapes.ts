/** One or two hulls of every form, invented, for checks that must hold for all of them. */
import type { HullShape } from '../../../src/craft/hullSchema.ts';

export const SHAPES: readonly HullShape[] = [
  { kind: 'spheroid', length: 3, diameter: 1 },
  { kind: 'spheroid', length: 0.8, diameter: 1.1 },
  { kind: 'twoSpheroid', foreLength: 1.2, aftLength: 2.6, diameter: 1 },
  { kind: 'naca4', length: 3.2, diameter: 0.8, tail: 'open' },
  { kind: 'naca4', length: 5, diameter: 0.9, tail: 'closed' },
  {
    kind: 'series58',
    length: 4,
    diameter: 1,
    widest: 0.4,
    noseRadius: 0.5,
    tailRadius: 0.1,
    prismatic: 0.65,
  },
  { kind: 'series58', length: 4, diameter: 1, widest: 0.4, noseRadius: 0, tailRadius: 0, prismatic: 0.6 },
  {
    kind: 'myring',
    noseLength: 0.6,
    middleLength: 0.7,
    tailLength: 1.1,
    diameter: 0.5,
    nosePower: 2,
    tailAngle: 0.4,
    noseOffset: 0.02,
    tailOffset: 0.08,
  },
  {
    kind: 'myring',
    noseLength: 0.6,
    middleLength: 0,
    tailLength: 1.1,
    diameter: 0.5,
    nosePower: 1.3,
    tailAngle: 0.1,
    noseOffset: 0,
    tailOffset: 0,
  },
  {
    kind: 'cylinder',
    diameter: 0.6,
    noseEnd: 'ellipsoid',
    noseLength: 0.5,
    middleLength: 1.4,
    tailEnd: 'cone',
    tailLength: 0.9,
  },
  {
    kind: 'cylinder',
    diameter: 0.6,
    noseEnd: 'flat',
    noseLength: 0,
    middleLength: 1.4,
    tailEnd: 'ogive',
    tailLength: 0.9,
  },
  {
    kind: 'offsets',
    along: 'station',
    across: 'diameter',
    rows: rows([0, 0.1, 0.4, 1, 1.8, 2.6, 3], [0, 0.38, 0.66, 0.9, 0.84, 0.44, 0.06]),
  },
  {
    kind: 'offsets',
    along: 'tape',
    across: 'girth',
    rows: rows([0, 0.1, 0.3, 0.6, 1, 1.6, 2.4, 3], [0, 0.6, 1.5, 2.2, 2.8, 2.9, 1.6, 0]),
  },
  { kind: 'gores', count: 6, rows: pattern([0, 0.2, 0.6, 1.2, 2, 2.6], [0, 0.2, 0.5, 0.6, 0.4, 0]) },
  { kind: 'gores', count: 4, rows: pattern([0, 0.2, 0.6, 1.2, 2, 2.6], [0, 0.6, 0.7, 0.8, 0.7, 0.3]) },
  { kind: 'twoSheet', rows: pattern([0, 0.1, 0.4, 0.9, 1.4, 1.5], [0, 0.3, 0.5, 0.5, 0.3, 0]) },
  { kind: 'roundTwoSheet', flatDiameter: 0.9, stance: 'lying' },
  { kind: 'roundTwoSheet', flatDiameter: 0.9, stance: 'standing' },
];

function rows(at: readonly number[], size: readonly number[]) {
  return at.map((place, i) => ({ at: place, size: size[i]! }));
}

function pattern(tape: readonly number[], width: readonly number[]) {
  return tape.map((place, i) => ({ tape: place, width: width[i]! }));
}

/** What a test is called for a shape. */
export const nameOf = (shape: HullShape): string => `${shape.kind} ${JSON.stringify(shape).length}`;

const LENGTHS = new Set([
  ...['length', 'diameter', 'foreLength', 'aftLength', 'noseLength', 'middleLength', 'tailLength'],
  ...['noseOffset', 'tailOffset', 'flatDiameter', 'at', 'size', 'tape', 'width'],
]);

/** The same form k times as large: every length in it, whatever the form. */
export function enlarged<T>(shape: T, k: number): T {
  return JSON.parse(JSON.stringify(shape), (key, value) =>
    LENGTHS.has(key) && typeof value === 'number' ? k * value : value,
  );
}
