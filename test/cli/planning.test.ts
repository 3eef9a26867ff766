import { expect, test } from 'vitest';
import { parse } from '../../src/craft/parse.ts';
import { assess } from '../../src/report/assess.ts';
import { heardLater } from './terminal.ts';

const sample = (name: string) => `samples/${name}.json`;

test('plan writes a craft that meets its targets, in one go from file to file', async () => {
  const files: Record<string, string> = {};
  const { code, out, errors } = await heardLater(
    ['plan', sample('library-scanner'), '--write', 'out.json'],
    files,
  );
  expect({ code, errors }).toEqual({ code: 0, errors: [] });
  expect(out).toContain('What to do');
  const planned = parse(files['out.json']!);
  expect(planned.ok && assess(planned.craft).met).toBe(true);
});

test('without a plan nothing is written: exit 1', async () => {
  const files: Record<string, string> = {};
  const { code, out } = await heardLater(['plan', sample('cave-mapper'), '--write', 'out.json'], files);
  expect(code).toBe(1);
  expect(out).toContain('What would help');
  expect(files).toEqual({});
});

test('--json has the keys that scripts read', async () => {
  const { out } = await heardLater(['plan', sample('library-scanner'), '--json']);
  const { plan } = JSON.parse(out);
  for (const key of ['status', 'deadBallast', 'weights', 'slides', 'loads', 'after', 'binding', 'gap']) {
    expect(plan).toHaveProperty(key);
  }
});

test('carry gives the curve; a line that is none is exit 2 with those there are', async () => {
  const { code, out } = await heardLater(['carry', sample('worked-example'), '--json']);
  expect(code).toBe(0);
  expect(JSON.parse(out).carry.points.length).toBeGreaterThan(50);
  const wrong = await heardLater(['carry', sample('worked-example'), '--line', 'roof']);
  expect(wrong).toMatchObject({ code: 2, out: '' });
  expect(wrong.errors[0]).toMatch(/--line: found "roof"; allowed: keel, axis, /);
});

test('a place that cannot be written is exit 2', async () => {
  const { code, errors } = await heardLater(['plan', sample('library-scanner'), '--write', '/dev/none/x']);
  expect(code).toBe(2);
  expect(errors[0]).toMatch(/cannot be written/);
});

test('a broken file is exit 2 before any solver is loaded', async () => {
  const { code, errors } = await heardLater(['plan', 'bad'], { bad: '{' });
  expect(code).toBe(2);
  expect(errors).toHaveLength(1);
});
