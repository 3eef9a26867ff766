/**
 * Added mass of the actual hull: the air it must carry along when it speeds up, sideways and turning.
 *
 *   m_ab = −ρ ∮ φ_a ∂φ_b/∂n dS,  a, b one of surge, sway, yaw;  n out of the hull
 *   ∂φ/∂n on the skin: surge n_x;  sway n_r cos θ;  yaw about the CB (x′ n_r − r n_x) cos θ, x′ = x − x_CB
 *   round the hull ∮dθ = 2π for surge, ∮cos²θ dθ = π for the others
 *
 * Shares of the displaced air's mass ρV and of its moment of inertia about the CB, as in ../hull/addedMass.ts, which
 * has them in closed form for the ellipsoid. A hull with unequal ends turns as it is pushed sideways at the CB: its
 * swayed air acts at x_CB + m_sway,yaw/m_sway.
 * Source: H. Lamb, Hydrodynamics (6th ed. 1932), §§ 118, 121.
 */
import { type Outcome, solved } from '../../numeric/outcome.ts';
import type { Hull } from '../hull/hull.ts';
import type { FlowNode, FlowPanel } from './flowPanel.ts';
import { felt, type Influence, influenceOf } from './sources.ts';

export interface CarriedAir {
  /** ÷ mass of the displaced air */
  readonly surge: number;
  readonly sway: number;
  /** ÷ the displaced air's moment of inertia about the CB */
  readonly yaw: number;
  /** Station at which the air carried sideways acts, m. */
  readonly swayStation: number;
}

/** `strengths`: the sources of the hull at rest in a stream from ahead; those of surge are their opposite. */
export function carriedAir(
  hull: Hull,
  panels: readonly FlowPanel[],
  endOn: Influence,
  strengths: Float64Array,
): Outcome<CarriedAir> {
  const sideways = influenceOf(panels, 1);
  if (sideways.status !== 'solved') return sideways;
  const { nodes, strengthsFor, potential } = sideways.value;
  const skinSway = nodes.map(({ normal }) => normal.r);
  const skinYaw = nodes.map(({ x, r, normal }) => (x - hull.cbStation) * normal.r - r * normal.x);
  const potentialSway = felt(potential, strengthsFor(skinSway));
  const potentialYaw = felt(potential, strengthsFor(skinYaw));
  const potentialSurge = felt(endOn.potential, strengths).map((value) => -value);
  const skinSurge = nodes.map(({ normal }) => normal.x);
  const sway = -Math.PI * overSkin(nodes, potentialSway, skinSway);
  return solved({
    surge: (-2 * Math.PI * overSkin(nodes, potentialSurge, skinSurge)) / hull.volume,
    sway: sway / hull.volume,
    yaw: (-Math.PI * overSkin(nodes, potentialYaw, skinYaw)) / hull.volumeInertia[2],
    swayStation: hull.cbStation - (Math.PI * overSkin(nodes, potentialSway, skinYaw)) / sway,
  });
}

/** ∫φ w r ds */
const overSkin = (nodes: readonly FlowNode[], potential: Float64Array, speed: readonly number[]): number =>
  nodes.reduce((sum, { r, ds }, i) => sum + potential[i]! * speed[i]! * r * ds, 0);
