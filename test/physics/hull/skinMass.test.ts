import { expect, test } from 'vitest';
import type { HullShape, HullSpec } from '../../../src/craft/hullSchema.ts';
import { seamCount, skinMassOf } from '../../../src/physics/hull/skinMass.ts';
import { built } from './built.ts';
import { near } from './near.ts';

const specOf = (shape: HullShape, count = 4): HullSpec => ({
  shape,
  seams: { massPerMetre: 0.006, count },
  patches: [],
});
const BALL: HullShape = { kind: 'spheroid', length: 2, diameter: 2 };
const FILM = { arealDensity: 0.045, arealDensityTolerance: 0.003 };

// Worked by hand: a ball of 1 m radius, 45 g/m² ± 3 g/m²; thin shell 2mR²/3.
test('film of a ball: mass, inertia and standard uncertainty', () => {
  const { film } = skinMassOf(specOf(BALL), built(BALL), FILM);
  near(film.mass, 0.045 * 4 * Math.PI);
  near(film.station, 1);
  for (const inertia of film.inertia) near(inertia, (2 / 3) * film.mass);
  // Rectangular distribution of half-width a: u = a/√3 (JCGM 100:2008, 4.3.7).
  near(film.uncertainty, (0.003 * 4 * Math.PI) / Math.sqrt(3));
});

test('four seams of a ball: half circles from tip to tip', () => {
  const { seams } = skinMassOf(specOf(BALL), built(BALL), FILM);
  near(seams.mass, 4 * 0.006 * Math.PI);
  near(seams.station, 1);
  near(seams.inertia[0], seams.mass / 2);
  near(seams.inertia[1], (seams.mass * 3) / 4);
});

test('the seam of a round two-sheet balloon is its whole rim', () => {
  const shape: HullShape = { kind: 'roundTwoSheet', flatDiameter: 0.9, stance: 'lying' };
  const hull = built(shape);
  const { seams } = skinMassOf(specOf(shape, 0), hull, FILM);
  const R = hull.length / 2;
  near(seams.mass, 0.006 * 2 * Math.PI * R);
  // Ring: mR² about its axis, mR²/2 about a diameter.
  near(seams.inertia[2], seams.mass * R * R);
  near(seams.inertia[0], (seams.mass * R * R) / 2);
});

test('seams are counted by the form: gores, two sheets, else as given', () => {
  const rows = [0, 0.5, 1].map((tape) => ({ tape, width: tape === 0.5 ? 0.2 : 0 }));
  expect(seamCount(specOf({ kind: 'gores', count: 7, rows }))).toBe(7);
  expect(seamCount(specOf({ kind: 'twoSheet', rows }))).toBe(2);
  expect(seamCount(specOf({ kind: 'roundTwoSheet', flatDiameter: 1, stance: 'standing' }))).toBe(2);
  expect(seamCount(specOf(BALL, 5))).toBe(5);
});
