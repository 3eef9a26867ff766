/** What can be carried where, against one weight for both, against plans with the load put there, and for each load. */
import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Craft } from '../../../src/craft/craft.ts';
import { loadHighs } from '../../../src/numeric/linearProgram/highsSolver.ts';
import { levellingWeight } from '../../../src/physics/balance/counterweight.ts';
import { oneWeight } from '../../../src/physics/balance/oneWeight.ts';
import { type CarryCurve, type CarryLine, carryCurve } from '../../../src/physics/ballast/carry.ts';
import { carryTable } from '../../../src/physics/ballast/carryTable.ts';
import { LivePlanner } from '../../../src/physics/ballast/live.ts';
import { planOf } from '../../../src/physics/ballast/plan.ts';
import { craftStateOf } from '../../../src/physics/craftState.ts';
import { partOf } from '../../edit/craftFixture.ts';
import { sampleCraft } from '../../samples/readSamples.ts';
import { randomCraft } from './randomCraft.ts';

const solver = await loadHighs();

function curve(craft: Craft, line: CarryLine = { kind: 'keel' }, stations = 11): CarryCurve {
  const outcome = carryCurve(craft, solver, line, { stations });
  if (outcome.status === 'infeasible') throw new Error(outcome.why);
  return outcome.value;
}

/** The craft with a part of that mass at a point of the curve. */
const laden = (craft: Craft, place: CarryCurve['points'][number]['place'], mass: number): Craft => ({
  ...craft,
  parts: {
    byId: { ...craft.parts.byId, laden: partOf('laden', { kind: 'load', mass, massTolerance: 0, place }) },
    order: [...craft.parts.order, 'laden'],
  },
});

test.each([
  ['straight', {}],
  ['curved', { curved: true }],
  ['pieces', { pieces: true }],
] as const)('%s: what the curve says can be carried can; a gram more cannot', (_, want) => {
  let tried = 0;
  fc.assert(
    fc.property(randomCraft(want), (craft) => {
      for (const { place, mass, deadBallast } of curve(craft, { kind: 'keel' }, 6).points) {
        if (mass === null) continue;
        const plan = planOf(laden(craft, place, mass - 1e-6), solver, { explain: false });
        if ('why' in plan) throw new Error(`${mass} at ${JSON.stringify(place)}: ${plan.why}`);
        expect(plan.deadBallast).toBeLessThan(deadBallast! + 2e-5);
        expect(planOf(laden(craft, place, mass + 1e-3), solver, { explain: false }).status).toBe(
          'infeasible',
        );
        tried++;
      }
    }),
    { numRuns: 15, endOnFailure: true, seed: 20 },
  );
  expect(tried).toBeGreaterThan(20);
});

test('without ballast: forward of the station of the one weight as much as levels, aft of it nothing', () => {
  const sample = sampleCraft('worked-example');
  const nose = { ...sample.hardpoints.byId.nose!, limit: 0 };
  const craft: Craft = {
    ...sample,
    hardpoints: { ...sample.hardpoints, byId: { nose } },
    targets: {
      heaviness: { least: -10, most: 0 },
      pitchTolerance: 1e-5,
      heelTolerance: 0.1,
      leastPendulumDepth: 0,
      turnTime: null,
      sideGust: null,
    },
  };
  const state = craftStateOf(craft);
  if (state.status === 'infeasible') throw new Error(state.why);
  const { loading, hull } = state.value;
  const one = oneWeight(loading, hull.length, 1);
  if (one.status === 'infeasible') throw new Error(one.why);
  const { points } = curve(craft, { kind: 'axis' }, 121);
  for (const { station, mass, deadBallast } of points) {
    if (station > one.value.station) {
      expect(mass).toBeNull();
      continue;
    }
    const levels = levellingWeight(loading, [station, 0, 0]);
    expect(levels.status === 'solved' && Math.abs(levels.value - mass!)).toBeLessThan(2e-5);
    expect(deadBallast).toBe(0);
  }
});

test('the lines: keel, axis, that of a hardpoint; a hardpoint that is gone', () => {
  const craft = sampleCraft('library-scanner');
  expect(curve(craft, { kind: 'axis' }).points.every(({ place }) => place.kind === 'axis')).toBe(true);
  const flank = curve(craft, { kind: 'hardpoint', hardpoint: 'port' });
  expect(flank.points.every(({ place }) => place.kind === 'skin')).toBe(true);
  expect(flank.points.map(({ station }) => station)).toEqual(
    curve(craft).points.map(({ station }) => station),
  );
  expect(carryCurve(craft, solver, { kind: 'hardpoint', hardpoint: 'mast' })).toMatchObject({
    status: 'infeasible',
    why: 'The hardpoint of that line is gone.',
  });
});

test('the curve stops when asked, and says that it is not complete', () => {
  const craft = sampleCraft('library-scanner');
  let told = 0;
  const outcome = carryCurve(
    craft,
    solver,
    { kind: 'keel' },
    { onProgress: () => told++, shouldStop: () => told >= 5 },
  );
  expect(outcome).toMatchObject({ status: 'solved', value: { complete: false } });
  expect(outcome.status === 'solved' && outcome.value.points).toHaveLength(5);
});

test('the table of loads: dead ballast without and with each, as planned with it forbidden and forced', () => {
  const craft = sampleCraft('orchard-counter');
  const { rows, complete } = carryTable(craft, solver);
  expect(complete).toBe(true);
  expect(rows.map(({ load }) => load)).toEqual(craft.loads.order);
  const force = (id: string, change: object): number => {
    const byId = { ...craft.loads.byId, [id]: { ...craft.loads.byId[id]!, ...change } };
    const plan = planOf({ ...craft, loads: { ...craft.loads, byId } }, solver, { explain: false });
    return 'why' in plan ? Number.NaN : plan.deadBallast;
  };
  for (const row of rows) {
    expect(row.without).toBeCloseTo(force(row.load, { must: false, options: [] }), 7);
    expect(row.with).toBeCloseTo(force(row.load, { must: true }), 7);
    expect(row.saved).toBeCloseTo(row.without! - row.with!, 12);
    expect(row.place).not.toBeNull();
  }
  // A load that hangs where lead would have to saves about its own mass of it.
  expect(rows.find(({ load }) => load === 'second-battery')!.saved).toBeGreaterThan(0.1);
});

test('the live plan of each frame of a drag has the least ballast of the full plan', () => {
  const live = new LivePlanner(solver);
  fc.assert(
    fc.property(randomCraft({ curved: true, hard: true }), (craft) => {
      for (let frame = 0; frame < 8; frame++) {
        const thruster = {
          ...craft.parts.byId.thruster!,
          place: { kind: 'axis', station: 2.2 + 0.1 * frame } as const,
        };
        const moved = { ...craft, parts: { ...craft.parts, byId: { ...craft.parts.byId, thruster } } };
        const [following, full] = [live.plan(moved)!, planOf(moved, solver, { explain: false })];
        expect(following.status).toBe(full.status);
        if ('why' in following || 'why' in full) continue;
        expect(following.deadBallast).toBeCloseTo(full.deadBallast, 5);
      }
    }),
    { numRuns: 20, endOnFailure: true, seed: 20 },
  );
  live.dispose();
});

test('with pieces or places to choose there is no live plan', () => {
  const live = new LivePlanner(solver);
  expect(live.plan(sampleCraft('planetarium-moon'))).toBeNull();
  expect(live.plan(sampleCraft('orchard-counter'))).toBeNull();
  live.dispose();
});
