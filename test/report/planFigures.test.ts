import { expect, test } from 'vitest';
import { listed } from '../../src/craft/craft.ts';
import { stowed } from '../../src/craft/stowage.ts';
import { loadHighs } from '../../src/numeric/linearProgram/highsSolver.ts';
import { planOf } from '../../src/physics/ballast/plan.ts';
import { assess } from '../../src/report/assess.ts';
import { movedParts } from '../../src/report/movedParts.ts';
import { planFigures } from '../../src/report/planFigures.ts';
import { sampleCraft, samples } from '../samples/readSamples.ts';

const solver = await loadHighs();

test.each(['orchard-counter', 'museum-atrium', 'library-scanner'])(
  '%s: the figures with the plan are those that the plan claims',
  (name) => {
    const craft = sampleCraft(name);
    const plan = planOf(craft, solver, { explain: false });
    if ('why' in plan) throw new Error(plan.why);
    const today = planFigures(craft);
    const then = planFigures(stowed(craft, plan.stowage));
    const figure = (figures: typeof then, key: string) =>
      figures.rows.find((each) => each.key === key)!.row.value;
    expect(figure(then, 'deadBallast')).toBeCloseTo(plan.deadBallast, 9);
    expect(figure(today, 'deadBallast')).toBeCloseTo(plan.deadBallastToday, 9);
    const aboard = plan.loads.filter(({ place, placeToday }) => place && !placeToday);
    const more = aboard.reduce((sum, { load }) => sum + craft.loads.byId[load]!.mass, 0);
    expect(figure(then, 'usefulLoad')! - figure(today, 'usefulLoad')!).toBeCloseTo(more, 9);
    expect(then.met).toBe(assess(plan.craft).met);
    const slid = plan.slides.filter(({ from, to }) => Math.abs(from - to) > 5e-4).length;
    expect(movedParts(craft, plan.craft)).toBe(slid + aboard.length);
  },
);

test('every sample has the same figures in the same order, and moves no part by staying as it is', () => {
  const crafts = samples.map(({ name }) => sampleCraft(name));
  const [first, ...rest] = crafts.map((craft) => planFigures(craft).rows.map(({ key }) => key));
  for (const keys of rest) expect(keys).toEqual(first);
  for (const craft of crafts) expect(movedParts(craft, { ...craft })).toBe(0);
});

test('a part taken out counts as moved', () => {
  const craft = sampleCraft('museum-atrium');
  const [gone] = listed(craft.parts).filter(({ kind }) => kind !== 'ballast');
  const without = {
    ...craft,
    parts: {
      byId: Object.fromEntries(Object.entries(craft.parts.byId).filter(([id]) => id !== gone!.id)),
      order: craft.parts.order.filter((id) => id !== gone!.id),
    },
  };
  expect(movedParts(craft, without)).toBe(1);
});
