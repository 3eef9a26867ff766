/**
 * The worked example, against figures worked out by hand beforehand: spheroid V = πLD²/6 and its area in closed form,
 * CIPM-2007 air, ideal gas, moments about the nose.
 */
import { expect, test } from 'vitest';
import type { Craft } from '../../src/craft/craft.ts';
import type { Place } from '../../src/craft/placeSchema.ts';
import { assess } from '../../src/report/assess.ts';
import { sampleCraft } from './readSamples.ts';

const craft = sampleCraft('worked-example');

const placed = (from: Craft, id: string, place: Place): Craft => ({
  ...from,
  parts: { ...from.parts, byId: { ...from.parts.byId, [id]: { ...from.parts.byId[id]!, place } } },
});

const value = (from: Craft, key: string): number => assess(from).rows[key]!.value!;
const grams = 1000;
const degrees = 180 / Math.PI;

test.each([
  ['hull.volume', 1, '1.570796'],
  ['hull.area', 1, '7.723431'],
  ['hull.cbStation', 1, '1.500000'],
  ['hull.skinMass', grams, '347.554'],
  ['air.density', 1, '1.199314'],
  ['gas.density', 1, '0.187148'],
  ['lift.gross', grams, '1589.907'],
  ['mass.solid', grams, '865.554'],
  ['cg.station', 1, '1.763207'],
  ['cg.height', 1, '-0.191731'],
  ['float.pitch', degrees, '53.929'],
  ['lead.mass', grams, '157.117'],
  ['lead.station', 1, '0.050'],
  ['lead.heavinessAfter', grams, '-567.235'],
  ['lead.pendulumDepthAfter', 1, '0.162274'],
  ['oneWeight.mass', grams, '724.353'],
  ['oneWeight.station', 1, '1.1855'],
])('%s is %d × … = %s', (key, scale, printed) => {
  const decimals = printed.split('.')[1]!.length;
  expect((value(craft, key) * scale).toFixed(decimals)).toBe(printed);
});

test('it has neither side nor heel, and heaviness is solid mass less gross lift', () => {
  expect(value(craft, 'cg.side')).toBe(0);
  expect(value(craft, 'float.heel')).toBe(0);
  expect(value(craft, 'heaviness')).toBeCloseTo(value(craft, 'mass.solid') - value(craft, 'lift.gross'), 15);
  expect(value(craft, 'float.pendulumDepth')).toBeCloseTo(0.191731, 6);
});

test('the battery slid to 0.60 m leaves 74.083 g of lead to hang', () => {
  const slid = placed(craft, 'battery', { kind: 'keel', station: 0.6, drop: 0.03 });
  expect((value(slid, 'lead.mass') * grams).toFixed(3)).toBe('74.083');
});

test('the lead hung where it was asked for, the craft floats level', () => {
  const lead = {
    ...craft.parts.byId.battery!,
    id: 'lead',
    mass: value(craft, 'lead.mass'),
    place: { kind: 'axis', station: 0.05 } as const,
  };
  const withLead: Craft = {
    ...craft,
    parts: { byId: { ...craft.parts.byId, lead }, order: [...craft.parts.order, 'lead'] },
  };
  expect(Math.abs(value(withLead, 'float.pitch'))).toBeLessThan(1e-9);
  expect((value(withLead, 'heaviness') * grams).toFixed(3)).toBe('-567.235');
});
