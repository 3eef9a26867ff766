/**
 * What the hull's flow does for a propeller wherever it is put: mean speed through its disc over that of the craft, and
 * thrust per watt over that in free air, at the speed and thrust of the craft as it flies today.
 */
import { valueOrNull } from '../../numeric/outcome.ts';
import { kinematicViscosity } from '../air/viscosity.ts';
import type { CraftState } from '../craftState.ts';
import { type BoundaryLayer, boundaryLayerOf } from '../flow/boundaryLayer.ts';
import { hullFlowOf } from '../flow/hullFlow.ts';
import { powerAgainstFree } from '../flow/idealPower.ts';
import { inflowAt } from '../flow/inflow.ts';
import { discArea } from '../thrust/propeller.ts';
import { type Thruster, thrustAt, thrustersOf } from '../thrust/thrusters.ts';

export interface InflowFigures {
  /** Mean axial speed through the disc, as a share of the speed of the craft. */
  readonly inflowRatio: number | null;
  /** Thrust per watt against that in free air: 1.08 is 8 % more. */
  readonly perWatt: number | null;
}

const NONE: InflowFigures = { inflowRatio: null, perWatt: null };

/** For a part with thrust figures; the flow about the hull and its layer are worked out once. `speed` in m/s; null when it is not known. */
export function inflowAlong(
  { hull, air }: CraftState,
  part: string,
  speed: number | null,
  throttle: number,
): (state: CraftState) => InflowFigures {
  const flow = valueOrNull(hullFlowOf(hull));
  if (!flow || speed === null) return () => NONE;
  const layer = valueOrNull(boundaryLayerOf(flow, speed, kinematicViscosity(air)));
  return (state) => {
    const own = thrustersOf(state).filter((thruster) => thruster.part === part);
    const ratios = own.map((thruster) => ratioAt(flow, layer, thruster));
    const [first] = own;
    if (!first || ratios.some((ratio) => ratio === null)) return NONE;
    const ratio = ratios.reduce<number>((sum, each) => sum + each!, 0) / own.length;
    const thrust = thrustAt(first, throttle, speed);
    const area = discArea(first.diameter);
    return { inflowRatio: ratio, perWatt: powerAgainstFree(thrust, area, air.density, speed, ratio) };
  };
}

/** Null with the disc wholly inside the hull. */
function ratioAt(
  flow: Parameters<typeof inflowAt>[0],
  layer: BoundaryLayer | null,
  thruster: Thruster,
): number | null {
  const { ratio, insideShare } = inflowAt(flow, layer, thruster);
  return insideShare < 1 ? ratio : null;
}
