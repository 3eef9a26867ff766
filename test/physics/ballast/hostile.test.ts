/** Damaged and degenerate crafts: a status and a sentence every time, within the time asked for. */
import { expect, test } from 'vitest';
import { type Craft, keyed, listed } from '../../../src/craft/craft.ts';
import { parseJson } from '../../../src/craft/parse.ts';
import { serialize } from '../../../src/craft/serialize.ts';
import { loadHighs } from '../../../src/numeric/linearProgram/highsSolver.ts';
import { carryCurve } from '../../../src/physics/ballast/carry.ts';
import { carryTable } from '../../../src/physics/ballast/carryTable.ts';
import { LivePlanner } from '../../../src/physics/ballast/live.ts';
import { type Plan, planOf } from '../../../src/physics/ballast/plan.ts';
import { damagedJson, seeded } from '../../craft/mutator.ts';
import { partOf } from '../../edit/craftFixture.ts';
import { loadOf, planningCraft } from '../../edit/planningFixture.ts';
import { notFinite } from '../../samples/finite.ts';
import { sampleText } from '../../samples/readSamples.ts';

const solver = await loadHighs();

function check(plan: Plan): void {
  expect(notFinite({ ...plan, craft: null })).toEqual([]);
  if ('why' in plan) {
    expect(plan.why).toMatch(/\.$/);
    return;
  }
  expect(plan.deadBallast).toBeGreaterThanOrEqual(plan.bound);
  expect(Math.abs(plan.disagreement.mass)).toBeLessThan(1e-4);
  expect(Math.abs(plan.disagreement.pitch)).toBeLessThan(2e-4);
}

/** The small craft of every sort of entry, with targets that it can meet. */
const base: Craft = {
  ...planningCraft(),
  targets: {
    heaviness: { least: -1.2, most: 0.1 },
    pitchTolerance: 0.1,
    heelTolerance: 0.1,
    leastPendulumDepth: 0.01,
    turnTime: null,
    sideGust: null,
  },
};

test('1,000 damaged crafts', () => {
  const random = seeded(77);
  const texts = [
    serialize(base),
    ...['planetarium-moon', 'library-scanner', 'warehouse-stock', 'cave-mapper', 'worked-example'].map(
      sampleText,
    ),
  ];
  const seen = new Map<string, number>();
  let planned = 0;
  for (let i = 0; planned < 1000; i++) {
    const parsed = parseJson(damagedJson(random, texts[i % texts.length]!));
    if (!parsed.ok) continue;
    planned++;
    const plan = planOf(parsed.craft, solver, {
      timeLimit: 1,
      explain: planned % 50 === 0,
      robust: planned % 3 === 0,
    });
    check(plan);
    seen.set(plan.status, (seen.get(plan.status) ?? 0) + 1);
  }
  expect(seen.get('optimal')).toBeGreaterThan(200);
  expect(seen.get('infeasible')).toBeGreaterThan(200);
}, 120_000);

const eachPart = (change: object): Craft => ({
  ...base,
  parts: keyed(listed(base.parts).map((part) => ({ ...part, ...change }))),
});
const targets = (change: Partial<Craft['targets']>): Craft => ({
  ...base,
  targets: { ...base.targets, ...change },
});

const degenerate: Record<string, Craft> = {
  'nothing weighs anything': { ...eachPart({ mass: 0 }), film: { ...base.film, arealDensity: 0 } },
  'nothing weighs anything and has a tolerance': {
    ...eachPart({ mass: 0, massTolerance: 1 }),
    film: { ...base.film, arealDensity: 0 },
  },
  'all is locked': eachPart({ locked: true }),
  'everything weighs a tonne': eachPart({ mass: 1000 }),
  'a hardpoint on the CB alone': {
    ...base,
    hardpoints: keyed([
      { id: 'cb', name: 'CB', place: { kind: 'axis', station: 1.5 }, limit: 1000, fill: 'continuous' },
    ]),
    leadAt: 'cb',
    loads: keyed([]),
  },
  'a hardpoint that holds nothing': {
    ...base,
    hardpoints: keyed(listed(base.hardpoints).map((each) => ({ ...each, limit: 0 }))),
  },
  'a band of no width': targets({ heaviness: { least: 0, most: 0 } }),
  'no tolerance at all': targets({ pitchTolerance: 0, heelTolerance: 0 }),
  'any attitude will do': targets({ pitchTolerance: Math.PI / 2, heelTolerance: Math.PI / 2 }),
  'a pendulum deeper than the hull': targets({ leastPendulumDepth: 50 }),
  'a band far out of reach': targets({ heaviness: { least: 900, most: 1000 } }),
  'slides of no length': eachPart({ slide: { from: 1, to: 1 } }),
  'slides beyond the hull': eachPart({ slide: { from: -50, to: 50 } }),
  'slides that begin where the part is not': eachPart({ slide: { from: 20, to: 30 } }),
  'no parts': { ...base, parts: keyed([]), wires: keyed([]) },
  'a gas that does not lift': { ...base, gas: { ...base.gas, purity: 0 } },
  'parts with the mass of a grain': eachPart({ mass: 1e-9 }),
};

test.each(Object.entries(degenerate))('%s', (_, craft) => {
  for (const robust of [false, true])
    check(planOf(craft, solver, { timeLimit: 3, robust, explain: !robust }));
  const live = new LivePlanner(solver);
  const following = live.plan({ ...craft, loads: keyed([]), pieces: [] });
  live.dispose();
  check(following!);
  const curve = carryCurve(craft, solver, { kind: 'keel' }, { stations: 7, timeLimit: 2 });
  expect(notFinite(curve)).toEqual([]);
  expect(notFinite(carryTable(craft, solver, { timeLimit: 2 }))).toEqual([]);
});

/** Far more to choose than any craft has. */
const crowded: Craft = {
  ...base,
  parts: keyed(
    Array.from({ length: 300 }, (_, i) =>
      partOf(`p${i}`, {
        mass: 0.002,
        massTolerance: 0.0001,
        place: { kind: 'keel', station: 0.01 * i, drop: 0 },
        slide: { from: 0, to: 3 },
      }),
    ),
  ),
  wires: keyed([]),
  pieces: Array.from({ length: 40 }, (_, k) => ({ mass: 0.001 * (k + 1), count: 1000 })),
  loads: keyed(
    Array.from({ length: 200 }, (_, i) =>
      loadOf(`l${i}`, {
        mass: 0.0013 + 0.0001 * (i % 17),
        options: [
          { kind: 'hardpoint', hardpoint: 'nose' },
          { kind: 'slide', place: { kind: 'keel', station: 1, drop: 0 }, from: 0.2, to: 2.8 },
        ],
      }),
    ),
  ),
};

/** A hang would run into the test's own time limit. */
test.each([false, true])('a crowded craft, robust: %s', (robust) => {
  check(planOf(crowded, solver, { timeLimit: 1, robust }));
});

test('asked to stop, it stops with what it has', () => {
  let asked = 0;
  const plan = planOf(crowded, solver, { timeLimit: 20, shouldStop: () => ++asked > 3 });
  check(plan);
  expect(asked).toBeGreaterThan(3);
});
