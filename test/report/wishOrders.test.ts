import { expect, test } from 'vitest';
import type { Craft } from '../../src/craft/craft.ts';
import { WISHES, type Wish } from '../../src/craft/planningSchema.ts';
import { loadHighs } from '../../src/numeric/linearProgram/highsSolver.ts';
import { type PlanFound, planOf } from '../../src/physics/ballast/plan.ts';
import { assess } from '../../src/report/assess.ts';
import { movedParts } from '../../src/report/movedParts.ts';
import { usefulLoad } from '../../src/report/planFigures.ts';
import { type OrderTried, orderReport, otherOrders } from '../../src/report/wishOrders.ts';
import { sampleCraft } from '../samples/readSamples.ts';

const solver = await loadHighs();

function planFor(craft: Craft, wishes: readonly Wish[] = craft.wishes): PlanFound {
  const plan = planOf({ ...craft, wishes: [...wishes] }, solver, { explain: false });
  if ('why' in plan) throw new Error(plan.why);
  return plan;
}

const tryAll = (craft: Craft): OrderTried[] =>
  otherOrders(craft.wishes).map((order) => ({ order, plan: planFor(craft, order) }));

/** Level already, and allowed to be so light that the loads may stay ashore: only carrying them moves the battery. */
function torn(): Craft {
  const craft = sampleCraft('museum-atrium');
  const battery = craft.parts.byId.battery!;
  if (battery.place.kind === 'free') throw new Error('the battery is free');
  const moved = { ...battery, place: { ...battery.place, station: 1.694 } };
  return {
    ...craft,
    targets: { ...craft.targets, heaviness: { ...craft.targets.heaviness, least: -0.4 } },
    parts: { ...craft.parts, byId: { ...craft.parts.byId, battery: moved } },
  };
}

const solidMass = (craft: Craft): number => assess(craft).rows['mass.solid']!.value!;

test('the other orders are all but the one of now, each once', () => {
  const others = otherOrders(WISHES);
  expect(others).toHaveLength(5);
  expect(new Set(others.map(String)).size).toBe(5);
  expect(others.map(String)).not.toContain(String(WISHES));
  for (const order of others) expect([...order].sort()).toEqual([...WISHES].sort());
  expect(otherOrders(['leastWire', 'usefulLoad'])).toEqual([['usefulLoad', 'leastWire']]);
  expect(otherOrders(['leastWire'])).toEqual([]);
  expect(otherOrders([])).toEqual([]);
});

test('where carrying a load moves the battery, another order is another plan, with the figures of that plan', () => {
  const craft = torn();
  const now = planFor(craft);
  const tried = tryAll(craft);
  const { others, open } = orderReport(craft, now, tried);
  expect(open).toBe(0);
  expect(others.length).toBeGreaterThan(0);
  const movedFirst = tried.find(({ order }) => order[0] === 'fewestMoved')!.plan as PlanFound;
  expect(usefulLoad(movedFirst.craft)).toBeLessThan(usefulLoad(now.craft));
  expect(movedParts(craft, movedFirst.craft)).toBeLessThan(movedParts(craft, now.craft));
  const told = others.find(({ order }) => order[0] === 'fewestMoved')!;
  expect(told.sentence).toMatch(
    /^Parts moved, useful load, wire: 0\.0 g of useful load of rank 2 instead of /,
  );
  expect(told.sentence).toContain('0 parts moved instead of 1');
  const imperial = orderReport(craft, now, tried, 'imperial').others[0]!;
  expect(imperial.sentence).toMatch(/ oz of useful load/);
});

test('an order that is told of was worth telling: seen from it, the order of now is another', () => {
  const craft = torn();
  const [told] = orderReport(craft, planFor(craft), tryAll(craft)).others;
  const other: Craft = { ...craft, wishes: [...told!.order] };
  const back = orderReport(other, planFor(other), tryAll(other));
  expect(back.others.length).toBeGreaterThan(0);
});

test.each(['library-scanner', 'orchard-counter', 'museum-atrium'])(
  '%s: no order is told of, and every order carries as much and moves as few',
  (name) => {
    const craft = sampleCraft(name);
    const now = planFor(craft);
    const tried = tryAll(craft);
    expect(orderReport(craft, now, tried)).toEqual({ others: [], open: 0 });
    for (const { plan } of tried) {
      const then = (plan as PlanFound).craft;
      expect(usefulLoad(then)).toBeCloseTo(usefulLoad(now.craft), 3);
      expect(movedParts(craft, then)).toBe(movedParts(craft, now.craft));
    }
  },
);

test('wire that another order saves is all by which the craft gets lighter', () => {
  const craft = sampleCraft('aviary-counter');
  const now = planFor(craft);
  const tried = tryAll(craft);
  const [told] = orderReport(craft, now, tried).others;
  const [, less, more] = told!.sentence.match(/([\d.]+) g of wire instead of ([\d.]+) g\.$/)!;
  const then = tried.find(({ order }) => order === told!.order)!.plan as PlanFound;
  expect(then.deadBallast).toBeCloseTo(now.deadBallast, 4);
  expect(usefulLoad(then.craft)).toBeCloseTo(usefulLoad(now.craft), 6);
  const saved = 1000 * (solidMass(now.craft) - solidMass(then.craft));
  expect(saved).toBeGreaterThan(0);
  // Two figures rounded to a tenth.
  expect(Math.abs(saved - (Number(more) - Number(less)))).toBeLessThan(0.1 + 1e-6);
});

test('of an order whose plan was not carried to a proof nothing is said', () => {
  const craft = torn();
  const cut = tryAll(craft).map(({ order, plan }): OrderTried => {
    const unproven = { ...(plan as PlanFound), wishesProven: false };
    return { order, plan: unproven };
  });
  expect(orderReport(craft, planFor(craft), cut)).toEqual({ others: [], open: 5 });
});
