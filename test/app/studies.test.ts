import { expect, test, vi } from 'vitest';
import { Cell } from '../../src/app/cell.ts';
import { Studies } from '../../src/app/studies.ts';
import { setName } from '../../src/edit/edits/craft.ts';
import { Session, type SessionState } from '../../src/edit/session.ts';
import { NO_STUDY } from '../../src/panels/turn/studying.ts';
import type { Reply } from '../../src/worker/messages.ts';
import { PlanClient, type Thread } from '../../src/worker/planClient.ts';
import { PlanServer } from '../../src/worker/planServer.ts';
import { placingCraft, solver } from '../physics/placing/placingCrafts.ts';

/** The real planning thread, but in this one: it answers in a later turn, and is silent once ended. */
function threadHere(): Thread {
  let ended = false;
  const thread: Thread = {
    postMessage: (message) => server.handle(structuredClone(message)),
    terminate: () => {
      ended = true;
    },
    onmessage: null,
    onerror: null,
  };
  const post = (data: Reply) =>
    setTimeout(() => ended || thread.onmessage?.(new MessageEvent('message', { data })));
  const server = new PlanServer(Promise.resolve(solver), post);
  return thread;
}

function onPage() {
  const session = new Session(placingCraft());
  const shown = new Cell<SessionState>(session.getState());
  session.subscribe(() => shown.set(session.getState()));
  return { session, studies: new Studies(shown, new PlanClient(threadHere)) };
}

const ASKED = { throttle: 0.5, vector: null, speed: null };

const until = (check: () => void) => vi.waitFor(check, { timeout: 20_000, interval: 5 });
const idle = (studies: Studies) => until(() => expect(studies.state.get().busy).toBe(false));

test('a study is worked out when asked for, for the craft as it is then', async () => {
  const { session, studies } = onPage();
  const { craft } = session.getState();
  expect(studies.state.get()).toBe(NO_STUDY);
  studies.start('thruster', ASKED);
  expect(studies.state.get()).toMatchObject({ part: 'thruster', craft, busy: true, points: [], share: 0 });
  session.apply(setName('Changed'));
  await idle(studies);
  const { points, today, ...rest } = studies.state.get();
  expect(rest).toEqual({
    part: 'thruster',
    craft,
    asked: ASKED,
    busy: false,
    share: 1,
    complete: true,
    why: null,
  });
  expect(rest.craft).toBe(craft);
  expect(points).toHaveLength(61);
  expect(today).toMatchObject({ station: 4.2 });
  studies.close();
  expect(studies.state.get()).toBe(NO_STUDY);
});

test('stopped half-way it keeps the stations it has told of', async () => {
  const { studies } = onPage();
  const watching = studies.state.subscribe(() => {
    if (studies.state.get().share > 0.4) studies.stop();
  });
  studies.start('thruster', ASKED);
  await idle(studies);
  watching();
  const { points, today, share, complete, why } = studies.state.get();
  expect({ complete, why }).toEqual({
    complete: false,
    why: 'Stopped before the last station was worked out.',
  });
  expect(share).toBeLessThan(0.5);
  expect(points.length).toBeGreaterThan(20);
  expect(points.length).toBeLessThan(31);
  expect(today).toMatchObject({ station: 4.2 });
});

test('a stopped one goes on with the stations that were left, for the craft it was begun for', async () => {
  const { session, studies } = onPage();
  const watching = studies.state.subscribe(() => {
    if (studies.state.get().share > 0.4) studies.stop();
  });
  studies.start('thruster', ASKED);
  await idle(studies);
  watching();
  const { craft, points: before, share } = studies.state.get();
  session.apply(setName('Changed'));
  const shares: number[] = [];
  studies.state.subscribe(() => shares.push(studies.state.get().share));
  studies.goOn();
  expect(studies.state.get()).toMatchObject({ busy: true, why: null, points: before });
  await idle(studies);
  expect(Math.min(...shares)).toBe(share);
  expect(studies.state.get()).toMatchObject({ complete: true, share: 1, why: null });
  expect(studies.state.get().craft).toBe(craft);
  const stations = studies.state.get().points.map(({ station }) => station);
  expect(stations).toHaveLength(61);
  expect(stations).toEqual(stations.toSorted((a, b) => a - b));
  expect(stations.slice(0, before.length)).toEqual(before.map(({ station }) => station));
});

test('stopped before anything was told there is nothing; begun again it is worked out afresh', async () => {
  const { studies } = onPage();
  studies.start('thruster', ASKED);
  studies.stop();
  await idle(studies);
  expect(studies.state.get()).toMatchObject({
    points: [],
    why: 'Stopped before the first station was worked out.',
  });
  studies.start('thruster', ASKED);
  expect(studies.state.get().why).toBe(null);
  await idle(studies);
  expect(studies.state.get().complete).toBe(true);
});

test('closed while it runs it stays closed', async () => {
  const { studies } = onPage();
  studies.start('thruster', ASKED);
  await until(() => expect(studies.state.get().share).toBeGreaterThan(0));
  studies.close();
  await new Promise((resolve) => setTimeout(resolve, 20));
  expect(studies.state.get()).toBe(NO_STUDY);
});

test('a part without thrust figures gives the sentence why', async () => {
  const { studies } = onPage();
  studies.start('battery', ASKED);
  await idle(studies);
  expect(studies.state.get()).toMatchObject({
    points: [],
    why: 'There are no thrust figures for this part. Parts that have them: thruster (thruster).',
  });
});
