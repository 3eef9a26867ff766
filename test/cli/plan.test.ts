import { expect, test } from 'vitest';
import { carry } from '../../src/cli/carry.ts';
import { plan } from '../../src/cli/plan.ts';
import { loadHighs } from '../../src/numeric/linearProgram/highsSolver.ts';
import { assess } from '../../src/report/assess.ts';
import { craftFrom, sampleCraft, samples } from '../samples/readSamples.ts';

const solver = await loadHighs();
const asked = { robust: false, json: false, units: 'metric', timeLimit: 20 } as const;

/** What of a text is no plain line for a terminal of 80 columns. */
const untidy = (text: string): string[] =>
  text.split('\n').filter((line) => [...line].length > 80 || /\s$/.test(line));

test('the plan for reading: what to do, today and planned side by side, the proof', () => {
  const { text, exitCode, file } = plan(sampleCraft('library-scanner'), solver, asked);
  expect(exitCode).toBe(0);
  expect(text).toContain('What to do\n  - Slide Battery to 1.020 m.\n');
  expect(text).toMatch(/\n +today +planned\n/);
  expect(text).toContain('Proven: gap 0.');
  expect(text).toContain('What stands in the way of less\n  - It may heel no more than 1.5°');
  expect(text).toContain('Lead is poisonous');
  expect(untidy(text)).toEqual([]);
  expect(assess(craftFrom(file!)).met).toBe(true);
});

test('without a plan: exit code 1, no file, and what would help', () => {
  const { text, exitCode, file } = plan(sampleCraft('cave-mapper'), solver, asked);
  expect({ exitCode, file }).toEqual({ exitCode: 1, file: null });
  expect(text).toMatch(/What would help\n {2}- Let Battery slide to 1\.\d+ m instead of 1\.050 m; then/);
  expect(untidy(text)).toEqual([]);
});

test('as JSON, in SI whatever the units', () => {
  const json = (units: 'metric' | 'imperial') =>
    JSON.parse(plan(sampleCraft('library-scanner'), solver, { ...asked, units, json: true }).text).plan;
  const [metric, imperial] = [json('metric'), json('imperial')];
  expect(imperial.deadBallast).toBe(metric.deadBallast);
  expect(metric.headline).toMatch(/ g of lead/);
  expect(imperial.headline).toMatch(/ oz of lead/);
});

test.each(samples)('$name: a plan or why there is none, plain or robust, in lines that fit', ({ text }) => {
  for (const robust of [false, true]) {
    const answer = plan(craftFrom(text), solver, { ...asked, robust, timeLimit: 5 });
    expect([0, 1]).toContain(answer.exitCode);
    expect(untidy(answer.text)).toEqual([]);
    expect(answer.file === null).toBe(answer.exitCode === 1);
  }
});

const line = { json: false, units: 'metric', line: 'keel' } as const;

test('what can be carried where, for reading and as JSON', () => {
  const craft = sampleCraft('museum-atrium');
  const reading = carry(craft, solver, line);
  expect(reading.exitCode).toBe(0);
  expect(untidy(reading.text)).toEqual([]);
  expect(reading.text).toContain('Sound recorder');
  const { carry: json } = JSON.parse(carry(craft, solver, { ...line, json: true }).text);
  expect(json.points).toHaveLength(101);
  expect(json).toMatchObject({ line: 'keel', complete: true, loadsComplete: true });
  expect(json.loads.map(({ load }: { load: string }) => load)).toEqual(craft.loads.order);
});

test('a line that is not there is bad use, with the lines that are', () => {
  expect(carry(sampleCraft('museum-atrium'), solver, { ...line, line: 'mast' })).toEqual({
    text: '--line: found "mast"; allowed: keel, axis, nose, chin\n',
    exitCode: 2,
  });
});
