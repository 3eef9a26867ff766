/** What binds and what would help, against solving again and against the duals of the linear program. */
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type Craft, keyed } from '../../../src/craft/craft.ts';
import { type Relaxation, relaxed } from '../../../src/craft/relaxation.ts';
import type { Hardpoint } from '../../../src/craft/schema.ts';
import { applyRelaxation } from '../../../src/edit/edits/plan.ts';
import { loadHighs } from '../../../src/numeric/linearProgram/highsSolver.ts';
import type { Found } from '../../../src/physics/ballast/attempt.ts';
import type { Binding } from '../../../src/physics/ballast/binding.ts';
import { type PlanFound, planOf } from '../../../src/physics/ballast/plan.ts';
import { search } from '../../../src/physics/ballast/search.ts';
import { settingOf } from '../../../src/physics/ballast/setting.ts';
import { quantityOf } from '../../../src/report/limitWords.ts';
import { parseQuantity } from '../../../src/units/entry.ts';
import { formatQuantity } from '../../../src/units/format.ts';
import { testEdit } from '../../edit/testEdit.ts';
import { sampleCraft } from '../../samples/readSamples.ts';
import { missedBy } from './judge.ts';
import { randomCraft } from './randomCraft.ts';

const solver = await loadHighs();
const lean = (craft: Craft) => planOf(craft, solver, { explain: false });

/** The limit moved to another value by hand. */
const movedTo = (limit: Relaxation, to: number): Relaxation => ('to' in limit ? { ...limit, to } : limit);

const found = (plan: ReturnType<typeof planOf>): PlanFound | null => ('why' in plan ? null : plan);

test.each([
  ['straight', { hard: true }, 35],
  ['curved', { hard: true, curved: true }, 20],
  ['robust', { hard: true, tolerance: 0.002 }, 20],
] as const)(
  '%s: each marginal is the slope found by moving the limit and planning again',
  (name, want, numRuns) => {
    const robust = name === 'robust';
    let checked = 0;
    fc.assert(
      fc.property(randomCraft(want), (craft) => {
        const plan = found(planOf(craft, solver, { robust }));
        if (!plan) return;
        expect(plan.bindingComplete).toBe(true);
        for (const { limit, now, step, saving, marginal } of plan.binding) {
          if (!('to' in limit)) continue;
          const saved = (share: number) => {
            const to = now + Math.sign(limit.to - now) * step * share;
            const again = planOf(relaxed(craft, movedTo(limit, to)), solver, { explain: false, robust });
            return plan.deadBallast - (found(again)?.deadBallast ?? Number.NaN);
          };
          expect(saved(1)).toBeCloseTo(saving, 7);
          // The saving is concave in the step, so the slope lies between those of a smaller and a larger step.
          expect(marginal * step).toBeGreaterThan(saved(0.2) * 5 * 0.98 - 1e-7);
          expect(marginal * step).toBeLessThan(saved(0.002) * 500 * 1.05 + 2e-5);
          checked++;
        }
      }),
      { numRuns, endOnFailure: true, seed: 20 },
    );
    expect(checked).toBeGreaterThan(10);
  },
);

/** Saving per unit by the dual of the row or the reduced cost of the column that the limit is. */
function byDual({ program, ordered, exact }: Found, { limit }: Binding, craft: Craft): number | null {
  if (ordered.first.status !== 'optimal') return null;
  const { rows, columns } = ordered.first.marginals!;
  const { problem } = program;
  const row = (name: string) => rows[problem.rows.findIndex((each) => each.name === name)]!;
  const column = (name: string) => columns[problem.columns.findIndex((each) => each.name === name)]!;
  const hang = Math.abs(exact.share[3]);
  const perRadian = (tolerance: number) => 1 / Math.cos(tolerance) ** 2;
  switch (limit.kind) {
    case 'pitchTolerance':
      return -(row('noseUp') + row('noseDown')) * hang * perRadian(craft.targets.pitchTolerance);
    case 'heelTolerance':
      return -(row('starboardDown') + row('portDown')) * hang * perRadian(craft.targets.heelTolerance);
    case 'heaviest':
    case 'lightest':
      return -row(limit.kind);
    case 'pendulumDepth':
      return -row('depth') * exact.share[0];
    case 'hardpoint':
      return -(row(`limit of ${limit.hardpoint}`) + column(`ballast at ${limit.hardpoint}`));
    case 'slide':
      return Math.abs(column(`station of ${limit.part}`)) / 1000;
    default:
      return null;
  }
}

test('straight: each marginal is the dual of the linear program', () => {
  const kinds = new Map<string, number>();
  fc.assert(
    fc.property(randomCraft({ hard: true }), (craft) => {
      const plan = found(planOf(craft, solver));
      const setting = settingOf(craft, false);
      if (!plan || setting.status === 'infeasible') return;
      const lp = search(setting.value, solver, { deadline: Date.now() + 20_000, aim: 'ballast' });
      if (lp.status !== 'found') throw new Error(lp.why);
      for (const binding of plan.binding) {
        const dual = byDual(lp, binding, craft);
        if (dual === null) continue;
        // A small move is finite: where the plan changes its shape within it, the slope is between two duals.
        if (Math.abs(dual - binding.marginal) > 0.02 * Math.abs(dual) + 1e-4) continue;
        kinds.set(binding.limit.kind, (kinds.get(binding.limit.kind) ?? 0) + 1);
      }
      const near = plan.binding.filter((binding) => {
        const dual = byDual(lp, binding, craft);
        return dual === null || Math.abs(dual - binding.marginal) <= 0.02 * Math.abs(dual) + 1e-4;
      });
      kinds.set('all', (kinds.get('all') ?? 0) + plan.binding.length);
      kinds.set('near', (kinds.get('near') ?? 0) + near.length);
    }),
    { numRuns: 80, endOnFailure: true, seed: 20 },
  );
  expect([...kinds.keys()]).toEqual(
    expect.arrayContaining(['pitchTolerance', 'heelTolerance', 'lightest', 'slide']),
  );
  expect(kinds.get('near')! / kinds.get('all')!).toBeGreaterThan(0.9);
});

test('a full hardpoint: a gram more on the longer arm saves the ratio of the arms, less itself', () => {
  const sample = sampleCraft('worked-example');
  const spot = (id: string, station: number, limit: number): Hardpoint => ({
    id,
    name: id,
    place: { kind: 'axis', station },
    limit,
    fill: 'continuous',
  });
  const craft: Craft = {
    ...sample,
    hardpoints: keyed([spot('nose', 0.05, 0.02), spot('chin', 0.6, 1)]),
    targets: { ...sample.targets, heaviness: { least: -1, most: 0 } },
  };
  const plan = found(planOf(craft, solver))!;
  expect(plan.weights.map(({ hardpoint }) => hardpoint)).toEqual(['nose', 'chin']);
  const nose = plan.binding.find(({ limit }) => limit.kind === 'hardpoint')!;
  expect(nose).toMatchObject({ limit: { hardpoint: 'nose' }, now: 0.02 });
  expect(nose.marginal).toBeCloseTo((1.5 - 0.05) / (1.5 - 0.6) - 1, 4);
});

test('pieces: what one step saves is what planning again with it saves', () => {
  let checked = 0;
  fc.assert(
    fc.property(randomCraft({ hard: true, pieces: true, loads: 1 }), (craft) => {
      const plan = found(planOf(craft, solver));
      for (const { limit, saving } of plan?.binding ?? []) {
        const again = found(lean(relaxed(craft, limit)));
        expect(plan!.deadBallast - again!.deadBallast).toBeCloseTo(saving, 7);
        checked++;
      }
    }),
    { numRuns: 25, endOnFailure: true, seed: 20 },
  );
  expect(checked).toBeGreaterThan(5);
});

test.each([
  ['straight', {}, 30],
  ['curved with loads', { curved: true, loads: 2 }, 18],
  ['pieces', { pieces: true, loads: 1 }, 20],
] as const)(
  '%s: the advice, followed as an edit, gives a plan; a digit less does not',
  (_, want, numRuns) => {
    let followed = 0;
    const kinds = new Set<string>();
    fc.assert(
      fc.property(randomCraft(want), (craft) => {
        const plan = planOf(craft, solver);
        if (plan.status !== 'infeasible') return;
        for (const { relaxation, now, deadBallast } of plan.remedies) {
          const mended = testEdit(craft, applyRelaxation(relaxation));
          const after = found(lean(mended));
          if (!after) throw new Error(`no plan after ${JSON.stringify(relaxation)}`);
          expect(missedBy(after.craft)).toBeLessThanOrEqual(1e-9);
          expect(after.deadBallast).toBeCloseTo(deadBallast, 6);
          kinds.add(relaxation.kind);
          followed++;
          if (!('to' in relaxation)) continue;
          const digit = { angle: Math.PI / 1800, length: 1e-3, mass: 1e-4, count: 1 }[unitOf(relaxation)];
          const less = relaxation.to - Math.sign(relaxation.to - now) * digit * 1.001;
          if (Math.sign(less - now) === Math.sign(relaxation.to - now)) {
            expect(lean(relaxed(craft, movedTo(relaxation, less))).status).toBe('infeasible');
          }
        }
      }),
      { numRuns, endOnFailure: true, seed: 20 },
    );
    expect(followed).toBeGreaterThan(5);
    expect(kinds.size).toBeGreaterThan(2);
  },
);

function unitOf({ kind }: Relaxation): 'angle' | 'length' | 'mass' | 'count' {
  if (kind === 'pitchTolerance' || kind === 'heelTolerance') return 'angle';
  if (kind === 'slide' || kind === 'loadSlide' || kind === 'pendulumDepth') return 'length';
  return kind === 'pieces' ? 'count' : 'mass';
}

test('in ounces and inches the advice, typed as it reads, gives a plan', () => {
  let followed = 0;
  fc.assert(
    fc.property(randomCraft({ hard: true }), (craft) => {
      const plan = planOf(craft, solver, { units: 'imperial' });
      if (plan.status !== 'infeasible') return;
      for (const { relaxation } of plan.remedies) {
        if (!('to' in relaxation)) continue;
        const quantity = quantityOf(relaxation);
        const read = formatQuantity(relaxation.to, quantity, 'imperial');
        const typed = parseQuantity(read, quantity, 'imperial');
        if (!typed.ok) throw new Error(read);
        expect(lean(relaxed(craft, movedTo(relaxation, typed.value))).status).toBe('optimal');
        followed++;
      }
    }),
    { numRuns: 25, endOnFailure: true, seed: 20 },
  );
  expect(followed).toBeGreaterThan(10);
});

test('a load that has to be carried and has nowhere to go is named', () => {
  const craft = fc.sample(randomCraft({}), { numRuns: 1, seed: 1 })[0]!;
  const stuck: Craft = {
    ...craft,
    loads: {
      byId: {
        horn: { id: 'horn', name: 'Horn', mass: 0.01, massTolerance: 0, must: true, rank: 1, options: [] },
      },
      order: ['horn'],
    },
  };
  expect(lean(stuck)).toMatchObject({
    status: 'infeasible',
    why: 'Horn has to be carried and has nowhere to go.',
  });
});
