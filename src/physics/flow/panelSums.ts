/**
 * What a point feels of a panel, for source strengths 1, t, t², … along it: ∫tᵏ (φ, ∂φ/∂x, ∂φ/∂ϱ) ds.
 *
 * The integrands are steep where the panel is near the point. There the panel is halved until each part is no longer
 * than its distance, and a Gauss rule taken on each. For a point on the panel itself the velocity has the principal
 * value: about the point parts of equal length in t are taken in pairs, on which 1/(t − t₀) cancels; what is left
 * goes as log|t − t₀|, which τ = d y³ makes smooth enough for a Gauss rule in y.
 */
import { gaussLegendre } from '../../numeric/quadrature.ts';
import { type FlowPanel, NODES, powerSlope, powerSum } from './flowPanel.ts';
import { type Order, type RingFlow, ringSource } from './ringSource.ts';

const rule = gaussLegendre(6);
const pairRule = gaussLegendre(10);
/** A part may be as long as its middle is far. */
const CLEAR = 2;
const DEEPEST = 40;

/** φ by powers of t, then ∂φ/∂x, then ∂φ/∂ϱ. */
export type PanelSums = Float64Array;

export const panelSums = (): PanelSums => new Float64Array(3 * NODES);

/** Beyond this many half lengths the sources of a panel act from its nodes. */
const FAR = 3.5;

export const isFar = ({ x, r, reach }: FlowPanel, station: number, rho: number): boolean =>
  Math.hypot(station - x, rho - r) > FAR * reach;

/** Adds the sums over the panel felt at (x, ϱ) off it. */
export function addNear(panel: FlowPanel, order: Order, x: number, rho: number, sums: PanelSums): void {
  addParts(panel, order, x, rho, -1, 1, 0, sums);
}

/** Adds the sums over the panel felt at its own place t₀, without the σ/2 of the outer side. */
export function addSelf(panel: FlowPanel, order: Order, t0: number, sums: PanelSums): void {
  const x = powerSum(panel.xs, t0);
  const rho = powerSum(panel.rs, t0);
  // Beyond the distance to the axis the ring is no longer like a straight line.
  const d = Math.min(1 - Math.abs(t0), rho / speedAt(panel, t0));
  pairRule.nodes.forEach((node, i) => {
    const y = (1 + node) / 2;
    const tau = d * y * y * y;
    const weight = 1.5 * d * y * y * pairRule.weights[i]!;
    addPoint(panel, order, x, rho, t0 - tau, weight, sums);
    addPoint(panel, order, x, rho, t0 + tau, weight, sums);
  });
  if (t0 - d > -1) addParts(panel, order, x, rho, -1, t0 - d, 0, sums);
  if (t0 + d < 1) addParts(panel, order, x, rho, t0 + d, 1, 0, sums);
}

function addParts(
  panel: FlowPanel,
  order: Order,
  x: number,
  rho: number,
  a: number,
  b: number,
  depth: number,
  sums: PanelSums,
): void {
  const middle = (a + b) / 2;
  const half = ((b - a) / 2) * speedAt(panel, middle);
  const away = Math.hypot(powerSum(panel.xs, middle) - x, powerSum(panel.rs, middle) - rho);
  if (depth < DEEPEST && away < CLEAR * half) {
    addParts(panel, order, x, rho, a, middle, depth + 1, sums);
    addParts(panel, order, x, rho, middle, b, depth + 1, sums);
    return;
  }
  for (let i = 0; i < rule.nodes.length; i += 1)
    addPoint(
      panel,
      order,
      x,
      rho,
      middle + ((b - a) / 2) * rule.nodes[i]!,
      ((b - a) / 2) * rule.weights[i]!,
      sums,
    );
}

const speedAt = (panel: FlowPanel, t: number): number =>
  Math.hypot(powerSlope(panel.xs, t), powerSlope(panel.rs, t));

const flow: RingFlow = { potential: 0, axial: 0, radial: 0 };

function addPoint(
  panel: FlowPanel,
  order: Order,
  x: number,
  rho: number,
  t: number,
  weight: number,
  sums: PanelSums,
): void {
  ringSource(order, x - powerSum(panel.xs, t), rho, Math.max(0, powerSum(panel.rs, t)), flow);
  let strength = weight * speedAt(panel, t);
  for (let k = 0; k < NODES; k += 1) {
    sums[k]! += strength * flow.potential;
    sums[NODES + k]! += strength * flow.axial;
    sums[2 * NODES + k]! += strength * flow.radial;
    strength *= t;
  }
}
