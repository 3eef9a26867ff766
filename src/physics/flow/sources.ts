/**
 * Sources on the skin that keep the air out of the hull.
 *
 *   ½σ(s) + ∫σ(s′) ∂G/∂n ds′ = w(s)
 *
 * w the outward speed of the skin that the sources must match, m/s; σ their strength, m/s; G the potential of a ring
 * of unit sources (ringSource.ts). Asked for at the nodes of the panels, which gives as many equations as unknowns.
 * Source: J. L. Hess & A. M. O. Smith, Calculation of potential flow about arbitrary bodies, Progress in Aeronautical
 * Sciences 8 (1967; from memory): their method for bodies of revolution, on curved panels with varying strength.
 */
import { type DenseSolver, factorDense } from '../../numeric/dense.ts';
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { type FlowNode, type FlowPanel, NODES, nodePowers } from './flowPanel.ts';
import { addNear, addSelf, isFar, panelSums } from './panelSums.ts';
import { type Order, type RingFlow, ringSource } from './ringSource.ts';

/** What n sources of unit strength do at the n nodes, n × n, row = where it is felt, column = whose it is. */
export interface Influence {
  readonly nodes: readonly FlowNode[];
  readonly potential: Float64Array;
  /** Along the skin, tailward. */
  readonly along: Float64Array;
  /** Strengths that give the skin the outward speeds asked for. */
  readonly strengthsFor: DenseSolver;
}

export function influenceOf(panels: readonly FlowPanel[], order: Order): Outcome<Influence> {
  const nodes = panels.flatMap((panel) => panel.nodes);
  const n = nodes.length;
  const tables = {
    potential: new Float64Array(n * n),
    along: new Float64Array(n * n),
    out: new Float64Array(n * n),
  };
  panels.forEach((panel, j) => {
    nodes.forEach((node, i) => {
      const own = Math.floor(i / NODES) === j;
      if (isFar(panel, node.x, node.r)) addFar(panel, order, node, i * n + j * NODES, tables);
      else addClose(panel, order, node, own, i * n + j * NODES, tables);
    });
  });
  for (let i = 0; i < n; i += 1) tables.out[i * n + i]! += 1 / 2;
  const solver = factorDense(tables.out, n);
  if (solver.status !== 'solved') return infeasible(`No air flow about this hull was found. ${solver.why}`);
  return solved({ nodes, potential: tables.potential, along: tables.along, strengthsFor: solver.value });
}

interface Tables {
  readonly potential: Float64Array;
  readonly along: Float64Array;
  readonly out: Float64Array;
}

const flow: RingFlow = { potential: 0, axial: 0, radial: 0 };

function addFar(panel: FlowPanel, order: Order, at: FlowNode, start: number, tables: Tables): void {
  panel.nodes.forEach(({ x, r, ds }, k) => {
    ringSource(order, at.x - x, at.r, r, flow);
    tables.potential[start + k] = ds * flow.potential;
    tables.along[start + k] = ds * (at.tangent.x * flow.axial + at.tangent.r * flow.radial);
    tables.out[start + k] = ds * (at.normal.x * flow.axial + at.normal.r * flow.radial);
  });
}

const sums = panelSums();

function addClose(
  panel: FlowPanel,
  order: Order,
  at: FlowNode,
  own: boolean,
  start: number,
  tables: Tables,
): void {
  sums.fill(0);
  if (own) addSelf(panel, order, at.t, sums);
  else addNear(panel, order, at.x, at.r, sums);
  for (let k = 0; k < NODES; k += 1) {
    const potential = ofNode(k, 0);
    const axial = ofNode(k, NODES);
    const radial = ofNode(k, 2 * NODES);
    tables.potential[start + k] = potential;
    tables.along[start + k] = at.tangent.x * axial + at.tangent.r * radial;
    tables.out[start + k] = at.normal.x * axial + at.normal.r * radial;
  }
}

/** From sums by powers of t to what unit strength at one node does, the strength falling to 0 at the others. */
function ofNode(node: number, offset: number): number {
  let sum = 0;
  for (let k = 0; k < NODES; k += 1) sum += sums[offset + k]! * nodePowers[k * NODES + node]!;
  return sum;
}

/** Row by row: table times strengths. */
export function felt(table: Float64Array, strengths: ArrayLike<number>): Float64Array {
  const n = strengths.length;
  const values = new Float64Array(n);
  for (let i = 0; i < n; i += 1) {
    let sum = 0;
    for (let j = 0; j < n; j += 1) sum += table[i * n + j]! * strengths[j]!;
    values[i] = sum;
  }
  return values;
}
