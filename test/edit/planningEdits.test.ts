import { expect, test } from 'vitest';
import { step } from '../../src/edit/edit.ts';
import { setWishes } from '../../src/edit/edits/craft.ts';
import { placeHardpoint, removeHardpoints, setHardpoint } from '../../src/edit/edits/hardpoints.ts';
import { addLeadPiece, removeLeadPieces, setLeadPiece } from '../../src/edit/edits/lead.ts';
import {
  addLoad,
  addLoadOption,
  removeLoadOption,
  removeLoads,
  setLoad,
  setLoadOption,
} from '../../src/edit/edits/loads.ts';
import { addPart, setSlide } from '../../src/edit/edits/parts.ts';
import { applyPlan } from '../../src/edit/edits/plan.ts';
import { slideAbout } from '../../src/edit/place.ts';
import { Session } from '../../src/edit/session.ts';
import { partOf } from './craftFixture.ts';
import { loadOf, planningCraft } from './planningFixture.ts';
import { testEdit } from './testEdit.ts';

const craft = planningCraft();
const logger = craft.loads.byId.logger!;

test('a hardpoint takes a limit and a fill', () => {
  const result = testEdit(
    craft,
    setHardpoint(craft.hardpoints.byId.nose!, 'limit', { limit: 0.05, fill: 'pieces' }),
  );
  expect(result.hardpoints.byId.nose).toMatchObject({ limit: 0.05, fill: 'pieces', name: 'Nose' });
});

test('a hardpoint taken away is no longer a place for loads; other places stay', () => {
  const result = testEdit(craft, removeHardpoints(['chin'], 'Chin'));
  expect(result.loads.byId.logger!.options.map(({ kind }) => kind)).toEqual(['slide']);
  expect(result.loads.byId.horn).toEqual(craft.loads.byId.horn);
});

test('ballast goes along with its hardpoint; locked ballast and other parts there stay', () => {
  const { place } = craft.hardpoints.byId.chin!;
  const { id: _, ...weight } = partOf('weight', { kind: 'ballast', place });
  const hung = testEdit(testEdit(craft, addPart(weight)), addPart({ ...weight, locked: true }));
  const to = { kind: 'keel', station: 0.7, drop: 0 } as const;
  const moved = testEdit(hung, step('Move', placeHardpoint('chin', to)));
  expect(testEdit(hung, setHardpoint(hung.hardpoints.byId.chin!, 'place', { place: to }))).toEqual(moved);
  expect(moved.parts.byId.weight!.place).toEqual(to);
  expect(moved.parts.byId['weight-2']!.place).toEqual(place);
});

test('a slide is given, its ends put in order and within limits, and taken away', () => {
  const given = testEdit(craft, setSlide(craft.parts.byId.fins!, { from: 2.7, to: 2.5 }));
  expect(given.parts.byId.fins!.slide).toEqual({ from: 2.5, to: 2.7 });
  expect(
    testEdit(craft, setSlide(craft.parts.byId.fins!, { from: -1e9, to: 1e9 })).parts.byId.fins!.slide,
  ).toEqual({
    from: -50,
    to: 50,
  });
  expect(testEdit(given, setSlide(craft.parts.byId.fins!, { from: 2.7, to: 2.5 }))).toBe(given);
  expect(testEdit(given, setSlide(craft.parts.byId.fins!, null)).parts.byId.fins!.slide).toBeNull();
});

test('pieces of lead come, change and go', () => {
  const more = testEdit(craft, addLeadPiece({ mass: 0.005, count: 2 }));
  expect(more.pieces).toHaveLength(3);
  expect(testEdit(more, setLeadPiece(2, 'count', { count: 7 })).pieces[2]).toEqual({ mass: 0.005, count: 7 });
  expect(testEdit(more, removeLeadPieces([0, 2])).pieces).toEqual([craft.pieces[1]]);
  expect(testEdit(craft, removeLeadPieces([9]))).toBe(craft);
});

test('loads come under an id that no part has, change, change order and go', () => {
  const { id: _, ...fields } = loadOf('x', { name: 'Battery' });
  const more = testEdit(craft, addLoad(fields));
  expect(more.loads.order).toEqual(['logger', 'horn', 'battery-2']);
  expect(testEdit(more, setLoad(craft.loads.byId.horn!, 'mass', { mass: 0.02 })).loads.byId.horn!.mass).toBe(
    0.02,
  );
  expect(testEdit(more, removeLoads(['logger', 'horn'], '2 loads')).loads.order).toEqual(['battery-2']);
});

test('a part comes under an id that no load has', () => {
  const { id: _, ...horn } = partOf('horn', { kind: 'fitting' });
  expect(testEdit(craft, addPart(horn)).parts.order.at(-1)).toBe('horn-2');
});

test('places where a load may go come, change and go', () => {
  const at = { kind: 'hardpoint', hardpoint: 'nose' } as const;
  const more = testEdit(craft, addLoadOption(logger, at));
  expect(more.loads.byId.logger!.options).toHaveLength(3);
  const [, slide] = craft.loads.byId.logger!.options;
  if (slide?.kind !== 'slide') throw new Error('the second option is a slide');
  const longer = testEdit(craft, setLoadOption(logger, 1, { ...slide, from: 2.5, to: 0.3 }));
  expect(longer.loads.byId.logger!.options[1]).toEqual({ ...slide, from: 0.3, to: 2.5 });
  expect(testEdit(craft, setLoadOption(logger, 1, { ...slide }))).toBe(craft);
  expect(testEdit(craft, setLoadOption(logger, 1, at)).loads.byId.logger!.options[1]).toEqual(at);
  expect(testEdit(craft, removeLoadOption(logger, 0)).loads.byId.logger!.options).toEqual([slide]);
});

test('wishes are put in another order', () => {
  expect(testEdit(craft, setWishes(['leastWire', 'usefulLoad'])).wishes).toEqual(['leastWire', 'usefulLoad']);
  expect(testEdit(craft, setWishes(craft.wishes))).toBe(craft);
});

const stowage = {
  weights: [
    { hardpoint: 'nose', pieces: [{ mass: 0.0123, count: 1 }] },
    {
      hardpoint: 'chin',
      pieces: [
        { mass: 0.01, count: 70 },
        { mass: 0.001, count: 2 },
      ],
    },
  ],
  slides: [{ part: 'battery', to: 0.5 }],
  loads: [
    { load: 'horn', place: craft.hardpoints.byId.nose!.place, slide: null },
    {
      load: 'logger',
      place: { kind: 'keel', station: 0.8, drop: 0.02 } as const,
      slide: { from: 0.5, to: 2 },
    },
  ],
};

test('a plan is one step: lead hung, slides moved, loads taken aboard; applied again it changes nothing', () => {
  const result = testEdit(craft, applyPlan(stowage));
  const added = result.parts.order.slice(craft.parts.order.length);
  expect(added).toEqual(['horn', 'logger', 'nose-lead', 'chin-lead', 'chin-lead-2', 'chin-lead-3']);
  const pieces = added.slice(2).map((id) => {
    const { mass, copies, kind } = result.parts.byId[id]!;
    return [kind, mass, copies.kind === 'together' ? copies.count : 0];
  });
  expect(pieces).toEqual([
    ['ballast', 0.0123, 1],
    ['ballast', 0.01, 64],
    ['ballast', 0.01, 6],
    ['ballast', 0.001, 2],
  ]);
  expect(result.parts.byId.battery!.place).toMatchObject({ station: 0.5 });
  expect(result.parts.byId.logger).toMatchObject({ kind: 'load', mass: 0.04, slide: { from: 0.5, to: 2 } });
  expect(testEdit(result, applyPlan(stowage))).toBe(result);
});

test('the next plan changes what a former one put there, and takes away what it no longer wants', () => {
  const before = testEdit(craft, applyPlan(stowage));
  const after = testEdit(
    before,
    applyPlan({
      weights: [{ hardpoint: 'nose', pieces: [{ mass: 0.002, count: 1 }] }],
      slides: [],
      loads: [stowage.loads[0]!],
    }),
  );
  expect(after.parts.order).toEqual([...craft.parts.order, 'horn', 'nose-lead']);
  expect(after.parts.byId['nose-lead']!.mass).toBe(0.002);
});

test('a plan is undone at once', () => {
  const session = new Session(craft);
  expect(session.apply(applyPlan(stowage))).toEqual([]);
  expect(session.getState().undoLabel).toBe('Apply the ballast plan');
  session.undo();
  expect(session.getState().craft).toEqual(craft);
});

test('what a plan names that is gone meanwhile is passed over', () => {
  const result = testEdit(
    craft,
    applyPlan({
      weights: [{ hardpoint: 'gone', pieces: [{ mass: 1, count: 1 }] }],
      slides: [{ part: 'gone', to: 1 }],
      loads: [{ load: 'gone', place: { kind: 'axis', station: 1 }, slide: null }],
    }),
  );
  expect(result).toBe(craft);
});

test('a first slide reaches a tenth of the hull either way, and not beyond its ends', () => {
  expect(slideAbout(1.5, 3)).toEqual({ from: 1.2, to: 1.8 });
  expect(slideAbout(0.1, 3)).toEqual({ from: 0, to: 0.4 });
  expect(slideAbout(2.95, 3)).toEqual({ from: 2.65, to: 3 });
  expect(slideAbout(3.2, 3)).toEqual({ from: 2.9, to: 3.2 });
});
