import { expect, test, vi } from 'vitest';
import { Cell } from '../../src/app/cell.ts';
import { Orders } from '../../src/app/orders.ts';
import { setName } from '../../src/edit/edits/craft.ts';
import { Session, type SessionState } from '../../src/edit/session.ts';
import { loadHighs } from '../../src/numeric/linearProgram/highsSolver.ts';
import { NO_ORDERS } from '../../src/panels/plan/planning.ts';
import { planOf } from '../../src/physics/ballast/plan.ts';
import { otherOrders } from '../../src/report/wishOrders.ts';
import type { Reply, Request, Withdrawal } from '../../src/worker/messages.ts';
import { PlanClient, type Thread } from '../../src/worker/planClient.ts';
import { PlanServer } from '../../src/worker/planServer.ts';
import { sampleCraft } from '../samples/readSamples.ts';

const solver = await loadHighs();

/** The real planning thread, but in this one, silent once ended; `requests` counts what was asked of it. */
function threadHere(requests: (Request | Withdrawal)[]): Thread {
  let ended = false;
  const thread: Thread = {
    postMessage: (message) => {
      requests.push(message);
      server.handle(structuredClone(message));
    },
    terminate: () => {
      ended = true;
    },
    onmessage: null,
    onerror: null,
  };
  const post = (data: Reply) => {
    if (!ended) thread.onmessage?.(new MessageEvent('message', { data }));
  };
  const server = new PlanServer(Promise.resolve(solver), post);
  return thread;
}

function onPage() {
  const session = new Session(sampleCraft('orchard-counter'));
  const shown = new Cell<SessionState>(session.getState());
  session.subscribe(() => shown.set(session.getState()));
  const requests: (Request | Withdrawal)[] = [];
  const orders = new Orders(shown, new PlanClient(() => threadHere(requests)));
  const { craft } = session.getState();
  return { session, orders, requests, answer: { craft, plan: planOf(craft, solver, { explain: false }) } };
}

const idle = (orders: Orders) =>
  vi.waitFor(() => expect(orders.state.get().busy).toBe(false), { timeout: 20_000, interval: 5 });

test('every other order is planned for once, with nothing explained', async () => {
  const { orders, requests, answer } = onPage();
  expect(orders.state.get()).toBe(NO_ORDERS);
  orders.start(answer);
  await idle(orders);
  const { tried, why } = orders.state.get();
  expect(why).toBeNull();
  const others = otherOrders(answer.craft.wishes);
  expect(tried.map(({ order }) => order)).toEqual(others);
  expect(requests.map((each) => each.task === 'plan' && each.craft.wishes)).toEqual(others);
  for (const each of requests) expect(each).toMatchObject({ options: { robust: false, explain: false } });
  for (const { plan } of tried) expect(plan.status).toBe('optimal');
});

test('stopped half-way it says so, and keeps what was tried', async () => {
  const { orders, answer } = onPage();
  orders.state.subscribe(() => {
    if (orders.state.get().tried.length === 1) queueMicrotask(orders.stop);
  });
  orders.start(answer);
  await idle(orders);
  const { tried, why } = orders.state.get();
  expect(why).toBe('Stopped before every order was tried.');
  expect(tried).toHaveLength(1);
});

test('once the craft changes they are forgotten, while they run and when they are done', async () => {
  const { session, orders, answer } = onPage();
  orders.start(answer);
  session.apply(setName('Changed'));
  expect(orders.state.get()).toBe(NO_ORDERS);
  await new Promise((resolve) => setTimeout(resolve, 50));
  expect(orders.state.get()).toBe(NO_ORDERS);
  session.undo();
  orders.start({ ...answer, craft: session.getState().craft });
  await idle(orders);
  expect(orders.state.get().tried).toHaveLength(5);
  session.apply(setName('Changed again'));
  expect(orders.state.get()).toBe(NO_ORDERS);
});
