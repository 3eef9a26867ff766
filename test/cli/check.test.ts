import { expect, test } from 'vitest';
import { sampleJson, samples } from '../samples/readSamples.ts';
import { heard } from './terminal.ts';

const files = Object.fromEntries(samples.map(({ name, text }) => [name, text]));

test('every sample is in order, whether it meets its targets or not', () => {
  const { code, out, errors } = heard(['check', ...Object.keys(files)], files);
  expect({ code, errors }).toEqual({ code: 0, errors: [] });
  expect(out.split('\n')).toHaveLength(samples.length + 1);
  expect(out).toContain('worked-example: a craft file in order: Worked example\n');
});

test('one bad file among good ones is exit 2, and the good ones are told all the same', () => {
  const { code, out, errors } = heard(['check', 'micro-round', 'bad', 'worked-example'], {
    ...files,
    bad: '{"steelyard": 1}',
  });
  expect(code).toBe(2);
  expect(out.split('\n').map((line) => line.split(':')[0])).toEqual(['micro-round', 'worked-example', '']);
  expect(errors.length).toBeGreaterThan(5);
  for (const line of errors) expect(line).toMatch(/^bad: \w+: found nothing; allowed: /);
});

test('a hull that cannot be formed is not in order', () => {
  const file = sampleJson('survey-6m');
  file.hull.shape.prismatic = 0.3;
  const { code, errors } = heard(['check', 'bad'], { bad: JSON.stringify(file) });
  expect(code).toBe(2);
  expect(errors[0]).toMatch(/^bad: hull\.shape: With a prismatic coefficient of 0\.300/);
});

test('a file that is not there, and a folder, are named', () => {
  const { code, errors } = heard(['check', 'no/such/file.json', 'samples']);
  expect(code).toBe(2);
  expect(errors).toEqual([
    'no/such/file.json: cannot be read: there is no such file',
    'samples: cannot be read: it is a folder',
  ]);
});

test('an empty craft is in order', () => {
  const file = {
    ...sampleJson('worked-example'),
    parts: [],
    film: { name: '', arealDensity: 0, arealDensityTolerance: 0 },
  };
  expect(heard(['check', 'empty'], { empty: JSON.stringify(file) }).code).toBe(0);
});
