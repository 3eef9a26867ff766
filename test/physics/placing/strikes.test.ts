import { expect, test } from 'vitest';
import { type Craft, keyed, listed } from '../../../src/craft/craft.ts';
import type { Part } from '../../../src/craft/schema.ts';
import { craftStateOf } from '../../../src/physics/craftState.ts';
import { type Meant, meantOf, strikesOf } from '../../../src/physics/placing/strikes.ts';
import { inUnits } from '../../../src/units/sentence.ts';
import { partOf } from '../../edit/craftFixture.ts';
import { craftWith, degrees, solvedValue, thrusterPart, turning } from '../thrust/thrustFixture.ts';

/** On the 4 × 1 m spheroid with a leg that reaches to 1 m below the axis; the propeller is 0.2 m across. */
function struck(part: Partial<Part>, others: readonly Part[] = [], change: Partial<Craft> = {}) {
  const leg = partOf('leg', {
    name: 'Leg',
    place: { kind: 'free', x: 1, y: 0, z: -0.8 },
    size: { length: 0.02, width: 0.02, height: 0.4 },
  });
  const state = craftStateOf({ ...craftWith([thrusterPart(part), leg, ...others]), ...change });
  const { cautions, strikes } = strikesOf(solvedValue(state), 'thruster');
  return { cautions: cautions.map((caution) => inUnits(caution, 'metric')), strikes };
}

test('with room all round there is nothing to say', () => {
  expect(struck({ place: { kind: 'keel', station: 2, drop: 0.15 } })).toEqual({
    cautions: [],
    strikes: false,
  });
});

test('skin: cut into, or nearer than the usual clearance', () => {
  expect(struck({ place: { kind: 'keel', station: 2, drop: 0.07 } })).toEqual({
    cautions: ['The propeller would strike the skin: it reaches 30 mm into it.'],
    strikes: true,
  });
  expect(struck({ place: { kind: 'keel', station: 2, drop: 0.105 } }).cautions).toEqual([
    'The propeller comes too near the skin: within 5 mm of it; keep 10 mm clear.',
  ]);
});

test('ground: the propeller reaches lower than all else of the craft, support and hull among it', () => {
  const low = { place: { kind: 'free', x: 2, y: 0, z: -0.95 } } as const;
  expect(struck(low).cautions).toEqual([
    'At rest the propeller would strike the ground first: all else ends 50 mm higher.',
  ]);
  const support = { kind: 'free', x: 2, y: 0, z: -1.2 } as const;
  expect(struck(low, [], { support })).toEqual({ cautions: [], strikes: false });
  expect(struck({ place: { kind: 'free', x: 2, y: 0, z: -0.895 } }).cautions).toEqual([
    'At rest the propeller comes too near the ground: within 5 mm of it; keep 10 mm clear.',
  ]);
  const small = craftWith([thrusterPart({ place: { kind: 'free', x: 2, y: 0.8, z: -0.35 } })]);
  expect(strikesOf(solvedValue(craftStateOf(small)), 'thruster').cautions).toEqual([]);
});

test('other parts are struck by name, the thruster’s own box never', () => {
  const camera = partOf('camera', {
    name: 'Camera',
    place: { kind: 'keel', station: 2.02, drop: 0.2 },
    size: { length: 0.1, width: 0.05, height: 0.05 },
  });
  const place = { kind: 'keel', station: 2, drop: 0.15 } as const;
  expect(struck({ place, size: { length: 1, width: 1, height: 0.1 } }, [camera])).toEqual({
    cautions: ['The propeller would strike Camera.'],
    strikes: true,
  });
  expect(struck({ place: { ...place, station: 2.2 } }, [camera]).strikes).toBe(false);
});

test('another propeller, and the fellow of a pair', () => {
  const place = { kind: 'free', x: 2, y: 0.09, z: -0.75 } as const;
  const other = { ...thrusterPart({ place: { ...place, y: -0.08 } }), id: 'other', name: 'Nose motor' };
  const tiny = { length: 0, width: 0, height: 0 };
  expect(struck({ place }, [{ ...other, size: tiny }]).cautions).toEqual([
    'The propeller would strike that of Nose motor.',
  ]);
  expect(struck({ place, copies: { kind: 'pair' } }).cautions).toEqual([
    'The propellers would strike each other.',
  ]);
  expect(struck({ place: { ...place, y: 0.11 }, copies: { kind: 'pair' } }).cautions).toEqual([]);
  expect(struck({ place, copies: { kind: 'together', count: 2 } }).cautions).toEqual([]);
});

test('beyond the ends of the hull it needs a mount, which is no strike', () => {
  expect(struck({ place: { kind: 'axis', station: 4.15 } })).toEqual({
    cautions: ['It stands beyond the tail: by 0.150 m, on a mount that is not in the sums.'],
    strikes: false,
  });
  expect(struck({ place: { kind: 'axis', station: -0.15 } }).cautions).toEqual([
    'It stands ahead of the nose: by 0.150 m, on a mount that is not in the sums.',
  ]);
});

test('turned far enough, a propeller behind the tail strikes it', () => {
  const behind = thrusterPart({ place: { kind: 'axis', station: 4.05 } }, { yaw: turning(0, 60 * degrees) });
  const craft = craftWith([behind]);
  const at = (station: number) => ({
    ...craft,
    parts: keyed(listed(craft.parts).map((part) => ({ ...part, place: { kind: 'axis' as const, station } }))),
  });
  expect(strikesOf(solvedValue(craftStateOf(at(4.05))), 'thruster').strikes).toBe(true);
  expect(strikesOf(solvedValue(craftStateOf(at(4.12))), 'thruster').strikes).toBe(false);
});

test('a fitting in the way today is the mount, which rules no place out; another part there is none', () => {
  const size = { length: 0.1, width: 0.1, height: 0.1 };
  const place = { kind: 'free', x: 2, y: 0.07, z: -0.75 } as const;
  const arm = partOf('arm', { name: 'Arm', place, size });
  const camera = partOf('camera', { kind: 'camera', name: 'Camera', place, size });
  const leg = partOf('leg', { place: { kind: 'free', x: 1, y: 0, z: -1 } });
  const thruster = thrusterPart({ place: { kind: 'free', x: 2, y: 0, z: -0.75 } });
  const state = solvedValue(craftStateOf(craftWith([thruster, arm, camera, leg])));
  const meant = meantOf(state, 'thruster');
  expect(meant).toMatchObject({ mounts: new Set(['arm']), lowest: false });
  expect(strikesOf(state, 'thruster').cautions).toEqual([
    'The propeller would strike Arm.',
    'The propeller would strike Camera.',
  ]);
  expect(strikesOf(state, 'thruster', meant).cautions).toEqual(['The propeller would strike Camera.']);
});

test('a part in the way that only the plan has hung there is told as such', () => {
  const thruster = thrusterPart({ place: { kind: 'free', x: 2, y: 0, z: -0.75 } });
  const lead = partOf('lead', {
    kind: 'ballast',
    name: 'Chin lead',
    place: { kind: 'free', x: 2, y: 0.07, z: -0.75 },
  });
  const stateWith = (...parts: Part[]) => solvedValue(craftStateOf(craftWith(parts)));
  const [bare, hung] = [stateWith(thruster), stateWith(thruster, lead)];
  const words = (meant: Meant) => strikesOf(hung, 'thruster', meant).cautions[0];
  expect(words(meantOf(bare, 'thruster'))).toBe('The propeller would strike Chin lead (hung by the plan).');
  expect(words(meantOf(hung, 'thruster'))).toBe('The propeller would strike Chin lead.');
});

test('where the propeller is the lowest of the craft today, being lowest is told and rules no place out', () => {
  const at = (station: number) =>
    solvedValue(craftStateOf(craftWith([thrusterPart({ place: { kind: 'keel', station, drop: 0.15 } })])));
  const meant = meantOf(at(2), 'thruster');
  expect(meant.lowest).toBe(true);
  expect(strikesOf(at(2.2), 'thruster').strikes).toBe(true);
  const { cautions, strikes } = strikesOf(at(2.2), 'thruster', meant);
  expect(cautions[0]).toMatch(/strike the ground first/);
  expect(strikes).toBe(false);
});
