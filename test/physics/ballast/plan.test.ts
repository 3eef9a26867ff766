import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Craft } from '../../../src/craft/craft.ts';
import { applyPlan } from '../../../src/edit/edits/plan.ts';
import { loadHighs } from '../../../src/numeric/linearProgram/highsSolver.ts';
import { levellingWithin } from '../../../src/physics/balance/counterweight.ts';
import { type Plan, type PlanFound, planOf } from '../../../src/physics/ballast/plan.ts';
import { craftStateOf } from '../../../src/physics/craftState.ts';
import { partOf } from '../../edit/craftFixture.ts';
import { testEdit } from '../../edit/testEdit.ts';
import { sampleCraft } from '../../samples/readSamples.ts';
import { deadBallast, missedBy } from './judge.ts';
import { randomCraft } from './randomCraft.ts';

const solver = await loadHighs();
const plan = (craft: Craft, robust = false): Plan => planOf(craft, solver, { explain: false, robust });
const degrees = Math.PI / 180;

const found = (craft: Craft): PlanFound => {
  const each = plan(craft);
  if ('why' in each) throw new Error(each.why);
  return each;
};

test('one hardpoint, nothing to slide: the closed form', () => {
  let compared = 0;
  fc.assert(
    fc.property(randomCraft({ slides: false }), (random) => {
      const [id] = random.hardpoints.order;
      const only = random.hardpoints.byId[id!]!;
      const craft: Craft = {
        ...random,
        parts: {
          ...random.parts,
          byId: { ...random.parts.byId, reader: { ...random.parts.byId.reader!, mass: 0 } },
        },
        hardpoints: {
          byId: { [id!]: { ...only, place: { kind: 'axis', station: 0.05 }, limit: 10 } },
          order: [id!],
        },
        targets: { ...random.targets, heaviness: { least: -9, most: 9 }, leastPendulumDepth: 0 },
      };
      const state = craftStateOf(craft);
      if (state.status === 'infeasible') throw new Error(state.why);
      const least = levellingWithin(state.value.loading, [0.05, 0, 0], craft.targets.pitchTolerance);
      const planned = plan(craft);
      if (least.status === 'infeasible') {
        expect(planned.status).toBe('infeasible');
        return;
      }
      compared++;
      expect(planned.status).toBe('optimal');
      // The hair kept from the edge is less than a milligram.
      if (planned.status === 'optimal') {
        expect(Math.abs(planned.deadBallast - least.value)).toBeLessThan(1e-6);
      }
    }),
    { numRuns: 150, endOnFailure: true, seed: 20 },
  );
  expect(compared).toBeGreaterThan(50);
});

test.each([
  ['straight', {}, 200],
  ['curved', { curved: true }, 150],
  ['pieces', { pieces: true, loads: 2 }, 80],
  ['curved with pieces and loads', { curved: true, pieces: true, loads: 2 }, 40],
  ['curved, cut to measure, with loads', { curved: true, loads: 3 }, 40],
] as const)(
  '%s: what is planned keeps the targets in the report, and weighs what it says',
  (_, want, numRuns) => {
    const seen = new Map<string, number>();
    fc.assert(
      fc.property(randomCraft(want), (craft) => {
        const planned = plan(craft);
        seen.set(planned.status, (seen.get(planned.status) ?? 0) + 1);
        if (planned.status !== 'optimal') {
          expect(planned.status).toBe('infeasible');
          return;
        }
        expect(missedBy(planned.craft)).toBeLessThanOrEqual(1e-9);
        expect(deadBallast(planned.craft)).toBeCloseTo(planned.deadBallast, 9);
        const { pitch, heel, mass } = planned.disagreement;
        expect(Math.abs(pitch)).toBeLessThan(0.01 * degrees);
        expect(Math.abs(heel)).toBeLessThan(0.01 * degrees);
        expect(Math.abs(mass)).toBeLessThan(1e-4);
        expect(planned.gap).toBe(0);
        expect(planned.bound).toBeLessThanOrEqual(planned.deadBallast);
      }),
      { numRuns, endOnFailure: true, seed: 20 },
    );
    expect(seen.get('optimal') ?? 0).toBeGreaterThan(numRuns / 5);
  },
);

test('carried out as an edit it gives the very craft, and planning that again changes nothing', () => {
  fc.assert(
    fc.property(randomCraft({ loads: 2 }), (craft) => {
      const first = plan(craft);
      if (first.status !== 'optimal') return;
      const carried = testEdit(craft, applyPlan(first.stowage));
      expect(carried).toEqual(first.craft);
      const second = found(carried);
      expect(second.deadBallast).toBeCloseTo(first.deadBallast, 7);
      expect(second.slides.map(({ from, to }) => Math.abs(to - from)).every((by) => by < 1e-4)).toBe(true);
      expect(second.loads.map(({ place }) => place !== null)).toEqual(
        first.loads.map(({ place }) => place !== null),
      );
    }),
    { numRuns: 60, endOnFailure: true, seed: 20 },
  );
});

test('ballast and loads that no plan may touch take up the room of their hardpoint, and count as dead ballast', () => {
  const craft = sampleCraft('library-scanner');
  const { place } = craft.hardpoints.byId.nose!;
  const weight = partOf('weight', { kind: 'ballast', mass: 0.06, massTolerance: 0, locked: true, place });
  const laden: Craft = {
    ...craft,
    parts: { byId: { ...craft.parts.byId, weight }, order: [...craft.parts.order, 'weight'] },
    hardpoints: {
      ...craft.hardpoints,
      byId: { ...craft.hardpoints.byId, nose: { ...craft.hardpoints.byId.nose!, limit: 0.13 } },
    },
  };
  const [free, held] = [found(craft), found(laden)];
  expect(held.deadBallastFixed).toBe(0.06);
  expect(held.deadBallast).toBeCloseTo(free.deadBallast, 6);
  expect(held.weights[0]).toMatchObject({ hardpoint: 'nose' });
  expect(held.weights[0]!.mass).toBeLessThanOrEqual(0.07 + 1e-9);
  expect(held.weights[0]!.mass).toBeCloseTo(free.weights[0]!.mass - 0.06, 6);
  const full = { ...laden.hardpoints.byId.nose!, limit: 0.1 };
  const crowded = {
    ...laden,
    hardpoints: { ...laden.hardpoints, byId: { ...laden.hardpoints.byId, nose: full } },
  };
  expect(plan(crowded).status).toBe('infeasible');
});
