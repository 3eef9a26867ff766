/**
 * The air that reaches a propeller disc near the hull.
 *
 *   ratio = mean axial speed over the open disc ÷ U, in the frictionless flow with the layer and the wake in it
 *
 * over the part of the disc outside the hull, the disc square to the hull axis. Left out: what the propeller does to
 * the flow about the hull (it sucks at the tail, which takes back part of what slow air gives: the thrust deduction),
 * the room the layer takes up, its swirl and pulsation, other propellers, fins and car, and a disc turned out of
 * square.
 */
import type { Vec3 } from '../../numeric/vector.ts';
import { type BoundaryLayer, type LayerSlice, skinAt } from './boundaryLayer.ts';
import { meanOverDisc, sharedArea } from './discRings.ts';
import type { HullFlow } from './hullFlow.ts';

export interface PropellerDisc {
  /** Its centre: station, side, height, m. */
  readonly at: Vec3;
  /** m */
  readonly diameter: number;
}

export interface Inflow {
  /** Mean axial speed through the open disc ÷ speed of the craft. */
  readonly ratio: number;
  /** The same without friction. */
  readonly potentialRatio: number;
  /** Share of the whole disc's area in the layer or the wake, 0…1. */
  readonly wakeShare: number;
  /** Share of the whole disc's area inside the hull, 0…1: above 0 the blades strike the skin. */
  readonly insideShare: number;
}

/** `layer` null: friction left out. A disc wholly inside the hull gets no air. */
export function inflowAt(
  flow: HullFlow,
  layer: BoundaryLayer | null,
  { at, diameter }: PropellerDisc,
): Inflow {
  const [station, side, height] = at;
  const disc = { offset: Math.hypot(side, height), radius: diameter / 2 };
  const frictionless = (rho: number): number => flow.velocityAt(station, rho).axial;
  const { skin, thickness, axialAt }: LayerSlice = layer
    ? layer.sliceAt(station)
    : { skin: skinAt(flow, station), thickness: 0, axialAt: frictionless };
  const edge = skin + thickness;
  const area = Math.PI * disc.radius * disc.radius;
  return {
    ratio: meanOverDisc(disc, skin, [edge], axialAt) ?? 0,
    potentialRatio: meanOverDisc(disc, skin, [edge], frictionless) ?? 0,
    wakeShare: (sharedArea(disc, edge) - sharedArea(disc, skin)) / area,
    // Where the section is not round, the skin on the side of the disc decides.
    insideShare: sharedArea(disc, flow.hull.radius(station, Math.atan2(side, height))) / area,
  };
}
