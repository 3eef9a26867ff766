import fc from 'fast-check';
import { expect, test } from 'vitest';
import { BLANK_HARDPOINT } from '../../src/craft/blank.ts';
import { type Craft, keyed, listed } from '../../src/craft/craft.ts';
import type { Place } from '../../src/craft/placeSchema.ts';
import type { Part } from '../../src/craft/schema.ts';
import { assess } from '../../src/report/assess.ts';
import type { BeamBar } from '../../src/report/assessment.ts';
import { fixtureCraft, partOf, wireOf } from '../edit/craftFixture.ts';
import { workedExample } from './workedExample.ts';

const value = (craft: Craft, key: string): number => assess(craft).rows[key]!.value!;

const station = fc.double({ min: 0, max: 3, noNaN: true });
const clock = fc.double({ min: 0, max: 2 * Math.PI, noNaN: true });
const small = fc.double({ min: 0, max: 0.3, noNaN: true });
const side = fc.double({ min: -0.6, max: 0.6, noNaN: true });
const place: fc.Arbitrary<Place> = fc.oneof(
  fc.record({ kind: fc.constant('skin' as const), station, clock, standoff: small }),
  fc.record({ kind: fc.constant('keel' as const), station, drop: small }),
  fc.record({ kind: fc.constant('axis' as const), station }),
  fc.record({ kind: fc.constant('free' as const), x: station, y: side, z: side }),
);
const copies: fc.Arbitrary<Part['copies']> = fc.oneof(
  fc.record({ kind: fc.constant('together' as const), count: fc.integer({ min: 1, max: 4 }) }),
  fc.constant({ kind: 'pair' as const }),
  fc.record({ kind: fc.constant('ring' as const), count: fc.integer({ min: 2, max: 5 }) }),
);
const part = fc
  .record({ mass: fc.double({ min: 0.001, max: 0.3, noNaN: true }), place, copies })
  .map((change) => partOf('part', change));
const craft = fc.array(part, { minLength: 2, maxLength: 10 }).map((all): Craft => {
  const parts = all.map((each, i) => ({ ...each, id: `part-${i}` }));
  const run = wireOf('run', { from: { kind: 'part', part: 'part-0' }, to: { kind: 'part', part: 'part-1' } });
  return { ...fixtureCraft(), parts: keyed(parts), wires: keyed([run]) };
});

const mirrored = (given: Craft): Craft => ({
  ...given,
  parts: keyed(listed(given.parts).map((each) => ({ ...each, place: mirroredPlace(each.place) }))),
});

const mirroredPlace = (given: Place): Place => {
  if (given.kind === 'skin') return { ...given, clock: -given.clock };
  return given.kind === 'free' ? { ...given, y: -given.y } : given;
};

test('a mirrored craft has the same figures, with side and heel turned over', () => {
  fc.assert(
    fc.property(craft, (given) => {
      // A run to a pair has its first branch to starboard: keep to what a mirror leaves alone.
      const plain = { ...given, wires: keyed<never>([]) };
      const [here, there] = [assess(plain).rows, assess(mirrored(plain)).rows];
      for (const key of ['mass.solid', 'cg.station', 'cg.height', 'heaviness', 'float.pendulumDepth']) {
        expect(there[key]!.value).toBeCloseTo(here[key]!.value!, 9);
      }
      expect(there['cg.side']!.value).toBeCloseTo(-here['cg.side']!.value!, 9);
    }),
  );
});

test('a single piece to starboard heels as far as one to port, the other way', () => {
  fc.assert(
    fc.property(fc.double({ min: 0.01, max: 0.6, noNaN: true }), (y) => {
      const at = (at: number) => ({
        ...workedExample(),
        parts: keyed([
          ...listed(workedExample().parts),
          partOf('lamp', { place: { kind: 'free', x: 1.5, y: at, z: -0.2 } }),
        ]),
      });
      expect(value(at(y), 'float.heel')).toBeGreaterThan(0);
      expect(value(at(-y), 'float.heel')).toBeCloseTo(-value(at(y), 'float.heel'), 12);
      expect(value(at(-y), 'float.pitch')).toBeCloseTo(value(at(y), 'float.pitch'), 12);
    }),
  );
});

test('the CG lies inside the box round hull, parts and wires', () => {
  fc.assert(
    fc.property(craft, (given) => {
      const { geometry } = assess(given);
      if (geometry.status === 'infeasible') throw new Error(geometry.why);
      const points = [
        ...geometry.pieces.map(({ cg }) => cg),
        ...geometry.wires.flatMap(({ branches }) => branches.flat()),
        [geometry.hull.skinStation, 0, 0] as const,
      ];
      for (const axis of [0, 1, 2] as const) {
        const along = points.map((point) => point[axis]);
        expect(geometry.cg![axis]).toBeGreaterThanOrEqual(Math.min(...along) - 1e-9);
        expect(geometry.cg![axis]).toBeLessThanOrEqual(Math.max(...along) + 1e-9);
      }
    }),
  );
});

test('the bars of the beam add up to solid mass × (CG − CB), and their masses to the solid mass', () => {
  fc.assert(
    fc.property(craft, (given) => {
      const { geometry, rows } = assess(given);
      if (geometry.status === 'infeasible') throw new Error(geometry.why);
      const sum = (pick: (bar: BeamBar) => number) =>
        geometry.beam.reduce((total, bar) => total + pick(bar), 0);
      const mass = rows['mass.solid']!.value!;
      expect(sum((bar) => bar.mass)).toBeCloseTo(mass, 9);
      expect(sum((bar) => bar.moment)).toBeCloseTo(
        mass * (rows['cg.station']!.value! - rows['hull.cbStation']!.value!),
        9,
      );
    }),
  );
});

test('the order of parts changes no figure', () => {
  fc.assert(
    fc.property(craft, (given) => {
      const turned = { ...given, parts: { ...given.parts, order: [...given.parts.order].reverse() } };
      for (const key of ['mass.solid', 'cg.station', 'float.pitch', 'float.swingPeriod']) {
        const [a, b] = [assess(given).rows[key]!.value, assess(turned).rows[key]!.value];
        if (a === null) expect(b).toBeNull();
        else expect(Math.abs(b! - a)).toBeLessThan(1e-9 * Math.max(1, Math.abs(a)));
      }
    }),
  );
});

test('scaling: twice the size at eight times the masses floats at the same pitch', () => {
  const one = workedExample();
  const scaledPlace = (given: Place): Place =>
    given.kind === 'keel'
      ? { ...given, station: 2 * given.station, drop: 2 * given.drop }
      : given.kind === 'axis'
        ? { ...given, station: 2 * given.station }
        : given;
  const two: Craft = {
    ...one,
    hull: { ...one.hull, shape: { kind: 'spheroid', length: 6, diameter: 2 } },
    film: { ...one.film, arealDensity: one.film.arealDensity * 2 },
    parts: keyed(
      listed(one.parts).map((each) => ({ ...each, mass: 8 * each.mass, place: scaledPlace(each.place) })),
    ),
    hardpoints: keyed([
      { id: 'nose', name: 'Nose', place: { kind: 'axis', station: 0.1 }, ...BLANK_HARDPOINT },
    ]),
  };
  expect(value(two, 'float.pitch')).toBeCloseTo(value(one, 'float.pitch'), 9);
  expect(value(two, 'lead.mass')).toBeCloseTo(8 * value(one, 'lead.mass'), 9);
  // A pendulum twice as long swings √2 as slowly.
  expect(value(two, 'float.swingPeriod')).toBeCloseTo(Math.SQRT2 * value(one, 'float.swingPeriod'), 9);
});

test('every figure is finite or says why there is none', () => {
  fc.assert(
    fc.property(craft, (given) => {
      for (const each of Object.values(assess(given).rows)) {
        if (each.value === null) expect(each.why).not.toBe('');
        else expect(Number.isFinite(each.value)).toBe(true);
      }
    }),
  );
});

test('a craft of nothing but air and film', () => {
  const bare = {
    ...workedExample(),
    parts: keyed<Part>([]),
    film: { ...workedExample().film, arealDensity: 0 },
  };
  const { rows, headline } = assess(bare);
  expect(rows['cg.station']).toMatchObject({
    value: null,
    status: 'infeasible',
    why: 'The craft has no mass.',
  });
  expect(rows['float.pitch']).toMatchObject({ value: null, status: 'infeasible' });
  expect(headline).toContain('add a part');
});

test('a hull that cannot be formed gives the sentence, and no figures', () => {
  const broken: Craft = {
    ...workedExample(),
    hull: {
      ...workedExample().hull,
      shape: {
        kind: 'myring',
        noseLength: 0.1,
        middleLength: 0.5,
        tailLength: 0.3,
        diameter: 0.2,
        nosePower: 2,
        tailAngle: 0.4,
        noseOffset: 0.5,
        tailOffset: 0,
      },
    },
  };
  const { geometry, headline, met } = assess(broken);
  expect(geometry.status).toBe('infeasible');
  expect(headline.length).toBeGreaterThan(20);
  expect(met).toBe(false);
});

test('tolerances become standard uncertainties: half-width ÷ √3 for one part alone', () => {
  const one = { ...workedExample(), parts: keyed([partOf('only', { massTolerance: 0.003 })]) };
  expect(assess(one).rows['mass.solid']!.uncertainty).toBeCloseTo(0.003 / Math.sqrt(3), 12);
  expect(assess(workedExample()).rows['mass.solid']!.uncertainty).toBeUndefined();
});

test('a support point: a neutral-enough craft held at its CG keeps any attitude; a heavy one hangs below its leg', () => {
  const heavy: Craft = {
    ...workedExample(),
    gas: { ...workedExample().gas, purity: 0 },
    support: { kind: 'axis', station: 1.7632 },
  };
  const { rows } = assess(heavy);
  expect(rows['support.load']!.value).toBeCloseTo(rows.heaviness!.value!, 12);
  // With no lift and the point on the axis just above the CG, it hangs level from it.
  expect(Math.abs(rows['support.pitch']!.value!)).toBeLessThan(0.02);
});

test('a part on skin that is not there is told of; on a boom it is not', () => {
  const beyond = (given: Place) =>
    assess({ ...workedExample(), parts: keyed([partOf('x', { place: given })]) }).cautions;
  expect(beyond({ kind: 'keel', station: 3.2, drop: 0 })[0]).toContain('beyond the hull');
  expect(beyond({ kind: 'axis', station: 3.2 })).toEqual([]);
});
