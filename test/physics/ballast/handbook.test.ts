/**
 * Handbook examples as plans: FAA-H-8083-1, permanent ballast (1876 lb, CG 32.2 in, limit 33.0, ballast station 228 → 7.7 lb;
 * last two from memory), and FAA Pilot's Handbook of Aeronautical Knowledge, ch. 9, weight shift. Pounds are taken as grams
 * and inches as decimetres or less, so that a hull of the program's sizes has its CB at the limit.
 */
import { expect, test } from 'vitest';
import { blankCraft } from '../../../src/craft/blank.ts';
import { type Craft, keyed } from '../../../src/craft/craft.ts';
import type { Part } from '../../../src/craft/schema.ts';
import { loadHighs } from '../../../src/numeric/linearProgram/highsSolver.ts';
import { planOf } from '../../../src/physics/ballast/plan.ts';
import { partOf } from '../../edit/craftFixture.ts';

const solver = await loadHighs();

/** A weightless spheroid with its CB at that station, wanted level to a hundredth of a millionth of a turn, whatever it weighs. */
function craftWithCb(cb: number, parts: readonly Part[], lead: number): Craft {
  const blank = blankCraft('Handbook', { kind: 'spheroid', length: 2 * cb, diameter: 1 }, 2 * cb);
  return {
    ...blank,
    film: { ...blank.film, arealDensity: 0 },
    parts: keyed(parts),
    hardpoints: keyed([
      { id: 'lead', name: 'Lead', place: { kind: 'axis', station: lead }, limit: 100, fill: 'continuous' },
    ]),
    leadAt: 'lead',
    targets: {
      heaviness: { least: -1000, most: 1000 },
      pitchTolerance: 1e-8,
      heelTolerance: 0.1,
      leastPendulumDepth: 0,
      turnTime: null,
      sideGust: null,
    },
  };
}

const at = (id: string, mass: number, x: number, change: Partial<Part> = {}): Part =>
  partOf(id, { mass, place: { kind: 'free', x, y: 0, z: -1 }, ...change });

test('permanent ballast', () => {
  const inch = 0.1;
  const craft = craftWithCb(33 * inch, [at('aeroplane', 1.876, 32.2 * inch)], 228 * inch);
  const plan = planOf(craft, solver, { explain: false });
  expect(plan).toMatchObject({ status: 'optimal' });
  if (plan.status === 'optimal') expect(plan.deadBallast * 1000).toBeCloseTo(7.7, 1);
});

test('weight shift: 100 lb of 8000 from station 30 to 150 takes the CG from 77.0 to 78.5', () => {
  const inch = 0.01;
  const rest = (8000 * 77 - 100 * 30) / 7900;
  const cargo = at('cargo', 0.1, 30 * inch, { slide: { from: 30 * inch, to: 150 * inch } });
  const craft = craftWithCb(78.5 * inch, [at('rest', 7.9, rest * inch), cargo], 0);
  const plan = planOf(craft, solver, { explain: false });
  if ('why' in plan) throw new Error(plan.why);
  expect(plan.deadBallast).toBeLessThan(1e-5);
  expect(plan.slides[0]!.to / inch).toBeCloseTo(150, 3);
});

test('weight shift: 7800 lb, CG 81.5 to 80.5 by moving over 120 in takes 65 lb', () => {
  const inch = 0.01;
  const rest = (7800 * 81.5 - 65 * 150) / (7800 - 65);
  const cargo = at('cargo', 0.065, 150 * inch, { slide: { from: 30 * inch, to: 150 * inch } });
  const craft = craftWithCb(80.5 * inch, [at('rest', 7.735, rest * inch), cargo], 0);
  const plan = planOf(craft, solver, { explain: false });
  if ('why' in plan) throw new Error(plan.why);
  expect(plan.deadBallast).toBeLessThan(1e-5);
  expect((plan.slides[0]!.from - plan.slides[0]!.to) / inch).toBeCloseTo(120, 3);
});
