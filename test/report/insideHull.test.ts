import { readdirSync, readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { firstThruster } from '../../src/craft/firstFigures.ts';
import { parse } from '../../src/craft/parse.ts';
import type { Place } from '../../src/craft/placeSchema.ts';
import { positionOf } from '../../src/physics/mass/position.ts';
import { assess } from '../../src/report/assess.ts';
import { depthInside } from '../../src/report/insideHull.ts';
import { placeChosen } from '../../src/report/placeAs.ts';
import { craft, geometry, part } from '../scene/fixture.ts';

const { hull } = geometry();
const WAIST = 1.4;
const waist = hull.radius(WAIST, 0);

const cautionsWith = (more: Parameters<typeof part>[2], place: Place) =>
  assess(craft([part('one', place, more)], [])).cautions.filter((each) =>
    /inside the hull|into the hull/.test(each),
  );

test('choosing the skin brings out what was on the axis or under the skin, and leaves what hung outside where it was', () => {
  for (const clock of [0, 1, Math.PI]) {
    for (const off of [-waist, -0.2, 0, 0.3]) {
      const at = positionOf({ kind: 'skin', station: WAIST, clock, standoff: off }, hull);
      const chosen = placeChosen('skin', at, hull);
      expect(chosen).toMatchObject({ kind: 'skin', station: WAIST });
      expect(chosen.kind === 'skin' && chosen.standoff).toBeCloseTo(Math.max(0, off), 9);
    }
  }
  expect(placeChosen('axis', [WAIST, 0.1, 0.2], hull)).toEqual({ kind: 'axis', station: WAIST });
});

const finned = { kind: 'fin' as const, fin: { area: 0.04, aspectRatio: 1 } };

test('a fin whose middle is farther than 10 mm under the skin brings a caution by name, and so deep', () => {
  const skin = (standoff: number): Place => ({ kind: 'skin', station: WAIST, clock: 1, standoff });
  expect(cautionsWith(finned, skin(-0.009))).toEqual([]);
  expect(cautionsWith(finned, skin(-0.123))).toEqual([
    expect.stringMatching(/^one: .*middle of the fin 123 mm under the skin/),
  ]);
  expect(cautionsWith({ kind: 'fin' }, skin(-0.123))).toEqual([]);
  expect(cautionsWith({ kind: 'battery' }, skin(-0.123))).toEqual([]);
});

test('a propeller is judged by its rim as it is turned, and may stand just outside either end', () => {
  const thruster = firstThruster({ width: 0.2, height: 0.2 });
  const motor = { kind: 'thruster' as const, thruster };
  const keel = (drop: number): Place => ({ kind: 'keel', station: WAIST, drop });
  expect(cautionsWith(motor, keel(0.12))).toEqual([]);
  expect(cautionsWith(motor, keel(0.05))).toEqual([expect.stringMatching(/50 mm/)]);
  expect(cautionsWith(motor, { kind: 'axis', station: hull.length })).toEqual([]);
  expect(cautionsWith(motor, { kind: 'axis', station: -0.001 })).toEqual([]);
  // Turned to push up, the disc lies flat under the keel and clears it.
  const up = { least: Math.PI / 2, most: Math.PI / 2, set: Math.PI / 2, slew: 0 };
  const at = positionOf(keel(0.05), hull);
  expect(depthInside({ thruster: { ...thruster, pitch: up }, fin: null }, at, hull)).toBe(0);
});

/** Its fins are one box on the axis, so that the sums stay short, and its thruster is in the tail. */
const LUMPED = 'worked-example.json';

test.each(readdirSync('samples').filter((file) => file !== LUMPED))(
  'no fin and no propeller of the sample %s is inside its hull',
  (file) => {
    const read = parse(readFileSync(`samples/${file}`, 'utf8'));
    const cautions = read.ok ? assess(read.craft).cautions : ['unreadable'];
    expect(cautions.filter((each) => /inside the hull|into the hull/.test(each))).toEqual([]);
  },
);
