// npm run bench: how long the work takes on this machine. Prints figures; judges nothing.
import { loadavg } from 'node:os';
import type { Craft } from '../../src/craft/craft.ts';
import type { HullShape } from '../../src/craft/hullSchema.ts';
import { placePart } from '../../src/edit/edits/parts.ts';
import { run } from '../../src/edit/history.ts';
import { hullOf } from '../../src/physics/hull/hullOf.ts';
import { assess } from '../../src/report/assess.ts';
import { craftOf } from './craftOf.ts';
import { benchFlow } from './flow.ts';
import { benchPage } from './page.ts';
import { benchPlacing } from './placing.ts';
import { benchPlan } from './plan.ts';
import { benchShapes } from './shapes.ts';
import { benchTurn } from './turn.ts';

const quantile = (sorted: readonly number[], share: number): string =>
  `${sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))]!.toFixed(3)} ms`;

/** Times `work(i)` over many rounds after as many to warm up. */
function time(label: string, rounds: number, work: (i: number) => unknown, reach: string): void {
  for (let i = 0; i < rounds; i++) work(i);
  const times = Array.from({ length: rounds }, (_, i) => {
    const start = performance.now();
    work(i);
    return performance.now() - start;
  }).sort((a, b) => a - b);
  print(label, `median ${quantile(times, 0.5)}`, `p95 ${quantile(times, 0.95)}`, reach);
}

const print = (label: string, ...figures: string[]): void =>
  console.log(`${label.padEnd(46)} ${figures.map((each) => each.padEnd(18)).join(' ')}`);

/** A craft for each frame of a drag: one part in another place, everything else the same objects. */
const dragFrames = (craft: Craft, frames: number): Craft[] =>
  Array.from({ length: frames }, (_, i) => {
    const id = craft.parts.order[i % craft.parts.order.length]!;
    return run(craft, placePart(id, { kind: 'keel', station: 1 + 0.001 * i, drop: 0.03 })).craft;
  });

/** The same craft read anew, so that nothing is remembered of it but the hull. */
const readAnew = (craft: Craft): Craft => {
  const copy = structuredClone(craft);
  copy.hull.shape = craft.hull.shape;
  return copy;
};

const lengthened = ({ hull, ...craft }: Craft, by: number): Craft => ({
  ...craft,
  hull: { ...hull, shape: { kind: 'spheroid', length: 4 + by, diameter: 1.3 } },
});

function benchRecompute(parts: number, reach: string): void {
  const craft = craftOf(parts);
  const rounds = 300;
  const frames = dragFrames(craft, 2 * rounds);
  let frame = 0;
  time(`recompute, ${parts} parts, one part moved`, rounds, () => assess(frames[frame++]!), `reach ${reach}`);
  const anew = Array.from({ length: 2 * rounds }, () => readAnew(craft));
  frame = 0;
  time(`recompute, ${parts} parts, all parts new`, rounds, () => assess(anew[frame++]!), `reach ${reach}`);
  time(
    `recompute, ${parts} parts, hull changing`,
    rounds,
    (i) => assess(lengthened(craft, i / 1000)),
    'reach 5 ms',
  );
}

const benchHull = (name: string, shape: HullShape): void =>
  time(`hull integrated, ${name}`, 100, () => hullOf({ ...shape }), 'reach 5 ms');

console.log(
  `Node ${process.version}, load ${loadavg()
    .map((each) => each.toFixed(2))
    .join(' ')}`,
);
benchRecompute(40, '0.3 ms');
benchRecompute(500, '3 ms');
for (const [name, shape] of Object.entries(benchShapes)) benchHull(name, shape);
benchFlow(print);
benchTurn(print);
await benchPlan(print);
await benchPlacing(print);
await benchPage(print);
