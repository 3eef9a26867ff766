import { expect, test } from 'vitest';
import type { Craft } from '../../src/craft/craft.ts';
import { loadHighs } from '../../src/numeric/linearProgram/highsSolver.ts';
import { planOf } from '../../src/physics/ballast/plan.ts';
import { assess } from '../../src/report/assess.ts';
import { beamOf } from '../../src/scene/beam.ts';
import { layBeam } from '../../src/scene/beamLayout.ts';
import { layTwo, planBeamInWords } from '../../src/scene/beamPlan.ts';
import { fromSide, hardpointPoints } from '../../src/scene/flatten.ts';
import { LIGHT } from '../../src/scene/palette.ts';
import { gaugesOf, ghostMarks, plannedBob, weightMarks } from '../../src/scene/planMarks.ts';
import { type Planned, type PlanToDraw, plannedOf } from '../../src/scene/planned.ts';
import { carryWords, fillWords, piecesWords, planInWords } from '../../src/scene/planWords.ts';
import { type Geometry, geometryOf } from '../../src/scene/subject.ts';
import { sampleCraft } from '../samples/readSamples.ts';
import { VIEW } from './fixture.ts';

const solver = await loadHighs();

interface Shown {
  readonly craft: Craft;
  readonly plan: PlanToDraw;
  readonly today: Geometry;
  readonly planned: Planned;
}

function shown(name: string): Shown {
  const craft = sampleCraft(name);
  const plan = planOf(craft, solver, { explain: false });
  if ('why' in plan) throw new Error(plan.why);
  const today = geometryOf(assess(craft))!;
  return { craft, plan, today, planned: plannedOf({ plan, planned: assess(plan.craft) }, today)! };
}

const moon = shown('planetarium-moon');
const library = shown('library-scanner');
const orchard = shown('orchard-counter');

test('there is nothing to draw until the plan and how it floats are both there', () => {
  expect(plannedOf({}, moon.today)).toBeNull();
  expect(plannedOf({ plan: moon.plan, planned: null }, moon.today)).toBeNull();
});

test('a ghost stands at the planned station, with an arrow from today and that station beside it', () => {
  const [ghost] = ghostMarks(library.planned, library.today, 0.004, 'metric');
  expect(ghost!.label).toBe('1.020 m');
  expect(ghost!.figure.middle.u).toBeCloseTo(1.02, 9);
  expect(ghost!.arrow).toMatchObject({ from: { u: 1.42 }, to: { u: 1.02 } });
});

test('a load that comes aboard has no arrow and says its name', () => {
  const fresh = ghostMarks(orchard.planned, orchard.today, 0.004, 'metric').filter(({ arrow }) => !arrow);
  expect(fresh.length).toBeGreaterThan(0);
  for (const { label } of fresh) expect(label).toMatch(/^\D+ \d+\.\d{3} m$/);
});

test('weights hang under their hardpoints with their mass and the pieces that make it, none over another', () => {
  const { today, planned } = moon;
  const [mark] = weightMarks(planned, VIEW, 'metric');
  expect(mark!.lines).toEqual([
    expect.stringMatching(/^\d+\.\d g$/),
    piecesWords(planned.weights[0]!.pieces, 'metric'),
  ]);
  const spot = today.hardpoints[0]!.at;
  const twice = {
    ...planned,
    weights: [1, 2, 3].map((n) => ({ ...planned.weights[0]!, at: spot, hardpoint: `${n}` })),
  };
  const drops = weightMarks(twice, VIEW, 'metric').map(({ drop }) => drop);
  expect(new Set(drops).size).toBe(3);
});

test('gauges show what the plan hangs there, and today without a plan', () => {
  const { craft, today, planned } = moon;
  const points = hardpointPoints(today, fromSide);
  const nose = (of: Planned | null) =>
    gaugesOf(craft, of, points, VIEW, 'metric').find(({ id }) => id === planned.weights[0]!.hardpoint)!;
  const { limit } = craft.hardpoints.byId[planned.weights[0]!.hardpoint]!;
  expect(nose(planned)).toMatchObject({
    share: expect.closeTo(planned.weights[0]!.mass / limit, 9),
    pieces: true,
  });
  expect(nose(null).share).toBe(0);
});

test('how full a hardpoint is, in words', () => {
  expect(fillWords({ hardpoint: 'a', mass: 0.011, limit: 0.2, fill: 'pieces' }, 'metric')).toBe(
    '11.0 of 200.0 g, in pieces',
  );
});

test('the bob of the plan shows only where it hangs apart from today’s', () => {
  const { planned, today } = library;
  expect(plannedBob(planned, today, VIEW)?.bob).not.toBeNull();
  expect(plannedBob({ ...planned, after: today }, today, VIEW)).toBeNull();
});

test('two beams share one scale, whichever reaches farther, and still fit', () => {
  for (const { today, planned } of [moon, library, orchard]) {
    for (const view of [VIEW, { ...VIEW, originX: -300 }]) {
      const beam = beamOf(today.beam, today.lead);
      const two = layTwo(beam, planned.after, view);
      expect(two.today.scale).toBeCloseTo(two.plan.page.scale, 9);
      expect(two.today.scale).toBeLessThanOrEqual(layBeam(beam, view).scale);
      for (const { bar, left, right } of [...two.today.bars, ...two.plan.page.bars]) {
        expect(right - left).toBeCloseTo(Math.abs(bar.moment) * two.today.scale, 6);
      }
    }
  }
});

test('the plan in words: what moves, what hangs where, what it comes to', () => {
  const { craft, plan } = library;
  const planned = assess(plan.craft);
  const subject = { craft, assessment: assess(craft), units: 'metric' as const, palette: LIGHT };
  expect(planInWords(subject, {})).toBe('');
  expect(planInWords(subject, { plan, planned })).toMatch(
    /^Plan: Battery to 1\.020 m; \d+\.\d g at hardpoint Nose; \d+\.\d g at hardpoint Port flank\. Dead ballast \d+\.\d g instead of 0\.0 g; it then floats .+\.$/,
  );
  const bare = { ...plan, slides: [], weights: [], loads: [] };
  expect(planInWords(subject, { plan: bare, planned })).toMatch(/^Plan: everything stays where it is\./);
  const after = geometryOf(planned)!;
  expect(planBeamInWords(beamOf(after.beam, null), 'metric')).toMatch(
    /^With the plan: \d+\.\d\d g·m forward, \d+\.\d\d g·m aft; .+\.$/,
  );
});

test('pieces are counted, with no zeros that say nothing', () => {
  const pieces = [
    { mass: 0.005, count: 2 },
    { mass: 0.001, count: 1 },
    { mass: 0.0012, count: 8 },
  ];
  expect(piecesWords(pieces, 'metric')).toBe('2 × 5 g + 1 g + 8 × 1.2 g');
});

test('a station of the curve says how much, or why nothing', () => {
  const spot = { station: 0.42, mass: 0.085, deadBallast: 0.011, proven: true };
  expect(carryWords(spot, 'metric')).toBe(
    'Station 0.420 m: up to 85.0 g of load, which leaves 11.0 g of dead ballast.',
  );
  expect(carryWords({ ...spot, proven: false }, 'metric')).toContain('at least 85.0 g');
  expect(carryWords({ ...spot, mass: null, deadBallast: null }, 'metric')).toBe(
    'Station 0.420 m: no plan keeps every target, whatever hangs here.',
  );
  expect(carryWords({ ...spot, mass: null, deadBallast: null, proven: false }, 'metric')).toBe(
    'Station 0.420 m: no plan was found in the time there was.',
  );
});
