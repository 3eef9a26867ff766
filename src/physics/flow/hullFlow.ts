/**
 * The hull's own flow field: air without friction streaming past it end-on, nose first, at speed 1.
 *
 *   v = x̂ + ∇φ, ∇²φ = 0, v·n = 0 on the skin, φ → 0 far away; φ by sources on the skin (sources.ts)
 *
 * x aft, ϱ off the axis, m; speeds are shares of the speed U of the craft through still air. On a spheroid the speed
 * along the skin is (1 + k₁)U times the cosine of the slope of the outline, (1 + k₁)U at the waist.
 * A hull that is no body of revolution is taken as the body of revolution of equal sections. Friction, thrust, car
 * and fins are left out; behind a blunt tail the air in truth breaks away, which no flow without friction does.
 */
import { kept } from '../../numeric/kept.ts';
import { type Outcome, solved } from '../../numeric/outcome.ts';
import type { Hull } from '../hull/hull.ts';
import { apply, legendreRule } from '../hull/legendreSeries.ts';
import { type CarriedAir, carriedAir } from './carriedAir.ts';
import { type FlowPanel, NODES, nodePowers } from './flowPanel.ts';
import { flowPanels } from './flowPanels.ts';
import { addNear, isFar, panelSums } from './panelSums.ts';
import { type RingFlow, ringSource } from './ringSource.ts';
import { felt, type Influence, influenceOf } from './sources.ts';

export interface HullFlow {
  readonly hull: Hull;
  /** Along the skin, nose tip to tail tip; both tips are at rest. */
  readonly surface: readonly SurfaceMark[];
  /** Velocity ÷ U at a station and distance from the axis outside the hull; inside it means nothing. */
  velocityAt(station: number, rho: number): FlowVelocity;
  /** Air the actual hull must carry along. Worked out at first ask. */
  addedMass(): Outcome<CarriedAir>;
  /** What the figures leave out of account for this hull; empty when there is nothing to say. */
  readonly cautions: readonly string[];
}

export interface SurfaceMark {
  /** m */
  readonly station: number;
  /** Tape distance from the nose tip along the outline, m. */
  readonly tape: number;
  /** Distance from the axis, m. */
  readonly radius: number;
  /** Speed along the skin ÷ U, + toward the tail. */
  readonly ratio: number;
}

export interface FlowVelocity {
  /** + aft */
  readonly axial: number;
  /** + away from the axis */
  readonly radial: number;
}

/** The flow about a hull; kept for as long as the hull is the same object. */
export const hullFlowOf: (hull: Hull) => Outcome<HullFlow> = kept((hull: Hull) => flowAbout(hull, 1));

/** `detail` 2 halves every panel; tests compare. */
export function flowAbout(hull: Hull, detail: number): Outcome<HullFlow> {
  const panels = flowPanels(hull, detail);
  const influence = influenceOf(panels, 0);
  if (influence.status !== 'solved') return influence;
  const { nodes, strengthsFor } = influence.value;
  const strengths = strengthsFor(nodes.map(({ normal }) => -normal.x));
  let carried: Outcome<CarriedAir> | null = null;
  return solved({
    hull,
    surface: surfaceOf(hull, panels, influence.value, strengths),
    velocityAt: fieldOf(panels, strengths),
    addedMass: () => {
      carried ??= carriedAir(hull, panels, influence.value, strengths);
      return carried;
    },
    cautions: isRound(hull) ? [] : [UNROUND],
  });
}

const UNROUND =
  'This hull is not round in section: its air flow is figured for the round hull of equal section area at every station.';

const isRound = (hull: Hull): boolean =>
  [0.25, 0.5, 0.75].every((share) => {
    const [top, side] = [0, Math.PI / 2].map((clock) => hull.radius(share * hull.length, clock));
    return Math.abs(top! - side!) < 1e-6 * hull.height;
  });

function surfaceOf(
  hull: Hull,
  panels: readonly FlowPanel[],
  { nodes, along }: Influence,
  strengths: Float64Array,
): SurfaceMark[] {
  const speeds = felt(along, strengths);
  const tapes = tapesOf(panels);
  const marks = nodes.map(({ x, r, tangent }, i) => ({
    station: x,
    tape: tapes[i]!,
    radius: r,
    ratio: tangent.x + speeds[i]!,
  }));
  const whole = panels.reduce((sum, { reach }) => sum + 2 * reach, 0);
  const nose = { station: 0, tape: 0, radius: 0, ratio: 0 };
  return [
    nose,
    // Where a panel is pinched off at a cusp the interpolated length can run back by a hair.
    ...marks.filter(({ tape }, i) => tape > (marks[i - 1] ?? nose).tape && tape < whole),
    { station: hull.length, tape: whole, radius: 0, ratio: 0 },
  ];
}

const rule = legendreRule(NODES);

/** Tape distance of every node. */
function tapesOf(panels: readonly FlowPanel[]): number[] {
  let start = 0;
  return panels.flatMap(({ nodes, reach }) => {
    const rates = nodes.map(({ ds }, i) => ds / rule.weights[i]!);
    const tapes = nodes.map((_, i) => start + apply(rule.running, i, rates));
    start += 2 * reach;
    return tapes;
  });
}

function fieldOf(panels: readonly FlowPanel[], strengths: Float64Array): HullFlow['velocityAt'] {
  const byPanel = panels.map((panel, i) => {
    const own = strengths.subarray(i * NODES, (i + 1) * NODES);
    return { panel, own, powers: Float64Array.from(own, (_, k) => apply(nodePowers, k, [...own])) };
  });
  const sums = panelSums();
  const flow: RingFlow = { potential: 0, axial: 0, radial: 0 };
  return (station, rho) => {
    let axial = 1;
    let radial = 0;
    for (const { panel, own, powers } of byPanel) {
      if (isFar(panel, station, rho)) {
        for (let k = 0; k < NODES; k += 1) {
          const { x, r, ds } = panel.nodes[k]!;
          ringSource(0, station - x, rho, r, flow);
          axial += own[k]! * ds * flow.axial;
          radial += own[k]! * ds * flow.radial;
        }
      } else {
        sums.fill(0);
        addNear(panel, 0, station, rho, sums);
        for (let k = 0; k < NODES; k += 1) {
          axial += powers[k]! * sums[NODES + k]!;
          radial += powers[k]! * sums[2 * NODES + k]!;
        }
      }
    }
    return { axial, radial };
  };
}
