/** 10,000 damaged craft files: the gate answers each with a craft or with problems, and the physics each craft with figures. */
import { expect, test } from 'vitest';
import { parse } from '../../src/craft/parse.ts';
import { serialize } from '../../src/craft/serialize.ts';
import { assess } from '../../src/report/assess.ts';
import { notFinite } from '../samples/finite.ts';
import { samples } from '../samples/readSamples.ts';
import { damaged, seeded, stretched } from './mutator.ts';

const RUNS = 10_000;

interface Tally {
  loaded: number;
  refused: number;
  hulls: number;
}

function judge(text: string, tally: Tally): string[] {
  const parsed = parse(text);
  if (!parsed.ok) {
    tally.refused++;
    return parsed.problems.length > 0 && parsed.problems.every(({ found, allowed }) => found && allowed)
      ? []
      : ['refused without saying why'];
  }
  tally.loaded++;
  const report = assess(parsed.craft);
  if (report.geometry.status === 'solved') tally.hulls++;
  const again = parse(serialize(parsed.craft));
  return [...notFinite(report), ...(again.ok ? [] : ['saved, it would not load again'])];
}

test(`${RUNS} damaged files: no throw, no partial load, no NaN`, { timeout: 120_000 }, () => {
  const random = seeded(1);
  const tally: Tally = { loaded: 0, refused: 0, hulls: 0 };
  const faults: string[] = [];
  for (let run = 0; run < RUNS; run++) {
    const text = damaged(random, samples[run % samples.length]!.text);
    try {
      faults.push(...judge(text, tally).map((fault) => `run ${run}: ${fault}`));
    } catch (error) {
      faults.push(`run ${run} threw: ${(error as Error).stack}`);
    }
  }
  expect(faults.slice(0, 20)).toEqual([]);
  // The damage reaches both ways: enough files load for the physics to be tried, enough are refused.
  expect(tally.loaded).toBeGreaterThan(RUNS / 5);
  expect(tally.refused).toBeGreaterThan(RUNS / 3);
  expect(tally.hulls).toBeGreaterThan(RUNS / 5);
});

test('1,500 files with numbers at the extremes the gate allows: figures or reasons, no NaN', {
  timeout: 120_000,
}, () => {
  const random = seeded(2);
  const tally: Tally = { loaded: 0, refused: 0, hulls: 0 };
  const faults: string[] = [];
  for (let run = 0; run < 1500; run++) {
    const { name, text } = samples[run % samples.length]!;
    const file = stretched(random, text, (each) => parse(each).ok);
    faults.push(...judge(file, tally).map((fault) => `run ${run}, ${name}: ${fault}`));
  }
  expect(faults.slice(0, 20)).toEqual([]);
  expect(tally.refused).toBe(0);
  expect(tally.hulls).toBeGreaterThan(900);
});
