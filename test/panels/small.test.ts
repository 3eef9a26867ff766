import { expect, test } from 'vitest';
import { catalogue } from '../../src/catalogue/catalogue.ts';
import type { Day } from '../../src/craft/schema.ts';
import { dayAs } from '../../src/panels/dayAs.ts';
import { foundParts } from '../../src/panels/foundParts.ts';
import { fileName } from '../../src/panels/ledger/download.ts';
import { shallowEqual } from '../../src/panels/shallow.ts';

test('a day given another way keeps what both ways have', () => {
  const measured: Day = { kind: 'measured', temperature: 290, pressure: 98_000, humidity: 0.3 };
  const qnh = dayAs('qnh', measured, 98_000);
  expect(qnh).toMatchObject({ kind: 'qnh', temperature: 290, humidity: 0.3 });
  expect(dayAs('measured', qnh, 97_500)).toEqual({ ...measured, pressure: 97_500 });
  expect(dayAs('qnh', { kind: 'standard', elevation: 400 }, null)).toMatchObject({ elevation: 400 });
  expect(dayAs('measured', measured, 1)).toBe(measured);
});

test('a search finds entries that hold every word, in any order and case', () => {
  const all = foundParts(catalogue.parts, '', null);
  expect(all).toHaveLength(catalogue.parts.length);
  const found = foundParts(catalogue.parts, 'PROPELLER brushless', null);
  expect(found.length).toBeGreaterThan(0);
  expect(found.length).toBeLessThan(all.length);
  for (const { name, note } of found) expect(`${name} ${note}`.toLowerCase()).toMatch(/propeller/);
  expect(foundParts(catalogue.parts, '', 'battery').every(({ kind }) => kind === 'battery')).toBe(true);
});

test('where no entry holds every word, those that hold any stand there, best first', () => {
  const kinds = foundParts(catalogue.parts, 'tail thruster', null).map(({ kind }) => kind);
  expect(kinds.slice(0, 3)).toEqual(['thruster', 'thruster', 'thruster']);
  expect(foundParts(catalogue.parts, 'fin', null)[0]!.kind).toBe('fin');
  expect(foundParts(catalogue.parts, 'xyzzy', null)).toEqual([]);
  const noted = foundParts(catalogue.parts, 'battery swollen xyzzy', null);
  expect(noted[0]!.kind).toBe('battery');
  const both = noted.filter(({ note }) => note.includes('swollen')).length;
  expect(noted.slice(0, both).every(({ note }) => note.includes('swollen'))).toBe(true);
});

test.each([
  ['Atrium camera craft', 'json', 'atrium-camera-craft.json'],
  ['Atrium / camera: 2', 'csv', 'atrium-camera-2.csv'],
  ['  Ölwanne / 3.2 m ', 'json', 'olwanne-3-2-m.json'],
  ['', 'csv', 'craft.csv'],
  ['../..', 'json', 'craft.json'],
  ['気球', 'json', '気球.json'],
])('a craft called %j is written to a file %s called %s', (name, extension, file) => {
  expect(fileName(name, extension)).toBe(file);
});

test('a search finds what stands in the note or in the word for the kind', () => {
  const names = (search: string) => foundParts(catalogue.parts, search, null).map(({ kind }) => kind);
  expect(new Set(names('useful load'))).toEqual(new Set(['load']));
  expect(names('lithium swollen')).toContain('battery');
  expect(names('light')).toContain('load');
  expect(names('lamp')).toContain('load');
  expect(names('xyzzy quux')).toEqual([]);
});

test('rows are alike when every value is', () => {
  expect(shallowEqual({ a: 1, b: 'x' }, { b: 'x', a: 1 })).toBe(true);
  expect(shallowEqual({ a: 1 }, { a: 2 })).toBe(false);
  expect(shallowEqual<{ a: number; b?: number }>({ a: 1 }, { a: 1, b: 1 })).toBe(false);
});
