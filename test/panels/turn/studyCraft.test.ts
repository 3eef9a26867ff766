import { expect, test } from 'vitest';
import { setName } from '../../../src/edit/edits/craft.ts';
import { moveAndHang, moveThruster } from '../../../src/edit/edits/moveThruster.ts';
import { Session } from '../../../src/edit/session.ts';
import { holdsFor, pointNow } from '../../../src/panels/turn/studyCraft.ts';
import { NO_STUDY, type StudyState } from '../../../src/panels/turn/studying.ts';
import { FIRST_TURNING } from '../../../src/panels/turn/turning.ts';
import type { PlacedPoint } from '../../../src/report/turning/studies.ts';
import { planningCraft } from '../../edit/planningFixture.ts';

const craft = planningCraft();
const part = craft.parts.byId.thruster!;
const place = { kind: 'keel', station: 1.1, drop: 0.2 } as const;
const point = { station: 1.1, place } as PlacedPoint;
const today = { station: 0.3, place: part.place } as PlacedPoint;
const study: StudyState = {
  ...NO_STUDY,
  part: part.id,
  craft,
  asked: { throttle: 1, vector: null, speed: null },
  points: [point],
  today,
};
const stowage = {
  weights: [{ hardpoint: 'nose', pieces: [{ mass: 0.0123, count: 1 }] }],
  slides: [{ part: 'battery', to: 0.5 }],
  loads: [],
};

test('a study holds wherever its thruster is moved, and after that is undone', () => {
  const session = new Session(craft);
  const now = () => session.getState().craft;
  session.apply(moveThruster(part, place));
  expect(holdsFor(study, now(), FIRST_TURNING)).toBe(true);
  expect(pointNow(study, now())).toBe(point);
  session.apply(moveThruster(part, { ...place, station: 1.2 }));
  expect(holdsFor(study, now(), FIRST_TURNING)).toBe(true);
  expect(pointNow(study, now())).toBeNull();
  session.undo();
  session.undo();
  expect(holdsFor(study, now(), FIRST_TURNING)).toBe(true);
  expect(pointNow(study, now())).toBe(today);
});

test('it holds again once what was done is undone, whatever that was', () => {
  const session = new Session(craft);
  session.apply(moveAndHang(part, place, stowage));
  expect(holdsFor(study, session.getState().craft, FIRST_TURNING)).toBe(false);
  session.undo();
  expect(holdsFor(study, session.getState().craft, FIRST_TURNING)).toBe(true);
});

test('it does not hold once anything else differs, or the thruster itself', () => {
  const after = (edit: Parameters<Session['apply']>[0]) => {
    const session = new Session(craft);
    session.apply(edit);
    return session.getState().craft;
  };
  expect(holdsFor(study, after(setName('Another')), FIRST_TURNING)).toBe(false);
  expect(holdsFor(study, after(moveAndHang(part, place, stowage)), FIRST_TURNING)).toBe(false);
  const heavier = { ...part, mass: part.mass + 0.01 };
  const parts = { ...craft.parts, byId: { ...craft.parts.byId, [part.id]: heavier } };
  expect(holdsFor(study, { ...craft, parts }, FIRST_TURNING)).toBe(false);
  expect(holdsFor(NO_STUDY, craft, FIRST_TURNING)).toBe(false);
  expect(holdsFor(study, craft, FIRST_TURNING)).toBe(true);
  expect(holdsFor(study, craft, { ...FIRST_TURNING, throttle: 0.5 })).toBe(false);
});
