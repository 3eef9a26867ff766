import { expect, test } from 'vitest';
import { parse } from '../../src/craft/parse.ts';
import { VERSION } from '../../src/craft/schema.ts';
import { stepUp } from '../../src/craft/versions.ts';
import { craftFrom, sampleCraft, sampleJson } from '../samples/readSamples.ts';

test('a file of version 0, which had no support point, steps up and has none', () => {
  const file = sampleJson('museum-atrium');
  delete file.support;
  file.steelyard = 0;
  expect(craftFrom(JSON.stringify(file))).toEqual({ ...sampleCraft('museum-atrium'), support: null });
});

test('stepping up leaves the file handed in as it was', () => {
  const file = { steelyard: 0, name: 'x' };
  stepUp(file);
  expect(file).toEqual({ steelyard: 0, name: 'x' });
});

test('rubbish of version 0 steps up without a throw and fails at the gate', () => {
  for (const text of ['{"steelyard":0}', '{"steelyard":0,"parts":7,"support":[]}', '{"steelyard":-0}']) {
    expect(parse(text).ok).toBe(false);
  }
});

test('a newer file says that it is newer', () => {
  const parsed = parse(JSON.stringify({ ...sampleJson('worked-example'), steelyard: VERSION + 1 }));
  expect(parsed).toEqual({
    ok: false,
    problems: [
      {
        path: 'steelyard',
        found: String(VERSION + 1),
        allowed: `a version up to ${VERSION}; this file comes from a newer Steelyard`,
      },
    ],
  });
});

test.each([undefined, null, '1', -1, 0.5, [1], {}, true])('version %j is no version', (version) => {
  const parsed = parse(JSON.stringify({ ...sampleJson('worked-example'), steelyard: version }));
  expect(parsed).toMatchObject({ ok: false, problems: [{ path: 'steelyard' }] });
});

test('a file of version 2 steps up: fins take their outline from their box, nothing is known of thrust', () => {
  const part = { id: 'a', size: { length: 0.2, width: 0.004, height: 0.3 } };
  const stepped = stepUp({
    steelyard: 2,
    parts: [{ ...part, kind: 'fin' }, { ...part, kind: 'thruster' }, { kind: 'fin', size: 'rubbish' }, 7],
    targets: { pitchTolerance: 0.1 },
  });
  expect(stepped).toMatchObject({
    file: {
      steelyard: VERSION,
      parts: [
        { fin: { area: 0.06, aspectRatio: 1.5 }, thruster: null, dragArea: null },
        { fin: null, thruster: null },
        { fin: null },
        7,
      ],
      targets: { turnTime: null, sideGust: null, pitchTolerance: 0.1 },
    },
  });
});

test.each([
  ['yaw', { least: 1, most: 0.5, set: 0.7, slew: 1 }, 'parts[0].thruster.yaw.least'],
  ['pitch', { least: -0.5, most: 0.5, set: 0.7, slew: 1 }, 'parts[0].thruster.pitch.set'],
])('a %s vectoring out of order is told', (way, vectoring, path) => {
  const file = sampleJson('worked-example');
  const still = { least: 0, most: 0, set: 0, slew: 0 };
  const [first, ...rest] = file.parts as Record<string, unknown>[];
  const thruster = {
    thrust: { kind: 'measured', staticThrust: 1 },
    diameter: 0.2,
    pitchSpeed: { kind: 'given', speed: 8 },
    reverse: 0,
    yaw: still,
    pitch: still,
    differential: false,
    [way]: vectoring,
  };
  const parsed = parse(JSON.stringify({ ...file, parts: [{ ...first, thruster }, ...rest] }));
  expect(parsed.ok ? [] : parsed.problems.map((problem) => problem.path)).toEqual([path]);
});
