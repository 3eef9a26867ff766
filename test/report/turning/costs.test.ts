import { expect, test } from 'vitest';
import type { Craft } from '../../../src/craft/craft.ts';
import { craftStateOf } from '../../../src/physics/craftState.ts';
import { assess } from '../../../src/report/assess.ts';
import { placeCostOf } from '../../../src/report/turning/costs.ts';
import { tailCraft } from './turningCrafts.ts';

const costOf = (craft: Craft) => {
  const state = craftStateOf(craft);
  if (state.status === 'infeasible') throw new Error(state.why);
  return placeCostOf(state.value, 'thruster')!;
};

const bare = (craft: Craft): Craft => ({ ...craft, wires: { byId: {}, order: [] } });

test('without wires the lead is the moment of the thruster over the arm of the lead', () => {
  // 110 g at 3.05 m about a CB at 1.5 m, answered at 0.05 m: 0.11 × 1.55 ÷ 1.45 kg, by hand.
  expect(costOf(bare(tailCraft()))).toMatchObject({ station: 3.05, wire: 0 });
  expect(costOf(bare(tailCraft())).lead).toBeCloseTo((0.11 * 1.55) / 1.45, 12);
});

test('with its wires it is the lead that the report tells, less that of the craft with the thruster at the CB', () => {
  const lead = (craft: Craft) => assess(craft).rows['lead.mass']!.value!;
  const central = tailCraft({ place: { kind: 'axis', station: 1.5 } });
  const cost = costOf(tailCraft());
  expect(cost.lead).toBeCloseTo(lead(tailCraft()) - lead(central), 12);
  expect(cost.wire).toBeGreaterThan(0);
  expect(costOf(central).lead).toBeCloseTo(0, 12);
  expect(costOf(central).wire).toBeCloseTo(0, 12);
});

test('ahead of the CB its place saves lead', () => {
  expect(costOf(tailCraft({ place: { kind: 'axis', station: 0.5 } })).lead).toBeLessThan(0);
});
