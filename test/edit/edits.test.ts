import { expect, test } from 'vitest';
import { listed } from '../../src/craft/craft.ts';
import type { Place } from '../../src/craft/placeSchema.ts';
import { step } from '../../src/edit/edit.ts';
import * as whole from '../../src/edit/edits/craft.ts';
import * as hardpoints from '../../src/edit/edits/hardpoints.ts';
import * as parts from '../../src/edit/edits/parts.ts';
import * as wires from '../../src/edit/edits/wires.ts';
import { fixtureCraft, partOf, wireOf } from './craftFixture.ts';
import { testEdit } from './testEdit.ts';

const craft = fixtureCraft();
const move = (id: string, place: Place) => step('Move', parts.placePart(id, place));
const { id: _, ...fields } = partOf('spare', { name: 'Spare' });

test('a part is added at the end under an id from its name, never one that is taken', () => {
  const once = testEdit(craft, parts.addPart(fields));
  expect(once.parts.order).toEqual([...craft.parts.order, 'spare']);
  const twice = testEdit(once, parts.addPart(fields));
  expect(twice.parts.order.at(-1)).toBe('spare-2');
});

test('several parts are added at once', () => {
  const more = testEdit(
    craft,
    parts.addParts([fields, { ...fields, name: '9 volt — “big”' }, { ...fields, name: '' }]),
  );
  expect(more.parts.order.slice(-3)).toEqual(['spare', 'volt-big', 'fitting']);
});

test('a duplicate follows its original, unlocked, named a copy and a little aft of it', () => {
  const locked = testEdit(craft, parts.setParts(['battery'], 'Lock', { locked: true }));
  const result = testEdit(locked, parts.duplicateParts(['battery'], 'Battery', 3));
  expect(result.parts.order.slice(1, 3)).toEqual(['battery', 'battery-copy']);
  const original = locked.parts.byId.battery!;
  expect(result.parts.byId['battery-copy']).toEqual({
    ...original,
    id: 'battery-copy',
    name: `${original.name} copy`,
    place: { kind: 'keel', station: 1.32, drop: 0.03 },
    locked: false,
  });
});

test('a duplicate stays on the hull, and copies of copies are numbered', () => {
  const once = testEdit(craft, parts.duplicateParts(['battery'], 'Battery', 1.31));
  const [original, copy] = [craft.parts.byId.battery!, once.parts.byId['battery-copy']!];
  expect(copy.place).toEqual(original.place);
  const twice = testEdit(once, parts.duplicateParts(['battery-copy'], copy.name, null));
  expect(listed(twice.parts).map(({ name }) => name)).toContain(`${original.name} copy 2`);
});

test('removing a part leaves its wire loose where it was', () => {
  const result = testEdit(craft, parts.removeParts(['battery', 'fins'], '2 parts'));
  expect(result.parts.order).toEqual(['thruster', 'lights']);
  expect(result.wires.byId.power!.from).toEqual({ kind: 'loose', place: craft.parts.byId.battery!.place });
  expect(result.wires.byId.power!.to).toEqual({ kind: 'part', part: 'thruster' });
});

test('fields of a part are set', () => {
  const result = testEdit(craft, parts.setPart(craft.parts.byId.battery!, 'mass', { mass: 0.2 }));
  expect(result.parts.byId.battery!.mass).toBe(0.2);
});

test('weighed: mass, tolerance and source together', () => {
  const { battery } = testEdit(craft, parts.markWeighed(craft.parts.byId.battery!, 0.172, 0.0005)).parts.byId;
  expect(battery).toMatchObject({ mass: 0.172, massTolerance: 0.0005, massSource: 'weighed' });
});

test('parts are put in another order', () => {
  const order = [...craft.parts.order].reverse();
  expect(testEdit(craft, parts.sortParts(order)).parts.order).toEqual(order);
});

test('moved to another place; back again is no change', () => {
  const moved = testEdit(craft, move('battery', { kind: 'keel', station: 0.6, drop: 0.03 }));
  expect(moved.parts.byId.battery!.place).toEqual({ kind: 'keel', station: 0.6, drop: 0.03 });
  expect(testEdit(craft, move('battery', { ...craft.parts.byId.battery!.place }))).toBe(craft);
});

test('a place out of all bounds is brought back in, a clock angle into one turn', () => {
  const far = testEdit(craft, move('fins', { kind: 'skin', station: 1e9, clock: -Math.PI / 2, standoff: 0 }));
  expect(far.parts.byId.fins!.place).toMatchObject({ station: 50 });
  expect((far.parts.byId.fins!.place as { clock: number }).clock).toBeCloseTo(1.5 * Math.PI, 8);
  const up = testEdit(craft, move('battery', { kind: 'keel', station: 1, drop: -3 }));
  expect(up.parts.byId.battery!.place).toEqual({ kind: 'keel', station: 1, drop: 0 });
});

test('shifted along the hull, each in its kind of place; locked ones stay', () => {
  const locked = testEdit(craft, parts.setParts(['thruster'], 'Lock', { locked: true }));
  const result = testEdit(locked, step('Shift', parts.shiftParts(['thruster', 'battery', 'lights'], 0.001)));
  expect(result.parts.byId.thruster!.place).toEqual({ kind: 'axis', station: 2.97 });
  expect(result.parts.byId.battery!.place).toEqual({ kind: 'keel', station: 1.301, drop: 0.03 });
  expect(result.parts.byId.lights!.place).toEqual({ kind: 'free', x: 1.201, y: 0.3, z: -0.3 });
});

test('wire runs come, change and go', () => {
  const { id: __, ...wire } = wireOf('x', { name: 'Signal', path: { kind: 'straight' } });
  const added = testEdit(craft, wires.addWire(wire));
  expect(added.wires.order).toEqual(['power', 'signal']);
  expect(
    testEdit(added, wires.setWire(added.wires.byId.signal!, 'slack', { slack: 0.1 })).wires.byId.signal!
      .slack,
  ).toBe(0.1);
  const joined = testEdit(
    added,
    step('Join', wires.joinWire('signal', 'to', { kind: 'part', part: 'fins' })),
  );
  expect(joined.wires.byId.signal!.to).toEqual({ kind: 'part', part: 'fins' });
  expect(listed(testEdit(added, wires.removeWires(['power'], 'Power')).wires).map(({ id }) => id)).toEqual([
    'signal',
  ]);
});

test('hardpoints come, change and go; the lead always has one', () => {
  const added = testEdit(craft, hardpoints.addHardpoint('Tail', { kind: 'axis', station: 2.9 }));
  expect(added.hardpoints.order).toEqual(['nose', 'chin', 'tail']);
  const chosen = testEdit(added, hardpoints.setLeadAt('tail'));
  expect(testEdit(chosen, hardpoints.removeHardpoints(['tail'], 'Tail')).leadAt).toBe('nose');
  expect(testEdit(craft, hardpoints.removeHardpoints(['nose', 'chin'], 'both'))).toBe(craft);
  expect(
    testEdit(craft, hardpoints.setHardpoint(craft.hardpoints.byId.nose!, 'name', { name: 'Bow' })).hardpoints
      .byId.nose!.name,
  ).toBe('Bow');
  const moved = testEdit(
    craft,
    step('Move', hardpoints.placeHardpoint('nose', { kind: 'axis', station: 0.1 })),
  );
  expect(moved.hardpoints.byId.nose!.place).toEqual({ kind: 'axis', station: 0.1 });
});

test('the support point is set and taken away', () => {
  const set = testEdit(craft, hardpoints.setSupport({ kind: 'keel', station: 1.4, drop: 0.1 }));
  expect(set.support).toEqual({ kind: 'keel', station: 1.4, drop: 0.1 });
  const placed = step('Move', hardpoints.placeSupport({ kind: 'keel', station: 1.5, drop: 0.1 }));
  expect(testEdit(set, placed).support).toEqual({ kind: 'keel', station: 1.5, drop: 0.1 });
  expect(testEdit(craft, placed)).toBe(craft);
  expect(testEdit(set, hardpoints.setSupport(null)).support).toBeNull();
});

test('name, notes, hull, film, gas, day and targets are set', () => {
  expect(testEdit(craft, whole.setName('Heron')).name).toBe('Heron');
  expect(testEdit(craft, whole.setNotes('n')).notes).toBe('n');
  const shape = { kind: 'spheroid', length: 3.5, diameter: 1 } as const;
  expect(testEdit(craft, whole.setShape('length', shape)).hull.shape).toEqual(shape);
  expect(testEdit(craft, whole.chooseShape({ ...craft.hull.shape }))).toBe(craft);
  expect(
    testEdit(craft, whole.setHull('seams', { seams: { massPerMetre: 0.002, count: 8 } })).hull.seams.count,
  ).toBe(8);
  expect(testEdit(craft, whole.setFilm('arealDensity', { arealDensity: 0.02 })).film.arealDensity).toBe(0.02);
  expect(testEdit(craft, whole.setGas('purity', { purity: 0.95 })).gas.purity).toBe(0.95);
  expect(testEdit(craft, whole.setDay('kind', { kind: 'standard', elevation: 500 })).day.kind).toBe(
    'standard',
  );
  expect(testEdit(craft, whole.setTargets('pitch', { pitchTolerance: 0.01 })).targets.pitchTolerance).toBe(
    0.01,
  );
});
