import { expect, test } from 'vitest';
import { firstThruster, STRAIGHT } from '../../src/craft/firstFigures.ts';
import type { Part } from '../../src/craft/schema.ts';
import type { ThrusterData } from '../../src/craft/thrustSchema.ts';
import { HAZARDS, hazardsOf } from '../../src/report/hazards.ts';
import { fixtureCraft } from '../edit/craftFixture.ts';

const craft = fixtureCraft();
const withPart = (id: string, change: Partial<Part>) => ({
  ...craft,
  parts: { ...craft.parts, byId: { ...craft.parts.byId, [id]: { ...craft.parts.byId[id]!, ...change } } },
});
const data: ThrusterData = firstThruster({ width: 0.2, height: 0.2 });
const sweeping = { ...STRAIGHT, least: -1 };

test('thrust that turns brings its caution, in yaw or in pitch; fixed thrust does not', () => {
  expect(hazardsOf(withPart('thruster', { thruster: data }))).not.toContain(HAZARDS.vectored);
  for (const way of ['yaw', 'pitch'] as const) {
    const turning = { ...data, [way]: sweeping };
    expect(hazardsOf(withPart('thruster', { thruster: turning }))).toContain(HAZARDS.vectored);
  }
});

test('a propeller brings its caution whatever its part is called, once, and the part keeps its own', () => {
  const odd = withPart('battery', { thruster: data });
  const hazards = hazardsOf(odd);
  expect(hazards.filter((hazard) => hazard === HAZARDS.thruster)).toHaveLength(1);
  expect(hazards).toContain(HAZARDS.battery);
});
