import { expect, test } from 'vitest';
import { takeInSide } from '../../src/canvas/gestures/take.ts';
import { middleOf, sideGround, type TestGround } from './ground.ts';

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
