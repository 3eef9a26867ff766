import { expect, test } from 'vitest';
import { aboutBar, aboutGrip } from '../../src/scene/about.ts';
import { beamOf } from '../../src/scene/beam.ts';
import { frontReadout, sideReadout } from '../../src/scene/readout.ts';
import { rowValue } from '../../src/scene/subject.ts';
import {
  beamInWords,
  frontInWords,
  heelWords,
  leadBarWords,
  leadWords,
  momentWords,
  pitchWords,
  selectionInWords,
  sideInWords,
} from '../../src/scene/words.ts';
import { craft, geometry, subject } from './fixture.ts';

const DEGREE = Math.PI / 180;
const of = subject();

test('attitudes have a side, and none when it rounds to nothing', () => {
  expect(pitchWords(6.2 * DEGREE, 'metric')).toBe('6.2° nose-up');
  expect(pitchWords(-6.2 * DEGREE, 'metric')).toBe('6.2° nose-down');
  expect(pitchWords(0.04 * DEGREE, 'metric')).toBe('level');
  expect(pitchWords(null, 'metric')).toContain('no attitude');
  expect(heelWords(-2 * DEGREE, 'imperial')).toBe('2.0° port down');
});

test('a moment is mass times arm, with its side', () => {
  expect(momentWords(0.172, -0.3, 'metric')).toBe('172.0 g × 0.300 m = 51.60 g·m forward');
});

test('during a drag: where the part is, its moment, and how the craft floats now', () => {
  const { title, lines } = sideReadout(of, { kind: 'part', id: 'battery', copy: 0 })!;
  expect(title).toBe('battery');
  expect(lines).toHaveLength(4);
  expect(lines[0]).toContain('station 1.200 m');
  expect(lines[1]).toBe('40 mm below the keel');
  expect(lines[3]).toBe(`floats ${pitchWords(rowValue(of.assessment, 'float.pitch'), 'metric')}`);
});

test('hull, wire run and hardpoint have readouts too; what is gone has none', () => {
  const read = (held: Parameters<typeof sideReadout>[1]) => sideReadout(of, held);
  expect(read({ kind: 'hull', end: 'tail' })!.lines[0]).toBe('3.000 m long · 1.000 m across');
  expect(read({ kind: 'wireEnd', id: 'power', side: 'to' })!.lines[0]).toMatch(/ m long, [\d.]+ g$/);
  expect(read({ kind: 'hardpoint', id: 'nose' })!.lines[0]).toContain('station 0.060 m');
  expect(read({ kind: 'part', id: 'gone', copy: 0 })).toBeNull();
});

test('in the front view: what can be seen there', () => {
  expect(frontReadout(of, { kind: 'part', id: 'fins', copy: 0 })!.lines[0]).toBe('clock angle 0.0°');
  expect(frontReadout(of, { kind: 'part', id: 'camera', copy: 0 })!.lines.slice(0, 2)).toEqual([
    '100 mm to starboard',
    '600 mm below the axis',
  ]);
});

test('the drawing in words for those who do not see it', () => {
  expect(sideInWords(of)).toContain('Hull 3.000 m long and 1.000 m high, 6 parts, 1 wire runs.');
  expect(frontInWords(of)).toContain('2 of 6 parts sit on the skin');
  expect(selectionInWords(of, ['battery'])).toMatch(/^battery at station 1\.200 m; floats /);
  expect(selectionInWords(of, [])).toBe('');
  const { beam, lead } = geometry();
  expect(beamInWords(beamOf(beam, lead), of)).toContain('forward of the CB');
});

test('lead is named where there is some', () => {
  const { lead } = geometry();
  expect(leadWords(of)).toBe(leadBarWords(lead!, 'metric')[1]);
  expect(leadWords(subject(craft([], [])))).toBeNull();
});

test('under the pointer: name, mass, arm and moment; a hardpoint says where it is and what would hang there', () => {
  const arm = geometry().beam.find(({ id }) => id === 'battery')!.station - geometry().cb[0];
  const { title, lines } = aboutGrip(of, { kind: 'part', id: 'battery', copy: 0 })!;
  expect(title).toBe('battery');
  expect(lines).toEqual([
    'mass 172.0 g',
    `arm ${Math.abs(arm).toFixed(3)} m forward of CB`,
    `moment ${(172 * Math.abs(arm)).toFixed(2)} g·m nose-down`,
  ]);
  expect(aboutGrip(of, { kind: 'wire', id: 'power' })!.lines).toHaveLength(3);
  expect(aboutGrip(of, { kind: 'hardpoint', id: 'nose' })!.lines).toEqual([
    'hardpoint at station 0.060 m',
    leadWords(of),
  ]);
  expect(aboutGrip(of, { kind: 'hull', end: 'tail' })).toBeNull();
  for (const bar of geometry().beam) expect(aboutBar(of, bar).lines).toHaveLength(3);
});
