/** Damaged and degenerate crafts: a study with finite figures, or a sentence, every time. */
import { expect, test } from 'vitest';
import { type Craft, keyed, listed } from '../../../src/craft/craft.ts';
import { parseJson } from '../../../src/craft/parse.ts';
import { serialize } from '../../../src/craft/serialize.ts';
import { placementStudy, thrusterParts } from '../../../src/physics/placing/study.ts';
import { damagedJson, seeded } from '../../craft/mutator.ts';
import { notFinite } from '../../samples/finite.ts';
import { finPart, thrusterOf, turning } from '../thrust/thrustFixture.ts';
import { placingCraft, solver, vectored } from './placingCrafts.ts';

const PAIR = placingCraft({
  part: { copies: { kind: 'pair' }, place: { kind: 'skin', station: 2, clock: 2, standoff: 0.2 } },
  data: { differential: true },
});

/** Whether there was a study. */
function check(craft: Craft, part = 'thruster'): boolean {
  const study = placementStudy(craft, part, solver, { stations: 3 });
  if (study.status === 'infeasible') {
    expect(study.why).toMatch(/\.$/);
    return false;
  }
  expect(notFinite(study.value)).toEqual([]);
  for (const { ballast, why, cautions } of study.value.points) {
    expect(ballast === null).toBe(why !== '');
    for (const caution of cautions) expect(caution).toMatch(/\.$/);
  }
  return true;
}

test('200 damaged crafts', () => {
  const random = seeded(5);
  const texts = [placingCraft(), PAIR].map(serialize);
  let made = 0;
  for (let i = 0; made < 200; i++) {
    const parsed = parseJson(damagedJson(random, texts[i % texts.length]!));
    if (!parsed.ok) continue;
    const [moving] = thrusterParts(parsed.craft);
    if (moving && check(parsed.craft, moving.id)) made++;
  }
}, 120_000);

const whole = placingCraft();
const eachPart = (change: object): Craft => ({
  ...whole,
  parts: keyed(listed(whole.parts).map((part) => ({ ...part, ...change }))),
});

const degenerate: Record<string, Craft> = {
  'nothing weighs anything': { ...eachPart({ mass: 0 }), film: { ...whole.film, arealDensity: 0 } },
  'everything weighs a tonne': eachPart({ mass: 1000 }),
  'all parts are thrusters at one place': eachPart({
    thruster: thrusterOf(vectored()),
    place: { kind: 'axis', station: 2 },
  }),
  'no thrust': placingCraft({ data: { thrust: { kind: 'measured', staticThrust: 0 } } }),
  'thrust backwards only': placingCraft({
    data: { yaw: { least: Math.PI, most: Math.PI, set: Math.PI, slew: 0 } },
  }),
  'turned all round both ways': placingCraft({
    data: { yaw: turning(0, Math.PI), pitch: turning(0, Math.PI) },
  }),
  'a propeller larger than the hull': placingCraft({ data: vectored({ diameter: 10 }) }),
  'fins as large as sails': placingCraft({ others: [finPart({ fin: { area: 100, aspectRatio: 20 } })] }),
  'a thruster far beyond the tail': placingCraft({ part: { place: { kind: 'axis', station: 50 } } }),
  'a thruster far beyond the nose on a free place': placingCraft({
    part: { place: { kind: 'free', x: -50, y: 50, z: 50 } },
  }),
  'a thruster deep inside the skin': placingCraft({
    part: { place: { kind: 'skin', station: 2, clock: 1, standoff: -0.5 } },
  }),
  'a ring of thrusters': placingCraft({
    part: {
      copies: { kind: 'ring', count: 6 },
      place: { kind: 'skin', station: 2, clock: 0, standoff: 0.3 },
    },
  }),
  'a gas that does not lift': { ...whole, gas: { ...whole.gas, purity: 0 } },
};

test.each(Object.entries(degenerate))('%s', (_, craft) => {
  expect(check(craft)).toBe(true);
});

test('one station, or two', () => {
  for (const stations of [1, 2]) {
    const study = placementStudy(whole, 'thruster', solver, { stations });
    expect(study.status === 'solved' && study.value.points.length).toBe(stations);
  }
});
