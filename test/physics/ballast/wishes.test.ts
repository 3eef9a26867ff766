/** What a plan looks for after least dead ballast, in the builder's order. */
import { expect, test } from 'vitest';
import { type Craft, keyed } from '../../../src/craft/craft.ts';
import type { Load, Wish } from '../../../src/craft/planningSchema.ts';
import { stationOf } from '../../../src/craft/station.ts';
import { loadHighs } from '../../../src/numeric/linearProgram/highsSolver.ts';
import { type PlanFound, planOf } from '../../../src/physics/ballast/plan.ts';
import { partOf, wireOf } from '../../edit/craftFixture.ts';
import { loadOf } from '../../edit/planningFixture.ts';
import { sampleCraft } from '../../samples/readSamples.ts';

const solver = await loadHighs();

/** Level and in its band as it is, with a battery that may slide and a wire from it to the tail. */
function levelCraft(loads: readonly Load[], wishes: Wish[]): Craft {
  const sample = sampleCraft('worked-example');
  return {
    ...sample,
    film: { ...sample.film, arealDensity: 0 },
    parts: keyed([
      partOf('battery', {
        mass: 0.3,
        place: { kind: 'keel', station: 1.4, drop: 0.02 },
        slide: { from: 0.9, to: 1.9 },
      }),
      partOf('thruster', { mass: 0.02, place: { kind: 'axis', station: 2.8 } }),
      partOf('deck', { mass: 1, place: { kind: 'keel', station: 1.48, drop: 0.05 } }),
    ]),
    wires: keyed([wireOf('power', { massPerMetre: 0.002 })]),
    loads: keyed(loads),
    wishes,
    targets: {
      heaviness: { least: -0.5, most: 0.05 },
      pitchTolerance: 0.05,
      heelTolerance: 0.05,
      leastPendulumDepth: 0.1,
      turnTime: null,
      sideGust: null,
    },
  };
}

function planned(craft: Craft): PlanFound {
  const plan = planOf(craft, solver, { explain: false });
  if ('why' in plan) throw new Error(plan.why);
  expect(plan).toMatchObject({ status: 'optimal', wishesProven: true, deadBallast: 0 });
  return plan;
}

const carried = ({ loads }: PlanFound): string[] =>
  loads.filter(({ place }) => place).map(({ load }) => load);

/** At the nose, where it needs the battery farther aft to balance it. */
const horn = loadOf('horn', { mass: 0.1, options: [{ kind: 'hardpoint', hardpoint: 'nose' }] });

test('useful load before fewest moved carries it and moves the battery; the other way round, neither', () => {
  const eager = planned(levelCraft([horn], ['usefulLoad', 'fewestMoved']));
  expect([carried(eager), eager.slides.length]).toEqual([['horn'], 1]);
  const still = planned(levelCraft([horn], ['fewestMoved', 'usefulLoad']));
  expect([carried(still), still.slides.length]).toEqual([[], 0]);
});

test('without a wish the fewest parts move, and those that must move the least', () => {
  const plan = planned(levelCraft([{ ...horn, must: true }], []));
  const [slide] = plan.slides;
  expect(slide!.to).toBeGreaterThan(1.4);
  const less = { ...levelCraft([{ ...horn, must: true }], []) };
  const stopped = { from: 0.9, to: slide!.to - 1e-3 };
  const short = { ...less.parts.byId.battery!, slide: stopped };
  const shorter: Craft = { ...less, parts: { ...less.parts, byId: { ...less.parts.byId, battery: short } } };
  const worse = planOf(shorter, solver, { explain: false });
  expect('why' in worse || worse.deadBallast > 1e-6).toBe(true);
});

test('least wire brings the battery as near the tail as the limits let it', () => {
  const still = planned(levelCraft([], ['fewestMoved', 'leastWire']));
  expect(still.slides).toEqual([]);
  const near = planned(levelCraft([], ['leastWire', 'fewestMoved']));
  expect(near.slides[0]!.to).toBeGreaterThan(1.5);
});

test('of loads that do not all fit, the rank decides before the mass', () => {
  const both = [
    loadOf('big', { mass: 0.2, rank: 2, options: [{ kind: 'hardpoint', hardpoint: 'nose' }] }),
    loadOf('small', { mass: 0.05, rank: 1, options: [{ kind: 'hardpoint', hardpoint: 'nose' }] }),
  ];
  const craft = (loads: Load[]): Craft => {
    const level = levelCraft(loads, ['usefulLoad']);
    const nose = {
      ...level.hardpoints.byId.nose!,
      place: { kind: 'keel', station: 1.5, drop: 0 } as const,
      limit: 0.2,
    };
    return { ...level, hardpoints: { ...level.hardpoints, byId: { nose } } };
  };
  expect(carried(planned(craft(both)))).toEqual(['small']);
  expect(carried(planned(craft(both.map((load) => ({ ...load, rank: 1 })))))).toEqual(['big']);
});

test('a load aboard stays where it is rather than move, and goes ashore when there is no lift for it', () => {
  const place = { kind: 'keel', station: 1.2, drop: 0.02 } as const;
  const probe = loadOf('probe', { mass: 0.05, options: [{ kind: 'slide', place, from: 1, to: 1.8 }] });
  const craft = levelCraft([probe], ['usefulLoad']);
  const aboard = partOf('probe', { kind: 'load', mass: 0.05, place: { ...place, station: 1.45 } });
  const laden: Craft = {
    ...craft,
    parts: { byId: { ...craft.parts.byId, probe: aboard }, order: [...craft.parts.order, 'probe'] },
  };
  const [kept] = planned(laden).loads;
  expect(stationOf(kept!.place!)).toBe(1.45);
  const tooHeavy = { ...laden, targets: { ...laden.targets, heaviness: { least: -0.5, most: -0.23 } } };
  expect(carried(planned(tooHeavy))).toEqual([]);
});
