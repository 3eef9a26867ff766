import { expect, test } from 'vitest';
import { type Craft, keyed, listed } from '../../src/craft/craft.ts';
import { loadHighs } from '../../src/numeric/linearProgram/highsSolver.ts';
import { type PlanFound, planOf } from '../../src/physics/ballast/plan.ts';
import { assess } from '../../src/report/assess.ts';
import type { Geometry } from '../../src/report/assessment.ts';
import {
  alongPlace,
  hardpointFills,
  planView,
  slideLines,
  stowageToDraw,
} from '../../src/report/planView.ts';
import { sampleCraft } from '../samples/readSamples.ts';

const solver = await loadHighs();

function geometry(craft: Craft): Geometry {
  const { geometry: found } = assess(craft);
  if (found.status !== 'solved') throw new Error(found.why);
  return found;
}

function planned(craft: Craft): PlanFound {
  const plan = planOf(craft, solver, { explain: false });
  if ('why' in plan) throw new Error(plan.why);
  return plan;
}

const seen = (name: string) => {
  const craft = sampleCraft(name);
  const plan = planned(craft);
  return { craft, plan, view: planView(plan, geometry(craft), geometry(plan.craft)) };
};

test('ghosts are the parts that slide, from where they are to where the plan puts them', () => {
  const { view } = seen('library-scanner');
  expect(view.ghosts.map(({ piece, from }) => [piece.part, from?.[0], piece.middle[0]])).toEqual([
    ['battery', 1.42, 1.02],
  ]);
  expect(view.weights.map(({ hardpoint }) => hardpoint)).toEqual(['nose', 'port']);
});

test('a load taken aboard is a ghost that comes from nowhere; one left ashore is told where it is', () => {
  const { craft, plan, view } = seen('orchard-counter');
  const fresh = plan.loads.filter(({ placeToday }) => !placeToday).map(({ load }) => load);
  const aboard = view.ghosts.filter(({ from }) => !from).map(({ piece }) => piece.part);
  expect(aboard.sort()).toEqual(fresh.sort());
  const first = plan.loads[0]!;
  const ashore = [{ ...first, place: null }];
  const back = planView({ ...plan, slides: [], loads: ashore }, geometry(plan.craft), geometry(craft));
  expect(back.ghosts).toEqual([]);
  expect(back.ashore.map(({ load }) => load)).toEqual([first.load]);
});

test.each(['orchard-counter', 'planetarium-moon', 'library-scanner', 'museum-atrium'])(
  '%s: the plan fills its hardpoints with its weights and the loads it hangs there, within the limits',
  (name) => {
    const { plan } = seen(name);
    for (const { hardpoint, mass, limit } of hardpointFills(plan.craft)) {
      const ballast = plan.weights.find((weight) => weight.hardpoint === hardpoint)?.mass ?? 0;
      const loads = plan.loads
        .filter((load) => load.hardpoint === hardpoint)
        .reduce((sum, { load }) => sum + plan.craft.loads.byId[load]!.mass, 0);
      expect(mass).toBeCloseTo(ballast + loads, 9);
      expect(mass).toBeLessThanOrEqual(limit + 1e-6);
    }
  },
);

test('lines follow the kind of place: skin and keel at their distance from the hull, the others straight', () => {
  const { hull } = geometry(sampleCraft('library-scanner'));
  const slide = { from: 0.4, to: 2.1 };
  for (const [x, y, z] of alongPlace({ kind: 'skin', station: 1, clock: 2, standoff: 0.03 }, slide, hull)) {
    expect(Math.hypot(y, z)).toBeCloseTo(hull.radius(x, 2) + 0.03, 12);
  }
  for (const [x, y, z] of alongPlace({ kind: 'keel', station: 1, drop: 0.05 }, slide, hull)) {
    expect([y, z]).toEqual([0, expect.closeTo(-hull.radius(x, Math.PI) - 0.05, 12)]);
  }
  expect(alongPlace({ kind: 'axis', station: 1 }, slide, hull)).toEqual([
    [0.4, 0, 0],
    [2.1, 0, 0],
  ]);
  expect(alongPlace({ kind: 'free', x: 1, y: 0.2, z: -0.3 }, slide, hull)).toEqual([
    [0.4, 0.2, -0.3],
    [2.1, 0.2, -0.3],
  ]);
});

test('rails are of what a plan may move: not of locked parts, and of a load the places given for it', () => {
  const craft = sampleCraft('library-scanner');
  const { hull } = geometry(craft);
  expect(slideLines(craft, hull).map(({ owner }) => owner)).toContainEqual({ kind: 'part', id: 'battery' });
  const locked = { ...craft, parts: keyed(listed(craft.parts).map((part) => ({ ...part, locked: true }))) };
  expect(slideLines(locked, hull).filter(({ owner }) => owner.kind === 'part')).toEqual([]);
  const orchard = sampleCraft('orchard-counter');
  const slides = listed(orchard.loads).flatMap(({ id, options }) =>
    options.flatMap(({ kind }, option) => (kind === 'slide' ? [{ kind: 'load', id, option }] : [])),
  );
  expect(slides.length).toBeGreaterThan(0);
  expect(
    slideLines(orchard, hull)
      .map(({ owner }) => owner)
      .filter(({ kind }) => kind === 'load'),
  ).toEqual(slides);
});

test.each(['orchard-counter', 'planetarium-moon', 'library-scanner', 'museum-atrium'])(
  '%s: a stowage on its own is drawn as the plan that it is of',
  (name) => {
    const { craft, plan } = seen(name);
    const { weights, slides, loads, craft: then } = plan;
    const drawn = stowageToDraw(craft, plan.stowage);
    expect(drawn).toMatchObject({ weights, slides, loads, craft: then });
    expect(drawn.deadBallast).toBeCloseTo(plan.deadBallast, 9);
    expect(drawn.deadBallastToday).toBeCloseTo(plan.deadBallastToday, 9);
  },
);

test('what a stowage names that is gone by now is not drawn', () => {
  const { plan } = seen('library-scanner');
  const craft: Craft = { ...plan.craft, hardpoints: keyed([]) };
  const slides = [{ part: 'gone', to: 1 }];
  const drawn = stowageToDraw(craft, { ...plan.stowage, slides });
  expect(plan.weights.length).toBeGreaterThan(0);
  expect([drawn.weights, drawn.slides]).toEqual([[], []]);
});
