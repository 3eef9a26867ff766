/** How long the hull's air flow takes, and how near it comes to what is known exactly. Prints figures; judges nothing. */
import type { Outcome } from '../../src/numeric/outcome.ts';
import { boundaryLayerOf } from '../../src/physics/flow/boundaryLayer.ts';
import { flowAbout, type HullFlow } from '../../src/physics/flow/hullFlow.ts';
import { inflowAt } from '../../src/physics/flow/inflow.ts';
import { skinSpeed } from '../physics/flow/exactSpheroid.ts';
import { built } from '../physics/hull/built.ts';
import { benchShapes } from './shapes.ts';

type Print = (label: string, ...figures: string[]) => void;

const ROUNDS = 60;
const NU = 1.46e-5;

function have<T>(outcome: Outcome<T>): T {
  if (outcome.status !== 'solved') throw new Error(outcome.why);
  return outcome.value;
}

/** Median and 95th percentile over the later rounds. */
function timed(work: (i: number) => unknown): string[] {
  const times = Array.from({ length: 2 * ROUNDS }, (_, i) => {
    const start = performance.now();
    work(i);
    return performance.now() - start;
  })
    .slice(ROUNDS)
    .sort((a, b) => a - b);
  return [
    `median ${times[ROUNDS >> 1]!.toFixed(2)} ms`,
    `p95 ${times[Math.floor(0.95 * ROUNDS)]!.toFixed(2)} ms`,
  ];
}

/** Greatest error of the speed over the skin of a spheroid of fineness 4, as a share of U. */
function skinError({ surface }: HullFlow): number {
  return Math.max(
    ...surface.slice(1, -1).map(({ station, ratio }) => Math.abs(ratio - skinSpeed(2, 0.5, station - 2))),
  );
}

export function benchFlow(print: Print): void {
  const exact = built({ kind: 'spheroid', length: 4, diameter: 1 });
  for (const detail of [0.5, 1, 2]) {
    const flow = have(flowAbout(exact, detail));
    const nodes = `${flow.surface.length - 2} nodes`;
    print(`flow, fineness 4, detail ${detail}`, `error ${skinError(flow).toExponential(1)} U`, nodes);
  }
  for (const [name, shape] of Object.entries(benchShapes)) {
    const hulls = Array.from({ length: 2 * ROUNDS }, () => built({ ...shape }));
    print(`flow about a hull, ${name}`, ...timed((i) => flowAbout(hulls[i]!, 1)), 'reach 20 ms');
  }
  benchOn(have(flowAbout(built(benchShapes.naca4), 1)), print);
}

function benchOn(flow: HullFlow, print: Print): void {
  const fresh = Array.from({ length: 2 * ROUNDS }, () => have(flowAbout(flow.hull, 1)));
  print('its added mass in surge, sway and yaw', ...timed((i) => fresh[i]!.addedMass()));
  print('its boundary layer at one speed', ...timed((i) => boundaryLayerOf(flow, 2 + i / 100, NU)));
  const layer = have(boundaryLayerOf(flow, 3, NU));
  const disc = (i: number) => ({ at: [(4.4 * i) / ROUNDS, 0.8, 0] as const, diameter: 0.3 });
  print('inflow at one disc', ...timed((i) => inflowAt(flow, layer, disc(i % ROUNDS))));
}
