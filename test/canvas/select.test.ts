import { expect, test } from 'vitest';
import { takeInFront, takeInSide } from '../../src/canvas/gestures/take.ts';
import { craft, PARTS, part } from '../scene/fixture.ts';
import { frontGround, middleOf, sideGround, type TestGround } from './ground.ts';

const clickOn = (ground: TestGround, id: string, keys = {}) => {
  const hand = ground.at(middleOf(ground, id), keys);
  takeInSide(ground, hand).end(hand, false);
};
const selected = (ground: TestGround) =>
  ground.session.getState().selection.map(({ kind, id }) => `${kind} ${id}`);

test('a click selects one thing, with Ctrl or Shift it adds or takes away', () => {
  const ground = sideGround();
  clickOn(ground, 'battery');
  clickOn(ground, 'camera', { ctrl: true });
  expect(selected(ground)).toEqual(['part battery', 'part camera']);
  clickOn(ground, 'battery', { shift: true });
  expect(selected(ground)).toEqual(['part camera']);
  clickOn(ground, 'camera', { ctrl: true });
  expect(selected(ground)).toEqual([]);
});

test('a click on one of several selected leaves it alone selected', () => {
  const ground = sideGround();
  clickOn(ground, 'battery');
  clickOn(ground, 'camera', { ctrl: true });
  clickOn(ground, 'battery');
  expect(selected(ground)).toEqual(['part battery']);
});

test('wire runs and hardpoints are selected by a click too', () => {
  const ground = sideGround();
  const on = ground.scene().lines[0]!.at.find(({ u }) => u > 2 && u < 2.2)!;
  takeInSide(ground, ground.at(on)).end(ground.at(on), false);
  expect(selected(ground)).toEqual(['wire power']);
  takeInSide(ground, ground.at({ u: 0.06, z: 0 })).end(ground.at({ u: 0.06, z: 0 }), false);
  expect(selected(ground)).toEqual(['hardpoint nose']);
});

test('a click on empty ground selects nothing, but not while adding', () => {
  const ground = sideGround();
  clickOn(ground, 'battery');
  const empty = (keys = {}) => ground.at({ u: 1.2, z: 0.2 }, keys);
  takeInSide(ground, empty({ ctrl: true })).end(empty({ ctrl: true }), false);
  expect(selected(ground)).toEqual(['part battery']);
  takeInSide(ground, empty()).end(empty(), false);
  expect(selected(ground)).toEqual([]);
});

test('a box dragged with Shift takes what is in it along with what was selected', () => {
  const ground = sideGround();
  clickOn(ground, 'thruster');
  const [from, to] = [ground.at({ u: 0.7, z: -0.42 }, { shift: true }), ground.at({ u: 1.3, z: -0.8 })];
  const box = takeInSide(ground, from);
  box.move(to);
  expect(ground.overlay().marquee).toEqual({ from, to });
  box.end(to, true);
  expect(selected(ground)).toEqual(['part thruster', 'part battery', 'part camera']);
  expect(ground.overlay().marquee).toBeNull();
});

test('a drag begun with Ctrl takes the part in hand along with the rest', () => {
  const ground = sideGround();
  clickOn(ground, 'battery');
  const from = middleOf(ground, 'camera');
  const gesture = takeInSide(ground, ground.at(from, { ctrl: true }));
  gesture.move(ground.at({ u: from.u + 0.2, z: from.z }, { ctrl: true }));
  gesture.end(ground.at(from), true);
  expect(selected(ground)).toEqual(['part battery', 'part camera']);
});

const NEST = craft(
  [
    part('pod', { kind: 'free', x: 1.2, y: 0, z: -0.7 }, { size: { length: 0.6, width: 0.2, height: 0.2 } }),
    part('cell', { kind: 'free', x: 1.25, y: 0, z: -0.7 }),
    part(
      'chip',
      { kind: 'free', x: 1.25, y: 0, z: -0.7 },
      { size: { length: 0.07, width: 0.04, height: 0.03 } },
    ),
  ],
  [],
);

test('further clicks on one spot go through what lies there, the smallest first; a click elsewhere starts anew', () => {
  for (const [ground, take] of [
    [sideGround(NEST), takeInSide],
    [frontGround(NEST), takeInFront],
  ] as const) {
    const spot = ground.at(middleOf(ground, 'chip'));
    const seen = [0, 1, 2, 3, 4].map((i) => {
      const hand = { ...spot, x: spot.x + (i % 2) };
      take(ground, hand).end(hand, false);
      return selected(ground)[0];
    });
    expect(seen).toEqual(['part chip', 'part cell', 'part pod', 'part chip', 'part cell']);
    ground.session.select([{ kind: 'part', id: 'pod' }]);
    const { x, y } = spot;
    const empty = { ...spot, x: x + 300, y: y - 90 };
    take(ground, empty).end(empty, false);
    ground.session.select([{ kind: 'part', id: 'pod' }]);
    const beside = { ...spot, x: x + 6, y };
    take(ground, beside).end(beside, false);
    expect(selected(ground)).toEqual(['part chip']);
  }
});

test('what is selected is dragged by a press within its brackets, in both views, whatever lies over it', () => {
  for (const [ground, take] of [
    [sideGround(NEST), takeInSide],
    [frontGround(NEST), takeInFront],
  ] as const) {
    const before = ground.craft().parts.byId;
    ground.session.select([{ kind: 'part', id: 'pod' }]);
    const hand = ground.at(middleOf(ground, 'chip'));
    const gesture = take(ground, hand);
    gesture.move({ ...hand, y: hand.y + 40 });
    gesture.end({ ...hand, y: hand.y + 40 }, true);
    const after = ground.craft().parts.byId;
    expect(after.pod!.place).not.toEqual(before.pod!.place);
    expect([after.cell, after.chip]).toEqual([before.cell, before.chip]);
    expect(selected(ground)).toEqual(['part pod']);
  }
});

test('picking several: each tap adds or takes away, a drag on empty ground draws the box, a drag takes all along', () => {
  const ground = sideGround(craft(), { several: true });
  const view = ground.view();
  clickOn(ground, 'battery');
  clickOn(ground, 'camera');
  clickOn(ground, 'thruster');
  clickOn(ground, 'thruster');
  expect(selected(ground)).toEqual(['part battery', 'part camera']);
  const [from, to] = [ground.at({ u: 1.3, z: -0.45 }), ground.at({ u: 1.7, z: -0.8 })];
  const box = takeInSide(ground, from);
  box.move(to);
  box.end(to, true);
  expect(selected(ground)).toEqual(['part battery', 'part camera', 'part gondola']);
  expect(ground.view()).toBe(view);
  const hand = ground.at(middleOf(ground, 'camera'));
  const gesture = takeInSide(ground, hand);
  gesture.move({ ...hand, x: hand.x + 40 });
  gesture.end({ ...hand, x: hand.x + 40 }, true);
  expect(ground.session.getState().undoLabel).toBe('Move camera');
  expect(ground.craft().parts.byId.gondola!.place).not.toEqual(PARTS[2]!.place);
});
