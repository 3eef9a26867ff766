import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type HullShape, shapeSchema } from '../../../src/craft/hullSchema.ts';
import { addedMassOf } from '../../../src/physics/hull/addedMass.ts';
import type { Hull } from '../../../src/physics/hull/hull.ts';
import { hullOf } from '../../../src/physics/hull/hullOf.ts';

/** The ranges of the craft file's own gate; ends and tiny values are drawn often. */
const within = (min: number, max: number) =>
  fc.oneof(
    fc.constantFrom(min, max),
    fc.double({ min, max, noNaN: true }),
    fc.double({ min, max: Math.min(max, min + 1), noNaN: true }),
  );
const length = within(0.05, 50);
const diameter = within(0.02, 50);
const distance = within(0, 50);
const size = within(0.01, 50);
const end = fc.constantFrom('ellipsoid', 'ogive', 'cone', 'flat');

/** Rows as they come: mostly from 0, ascending and with ends closed, some of them smooth, sometimes none of that. */
const rarelyNot = fc.integer({ min: 0, max: 9 }).map((n) => n > 0);
const sizes = (i: number, n: number, smooth: boolean, width: number) =>
  smooth ? Math.sin((Math.PI * i) / n) * (0.5 + width / 1000) : width;
const places = fc
  .record({
    steps: fc.array(fc.tuple(within(0.001, 2), within(0.001, 1.5)), { minLength: 3, maxLength: 25 }),
    ordered: rarelyNot,
    fromZero: rarelyNot,
    closed: rarelyNot,
    smooth: fc.boolean(),
  })
  .map(({ steps, ordered, fromZero, closed, smooth }) => {
    let at = 0;
    return steps.map(([step, width], i) => {
      at = i === 0 ? (fromZero ? 0 : step) : Math.min(50, ordered ? at + step : step);
      const end = i === 0 || i === steps.length - 1;
      return { at, size: closed && end ? 0 : Math.max(0, sizes(i, steps.length - 1, smooth, width)) };
    });
  });
const pattern = places.map((rows) => rows.map(({ at, size: width }) => ({ tape: at, width })));

const shapes: Record<HullShape['kind'], fc.Arbitrary<unknown>> = {
  spheroid: fc.record({ length, diameter }),
  twoSpheroid: fc.record({ foreLength: within(0.02, 50), aftLength: within(0.02, 50), diameter }),
  naca4: fc.record({ length, diameter, tail: fc.constantFrom('open', 'closed') }),
  series58: fc.record({
    length,
    diameter,
    widest: within(0.1, 0.9),
    noseRadius: within(0, 2),
    tailRadius: within(0, 2),
    prismatic: within(0.3, 0.9),
  }),
  myring: fc.record({
    noseLength: size,
    middleLength: distance,
    tailLength: size,
    diameter,
    nosePower: within(0.5, 10),
    tailAngle: fc.oneof(within(-2 * Math.PI, 2 * Math.PI), within(0, 0.5)),
    noseOffset: distance,
    tailOffset: distance,
  }),
  cylinder: fc.record({
    diameter,
    noseEnd: end,
    noseLength: distance,
    middleLength: distance,
    tailEnd: end,
    tailLength: distance,
  }),
  offsets: fc.record({
    along: fc.constantFrom('station', 'tape'),
    across: fc.constantFrom('diameter', 'girth'),
    rows: places,
  }),
  gores: fc.record({ count: fc.integer({ min: 3, max: 64 }), rows: pattern }),
  twoSheet: fc.record({ rows: pattern }),
  roundTwoSheet: fc.record({ flatDiameter: length, stance: fc.constantFrom('standing', 'lying') }),
};

function figuresOf(hull: Hull): Record<string, number> {
  const [a, b] = [0.3 * hull.length, 0.9 * hull.length];
  const { volumeInertia, skinInertia, seamInertia, ...rest } = hull;
  const numbers = Object.entries(rest).filter(
    (entry): entry is [string, number] => typeof entry[1] === 'number',
  );
  return {
    ...Object.fromEntries(numbers),
    solid: Math.min(...volumeInertia),
    skin: Math.min(...skinInertia),
    seam: Math.min(...seamInertia),
    radius: hull.radius(a, 1),
    sectionArea: hull.sectionArea(a),
    girth: hull.girth(a),
    tape: hull.tapeAt(a, 1),
    station: hull.stationAt(hull.seamLength / 2, 1),
    ...hull.skinPath(a, b, 1),
    ...addedMassOf(hull),
    drawn: hull.drawStations(40).reduce((sum, x) => sum + x, 0),
  };
}

function checkFigures(hull: Hull): void {
  for (const [name, value] of Object.entries(figuresOf(hull))) {
    if (!Number.isFinite(value) || value < 0) throw new Error(`${name} is ${value}`);
  }
  expect(hull.volume).toBeGreaterThan(0);
  expect(hull.area).toBeGreaterThan(0);
  expect(hull.filmArea).toBeGreaterThanOrEqual(hull.area * (1 - 1e-9));
  expect(hull.cbStation).toBeGreaterThan(0);
  expect(hull.cbStation).toBeLessThan(hull.length);
  expect(hull.seamLength).toBeGreaterThanOrEqual(hull.length * (1 - 1e-9));
}

const tally = { solved: 0, refused: 0 };

test.each(Object.keys(shapes) as HullShape['kind'][])(
  '%s from anywhere in the schema: a hull or a sentence',
  (kind) => {
    Object.assign(tally, { solved: 0, refused: 0 });
    fc.assert(
      fc.property(shapes[kind], (fields) => {
        const shape = shapeSchema.parse({ kind, ...(fields as object) });
        const outcome = hullOf(shape);
        if (outcome.status === 'solved') {
          tally.solved += 1;
          checkFigures(outcome.value);
        } else {
          tally.refused += 1;
          expect(outcome.why).toMatch(/^[A-Z].*\.$/);
          expect(outcome.why).not.toMatch(/NaN|Infinity|undefined/);
          expect(outcome.remedy).toMatch(/^[A-Z].*\.$/);
          expect(outcome.remedy).not.toMatch(/NaN|Infinity|undefined/);
        }
      }),
      { numRuns: 400 },
    );
    expect(tally.solved).toBeGreaterThan(10);
  },
);
