import { expect, test } from 'vitest';
import { parse } from '../../src/craft/parse.ts';
import { serialize } from '../../src/craft/serialize.ts';
import { planningCraft } from '../edit/planningFixture.ts';
import { craftFrom, sampleJson } from '../samples/readSamples.ts';

/** The problems of the planning craft's file after a change. */
// biome-ignore lint/suspicious/noExplicitAny: the change makes the file wrong on purpose
function problemsAfter(change: (file: any) => void) {
  const file = JSON.parse(serialize(planningCraft()));
  change(file);
  const parsed = parse(JSON.stringify(file));
  return parsed.ok ? [] : parsed.problems;
}

test('a craft with slides, pieces, loads and wishes is saved and read as it was', () => {
  expect(craftFrom(serialize(planningCraft()))).toEqual(planningCraft());
});

test('a slide whose ends are the wrong way round is named, on a part and on a load', () => {
  const problems = problemsAfter((file) => {
    file.parts[1].slide = { from: 2, to: 1 };
    file.loads[0].options[1].from = 3;
  });
  expect(problems).toMatchObject([
    { path: 'parts[1].slide.from', found: '2 m', allowed: 'at most parts[1].slide.to (1 m)' },
    {
      path: 'loads[0].options[1].from',
      found: '3 m',
      allowed: 'at most loads[0].options[1].to (2 m)',
    },
  ]);
});

test('a load that may hang at a hardpoint which does not exist', () => {
  const [problem] = problemsAfter((file) => {
    file.loads[1].options[0].hardpoint = 'mast';
  });
  expect(problem).toMatchObject({
    name: 'horn',
    path: 'loads[1].options[0].hardpoint',
    found: '"mast"',
    allowed: 'the id of a hardpoint in this file (nose, chin)',
  });
});

test('what may stand once only: piece masses, wishes, hardpoints of one load, ids of loads', () => {
  const problems = problemsAfter((file) => {
    file.pieces[1].mass = file.pieces[0].mass;
    file.wishes = ['leastWire', 'leastWire'];
    file.loads[0].options.push({ kind: 'hardpoint', hardpoint: 'chin' });
    file.loads[1].id = 'logger';
  });
  expect(problems.map(({ path }) => path)).toEqual([
    'loads[1].id',
    'pieces[1].mass',
    'loads[0].options[2].hardpoint',
    'wishes[1]',
  ]);
});

test('a load with the id of a part that is no load', () => {
  const problems = problemsAfter((file) => {
    file.loads[0].id = 'battery';
  });
  expect(problems).toMatchObject([
    { path: 'loads[0].id', found: '"battery"', allowed: expect.stringContaining('this one is a battery') },
  ]);
});

test('values out of range are named by their field', () => {
  const problems = problemsAfter((file) => {
    file.hardpoints[0].limit = -1;
    file.hardpoints[1].fill = 'sand';
    file.pieces[0].mass = 0;
    file.pieces[1].count = 1.5;
    file.loads[0].rank = 0;
    file.wishes[0] = 'speed';
  });
  expect(problems.map(({ path }) => path).sort()).toEqual([
    'hardpoints[0].limit',
    'hardpoints[1].fill',
    'loads[0].rank',
    'pieces[0].mass',
    'pieces[1].count',
    'wishes[0]',
  ]);
});

test('a file of version 1 steps up: no slides, no loads, hardpoints as good as without a limit', () => {
  const file = sampleJson('museum-atrium');
  file.steelyard = 1;
  for (const part of file.parts) delete part.slide;
  for (const hardpoint of file.hardpoints) {
    delete hardpoint.limit;
    delete hardpoint.fill;
  }
  for (const key of ['pieces', 'loads', 'wishes']) delete file[key];
  const craft = craftFrom(JSON.stringify(file));
  expect(craft.hardpoints.byId.nose).toMatchObject({ limit: 10, fill: 'continuous' });
  expect(craft.wishes).toEqual(['usefulLoad', 'fewestMoved', 'leastWire']);
  expect(craft.loads.order).toEqual([]);
  expect(craft.parts.byId.battery!.slide).toBeNull();
});

test.each([
  '{"steelyard":1}',
  '{"steelyard":1,"parts":[null,7,[]],"hardpoints":{}}',
  '{"steelyard":1,"parts":"x"}',
])('rubbish of version 1, %s, is refused without a throw', (text) => {
  expect(parse(text).ok).toBe(false);
});
