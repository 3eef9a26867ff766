import fc from 'fast-check';
import { expect, test } from 'vitest';
import { loadHighs } from '../../src/numeric/linearProgram/highsSolver.ts';
import type { LinearSolver } from '../../src/numeric/linearProgram/result.ts';
import { type Plan, planOf } from '../../src/physics/ballast/plan.ts';
import { hullOfCraft } from '../../src/physics/craftState.ts';
import type { Reply, Request, Withdrawal } from '../../src/worker/messages.ts';
import { PlanClient, type Thread } from '../../src/worker/planClient.ts';
import { PlanServer } from '../../src/worker/planServer.ts';
import { reunited } from '../../src/worker/reunited.ts';
import { sampleCraft } from '../samples/readSamples.ts';

const solver = await loadHighs();

/** A thread within this one: messages are copied both ways and come in a later turn, as a Worker's do. */
class NearThread implements Thread {
  static begun = 0;
  readonly seen: (Request | Withdrawal)[] = [];
  onmessage: Thread['onmessage'] = null;
  onerror: Thread['onerror'] = null;
  #ended = false;
  readonly #server: PlanServer;

  constructor(solverOf: Promise<LinearSolver> = Promise.resolve(solver)) {
    NearThread.begun++;
    this.#server = new PlanServer(solverOf, (reply) => this.#send(structuredClone(reply)));
  }

  postMessage(message: Request | Withdrawal): void {
    const copy = structuredClone(message);
    this.seen.push(copy);
    setTimeout(() => this.#ended || this.#server.handle(copy));
  }

  terminate(): void {
    this.#ended = true;
  }

  #send(data: Reply): void {
    setTimeout(() => {
      if (!this.#ended) this.onmessage?.(new MessageEvent('message', { data }));
    });
  }
}

const museum = sampleCraft('museum-atrium');

test('a plan asked of the thread is the plan made here; progress is heard before it', async () => {
  const client = new PlanClient(() => new NearThread());
  const heard: string[] = [];
  const { answer } = client.plan(museum, {}, ({ step }) => heard.push(step));
  expect(await answer).toEqual({ status: 'done', value: planOf(museum, solver) });
  expect(heard.at(-1)).toBe('explaining');
  client.dispose();
});

test('curve and table come back, the curve telling its share', async () => {
  const client = new PlanClient(() => new NearThread());
  const shares: number[] = [];
  const curve = client.carry({ craft: museum, line: { kind: 'keel' }, options: { stations: 41 } }, (share) =>
    shares.push(share),
  );
  const table = client.table({ craft: museum, options: {} });
  expect(await curve.answer).toMatchObject({
    status: 'done',
    value: { status: 'solved', value: { complete: true } },
  });
  expect(shares.at(-1)).toBe(1);
  expect(shares.length).toBeLessThan(25);
  expect(await table.answer).toMatchObject({
    status: 'done',
    value: { rows: [{ load: 'sound-recorder' }, {}] },
  });
  client.dispose();
});

test('what waits can be stopped without disturbing what runs', async () => {
  NearThread.begun = 0;
  const client = new PlanClient(() => new NearThread());
  const first = client.plan(museum);
  const second = client.plan(museum);
  second.stop();
  expect(await second.answer).toEqual({ status: 'stopped' });
  expect((await first.answer).status).toBe('done');
  expect(NearThread.begun).toBe(1);
  client.dispose();
});

test('stopping what runs ends the thread; what waited is asked again of a new one', async () => {
  NearThread.begun = 0;
  const client = new PlanClient(() => new NearThread());
  const first = client.plan(museum);
  const second = client.table({ craft: museum, options: {} });
  first.stop();
  first.stop();
  expect(await first.answer).toEqual({ status: 'stopped' });
  expect((await second.answer).status).toBe('done');
  expect(NearThread.begun).toBe(2);
  client.dispose();
});

test('following: of crafts that come faster than plans the newest is planned for', async () => {
  const threads: NearThread[] = [];
  const client = new PlanClient(() => {
    const thread = new NearThread();
    threads.push(thread);
    return thread;
  });
  const craft = sampleCraft('library-scanner');
  const at = (station: number) => {
    const thruster = { ...craft.parts.byId['tail-thruster']!, place: { kind: 'axis', station } as const };
    return { ...craft, parts: { ...craft.parts, byId: { ...craft.parts.byId, 'tail-thruster': thruster } } };
  };
  const plans: (Plan | null)[] = [];
  await new Promise<void>((resolve) => {
    for (let frame = 0; frame <= 10; frame++) {
      client.follow(at(3.2 + 0.01 * frame), false, (plan) => {
        plans.push(plan);
        if (frame === 10) resolve();
      });
    }
  });
  expect(plans).toHaveLength(2);
  expect(threads[0]!.seen).toHaveLength(2);
  const last = plans.at(-1)!;
  const here = planOf(at(3.3), solver, { explain: false });
  if ('why' in last || 'why' in here) throw new Error('both are feasible');
  expect(last.deadBallast).toBeCloseTo(here.deadBallast, 6);
  client.dispose();
});

test('a thread that breaks down fails what was asked of it; the next request begins another', async () => {
  const threads: NearThread[] = [];
  const client = new PlanClient(() => {
    const thread = new NearThread();
    threads.push(thread);
    return thread;
  });
  const first = client.plan(museum);
  threads[0]!.onerror!({ message: 'out of memory' } as ErrorEvent);
  expect(await first.answer).toEqual({ status: 'failed', why: 'The planner broke down: out of memory.' });
  expect((await client.plan(museum, { explain: false }).answer).status).toBe('done');
  expect(threads).toHaveLength(2);
  client.dispose();
});

test('a solver that cannot be loaded fails each request with a sentence', async () => {
  const missing = Promise.reject<LinearSolver>(new Error('highs.wasm: not found'));
  missing.catch(() => {});
  const client = new PlanClient(() => new NearThread(missing));
  expect(await client.plan(museum).answer).toEqual({
    status: 'failed',
    why: 'The planner failed: highs.wasm: not found.',
  });
  client.dispose();
});

test('what a message did not change is the object it was, so that no hull is formed again', () => {
  const before = sampleCraft('museum-atrium');
  const copy = structuredClone(before);
  copy.parts.byId.battery!.mass = 0.4;
  const now = reunited(before, copy);
  expect(now.hull).toBe(before.hull);
  expect(hullOfCraft(now)).toBe(hullOfCraft(before));
  expect(now.parts.byId.camera).toBe(before.parts.byId.camera);
  expect(now.parts.byId.battery).not.toBe(before.parts.byId.battery);
  expect(reunited(before, structuredClone(before))).toBe(before);
});

test('reunited values are equal to what came, whatever came before', () => {
  fc.assert(
    fc.property(fc.jsonValue(), fc.jsonValue(), (before, now) => {
      expect(reunited(before, structuredClone(now))).toEqual(now);
    }),
  );
});
