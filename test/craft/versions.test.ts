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
