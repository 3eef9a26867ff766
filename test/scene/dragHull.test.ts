import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type HullShape, SHAPE_KINDS, shapeSchema } from '../../src/craft/hullSchema.ts';
import { hullOf } from '../../src/physics/hull/hullOf.ts';
import { withDiameter, withLength } from '../../src/scene/dragHull.ts';

const lens = [0, 0.25, 0.5, 0.75, 1];
const profile = lens.map((at) => Math.sqrt(Math.max(0, 1 - (2 * at - 1) ** 2)));

const SHAPES: readonly HullShape[] = [
  { kind: 'spheroid', length: 3, diameter: 1 },
  { kind: 'twoSpheroid', foreLength: 1.2, aftLength: 1.8, diameter: 1 },
  { kind: 'naca4', length: 3, diameter: 0.8, tail: 'closed' },
  {
    kind: 'series58',
    length: 3,
    diameter: 0.7,
    widest: 0.4,
    noseRadius: 0.5,
    tailRadius: 0.1,
    prismatic: 0.65,
  },
  {
    kind: 'myring',
    ...{ noseLength: 0.8, middleLength: 0.9, tailLength: 1.3, diameter: 1, nosePower: 2 },
    ...{ tailAngle: 0.4, noseOffset: 0.05, tailOffset: 0.1 },
  },
  {
    kind: 'cylinder',
    ...{
      diameter: 0.8,
      noseEnd: 'ellipsoid',
      noseLength: 0.6,
      middleLength: 1,
      tailEnd: 'cone',
      tailLength: 1.2,
    },
  },
  {
    kind: 'cylinder',
    ...{
      diameter: 0.8,
      noseEnd: 'flat',
      noseLength: 0.6,
      middleLength: 1,
      tailEnd: 'ellipsoid',
      tailLength: 1.2,
    },
  },
  {
    kind: 'offsets',
    along: 'station',
    across: 'diameter',
    rows: lens.map((at, i) => ({ at: 3 * at, size: profile[i]! })),
  },
  {
    kind: 'offsets',
    along: 'tape',
    across: 'girth',
    rows: lens.map((at, i) => ({ at: 3.4 * at, size: 2.4 * profile[i]! })),
  },
  { kind: 'gores', count: 6, rows: lens.map((at, i) => ({ tape: 3.2 * at, width: 0.45 * profile[i]! })) },
  { kind: 'twoSheet', rows: lens.map((at, i) => ({ tape: 3.2 * at, width: 1.1 * profile[i]! })) },
  { kind: 'roundTwoSheet', flatDiameter: 1, stance: 'lying' },
];

const formed = (shape: HullShape) => {
  const hull = hullOf(shape);
  if (hull.status !== 'solved') throw new Error(hull.why);
  return hull.value;
};

const name = (shape: HullShape) =>
  shape.kind === 'offsets'
    ? `offsets by ${shape.along}`
    : shape.kind === 'cylinder'
      ? `cylinder, ${shape.noseEnd}`
      : shape.kind;

test('every kind of shape is tried', () => {
  expect(new Set(SHAPES.map(({ kind }) => kind))).toEqual(new Set(SHAPE_KINDS));
});

test.each(SHAPES.map((shape) => [name(shape), shape] as const))(
  '%s reaches the length asked for',
  (_, shape) => {
    const { length } = formed(shape);
    fc.assert(
      fc.property(fc.double({ min: 0.75, max: 2, noNaN: true }), (ratio) => {
        const longer = withLength(shape, length, length * ratio);
        expect(shapeSchema.safeParse(longer).error).toBeUndefined();
        expect(formed(longer).length / (length * ratio)).toBeCloseTo(1, 6);
      }),
      { numRuns: 12 },
    );
  },
);

test.each(SHAPES.map((shape) => [name(shape), shape] as const))(
  '%s reaches the diameter asked for',
  (_, shape) => {
    const { height } = formed(shape);
    for (const ratio of [0.8, 1.15]) {
      const wider = withDiameter(shape, height, height * ratio);
      expect(shapeSchema.safeParse(wider).error).toBeUndefined();
      // The thickness that names a NACA 4-digit form is its greatest only to about a part in ten thousand.
      expect(formed(wider).height / (height * ratio)).toBeCloseTo(1, shape.kind === 'naca4' ? 3 : 6);
    }
  },
);

test('a parallel middle gives way first, then the ends in proportion', () => {
  const shape = SHAPES.find(({ kind }) => kind === 'cylinder')!;
  expect(withLength(shape, 2.8, 2)).toMatchObject({ noseLength: 0.6, middleLength: 0.2, tailLength: 1.2 });
  expect(withLength(shape, 2.8, 0.9)).toMatchObject({ noseLength: 0.3, middleLength: 0, tailLength: 0.6 });
});

test('no hand makes a hull smaller or larger than the craft file holds', () => {
  for (const shape of SHAPES) {
    const { length, height } = formed(shape);
    for (const asked of [-5, 0, 40, 1e9]) {
      expect(shapeSchema.safeParse(withLength(shape, length, asked)).error?.message).toBeUndefined();
      expect(shapeSchema.safeParse(withDiameter(shape, height, asked)).error?.message).toBeUndefined();
    }
  }
});
