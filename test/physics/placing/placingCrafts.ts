/** Craft for placement studies: a 4 m hull with room to level it, and a thruster to move. */
import { type Craft, keyed } from '../../../src/craft/craft.ts';
import type { HullShape } from '../../../src/craft/hullSchema.ts';
import type { Part, WireRun } from '../../../src/craft/schema.ts';
import type { ThrusterData } from '../../../src/craft/thrustSchema.ts';
import { loadHighs } from '../../../src/numeric/linearProgram/highsSolver.ts';
import {
  type PlacementStudy,
  placementStudy,
  type StudyOptions,
} from '../../../src/physics/placing/study.ts';
import { partOf, wireOf } from '../../edit/craftFixture.ts';
import { craftWith, degrees, finPart, solvedValue, thrusterPart, turning } from '../thrust/thrustFixture.ts';

export const solver = await loadHighs();

/** CB at 1.5 + (3/8)(2.5 − 1.5) = 1.875 m, forward of mid-length: centroids of half-spheroids. */
export const BLUNT_CB = 1.875;
export const BLUNT: HullShape = { kind: 'twoSpheroid', foreLength: 1.5, aftLength: 2.5, diameter: 1 };

export const vectored = (change: Partial<ThrusterData> = {}): Partial<ThrusterData> => ({
  yaw: turning(0, 60 * degrees),
  ...change,
});

interface Want {
  readonly part?: Partial<Part>;
  readonly data?: Partial<ThrusterData>;
  readonly others?: readonly Part[];
  readonly wires?: readonly WireRun[];
  readonly shape?: HullShape;
}

/** Any heaviness will do; level to a thousandth of a degree by lead at nose and tail. */
export function placingCraft({
  part = {},
  data = vectored(),
  others = [finPart()],
  wires = [wireOf('power')],
  shape = BLUNT,
}: Want = {}): Craft {
  const blank = craftWith(
    [
      thrusterPart({ mass: 0.1, place: { kind: 'axis', station: 4.2 }, ...part }, data),
      partOf('battery', {
        kind: 'battery',
        mass: 0.3,
        place: { kind: 'keel', station: BLUNT_CB, drop: 0.1 },
      }),
      partOf('car', { mass: 0.4, place: { kind: 'keel', station: BLUNT_CB, drop: 0.3 } }),
      ...others,
    ],
    shape,
  );
  return {
    ...blank,
    wires: keyed(wires),
    hardpoints: keyed([
      { id: 'nose', name: 'Nose', place: { kind: 'axis', station: 0 }, limit: 5, fill: 'continuous' },
      { id: 'tail', name: 'Tail', place: { kind: 'axis', station: 4 }, limit: 5, fill: 'continuous' },
    ]),
    leadAt: 'nose',
    targets: {
      ...blank.targets,
      heaviness: { least: -5, most: 5 },
      pitchTolerance: 1e-3 * degrees,
      leastPendulumDepth: 0,
    },
  };
}

export const studyOf = (craft: Craft, options: StudyOptions = { stations: 9 }): PlacementStudy =>
  solvedValue(placementStudy(craft, 'thruster', solver, options));
