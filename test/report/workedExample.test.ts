// A prolate spheroid 3 × 1 m, worked by hand; each figure to the digits it was worked to.
import { expect, test } from 'vitest';
import { placePart } from '../../src/edit/edits/parts.ts';
import { run } from '../../src/edit/history.ts';
import { assess } from '../../src/report/assess.ts';
import { workedExample } from './workedExample.ts';

const { rows } = assess(workedExample());
const degrees = Math.PI / 180;

test.each([
  ['hull.volume', 1.570796, 6],
  ['hull.area', 7.723431, 6],
  ['hull.cbStation', 1.5, 9],
  ['hull.skinMass', 0.347554, 6],
  ['air.density', 1.199314, 6],
  ['gas.density', 0.187148, 6],
  ['lift.gross', 1.589907, 6],
  ['mass.solid', 0.865554, 6],
  ['cg.station', 1.763207, 6],
  ['cg.side', 0, 12],
  ['cg.height', -0.191731, 6],
  ['float.heel', 0, 12],
  ['lead.mass', 0.157117, 6],
  ['lead.station', 0.05, 9],
  ['lead.heavinessAfter', -0.567235, 6],
  ['lead.pendulumDepthAfter', 0.162274, 6],
  ['oneWeight.mass', 0.724353, 6],
  ['oneWeight.station', 1.1855, 4],
] as const)('%s is %d', (key, value, digits) => {
  expect(rows[key]!.status).toBe('solved');
  expect(rows[key]!.value).toBeCloseTo(value, digits);
});

test('it floats 53.929° nose-up', () => {
  expect(rows['float.pitch']!.value! / degrees).toBeCloseTo(53.929, 3);
});

test('with the battery at 0.60 m, 74.083 g do', () => {
  const { craft } = run(workedExample(), placePart('battery', { kind: 'keel', station: 0.6, drop: 0.03 }));
  expect(assess(craft).rows['lead.mass']!.value).toBeCloseTo(0.074083, 6);
});
