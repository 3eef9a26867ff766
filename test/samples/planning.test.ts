/** The samples made for planning do what their notes say: what the plan makes of each, and what it says of it. */
import { expect, test } from 'vitest';
import type { Craft } from '../../src/craft/craft.ts';
import { applyPlan, applyRelaxation } from '../../src/edit/edits/plan.ts';
import { loadHighs } from '../../src/numeric/linearProgram/highsSolver.ts';
import { type PlanFound, planOf } from '../../src/physics/ballast/plan.ts';
import { assess } from '../../src/report/assess.ts';
import { planReport } from '../../src/report/planReport.ts';
import { testEdit } from '../edit/testEdit.ts';
import { sampleCraft } from './readSamples.ts';

const solver = await loadHighs();

function planned(craft: Craft): PlanFound {
  const plan = planOf(craft, solver);
  if ('why' in plan) throw new Error(plan.why);
  return plan;
}

const grams = (mass: number): number => Math.round(mass * 1000);

test.each(['orchard-counter', 'planetarium-moon', 'library-scanner', 'museum-atrium'])(
  '%s misses its targets today and meets them with the plan carried out, proven',
  (name) => {
    const craft = sampleCraft(name);
    expect(assess(craft).met).toBe(false);
    const plan = planned(craft);
    expect(plan).toMatchObject({ status: 'optimal', gap: 0, wishesProven: true });
    expect(assess(testEdit(craft, applyPlan(plan.stowage))).met).toBe(true);
  },
);

test('the orchard craft: lead swapped for payload', () => {
  const craft = sampleCraft('orchard-counter');
  const plan = planned(craft);
  expect(grams(plan.deadBallastToday)).toBe(72);
  expect(grams(plan.deadBallast)).toBeLessThan(20);
  expect(plan.loads.every(({ place }) => place !== null)).toBe(true);
  const ashore = { ...craft, loads: { byId: {}, order: [] } };
  expect(planned(ashore).deadBallast).toBeGreaterThan(0.2);
});

test('the moon carrier: whole pieces only, and not more of them than there are', () => {
  const craft = sampleCraft('planetarium-moon');
  const plan = planned(craft);
  for (const { mass, count } of craft.pieces) {
    const used = plan.weights.flatMap(({ pieces }) => pieces.filter((piece) => piece.mass === mass));
    expect(used.reduce((sum, piece) => sum + piece.count, 0)).toBeLessThanOrEqual(count);
  }
  expect(plan.weights.length).toBeGreaterThan(0);
  const cut = planned({
    ...craft,
    hardpoints: {
      ...craft.hardpoints,
      byId: Object.fromEntries(
        Object.entries(craft.hardpoints.byId).map(([id, each]) => [id, { ...each, fill: 'continuous' }]),
      ),
    },
  });
  expect(cut.deadBallast).toBeLessThan(plan.deadBallast);
  expect(plan.deadBallast - cut.deadBallast).toBeLessThan(0.0012);
});

test('the cave craft: no plan until the tray is longer, by as much as the plan says', () => {
  const craft = sampleCraft('cave-mapper');
  const plan = planOf(craft, solver);
  if (plan.status !== 'infeasible') throw new Error('it should not be feasible');
  const longer = plan.remedies.find(({ relaxation }) => relaxation.kind === 'slide')!;
  expect(longer.relaxation).toMatchObject({ part: 'battery', end: 'from' });
  expect(longer.now).toBe(1.05);
  const mended = testEdit(craft, applyRelaxation(longer.relaxation));
  expect(assess(planned(mended).craft).met).toBe(true);
  const { headline, proof, remedies } = planReport(craft, plan);
  expect(headline).toBe('No ballast, slide or place of a load keeps every target at once.');
  expect(proof).toBe('Any one of these would do:');
  expect(remedies.map(({ sentence }) => sentence)).toContainEqual(
    expect.stringMatching(
      /^Let Battery slide to 1\.0\d\d m instead of 1\.050 m; then \d+\.\d g of lead does it\.$/,
    ),
  );
});

test('the library craft: heel and pitch together, and both stand in the way of less', () => {
  const craft = sampleCraft('library-scanner');
  const plan = planned(craft);
  expect(plan.weights.map(({ hardpoint }) => hardpoint)).toEqual(['nose', 'port']);
  expect(plan.slides).toEqual([{ part: 'battery', from: 1.42, to: 1.02 }]);
  expect(plan.binding.map(({ limit }) => limit.kind).sort()).toEqual([
    'heelTolerance',
    'pitchTolerance',
    'slide',
  ]);
});

test('the museum craft: lead replaced by a recorder and lamps', () => {
  const craft = sampleCraft('museum-atrium');
  const plan = planned(craft);
  const { headline, proof } = planReport(craft, plan);
  expect(headline).toMatch(
    /^You do not need 16\d\.\d g of lead\. Slide Battery to 2\.0\d\d m, hang Sound recorder at the chin and hang Row of lamps for the ribs at 0\.600 m, and 11\.8 g at the nose does it\.$/,
  );
  expect(proof).toMatch(/^It cannot be done with less: it may be no more than 30\.0 g light/);
});
