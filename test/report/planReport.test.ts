import fc from 'fast-check';
import { expect, test } from 'vitest';
import { keyed, listed } from '../../src/craft/craft.ts';
import { loadHighs } from '../../src/numeric/linearProgram/highsSolver.ts';
import { type PlanFound, planOf } from '../../src/physics/ballast/plan.ts';
import { planJson } from '../../src/report/planJson.ts';
import { planReport } from '../../src/report/planReport.ts';
import { planHeadline, weightWords } from '../../src/report/planWords.ts';
import { partOf } from '../edit/craftFixture.ts';
import { randomCraft } from '../physics/ballast/randomCraft.ts';
import { notFinite } from '../samples/finite.ts';
import { sampleCraft } from '../samples/readSamples.ts';

const solver = await loadHighs();

test('every sentence is whole: no braces, no missing value, a full stop or colon at the end', () => {
  fc.assert(
    fc.property(
      randomCraft({ loads: 2, hard: true }),
      randomCraft({ pieces: true, loads: 1 }),
      fc.constantFrom('metric' as const, 'imperial' as const),
      (a, b, units) => {
        for (const craft of [a, b]) {
          const report = planReport(craft, planOf(craft, solver), units);
          const sentences = [
            report.headline,
            report.proof,
            ...report.steps,
            ...report.binding.map(({ sentence }) => sentence),
            ...report.remedies.map(({ sentence }) => sentence),
          ].filter(Boolean);
          for (const sentence of sentences) {
            expect(sentence).toMatch(/^\S.*[.:]$/);
            expect(sentence).not.toMatch(/[{}]|undefined|null|NaN/);
          }
          if (units === 'imperial') expect(sentences.join(' ')).not.toMatch(/\d (g|mm|m)\b/);
        }
      },
    ),
    { numRuns: 25, endOnFailure: true, seed: 20 },
  );
});

test('JSON has the keys that scripts rely on, in SI, and survives being written', () => {
  const craft = sampleCraft('library-scanner');
  const json = planJson(craft, planOf(craft, solver));
  expect(JSON.parse(JSON.stringify(json))).toEqual(json);
  expect(notFinite(json)).toEqual([]);
  const { plan } = json as { plan: Record<string, unknown> };
  expect(Object.keys(plan)).toEqual(
    expect.arrayContaining([
      'status',
      'deadBallast',
      'weights',
      'slides',
      'loads',
      'after',
      'binding',
      'gap',
      'bound',
    ]),
  );
  expect(plan).toMatchObject({
    status: 'optimal',
    gap: 0,
    weights: [{ hardpoint: 'nose' }, { hardpoint: 'port' }],
    slides: [{ part: 'battery', from: 1.42, to: 1.02 }],
    binding: [
      { limit: 'heelTolerance', unit: 'kg/rad' },
      { limit: 'pitchTolerance', unit: 'kg/rad' },
      { limit: 'slide battery from', unit: 'kg/m' },
    ],
    after: { 'float.heel': { unit: 'rad', status: 'solved' } },
  });
});

test('JSON of a craft without a plan gives the relaxations', () => {
  const craft = sampleCraft('cave-mapper');
  expect(planJson(craft, planOf(craft, solver))).toMatchObject({
    plan: {
      status: 'infeasible',
      relaxations: expect.arrayContaining([
        expect.objectContaining({ limit: 'slide battery from', now: 1.05 }),
        expect.objectContaining({ limit: 'hardpoint nose', now: 0.008 }),
      ]),
    },
  });
});

const craft = sampleCraft('museum-atrium');
const nothing: PlanFound = {
  status: 'optimal',
  robust: false,
  stowage: { weights: [], slides: [], loads: [] },
  craft,
  deadBallast: 0,
  deadBallastToday: 0,
  deadBallastFixed: 0,
  weights: [],
  slides: [],
  loads: [],
  bound: 0,
  gap: 0,
  wishesProven: true,
  disagreement: { pitch: 0, heel: 0, mass: 0 },
  binding: [],
  bindingComplete: true,
};

test.each<[string, Partial<PlanFound>, string]>([
  ['nothing to do', {}, 'The craft is as planned already, with no lead: nothing to do.'],
  [
    'lead to take out',
    { deadBallastToday: 0.07 },
    'You do not need {0.07 mass} of lead. No lead is needed any more.',
  ],
  [
    'a slide alone',
    { slides: [{ part: 'battery', from: 2.12, to: 1.9 }] },
    'Slide Battery to {1.9 length}: then no lead is needed.',
  ],
  [
    'a move too small to tell',
    { slides: [{ part: 'battery', from: 2.12, to: 2.1201 }] },
    'The craft is as planned already, with no lead: nothing to do.',
  ],
  [
    'lead that stays',
    {
      deadBallast: 0.03,
      deadBallastFixed: 0.02,
      deadBallastToday: 0.03,
      weights: [{ hardpoint: 'nose', mass: 0.01, pieces: [] }],
    },
    '{0.01 mass} at the nose does it, besides the {0.02 mass} that stay where they are.',
  ],
  [
    'a load put ashore',
    {
      loads: [
        { load: 'sound-recorder', place: null, hardpoint: null, placeToday: { kind: 'axis', station: 1 } },
      ],
    },
    'Leave Sound recorder ashore: then no lead is needed.',
  ],
])('%s', (_, change, headline) => {
  expect(planHeadline(craft, { ...nothing, ...change }, null)).toBe(headline);
});

test('pieces are counted in words', () => {
  const pieces = [
    { mass: 0.005, count: 2 },
    { mass: 0.001, count: 1 },
  ];
  expect(weightWords(craft, { hardpoint: 'nose', mass: 0.011, pieces })).toBe(
    'two {0.005 mass} pieces and one {0.001 mass} piece at the nose',
  );
});

test('a plan carried out has nothing left to do', () => {
  const craft = sampleCraft('museum-atrium');
  const plan = planOf(craft, solver);
  if ('why' in plan) throw new Error(plan.why);
  const again = planOf(plan.craft, solver);
  const { headline, steps } = planReport(plan.craft, again);
  expect(steps).toEqual([]);
  expect(headline).toMatch(/^The craft is as planned already, with 11\.\d g of lead: nothing to do\.$/);
});

test('lead that hangs there already is told of: changed or taken off, never hung twice', () => {
  const craft = sampleCraft('museum-atrium');
  const { place } = craft.hardpoints.byId.nose!;
  const lead = partOf('lump', { kind: 'ballast', mass: 0.061, massTolerance: 0, place });
  const leaded = { ...craft, parts: keyed([...listed(craft.parts), lead]) };
  const { steps } = planReport(leaded, planOf(leaded, solver));
  expect(steps.at(-1)).toMatch(
    /^Hang \d+\.\d g at the nose instead of the 61\.0 g there\.$|^Take the 61\.0 g of lead off the nose\.$/,
  );
});

test('a robust plan that the spread of masses forbids says how wide the spread is, and what to weigh', () => {
  const craft = sampleCraft('museum-atrium');
  const { proof } = planReport(craft, planOf(craft, solver, { robust: true }));
  expect(proof).toMatch(
    /All masses together may be off by ±\d+\.\d g, and the band of heaviness is only 50\.0 g wide/,
  );
  expect(proof).toContain('the film (±');
});
