import { expect, test } from 'vitest';
import type { Craft } from '../../src/craft/craft.ts';
import { stationOf } from '../../src/craft/station.ts';
import { stowed } from '../../src/craft/stowage.ts';
import { loadHighs } from '../../src/numeric/linearProgram/highsSolver.ts';
import { type PlanFound, planOf } from '../../src/physics/ballast/plan.ts';
import { planDifferences } from '../../src/report/planDifferences.ts';
import { planSteps } from '../../src/report/planWords.ts';
import { say } from '../../src/units/sentence.ts';
import { sampleCraft } from '../samples/readSamples.ts';

const solver = await loadHighs();

function planFor(craft: Craft): PlanFound {
  const plan = planOf(craft, solver, { explain: false });
  if ('why' in plan) throw new Error(plan.why);
  return plan;
}

const SAMPLES = ['orchard-counter', 'planetarium-moon', 'library-scanner', 'museum-atrium'];

test.each(SAMPLES)('%s: as many things differ from today as the plan has steps', (name) => {
  const craft = sampleCraft(name);
  const plan = planFor(craft);
  const differences = planDifferences(craft, plan.craft);
  expect(differences.length).toBe(planSteps(craft, plan).length);
  expect(differences.length).toBeGreaterThan(0);
  const back = planDifferences(plan.craft, craft).map(({ key, words: [a, b] }) => [key, b, a]);
  expect(back.sort()).toEqual(differences.map(({ key, words }) => [key, ...words]).sort());
});

test.each(SAMPLES)('%s: nothing differs from itself', (name) => {
  const craft = sampleCraft(name);
  expect(planDifferences(craft, { ...craft })).toEqual([]);
  expect(planDifferences(planFor(craft).craft, stowed(craft, planFor(craft).stowage))).toEqual([]);
});

test('two plans: lead by hardpoint, a slide by its station, a load by where it hangs or that it is ashore', () => {
  const craft = sampleCraft('orchard-counter');
  const { stowage } = planFor(craft);
  const [first] = stowage.loads;
  const part = Object.values(craft.parts.byId).find(({ kind }) => kind === 'battery')!;
  const [nose] = craft.hardpoints.order;
  const one = stowed(craft, { ...stowage, weights: [] });
  const other = stowed(craft, {
    weights: [{ hardpoint: nose!, pieces: [{ mass: 0.03, count: 2 }] }],
    slides: [{ part: part.id, to: 1.234 }],
    loads: stowage.loads.filter((load) => load !== first),
  });
  const words = Object.fromEntries(planDifferences(one, other).map((each) => [each.key, each.words]));
  expect(words).toMatchObject({
    [`lead ${nose}`]: ['none', say(0.06, 'mass')],
    [`part ${part.id}`]: [
      `at ${say(stationOf(one.parts.byId[part.id]!.place), 'length')}`,
      `at ${say(1.234, 'length')}`,
    ],
    [`part ${first!.load}`]: [expect.stringMatching(/^at /), 'ashore'],
  });
});
