import { expect, test } from 'vitest';
import { hangLoad } from '../../src/edit/edits/carry.ts';
import { sampleCraft } from '../samples/readSamples.ts';
import { testEdit } from './testEdit.ts';

const craft = sampleCraft('orchard-counter');
const load = craft.loads.byId[craft.loads.order[0]!]!;
const place = { kind: 'keel', station: 0.5, drop: 0 } as const;

test('a load ashore comes aboard at the place, which it may then go to', () => {
  const hung = testEdit(craft, hangLoad(load, place));
  expect(hung.parts.order.at(-1)).toBe(load.id);
  expect(hung.parts.byId[load.id]).toMatchObject({ kind: 'load', mass: load.mass, place, slide: null });
  expect(hung.loads.byId[load.id]!.options.at(-1)).toEqual({ kind: 'slide', place, from: 0.5, to: 0.5 });
});

test('a load aboard is moved, and a place it may go to already is not listed twice', () => {
  const hung = testEdit(craft, hangLoad(load, place));
  const moved = testEdit(hung, hangLoad(load, { ...place, station: 0.7 }));
  expect(moved.parts.order).toEqual(hung.parts.order);
  expect(moved.parts.byId[load.id]!.place).toEqual({ ...place, station: 0.7 });
  const back = testEdit(moved, hangLoad(load, place));
  expect(back.loads.byId[load.id]!.options).toEqual(moved.loads.byId[load.id]!.options);
});

test('hanging it where it hangs changes nothing', () => {
  const hung = testEdit(craft, hangLoad(load, place));
  expect(testEdit(hung, hangLoad(load, place))).toBe(hung);
});
