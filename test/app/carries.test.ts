import { expect, test, vi } from 'vitest';
import { Carries } from '../../src/app/carries.ts';
import { Cell } from '../../src/app/cell.ts';
import { setName } from '../../src/edit/edits/craft.ts';
import { Session, type SessionState } from '../../src/edit/session.ts';
import { loadHighs } from '../../src/numeric/linearProgram/highsSolver.ts';
import type { Reply, Request, Withdrawal } from '../../src/worker/messages.ts';
import { PlanClient, type Thread } from '../../src/worker/planClient.ts';
import { PlanServer } from '../../src/worker/planServer.ts';
import { sampleCraft } from '../samples/readSamples.ts';

/** The real planning thread, but in this one; `requests` counts what was asked of it. */
function threadHere(requests: (Request | Withdrawal)[]): Thread {
  const thread: Thread = { postMessage: () => {}, terminate: () => {}, onmessage: null, onerror: null };
  const post = (data: Reply) => thread.onmessage?.(new MessageEvent('message', { data }));
  const server = new PlanServer(loadHighs(), post);
  thread.postMessage = (message) => {
    requests.push(message);
    server.handle(structuredClone(message));
  };
  return thread;
}

function onPage() {
  const session = new Session(sampleCraft('orchard-counter'));
  const shown = new Cell<SessionState>(session.getState());
  session.subscribe(() => shown.set(session.getState()));
  const requests: (Request | Withdrawal)[] = [];
  const carries = new Carries(shown, new PlanClient(() => threadHere(requests)), 0);
  carries.lookAt(true);
  return { session, carries, requests };
}

const idle = (carries: Carries) =>
  vi.waitFor(() => expect(carries.state.get().carry.busy).toBe(false), { timeout: 20_000, interval: 20 });

test('a curve is worked out once a line is chosen, and again after a change', async () => {
  const { session, carries, requests } = onPage();
  expect(requests).toHaveLength(0);
  carries.setLine({ kind: 'keel' });
  await idle(carries);
  const first = carries.state.get().carry.curve!;
  expect(first).toMatchObject({ line: { kind: 'keel' }, complete: true });
  expect(first.points).toHaveLength(101);
  session.apply(setName('Changed'));
  expect(carries.state.get().carry.busy).toBe(true);
  await idle(carries);
  expect(requests).toHaveLength(2);
  carries.setLine(null);
  expect(carries.state.get().carry).toMatchObject({ curve: null, busy: false });
});

test('a line whose hardpoint is gone gives a sentence', async () => {
  const { carries } = onPage();
  carries.setLine({ kind: 'hardpoint', hardpoint: 'gone' });
  await idle(carries);
  expect(carries.state.get().carry).toMatchObject({
    curve: null,
    why: 'The hardpoint of that line is gone. Choose another line.',
  });
});

test('the table has a row for each load, for the craft it was asked for', async () => {
  const { session, carries } = onPage();
  const { craft } = session.getState();
  carries.workOutTable();
  await vi.waitFor(() => expect(carries.state.get().table.busy).toBe(false), { timeout: 20_000 });
  const { table } = carries.state.get();
  expect(table.table?.rows.map(({ load }) => load)).toEqual(craft.loads.order);
  expect(table.craft).toBe(craft);
});
