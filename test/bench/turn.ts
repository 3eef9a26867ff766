/** How long turns take: one slope, one turn simulated, all answers, the few of a study. Prints figures; judges nothing. */
import type { Craft } from '../../src/craft/craft.ts';
import { craftStateOf } from '../../src/physics/craftState.ts';
import { commandsOf, cruiseSpeedOf, straightAt } from '../../src/physics/turning/asked.ts';
import { motionOf } from '../../src/physics/turning/motion.ts';
import { quarterTurn } from '../../src/physics/turning/quarterTurn.ts';
import { steadyTurn } from '../../src/physics/turning/steady.ts';
import { steadyCurve, turnOf } from '../../src/physics/turning/turn.ts';
import { turnFigures as fewFigures } from '../../src/physics/turning/turnFigures.ts';
import { turningCraftOf } from '../../src/physics/turning/turningCraft.ts';
import { turnFigures, turnReport } from '../../src/report/turning/turnReport.ts';
import { battery, craftWith, fins, sidePair, tailThruster } from '../physics/turning/turningCrafts.ts';
import { sample } from './placing.ts';

type Print = (label: string, ...figures: string[]) => void;

const ASKED = { throttle: 1, vector: null, speed: null };
const ROUNDS = 200;

const CRAFTS = {
  'tail thruster': [battery, tailThruster(), fins()],
  'side pair': [battery, sidePair(), fins()],
};

export function benchTurn(print: Print): void {
  for (const [name, parts] of Object.entries(CRAFTS)) benchCraft(name, parts, print);
  benchReport('museum-atrium', print);
}

/** Read anew each time: nothing is remembered of it but the hull, and then not even that. */
function benchReport(name: string, print: Print): void {
  const craft = sample(name);
  const anew = () => structuredClone(craft);
  const sameHull = () => ({ ...anew(), hull: craft.hull });
  const figures = (of: Craft) => turnFigures(of, ASKED, 'metric');
  const report = (of: Craft) => turnReport(of, ASKED, 'metric');
  print(`figures of a turn while dragging, ${name}`, ...spread(figures, sameHull), '');
  print(`report of a turn, ${name}`, ...spread(report, sameHull, 50), 'reach 25 ms');
  print(`report of a turn, hull new, ${name}`, ...spread(report, anew, 50), 'reach 25 ms');
}

function benchCraft(name: string, parts: Parameters<typeof craftWith>[0], print: Print): void {
  const file = craftWith(parts);
  const state = craftStateOf({ ...file, targets: { ...file.targets, turnTime: 2.5, sideGust: 0.5 } });
  if (state.status !== 'solved') throw new Error(state.why);
  const reduced = turningCraftOf(state.value);
  if (reduced.status !== 'solved') throw new Error(reduced.why);
  const craft = reduced.value;
  const { straight, turn } = commandsOf(craft, ASKED);
  const cruise = cruiseSpeedOf(craft, ASKED);
  const timed = (label: string, reach: string, work: () => unknown) =>
    print(`${label}, ${name}`, ...spread(work, () => undefined), reach);

  benchSlope(`slope of a motion, ${name}`, motionOf(craft, turn, straight.angles), print);
  timed('90° from rest', 'reach 5 ms', () => quarterTurn(craft, straightAt(0, straight), turn));
  timed('90° from cruise', 'reach 5 ms', () => quarterTurn(craft, straightAt(cruise, straight), turn));
  timed('steady turn, followed and by Newton', 'reach 5 ms', () => steadyTurn(craft, straight, turn, cruise));
  timed('everything about a turn, two targets', '', () => turnOf(state.value, ASKED));
  timed('steady turn over vectoring', '', () => steadyCurve(state.value, ASKED));
  timed('the few figures of a study', '', () => fewFigures(state.value, ASKED));
}

function benchSlope(label: string, { slope }: ReturnType<typeof motionOf>, print: Print): void {
  const state = Float64Array.of(1, -0.3, 0.5, 0, 0, 0.2);
  const into = new Float64Array(6);
  const many = 20_000;
  const run = () => {
    for (let i = 0; i < many; i += 1) slope(0.1, state, into);
  };
  run();
  const start = performance.now();
  run();
  print(label, `${(((performance.now() - start) * 1000) / many).toFixed(2)} µs`, '', 'reach a few µs');
}

function spread<T>(work: (of: T) => unknown, make: () => T, rounds = ROUNDS): string[] {
  for (let i = 0; i < rounds; i += 1) work(make());
  const times = Array.from({ length: rounds }, () => {
    const of = make();
    const start = performance.now();
    work(of);
    return performance.now() - start;
  }).sort((a, b) => a - b);
  const at = (share: number) => `${times[Math.floor(share * rounds)]!.toFixed(3)} ms`;
  return [`median ${at(0.5)}`, `p95 ${at(0.95)}`];
}
