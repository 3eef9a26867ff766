import { expect, test } from 'vitest';
import { assess } from '../../src/report/assess.ts';
import { workingOf } from '../../src/report/workings.ts';
import { workedExample } from './workedExample.ts';

const { rows } = assess({ ...workedExample(), support: { kind: 'keel', station: 1.4, drop: 0.1 } });

test.each(Object.keys(rows))('%s opens into formula, figures and source', (key) => {
  const working = workingOf(key, rows)!;
  expect(working.formula.length).toBeGreaterThan(5);
  expect(working.source.length).toBeGreaterThan(3);
  for (const input of working.inputs) expect(Object.values(rows)).toContain(input);
});

test('a key that is no figure has none', () => {
  expect(workingOf('toString', rows)).toBeNull();
});
