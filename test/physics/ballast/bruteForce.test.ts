/**
 * Every way to hang the pieces and place the loads, tried one by one: 500 random small problems. The limits are written
 * anew here, from the moments: |q_x| ≤ tan τ_p (−q_z), |q_y| ≤ tan τ_h (−q_z), heaviness in its band, depth ≥ floor.
 */
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type Craft, listed } from '../../../src/craft/craft.ts';
import { loadHighs } from '../../../src/numeric/linearProgram/highsSolver.ts';
import type { Vec3 } from '../../../src/numeric/vector.ts';
import {
  hangOf,
  heavinessOf,
  type Loading,
  pendulumDepthOf,
  withWeight,
} from '../../../src/physics/balance/loading.ts';
import { planOf } from '../../../src/physics/ballast/plan.ts';
import { craftStateOf } from '../../../src/physics/craftState.ts';
import { positionOf } from '../../../src/physics/mass/position.ts';
import { randomCraft } from './randomCraft.ts';

const solver = await loadHighs();

/** Kept with so much to spare, rad. The plan keeps a hair of 1e-6 from each edge. */
function keeps(craft: Craft, loading: Loading, spare: number): boolean {
  const { heaviness, pitchTolerance, heelTolerance, leastPendulumDepth } = craft.targets;
  const [qx, qy, qz] = hangOf(loading);
  return (
    qz < 0 &&
    Math.abs(qx) <= Math.tan(pitchTolerance - spare) * -qz &&
    Math.abs(qy) <= Math.tan(heelTolerance - spare) * -qz &&
    heavinessOf(loading) <= heaviness.most - spare &&
    heavinessOf(loading) >= heaviness.least + spare &&
    pendulumDepthOf(loading)! >= Math.max(leastPendulumDepth, 1e-4) + spare
  );
}

interface Trial {
  readonly loading: Loading;
  readonly ballast: number;
  /** Room left at each hardpoint and pieces left of each size. */
  readonly room: readonly number[];
  readonly stock: readonly number[];
}

function bruteForce(craft: Craft, spare: number): number {
  const state = craftStateOf(craft);
  if (state.status === 'infeasible') throw new Error(state.why);
  const { hull, loading } = state.value;
  const spots = listed(craft.hardpoints);
  const at = spots.map(({ place }): Vec3 => positionOf(place, hull));
  const loads = listed(craft.loads);
  let best = Number.POSITIVE_INFINITY;

  const hang = (trial: Trial, h: number, k: number): void => {
    if (trial.ballast >= best) return;
    if (h === spots.length) {
      if (keeps(craft, trial.loading, spare)) best = trial.ballast;
      return;
    }
    if (k === craft.pieces.length) {
      hang(trial, h + 1, 0);
      return;
    }
    const { mass } = craft.pieces[k]!;
    for (let count = 0; count <= trial.stock[k]! && count * mass <= trial.room[h]! + 1e-12; count++) {
      hang(
        {
          loading: withWeight(trial.loading, count * mass, at[h]!),
          ballast: trial.ballast + count * mass,
          room: trial.room.with(h, trial.room[h]! - count * mass),
          stock: trial.stock.with(k, trial.stock[k]! - count),
        },
        h,
        k + 1,
      );
    }
  };

  const place = (trial: Trial, l: number): void => {
    const load = loads[l];
    if (!load) {
      hang(trial, 0, 0);
      return;
    }
    if (!load.must) place(trial, l + 1);
    for (const option of load.options) {
      if (option.kind === 'slide') continue;
      const h = craft.hardpoints.order.indexOf(option.hardpoint);
      const room = trial.room.with(h, trial.room[h]! - load.mass);
      if (room[h]! < 0) continue;
      place({ ...trial, room, loading: withWeight(trial.loading, load.mass, at[h]!) }, l + 1);
    }
  };

  const stock = craft.pieces.map(({ count }) => count);
  place({ loading, ballast: 0, room: spots.map(({ limit }) => limit), stock }, 0);
  return best;
}

/** Loads go to hardpoints only, so that there is something to count. */
const withoutSlides = (craft: Craft): Craft => ({
  ...craft,
  loads: {
    ...craft.loads,
    byId: Object.fromEntries(
      listed(craft.loads).map((load) => [
        load.id,
        { ...load, options: load.options.filter(({ kind }) => kind === 'hardpoint') },
      ]),
    ),
  },
});

test('500 random problems of pieces and places: the same least ballast, or none either', () => {
  const seen = { optimal: 0, infeasible: 0, withLoads: 0, withBallast: 0 };
  fc.assert(
    fc.property(randomCraft({ slides: false, pieces: true, loads: 2 }), (random) => {
      const craft = withoutSlides(random);
      const plan = planOf(craft, solver, { explain: false });
      const [lax, strict] = [bruteForce(craft, 0), bruteForce(craft, 3e-6)];
      if (plan.status === 'optimal') {
        seen.optimal++;
        if (plan.loads.some(({ place }) => place)) seen.withLoads++;
        if (plan.deadBallast > 0) seen.withBallast++;
        expect(plan.deadBallast).toBeGreaterThan(lax - 1e-9);
        expect(plan.deadBallast).toBeLessThan(strict + 1e-9);
      } else {
        seen.infeasible++;
        expect(plan.status).toBe('infeasible');
        expect(strict).toBe(Number.POSITIVE_INFINITY);
      }
    }),
    { numRuns: 500, endOnFailure: true, seed: 20 },
  );
  expect(Math.min(...Object.values(seen))).toBeGreaterThan(30);
});
