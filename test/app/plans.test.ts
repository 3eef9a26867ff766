import { expect, test, vi } from 'vitest';
import { Cell } from '../../src/app/cell.ts';
import { Plans } from '../../src/app/plans.ts';
import type { Craft } from '../../src/craft/craft.ts';
import { setName } from '../../src/edit/edits/craft.ts';
import { Session, type SessionState } from '../../src/edit/session.ts';
import { MOST_KEPT } from '../../src/panels/plan/planning.ts';
import type { Plan, PlanFound, PlanProgress } from '../../src/report/plans.ts';
import { type Answer, PlanClient } from '../../src/worker/planClient.ts';
import { sampleCraft } from '../samples/readSamples.ts';

interface AskedPlan {
  readonly craft: Craft;
  readonly robust: boolean | undefined;
  readonly tell: (progress: PlanProgress) => void;
  readonly settle: (answer: Answer<Plan>) => void;
  stopped: boolean;
}

/** A client that answers when the test says so. */
class HeldClient extends PlanClient {
  readonly asked: AskedPlan[] = [];
  readonly followed: { craft: Craft; onPlan: (plan: Plan | null) => void }[] = [];

  override plan(
    ...[craft, options, onProgress]: Parameters<PlanClient['plan']>
  ): ReturnType<PlanClient['plan']> {
    let settle: AskedPlan['settle'] = () => {};
    const answer = new Promise<Answer<Plan>>((resolve) => {
      settle = resolve;
    });
    const each = { craft, robust: options?.robust, tell: onProgress ?? (() => {}), settle, stopped: false };
    this.asked.push(each);
    const stop = () => {
      each.stopped = true;
      settle({ status: 'stopped' });
    };
    return { answer, stop };
  }

  override follow(...[craft, , onPlan]: Parameters<PlanClient['follow']>): void {
    this.followed.push({ craft, onPlan });
  }
}

const found = (deadBallast: number): PlanFound => ({
  status: 'optimal',
  robust: false,
  stowage: { weights: [], slides: [], loads: [] },
  craft: sampleCraft('cave-mapper'),
  deadBallast,
  deadBallastToday: 0,
  deadBallastFixed: 0,
  weights: [],
  slides: [],
  loads: [],
  bound: deadBallast,
  gap: 0,
  wishesProven: true,
  disagreement: { pitch: 0, heel: 0, mass: 0 },
  binding: [],
  bindingComplete: true,
});

function onPage(): { session: Session; client: HeldClient; plans: Plans } {
  const session = new Session(sampleCraft('cave-mapper'));
  const shown = new Cell<SessionState>(session.getState());
  session.subscribe(() => shown.set(session.getState()));
  const client = new HeldClient();
  return { session, client, plans: new Plans(shown, client, 0) };
}

const begun = (client: HeldClient, count: number) =>
  vi.waitFor(() => expect(client.asked).toHaveLength(count));

test('nothing is asked for until somebody looks at the plan', async () => {
  const { session, client, plans } = onPage();
  session.apply(setName('Changed'));
  await new Promise((resolve) => setTimeout(resolve, 5));
  expect(client.asked).toHaveLength(0);
  plans.lookAt(true);
  await begun(client, 1);
  expect(client.asked[0]!.craft).toBe(session.getState().craft);
});

test('a change drops what runs, and its late answer', async () => {
  const { session, client, plans } = onPage();
  plans.lookAt(true);
  await begun(client, 1);
  session.apply(setName('Changed'));
  await begun(client, 2);
  expect(client.asked[0]!.stopped).toBe(true);
  client.asked[1]!.settle({ status: 'done', value: found(0.01) });
  await vi.waitFor(() => expect(plans.state.get().busy).toBe(false));
  expect(plans.state.get().answer).toMatchObject({ craft: session.getState().craft });
});

test('stopped by hand, the best so far stays; with none so far it says so', async () => {
  const { client, plans } = onPage();
  plans.lookAt(true);
  await begun(client, 1);
  const best = found(0.02);
  client.asked[0]!.tell({ step: 'searching', deadBallast: 0.02, bound: 0, plan: best });
  plans.stop();
  await vi.waitFor(() => expect(plans.state.get().busy).toBe(false));
  expect(plans.state.get().answer?.plan).toBe(best);
  plans.again();
  await begun(client, 2);
  plans.stop();
  await vi.waitFor(() => expect(plans.state.get().failure).toBe('Stopped before there was a plan.'));
});

test('the plan is there before what stands in its way is told', async () => {
  const { client, plans } = onPage();
  plans.lookAt(true);
  await begun(client, 1);
  const plan = found(0.02);
  client.asked[0]!.tell({ step: 'explaining', deadBallast: 0.02, bound: 0.02, plan });
  expect(plans.state.get()).toMatchObject({ busy: true, answer: { plan } });
});

test('during a drag the plan follows; where there is something to choose it waits for the release', async () => {
  const { session, client, plans } = onPage();
  plans.lookAt(true);
  await begun(client, 1);
  const drag = session.beginDrag('Rename');
  drag.move(setName('Halfway').recipe);
  expect(client.asked[0]!.stopped).toBe(true);
  expect(client.followed.map(({ craft }) => craft.name)).toEqual(['Halfway']);
  client.followed[0]!.onPlan(null);
  expect(plans.state.get().waiting).toBe(true);
  client.followed[0]!.onPlan(found(0.03));
  expect(plans.state.get()).toMatchObject({ waiting: false, answer: { plan: { deadBallast: 0.03 } } });
  drag.commit();
  await begun(client, 2);
  client.followed[0]!.onPlan(found(0.04));
  expect(plans.state.get().answer?.plan).toMatchObject({ deadBallast: 0.03 });
});

test('a robust plan is another plan', async () => {
  const { client, plans } = onPage();
  plans.lookAt(true);
  await begun(client, 1);
  plans.setRobust(true);
  await begun(client, 2);
  expect(client.asked.map(({ robust }) => robust)).toEqual([false, true]);
});

test('a handful of plans is kept, each under a number of its own, and none beyond; none stands beside itself', () => {
  const { plans } = onPage();
  for (let i = 0; i < MOST_KEPT + 1; i++) plans.keep(found(i));
  const { kept } = plans.state.get();
  expect(kept.map(({ number }) => number)).toEqual([1, 2, 3, 4, 5]);
  plans.show(kept[1]!);
  plans.drop(kept[1]!);
  expect(plans.state.get()).toMatchObject({ shown: null, kept: [kept[0], ...kept.slice(2)] });
  plans.show(kept[2]!);
  plans.showBeside(kept[3]!);
  plans.show(kept[3]!);
  expect(plans.state.get()).toMatchObject({ shown: kept[3], beside: null });
  plans.showBeside(kept[2]!);
  plans.drop(kept[2]!);
  expect(plans.state.get()).toMatchObject({ shown: kept[3], beside: null });
  plans.keep(found(9));
  expect(plans.state.get().kept.at(-1)!.number).toBe(6);
});
