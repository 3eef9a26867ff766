/** How long a placement study takes, on samples: its ballast cut to measure, with a slide, and in pieces with places to choose. */
import { readFileSync } from 'node:fs';
import type { Craft } from '../../src/craft/craft.ts';
import { parse } from '../../src/craft/parse.ts';
import { loadHighs } from '../../src/numeric/linearProgram/highsSolver.ts';
import type { LinearSolver } from '../../src/numeric/linearProgram/result.ts';
import { placementStudy, thrusterParts } from '../../src/physics/placing/study.ts';

type Print = (label: string, ...figures: string[]) => void;

/** From the folder of the project, in which npm runs this. */
export function sample(name: string): Craft {
  const parsed = parse(readFileSync(`samples/${name}.json`, 'utf8'));
  if (!parsed.ok) throw new Error(`${name} is no craft file`);
  return parsed.craft;
}

const ROUNDS = 5;

function timesOf(craft: Craft, solver: LinearSolver): number[] {
  const { id } = thrusterParts(craft)[0]!;
  return Array.from({ length: ROUNDS }, () => {
    // Read anew, so that nothing is remembered of it, the hull's flow neither.
    const fresh = structuredClone(craft);
    const start = performance.now();
    placementStudy(fresh, id, solver);
    return performance.now() - start;
  }).sort((a, b) => a - b);
}

const seconds = (value: number): string => `${(value / 1000).toFixed(2)} s`;

export async function benchPlacing(print: Print): Promise<void> {
  const solver = await loadHighs();
  const crafts = [
    ['glasshouse-sampler', 'lead cut to measure', 'reach 2 s'],
    ['library-scanner', 'the same and a slide', 'reach 2 s'],
    ['museum-atrium', 'pieces and places', ''],
  ] as const;
  for (const [name, what, reach] of crafts) {
    const times = timesOf(sample(name), solver);
    const figures = [`median ${seconds(times[ROUNDS >> 1]!)}`, `worst ${seconds(times.at(-1)!)}`, reach];
    print(`study of 61 stations, ${what}`, ...figures);
  }
}
