/** Plans against a random search, against another simplex, against every corner of the tolerances. */
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type Craft, listed } from '../../../src/craft/craft.ts';
import { stowed } from '../../../src/craft/stowage.ts';
import { loadHighs } from '../../../src/numeric/linearProgram/highsSolver.ts';
import { planOf } from '../../../src/physics/ballast/plan.ts';
import { ballastOf } from '../../../src/physics/ballast/point.ts';
import { search } from '../../../src/physics/ballast/search.ts';
import { settingOf } from '../../../src/physics/ballast/setting.ts';
import { leastBallast } from '../../../src/physics/ballast/stages.ts';
import { seeded } from '../../craft/mutator.ts';
import { rivalObjective } from '../../numeric/linearProgram/rival.ts';
import { guess } from './guess.ts';
import { deadBallast, missedBy, missedStrictly } from './judge.ts';
import { randomCraft, type Want } from './randomCraft.ts';

const solver = await loadHighs();

test.each<[string, Want]>([
  ['straight', { hard: true }],
  ['curved', { hard: true, curved: true }],
  ['pieces and loads', { pieces: true, loads: 2 }],
  ['curved, pieces and loads', { hard: true, curved: true, pieces: true, loads: 2 }],
  ['curved, cut to measure, loads', { hard: true, curved: true, loads: 3 }],
])('%s: no guess of 6,000 is better than the plan', (_, want) => {
  const random = seeded(5);
  let kept = 0;
  fc.assert(
    fc.property(randomCraft(want), (craft) => {
      const plan = planOf(craft, solver, { explain: false });
      for (let i = 0; i < 150; i++) {
        const stowage = guess(craft, random);
        if (!stowage) continue;
        const made = stowed(craft, stowage);
        if (missedStrictly(made) > -2e-6) continue;
        kept++;
        if (plan.status !== 'optimal') throw new Error(`${plan.status}, yet there is a plan`);
        expect(deadBallast(made)).toBeGreaterThan(plan.deadBallast - 1e-6);
      }
    }),
    { numRuns: 40, endOnFailure: true, seed: 20 },
  );
  expect(kept).toBeGreaterThan(20);
});

test('100 continuous problems: yalps finds the same least ballast', () => {
  let compared = 0;
  fc.assert(
    fc.property(randomCraft({}), (craft) => {
      const setting = settingOf(craft, false);
      if (setting.status === 'infeasible') throw new Error(setting.why);
      const found = search(setting.value, solver, { deadline: Date.now() + 20_000, aim: 'ballast' });
      if (found.status !== 'found') return;
      const costs = new Map(leastBallast(setting.value, found.program).terms);
      const { columns, rows } = found.program.problem;
      const rival = rivalObjective({
        rows,
        columns: columns.map((column, j) => ({ ...column, cost: costs.get(j) ?? 0, integer: false })),
      });
      expect(rival).not.toBeNull();
      expect(rival! / 1000).toBeCloseTo(ballastOf(setting.value, found.point), 6);
      compared++;
    }),
    { numRuns: 100, endOnFailure: true, seed: 20 },
  );
  expect(compared).toBeGreaterThan(40);
});

/** The craft with every mass at one end of its band: bit k of `corner` for the k-th. */
function atCorner(craft: Craft, corner: number): Craft {
  const end = (k: number) => ((corner >> k) & 1 ? 1 : -1);
  const parts = listed(craft.parts).map((part, k) => ({
    ...part,
    mass: part.mass + end(k + 1) * part.massTolerance,
  }));
  const { arealDensity, arealDensityTolerance } = craft.film;
  return {
    ...craft,
    film: { ...craft.film, arealDensity: arealDensity + end(0) * arealDensityTolerance },
    parts: { ...craft.parts, byId: Object.fromEntries(parts.map((part) => [part.id, part])) },
  };
}

test.each<[string, Want]>([
  ['straight', { tolerance: 0.005, loads: 1 }],
  ['curved', { tolerance: 0.005, curved: true, loads: 1 }],
  ['pieces', { tolerance: 0.005, pieces: true, loads: 1 }],
])(
  '%s: a robust plan keeps its targets at every corner of the tolerances; a plain one does not',
  (_, want) => {
    let [robust, plainBroken] = [0, 0];
    fc.assert(
      fc.property(randomCraft(want), (craft) => {
        const plan = planOf(craft, solver, { explain: false, robust: true });
        if (plan.status !== 'optimal') return;
        robust++;
        const corners = 2 ** (1 + craft.parts.order.length + craft.loads.order.length);
        const worst = (made: Craft) =>
          Math.max(...Array.from({ length: corners }, (__, corner) => missedBy(atCorner(made, corner))));
        expect(worst(plan.craft)).toBeLessThanOrEqual(1e-9);
        const plain = planOf(craft, solver, { explain: false });
        if (plain.status !== 'optimal') throw new Error('a robust plan is a plan');
        expect(plain.deadBallast).toBeLessThanOrEqual(plan.deadBallast + 1e-8);
        if (worst(plain.craft) > 1e-6) plainBroken++;
      }),
      { numRuns: 60, endOnFailure: true, seed: 20 },
    );
    expect(robust).toBeGreaterThan(10);
    expect(plainBroken).toBeGreaterThan(3);
  },
);
