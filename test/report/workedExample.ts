/** The worked example as a craft: hand-checked figures stand in `workedExample.test.ts`. */
import { BLANK_HARDPOINT, blankCraft } from '../../src/craft/blank.ts';
import { type Craft, keyed } from '../../src/craft/craft.ts';
import { partOf } from '../edit/craftFixture.ts';

const point = { size: { length: 0, width: 0, height: 0 }, massTolerance: 0 };

export function workedExample(): Craft {
  const craft = blankCraft('Worked example', { kind: 'spheroid', length: 3, diameter: 1 }, 3);
  return {
    ...craft,
    film: { name: 'Film', arealDensity: 0.045, arealDensityTolerance: 0 },
    parts: keyed([
      partOf('thruster', { ...point, mass: 0.11, place: { kind: 'axis', station: 2.97 } }),
      partOf('fins', { ...point, mass: 0.096, place: { kind: 'axis', station: 2.62 } }),
      partOf('gondola', { ...point, mass: 0.14, place: { kind: 'keel', station: 1.45, drop: 0.04 } }),
      partOf('battery', { ...point, mass: 0.172, place: { kind: 'keel', station: 1.3, drop: 0.03 } }),
    ]),
    hardpoints: keyed([
      { id: 'nose', name: 'Nose', place: { kind: 'axis', station: 0.05 }, ...BLANK_HARDPOINT },
    ]),
  };
}
