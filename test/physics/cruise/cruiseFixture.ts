/** A 4 × 1 m spheroid of no skin mass, its CG put where a test wants it. */
import { keyed } from '../../../src/craft/craft.ts';
import type { Part } from '../../../src/craft/schema.ts';
import type { ThrusterData } from '../../../src/craft/thrustSchema.ts';
import { type CraftState, craftStateOf } from '../../../src/physics/craftState.ts';
import { partOf } from '../../edit/craftFixture.ts';
import { craftWith, solvedValue, thrusterPart } from '../thrust/thrustFixture.ts';

export interface Wanted {
  /** kg. Default 0. */
  readonly heaviness?: number;
  /** CG aft of the CB and below it, m. Default 0 and 0.1. */
  readonly aft?: number;
  readonly depth?: number;
  /** Thruster's place: aft of the CB and above it, m. Default 2 and 0. */
  readonly thrusterAft?: number;
  readonly thrusterHeight?: number;
  readonly thruster?: Partial<ThrusterData>;
  /** Besides weight and thruster. Default none. */
  readonly parts?: readonly Part[];
}

const CB = 2;

export function balanced(wanted: Wanted = {}): CraftState {
  const { heaviness = 0, aft = 0, depth = 0.1, thrusterAft = 2, thrusterHeight = 0, parts = [] } = wanted;
  const place = { kind: 'free', x: CB + thrusterAft, y: 0, z: thrusterHeight } as const;
  const others = [thrusterPart({ place }, wanted.thruster), ...parts];
  const craft = { ...craftWith(others), film: { name: '', arealDensity: 0, arealDensityTolerance: 0 } };
  const { loading } = solvedValue(craftStateOf(craft));
  const { mass, moment } = loading.solid;
  const total = loading.grossLift + heaviness;
  const lead = total - mass;
  const [x, z] = [((CB + aft) * total - moment[0]) / lead, (-depth * total - moment[2]) / lead];
  const weight = partOf('weight', { mass: lead, place: { kind: 'free', x, y: 0, z } });
  return solvedValue(craftStateOf({ ...craft, parts: keyed([...others, weight]) }));
}
