import { expect, test } from 'vitest';
import { takeInSide } from '../../src/canvas/gestures/take.ts';
import { pinch, wheel } from '../../src/canvas/gestures/zoom.ts';
import { Hands } from '../../src/canvas/hands.ts';
import { toWorld } from '../../src/scene/view.ts';
import { middleOf, sideGround } from './ground.ts';

const turn = { deltaX: 0, deltaY: 0, deltaMode: 0, shiftKey: false, ctrlKey: false };
const EMPTY = { u: 1.2, z: 0.2 };

test('dragging empty ground moves the drawing under the hand', () => {
  const ground = sideGround();
  const { view, at } = ground;
  const before = view();
  const down = at(EMPTY);
  const gesture = takeInSide(ground, down);
  gesture.move({ ...down, x: down.x + 30, y: down.y - 12 });
  gesture.move({ ...down, x: down.x + 50, y: down.y - 20 });
  expect(view()).toMatchObject({
    originX: before.originX + 50,
    originY: before.originY - 20,
    scale: before.scale,
  });
});

test('the hull cannot be pushed out of sight', () => {
  const ground = sideGround();
  const down = ground.at(EMPTY);
  takeInSide(ground, down).move({ ...down, x: down.x + 90_000 });
  expect(ground.view().originX).toBeLessThan(ground.view().width);
});

test('the wheel zooms about the pointer; a notch in and a notch out cancel', () => {
  const ground = sideGround();
  const at = { x: 300, y: 180 };
  const before = toWorld(ground.view(), at);
  wheel(ground, at, { ...turn, deltaY: -100 });
  expect(ground.view().scale).toBeCloseTo(240 * 1.2, 6);
  expect(toWorld(ground.view(), at).u).toBeCloseTo(before.u, 9);
  wheel(ground, at, { ...turn, deltaY: 100 });
  expect(ground.view().scale).toBeCloseTo(240, 6);
});

test('with Shift the wheel moves along the hull', () => {
  const ground = sideGround();
  wheel(ground, { x: 0, y: 0 }, { ...turn, deltaY: 3, deltaMode: 1, shiftKey: true });
  expect(ground.view()).toMatchObject({ originX: 60 - 48, scale: 240 });
});

test('two fingers apart zoom about their middle, and carry it along', () => {
  const ground = sideGround();
  const before = toWorld(ground.view(), { x: 200, y: 200 });
  pinch(ground, { x: 150, y: 200 }, { x: 250, y: 200 }).move({ x: 200, y: 230 }, { x: 400, y: 230 });
  expect(ground.view().scale).toBeCloseTo(480, 6);
  expect(toWorld(ground.view(), { x: 300, y: 230 }).u).toBeCloseTo(before.u, 9);
});

test('a hand that hardly moves clicks; one that does drags', () => {
  const ground = sideGround();
  const hands = new Hands();
  const start = ground.craft();
  const down = ground.at(middleOf(ground, 'battery'));
  hands.down(1, down, ground, takeInSide);
  hands.move(1, { ...down, x: down.x + 2 });
  hands.up(1, { ...down, x: down.x + 2 });
  expect(ground.craft()).toBe(start);
  expect(ground.session.getState().selection).toEqual([{ kind: 'part', id: 'battery' }]);
  hands.down(1, down, ground, takeInSide);
  hands.move(1, { ...down, x: down.x + 60 });
  hands.up(1, { ...down, x: down.x + 60 });
  expect(ground.session.getState().undoLabel).toBe('Move battery');
});

test('a second finger gives up the drag and zooms instead', () => {
  const ground = sideGround();
  const hands = new Hands();
  const start = ground.craft();
  const down = ground.at(middleOf(ground, 'battery'), { touch: true });
  hands.down(1, down, ground, takeInSide);
  hands.move(1, { ...down, x: down.x + 40 });
  expect(ground.craft()).not.toBe(start);
  hands.down(2, { ...down, x: down.x + 140 }, ground, takeInSide);
  expect(ground.craft()).toBe(start);
  hands.move(2, { ...down, x: down.x + 240 });
  expect(ground.view().scale).toBeCloseTo(480, 6);
  hands.up(2, down);
  hands.move(1, { ...down, x: 0 });
  hands.up(1, down);
  expect(ground.session.getState().undoLabel).toBeNull();
});

test('Escape in the middle of a drag holds until the hand is lifted', () => {
  const ground = sideGround();
  const hands = new Hands();
  const start = ground.craft();
  const down = ground.at(middleOf(ground, 'battery'));
  expect(hands.cancel()).toBe(false);
  hands.down(1, down, ground, takeInSide);
  hands.move(1, { ...down, x: down.x + 60 });
  expect(hands.cancel()).toBe(true);
  hands.move(1, { ...down, x: down.x + 90 });
  hands.up(1, { ...down, x: down.x + 90 });
  expect(ground.craft()).toBe(start);
  expect(ground.session.getState().undoLabel).toBeNull();
});

test('a pointer that is lost takes its drag back', () => {
  const ground = sideGround();
  const hands = new Hands();
  const start = ground.craft();
  const down = ground.at(middleOf(ground, 'battery'));
  hands.down(1, down, ground, takeInSide);
  hands.move(1, { ...down, x: down.x + 60 });
  hands.lost(1);
  expect(ground.craft()).toBe(start);
});
