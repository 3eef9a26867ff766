import { IDBFactory } from 'fake-indexeddb';
import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import 'fake-indexeddb/auto';
import { type KeptCraft, plansSetting } from '../../src/app/kept.ts';
import { keptPlans, putKeptPlans } from '../../src/app/keptPlans.ts';
import { openKeep } from '../../src/app/openKeep.ts';
import { PassingKeep } from '../../src/app/passingKeep.ts';
import { loadHighs } from '../../src/numeric/linearProgram/highsSolver.ts';
import { type KeptPlan, MOST_KEPT } from '../../src/panels/plan/planning.ts';
import { planOf } from '../../src/physics/ballast/plan.ts';
import { sampleCraft } from '../samples/readSamples.ts';

beforeEach(() => vi.stubGlobal('indexedDB', new IDBFactory()));
afterEach(() => vi.unstubAllGlobals());

const solver = await loadHighs();

const plans = ['orchard-counter', 'planetarium-moon', 'library-scanner', 'museum-atrium'].map(
  (sample, i): KeptPlan => {
    const plan = planOf(sampleCraft(sample), solver, { explain: false });
    if ('why' in plan) throw new Error(plan.why);
    return { number: i + 1, robust: plan.robust, stowage: plan.stowage };
  },
);

const craft = (id: string): KeptCraft => ({
  id,
  name: id,
  text: '',
  changedAt: 0,
  writer: 'here',
  view: { tilted: false, tab: 'plan' },
});

test('plans put by are there on the next visit, each with its own craft', async () => {
  await putKeptPlans(await openKeep(), 'a', plans);
  const keep = await openKeep();
  expect(await keptPlans(keep, 'a')).toEqual(plans);
  expect(await keptPlans(keep, 'b')).toEqual([]);
});

test('another page that shows the craft and keeps how it does so takes none away', async () => {
  const keep = await openKeep();
  await putKeptPlans(keep, 'a', plans);
  await (await openKeep()).put(craft('a'), null);
  expect(await keptPlans(keep, 'a')).toEqual(plans);
});

test.each([
  ['in a lasting keep', openKeep],
  ['in a passing one', async () => new PassingKeep()],
])('with a removed craft go its plans, %s', async (_, open) => {
  const keep = await open();
  for (const id of ['a', 'b']) {
    await keep.put(craft(id), null);
    await putKeptPlans(keep, id, plans);
  }
  await keep.remove('a');
  expect(await keptPlans(keep, 'a')).toEqual([]);
  expect(await keptPlans(keep, 'b')).toEqual(plans);
});

test('what is no plan of today is passed over, and a browser that cannot read has none', async () => {
  const keep = await openKeep();
  const [first, second] = plans as [KeptPlan, KeptPlan];
  const elsewhere = {
    ...first,
    stowage: { ...first.stowage, loads: [{ load: 'a', place: { kind: 'moon' } }] },
  };
  await keep.putSetting(plansSetting('a'), [elsewhere, 'plan', { number: 1 }, null, second]);
  expect(await keptPlans(keep, 'a')).toEqual([second]);
  await keep.putSetting(plansSetting('a'), 'none');
  expect(await keptPlans(keep, 'a')).toEqual([]);
  await keep.putSetting(plansSetting('a'), Array(MOST_KEPT + 3).fill(first));
  expect(await keptPlans(keep, 'a')).toHaveLength(MOST_KEPT);
  const refusing = { setting: () => Promise.reject(new Error('refused')) };
  expect(await keptPlans(refusing, 'a')).toEqual([]);
});
