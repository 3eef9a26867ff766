import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { expect, test } from 'vitest';
import type { Craft } from '../../../src/craft/craft.ts';
import { stowed } from '../../../src/craft/stowage.ts';
import { loadHighs } from '../../../src/numeric/linearProgram/highsSolver.ts';
import { EditorContext } from '../../../src/panels/editor.ts';
import { Inspector } from '../../../src/panels/Inspector.tsx';
import { PlanPanel } from '../../../src/panels/plan/PlanPanel.tsx';
import {
  NO_CARRIES,
  NO_ORDERS,
  NO_PLANS,
  type Planning,
  PlanningContext,
  type PlansState,
} from '../../../src/panels/plan/planning.ts';
import { carryCurve } from '../../../src/physics/ballast/carry.ts';
import { carryTable } from '../../../src/physics/ballast/carryTable.ts';
import { type PlanFound, planOf } from '../../../src/physics/ballast/plan.ts';
import { planReport } from '../../../src/report/planReport.ts';
import { otherOrders } from '../../../src/report/wishOrders.ts';
import type { UnitSystem } from '../../../src/units/units.ts';
import { sampleCraft } from '../../samples/readSamples.ts';
import { danglingIds, editorOn, render, seen, unnamed } from '../render.tsx';

const solver = await loadHighs();
const nothing = () => {};

const planning = (state: Partial<Planning>): Planning => ({
  ...NO_PLANS,
  ...NO_CARRIES,
  orders: NO_ORDERS,
  setRobust: nothing,
  again: nothing,
  stop: nothing,
  keep: nothing,
  show: nothing,
  showBeside: nothing,
  drop: nothing,
  setLine: nothing,
  stopCarry: nothing,
  setCarryLoad: nothing,
  workOutTable: nothing,
  stopTable: nothing,
  tryOrders: nothing,
  stopOrders: nothing,
  ...state,
});

function panel(craft: Craft, state: Partial<Planning>, units: UnitSystem = 'metric'): string {
  const page = createElement(PlanningContext, { value: planning(state) }, createElement(PlanPanel));
  return renderToStaticMarkup(createElement(EditorContext, { value: editorOn(craft, { units }) }, page));
}

const orchard = sampleCraft('orchard-counter');
const cave = sampleCraft('cave-mapper');
const moon = sampleCraft('planetarium-moon');

function foundOn(craft: Craft): PlanFound {
  const plan = planOf(craft, solver);
  if ('why' in plan) throw new Error(plan.why);
  return plan;
}

const plan = foundOn(orchard);
const curve = carryCurve(orchard, solver, { kind: 'keel' });
const shown: PlansState['kept'] = [{ number: 1, robust: false, stowage: plan.stowage }];
const full = panel(orchard, {
  answer: { plan, craft: orchard },
  kept: shown,
  shown: shown[0]!,
  carry: {
    line: { kind: 'keel' },
    curve: curve.status === 'solved' ? curve.value : null,
    busy: true,
    share: 0.5,
    why: null,
    load: null,
  },
  table: { table: carryTable(orchard, solver), craft: orchard, busy: false, why: null },
});

test.each([
  ['with everything', full],
  ['nothing yet', panel(orchard, {})],
  ['pieces', panel(moon, { busy: true })],
  ['infeasible', panel(cave, { answer: { plan: planOf(cave, solver), craft: cave } })],
])('%s: every field has a name, and every description is there', (_, markup) => {
  expect(unnamed(markup)).toEqual([]);
  expect(danglingIds(markup)).toEqual([]);
});

test('a plan is told in the words of the report, in the builder’s units', () => {
  for (const units of ['metric', 'imperial'] as const) {
    const text = seen(panel(orchard, { answer: { plan, craft: orchard } }, units));
    const { headline, proof, steps, binding } = planReport(orchard, plan, units);
    for (const each of [headline, proof, ...steps, ...binding.map(({ sentence }) => sentence)]) {
      expect(text).toContain(each);
    }
  }
});

test('a plan for the craft before the last change cannot be applied', () => {
  const answer = { plan, craft: { ...orchard } };
  expect(panel(orchard, { answer })).toMatch(/aria-disabled="true"[^>]*>Apply the plan/);
  expect(panel(orchard, { answer: { plan, craft: orchard } })).toMatch(
    /aria-disabled="false"[^>]*>Apply the plan/,
  );
});

test('where no plan can be made, every remedy has its button', () => {
  const none = planOf(cave, solver);
  const text = seen(panel(cave, { answer: { plan: none, craft: cave } }));
  const { remedies } = planReport(cave, none);
  expect(remedies.length).toBeGreaterThan(1);
  for (const { sentence } of remedies) expect(text).toContain(sentence);
  expect(text.split('Do this').length - 1).toBe(remedies.length);
  expect(text).not.toContain('Apply the plan');
});

test('progress says how far it is, and there is a way to stop', () => {
  const progress = { step: 'searching', deadBallast: 0.05, bound: 0.04, plan: null } as const;
  const text = seen(panel(orchard, { busy: true, progress }));
  expect(text).toContain('Searching: best so far 50.0 g, none below 40.0 g.');
  expect(text).toContain('Stop');
});

test('whether another order of the wishes changes the plan is said once all were tried, and not before', () => {
  const answer = { plan, craft: orchard };
  const asked = { craft: orchard, robust: false };
  const tried = otherOrders(orchard.wishes).map((order) => ({ order, plan }));
  const text = (orders: Partial<Planning['orders']>, state: Partial<Planning> = {}) =>
    seen(panel(orchard, { answer, orders: { ...NO_ORDERS, asked, ...orders }, ...state }));
  const none = `Another order would not change this plan: the other ${tried.length} were tried.`;
  expect(text({ tried })).toContain(none);
  for (const orders of [{}, { tried, busy: true }, { tried: tried.slice(1), why: 'Stopped.' }]) {
    expect(text(orders)).not.toContain('not change this plan');
  }
  const open = tried.map((each) => ({ ...each, plan: { ...plan, wishesProven: false } }));
  expect(text({ tried: open })).toContain(`${tried.length} of ${tried.length} other orders could not be`);
  const less = { ...plan, craft: stowed(orchard, { ...plan.stowage, loads: [] }) };
  expect(text({ tried: tried.map((each) => ({ ...each, plan: less })) })).toMatch(
    /: 0\.0 g of useful load .* Take it/,
  );
  const question = 'Would another order change it?';
  expect(text({})).toContain(question);
  for (const state of [
    { busy: true },
    { answer: { plan, craft: { ...orchard } } },
    { answer: { plan: { ...plan, wishesProven: false }, craft: orchard } },
  ]) {
    expect(text({}, state)).not.toContain(question);
  }
});

test('kept plans stand in a table; each can be shown, applied and dropped', () => {
  const text = seen(full);
  for (const word of ['Kept plans', 'Show plan 1', 'Apply plan 1', 'Drop plan 1', 'Today and with plan 1']) {
    expect(text).toContain(word);
  }
});

test('two kept plans stand side by side in their figures and in what differs', () => {
  const [first] = plan.stowage.loads;
  const without = { ...plan.stowage, loads: plan.stowage.loads.filter((load) => load !== first) };
  const kept = [...shown, { number: 2, robust: false, stowage: without }];
  const beside = (state: Partial<Planning>) => seen(panel(orchard, { kept, shown: kept[1]!, ...state }));
  const text = beside({ beside: kept[0]! });
  for (const word of ['Plan 2 beside', 'Plan 1 and plan 2', 'Pendulum depth', 'What differs', 'ashore']) {
    expect(text).toContain(word);
  }
  expect(text).toContain(orchard.loads.byId[first!.load]!.name);
  expect(beside({})).toContain('Today and with plan 2');
  const same = [...shown, { ...shown[0]!, number: 2 }];
  expect(beside({ kept: same, shown: same[1]!, beside: same[0]! })).toContain(
    'Everything is in the same place.',
  );
});

test('a part’s slide and a hardpoint’s limit and fill are typed in the inspector', () => {
  const part = seen(render(Inspector, {}, orchard, { selection: [{ kind: 'part', id: 'battery' }] }));
  expect(part).toContain('Slide from');
  expect(part).toContain('Slide to');
  const fixed = seen(render(Inspector, {}, orchard, { selection: [{ kind: 'part', id: 'gondola' }] }));
  expect(fixed).toContain('The plan may slide it');
  expect(fixed).not.toContain('Slide from');
  const id = orchard.hardpoints.order[0]!;
  const hardpoint = seen(render(Inspector, {}, orchard, { selection: [{ kind: 'hardpoint', id }] }));
  expect(hardpoint).toContain('Holds at most');
  expect(hardpoint).toContain('Lead comes');
});
