import { expect, test } from 'vitest';
import { thrustNudgeEdit, thrustNudgeFor } from '../../src/canvas/gestures/nudgeThrust.ts';
import { takeFromAbove, takeInSide } from '../../src/canvas/gestures/take.ts';
import type { Craft } from '../../src/craft/craft.ts';
import type { ThrusterData } from '../../src/craft/thrustSchema.ts';
import { Session } from '../../src/edit/session.ts';
import type { PlanePoint } from '../../src/scene/view.ts';
import { DEGREE, fixed, tailCraft, thrusterData, upTo } from '../report/turning/turningCrafts.ts';
import { groundFromAbove, sideGround, type TestGround } from './ground.ts';

const craftWith = (change: Partial<ThrusterData>): Craft =>
  tailCraft({ thruster: thrusterData({ yaw: upTo(60), pitch: upTo(40), ...change }) });

const thruster = (ground: TestGround) => ground.craft().parts.byId.thruster!.thruster!;
const degrees = (angle: number) => angle / DEGREE;

/** A point so far from the disc in the direction of an angle from the nose, + up or to starboard. */
function out(ground: TestGround, angle: number, px = 72): PlanePoint {
  const { at, way } = ground.scene().thrust[0]!;
  const far = px / ground.view().scale;
  const [ahead, across] = [far * Math.cos(angle * DEGREE), far * Math.sin(angle * DEGREE)];
  return way === 'pitch' ? { u: at.u - ahead, z: at.z + across } : { u: at.u + across, z: at.z + ahead };
}

const handle = (ground: TestGround): PlanePoint => ground.scene().thrust[0]!.handle!;

test('in the side view the tip turns the thrust in pitch to whole 5°, in one step of history taken back in one', () => {
  const ground = sideGround(craftWith({}));
  const start = ground.craft();
  const gesture = takeInSide(ground, ground.at(handle(ground)));
  for (const angle of [6, 14, 22.9]) gesture.move(ground.at(out(ground, angle)));
  expect(ground.overlay()).toMatchObject({ held: { kind: 'thrust', id: 'thruster', way: 'pitch' } });
  expect([...ground.overlay().moving]).toEqual(['part thruster']);
  expect(degrees(thruster(ground).pitch.set)).toBeCloseTo(25, 9);
  expect(thruster(ground).yaw.set).toBe(0);
  gesture.end(ground.at(out(ground, 22.9)), true);
  expect(ground.session.getState()).toMatchObject({
    dragging: false,
    undoLabel: 'Turn the thrust of Tail thruster',
  });
  ground.session.undo();
  expect(ground.craft()).toEqual(start);
  expect(ground.session.getState().undoLabel).toBeNull();
});

test('with Alt it goes where the hand is, never past its limits; Escape leaves all as it was', () => {
  const ground = sideGround(craftWith({}));
  const start = ground.craft();
  const gesture = takeInSide(ground, ground.at(handle(ground)));
  gesture.move(ground.at(out(ground, -13.2), { alt: true }));
  expect(degrees(thruster(ground).pitch.set)).toBeCloseTo(-13.2, 6);
  for (const [hand, held] of [
    [75, 40],
    [-100, -40],
  ] as const) {
    gesture.move(ground.at(out(ground, hand), { alt: true }));
    expect(degrees(thruster(ground).pitch.set)).toBeCloseTo(held, 9);
  }
  gesture.cancel();
  expect(ground.craft()).toBe(start);
  expect(ground.overlay().held).toBeNull();
});

test('taken beside its middle, the handle does not jump', () => {
  const ground = sideGround(craftWith({}));
  const gesture = takeInSide(ground, ground.at(out(ground, 7)));
  gesture.move(ground.at(out(ground, 9), { alt: true }));
  expect(degrees(thruster(ground).pitch.set)).toBeCloseTo(2, 6);
});

test('from above the tip turns the thrust in yaw, + to starboard', () => {
  const ground = groundFromAbove(craftWith({}));
  const gesture = takeFromAbove(ground, ground.at(handle(ground)));
  gesture.move(ground.at(out(ground, 31)));
  gesture.end(ground.at(out(ground, 31)), true);
  expect(degrees(thruster(ground).yaw.set)).toBeCloseTo(30, 9);
  expect(thruster(ground).pitch.set).toBe(0);
});

test('the hand leads what it sees: with the thrust turned to starboard, the pitch is more than it looks', () => {
  const yaw = { ...upTo(60), set: 60 * DEGREE };
  const ground = sideGround(craftWith({ yaw }));
  const gesture = takeInSide(ground, ground.at(handle(ground)));
  gesture.move(ground.at(out(ground, 45, 50), { alt: true }));
  // Seen at 45° where only cos 60° of the length ahead is seen: tan θ = tan 45° · cos 60°.
  expect(degrees(thruster(ground).pitch.set)).toBeCloseTo(degrees(Math.atan(0.5)), 6);
});

test('what does not turn has no handle; a click on one selects its part; from above parts stay', () => {
  const stiff = sideGround(craftWith({ pitch: fixed }));
  expect(stiff.scene().thrust[0]!.handle).toBeNull();
  const ground = groundFromAbove(craftWith({}));
  takeFromAbove(ground, ground.at(handle(ground))).end(ground.at(handle(ground)), false);
  expect(ground.session.getState().selection).toEqual([{ kind: 'part', id: 'thruster' }]);
  const { at } = ground.scene().thrust[0]!;
  const gesture = takeFromAbove(ground, ground.at(at));
  gesture.move(ground.at({ u: at.u + 0.3, z: at.z }));
  expect(ground.overlay().hint).toContain('moved in the side view');
  expect(ground.craft().parts.byId.thruster!.place).toEqual(craftWith({}).parts.byId.thruster!.place);
});

test('dragging an arrow that does not turn in this view moves nothing and says where its limits are; a click selects its part', () => {
  for (const [way, ground, take] of [
    ['pitch', sideGround(craftWith({ pitch: fixed })), takeInSide],
    ['yaw', groundFromAbove(craftWith({ yaw: fixed })), takeFromAbove],
  ] as const) {
    const [before, view] = [ground.craft(), ground.view()];
    const { at, tip } = ground.scene().thrust[0]!;
    const near = ground.at({ u: 0.1 * at.u + 0.9 * tip.u, z: 0.1 * at.z + 0.9 * tip.z });
    const gesture = take(ground, near);
    gesture.move({ ...near, x: near.x + 40, y: near.y + 30 });
    expect(ground.overlay().hint).toBe(`Tail thruster is fixed in ${way}: set its limits under Selected.`);
    expect(ground.view()).toEqual(view);
    expect(ground.craft()).toBe(before);
    take(ground, near).end(near, false);
    expect(ground.session.getState().selection).toEqual([{ kind: 'part', id: 'thruster' }]);
  }
});

test('comma and full stop turn by 1°, with Shift by 10°: pitch in the side view, yaw from above, nothing from astern', () => {
  const stroke = (key: string, code: string, shiftKey = false) => ({ key, code, shiftKey });
  expect(thrustNudgeFor(stroke('.', 'Period'), 'side')).toEqual({ way: 'pitch', by: DEGREE });
  expect(thrustNudgeFor(stroke(',', 'Comma'), 'above')).toEqual({ way: 'yaw', by: -DEGREE });
  expect(thrustNudgeFor(stroke('>', 'Period', true), 'above')).toEqual({ way: 'yaw', by: 10 * DEGREE });
  // On a German keyboard Shift and comma write a semicolon.
  expect(thrustNudgeFor(stroke(';', 'Comma', true), 'side')).toEqual({ way: 'pitch', by: -10 * DEGREE });
  expect(thrustNudgeFor(stroke('.', 'Period'), 'front')).toBeNull();
  expect(thrustNudgeFor(stroke('x', 'KeyX'), 'side')).toBeNull();
});

// What the keys write, without and with Shift: the Windows layouts, from memory.
test.each([
  ['French, where the full stop needs Shift', [';', '.'], [':', '/']],
  ['US', [',', '<'], ['.', '>']],
  ['Dvorak', ['w', 'W'], ['v', 'V']],
] as const)('both ways by 1° and by 10° in the places of the two keys: %s', (_, comma, period) => {
  const turn = (key: string, code: string, shiftKey: boolean) =>
    degrees(thrustNudgeFor({ key, code, shiftKey }, 'side')?.by ?? 0);
  for (const [code, keys, sense] of [
    ['Comma', comma, -1],
    ['Period', period, 1],
  ] as const) {
    expect(turn(keys[0], code, false)).toBeCloseTo(sense, 9);
    expect(turn(keys[1], code, true)).toBeCloseTo(10 * sense, 9);
  }
});

test('where the two signs are on other keys, those turn by 1° too', () => {
  const dvorak = (key: string, code: string, shiftKey = false) =>
    thrustNudgeFor({ key, code, shiftKey }, 'side');
  expect(dvorak(',', 'KeyW')?.by).toBeCloseTo(-DEGREE, 9);
  expect(dvorak('.', 'KeyE')?.by).toBeCloseTo(DEGREE, 9);
  expect(dvorak('>', 'KeyE', true)).toBeNull();
});

test('a burst of those keys is undone at once and stops at the limit; what cannot turn says so', () => {
  const session = new Session(craftWith({ yaw: fixed }));
  const turn = (way: 'yaw' | 'pitch', by: number) => {
    const { craft, selection } = session.getState();
    return thrustNudgeEdit(craft, selection, { way, by: by * DEGREE });
  };
  expect(turn('pitch', 1)).toBeNull();
  session.select([{ kind: 'part', id: 'thruster' }]);
  expect(turn('yaw', 1)).toBe('Tail thruster does not turn in yaw. Its limits are under Selected.');
  const pitch = () => degrees(session.getState().craft.parts.byId.thruster!.thruster!.pitch.set);
  for (const by of [1, 1, 10]) {
    const edit = turn('pitch', by);
    if (edit === null || typeof edit === 'string') throw new Error(`no edit: ${edit}`);
    session.apply(edit);
  }
  expect(pitch()).toBeCloseTo(12, 9);
  for (let i = 0; i < 5; i++)
    session.apply(turn('pitch', 10) as Exclude<ReturnType<typeof turn>, string | null>);
  expect(pitch()).toBeCloseTo(40, 9);
  session.undo();
  expect(pitch()).toBe(0);
  expect(session.getState().undoLabel).toBeNull();
});
