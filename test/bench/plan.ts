/** How long plans take: a frame of a drag, pieces and places, the carry curve. Prints figures; judges nothing. */
import { Worker } from 'node:worker_threads';
import { build } from 'esbuild';
import { blankCraft } from '../../src/craft/blank.ts';
import { type Craft, keyed } from '../../src/craft/craft.ts';
import type { HullShape } from '../../src/craft/hullSchema.ts';
import type { Place } from '../../src/craft/placeSchema.ts';
import type { Load } from '../../src/craft/planningSchema.ts';
import type { Hardpoint, Part } from '../../src/craft/schema.ts';
import { loadHighs } from '../../src/numeric/linearProgram/highsSolver.ts';
import type { LinearSolver } from '../../src/numeric/linearProgram/result.ts';
import { carryCurve } from '../../src/physics/ballast/carry.ts';
import { LivePlanner } from '../../src/physics/ballast/live.ts';
import { planOf } from '../../src/physics/ballast/plan.ts';
import { seeded } from '../craft/mutator.ts';
import { partOf, wireOf } from '../edit/craftFixture.ts';

type Print = (label: string, ...figures: string[]) => void;

const SHAPE: HullShape = { kind: 'spheroid', length: 3, diameter: 1 };
const keel = (station: number): Place => ({ kind: 'keel', station, drop: 0.03 });
const axis = (station: number): Place => ({ kind: 'axis', station });

const hardpoint = (id: string, place: Place, fill: Hardpoint['fill']): Hardpoint => ({
  id,
  name: id,
  place,
  limit: 0.15,
  fill,
});

/** Ten hardpoints and five slides with wires: 20 columns with their distances. */
function continuousCraft(thruster: number): Craft {
  const blank = blankCraft('Bench', SHAPE, 3);
  const sliding = [0.8, 1, 1.2, 1.4, 1.6].map((station, i) =>
    partOf(`part-${i}`, {
      mass: 0.12,
      place: keel(station),
      slide: { from: station - 0.2, to: station + 0.2 },
    }),
  );
  const fixed = Array.from({ length: 30 }, (_, i) =>
    partOf(`fixed-${i}`, { mass: 0.01, place: keel(0.1 * i) }),
  );
  return {
    ...blank,
    film: { ...blank.film, arealDensity: 0.045 },
    parts: keyed([
      partOf('thruster', { mass: 0.14, place: axis(thruster) }),
      partOf('battery', { mass: 0.1, place: keel(1.3) }),
      ...sliding,
      ...fixed,
    ]),
    wires: keyed([wireOf('power')]),
    hardpoints: keyed(
      Array.from({ length: 10 }, (_, i) => hardpoint(`spot-${i}`, keel(0.1 + 0.29 * i), 'continuous')),
    ),
    leadAt: 'spot-0',
    targets: { ...blank.targets, heaviness: { least: -0.2, most: 0.1 } },
  };
}

/** Twenty loads with three places each: 60 binaries, and pieces of lead at three hardpoints. */
function choosyCraft(seed: number): Craft {
  const random = seeded(seed);
  const between = (from: number, to: number) => from + (to - from) * random();
  const blank = blankCraft('Bench', SHAPE, 3);
  const spots = [
    hardpoint('nose', axis(0.05), 'pieces'),
    hardpoint('chin', keel(0.6), 'pieces'),
    hardpoint('tail', axis(2.95), 'pieces'),
  ];
  const loads = Array.from(
    { length: 20 },
    (_, i): Load => ({
      id: `load-${i}`,
      name: `Load ${i}`,
      mass: between(0.002, 0.012),
      massTolerance: 0,
      must: random() < 0.2,
      rank: 1 + Math.floor(random() * 3),
      options: spots.map(({ id }) => ({ kind: 'hardpoint', hardpoint: id })),
    }),
  );
  const parts: Part[] = [
    partOf('thruster', { mass: between(0.1, 0.2), place: axis(2.9) }),
    partOf('battery', { mass: between(0.1, 0.3), place: keel(between(0.6, 2)) }),
    partOf('deck', { mass: between(0.55, 0.65), place: keel(1.5) }),
  ];
  return {
    ...blank,
    film: { ...blank.film, arealDensity: 0.045 },
    parts: keyed(parts),
    hardpoints: keyed(spots.map((spot) => ({ ...spot, limit: 0.3 }))),
    pieces: [
      { mass: 0.01, count: 10 },
      { mass: 0.005, count: 10 },
      { mass: 0.001, count: 10 },
    ],
    loads: keyed(loads),
    leadAt: 'nose',
    targets: { ...blank.targets, heaviness: { least: -0.03, most: 0.01 }, leastPendulumDepth: 0.05 },
  };
}

const milliseconds = (value: number): string => `${value.toFixed(value < 10 ? 2 : 0)} ms`;
const at = (sorted: readonly number[], share: number): number =>
  sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))]!;
const spread = (times: number[]): string[] => {
  const sorted = times.sort((a, b) => a - b);
  return [
    `median ${milliseconds(at(sorted, 0.5))}`,
    `p95 ${milliseconds(at(sorted, 0.95))}`,
    `worst ${milliseconds(sorted.at(-1)!)}`,
  ];
};

const timed = (work: () => unknown): number => {
  const start = performance.now();
  work();
  return performance.now() - start;
};

const FRAMES = 300;
const frames = (): Craft[] => Array.from({ length: FRAMES }, (_, i) => continuousCraft(2 + 0.003 * i));

function benchLive(solver: LinearSolver, print: Print): void {
  const live = new LivePlanner(solver);
  const [warm, ...rest] = frames();
  live.plan(warm!);
  // A page edits one part of one craft; here too everything else stays the same objects.
  const times = rest.map(({ parts }) => {
    const { thruster } = parts.byId;
    const frame = { ...warm!, parts: { ...warm!.parts, byId: { ...warm!.parts.byId, thruster: thruster! } } };
    return timed(() => live.plan(frame));
  });
  live.dispose();
  print('plan of a drag frame, 20 columns, in process', ...spread(times), 'reach 2 ms');
}

/** Threads of Node read JavaScript only. */
async function threadCode(): Promise<string> {
  const { outputFiles } = await build({
    // From the folder of the project, in which npm runs this: the bench itself is bundled elsewhere.
    entryPoints: ['test/bench/planThread.ts'],
    bundle: true,
    write: false,
    platform: 'node',
    format: 'cjs',
    external: ['highs'],
  });
  return outputFiles[0]!.text;
}

/** From posting a craft to hearing its plan, through a thread of its own. */
async function benchRoundTrip(print: Print): Promise<void> {
  const worker = new Worker(await threadCode(), { eval: true });
  const answer = (message: unknown) =>
    new Promise<void>((resolve) => {
      worker.once('message', () => resolve());
      worker.postMessage(message);
    });
  const times: number[] = [];
  for (const [id, craft] of frames().entries()) {
    const start = performance.now();
    await answer({ id, task: 'follow', craft, robust: false });
    if (id > 20) times.push(performance.now() - start);
  }
  await worker.terminate();
  print('the same with the round trip to a thread', ...spread(times), 'reach 2 ms');
}

function benchChoices(solver: LinearSolver, print: Print): void {
  const gaps: number[] = [];
  const found = new Map<string, number>();
  const times = Array.from({ length: 50 }, (_, i) => {
    const craft = choosyCraft(1 + i);
    return timed(() => {
      const plan = planOf(craft, solver, { explain: false, timeLimit: 20 });
      found.set(plan.status, (found.get(plan.status) ?? 0) + 1);
      if (!('why' in plan)) gaps.push(plan.gap);
    });
  });
  const outcomes = [...found].map(([status, count]) => `${count} ${status}`).join(', ');
  print('plan with 60 binaries, 50 random crafts', ...spread(times), `greatest gap ${Math.max(...gaps)}`);
  print('', outcomes);
}

function benchCarry(solver: LinearSolver, print: Print): void {
  const craft = continuousCraft(2.9);
  carryCurve(craft, solver, { kind: 'keel' });
  const times = Array.from({ length: 10 }, () => timed(() => carryCurve(craft, solver, { kind: 'keel' })));
  print('carry curve of 101 stations', ...spread(times), 'reach 300 ms');
}

export async function benchPlan(print: Print): Promise<void> {
  const start = performance.now();
  const solver = await loadHighs();
  print('solver loaded', milliseconds(performance.now() - start));
  benchLive(solver, print);
  await benchRoundTrip(print);
  benchChoices(solver, print);
  benchCarry(solver, print);
}
