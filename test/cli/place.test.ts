import { expect, test } from 'vitest';
import { commandOf } from '../../src/cli/args.ts';
import { keyed, listed } from '../../src/craft/craft.ts';
import { serialize } from '../../src/craft/serialize.ts';
import { placingCraft, studyOf } from '../physics/placing/placingCrafts.ts';
import { heard, heardLater } from './terminal.ts';

const craft = placingCraft({ part: { name: 'Tail motor' } });
const files = { it: serialize(craft) };
const place = (...options: string[]) => heardLater(['place', 'it', ...options], { ...files });
const COMMON = ['--part', 'thruster', '--stations', '9'];

test('a table, nose first, of no more than 80 columns; the best marked, and where it is', async () => {
  const { code, out, errors } = await place(...COMMON);
  expect({ code, errors }).toEqual({ code: 0, errors: [] });
  const lines = out.split('\n');
  for (const line of lines) expect([...line].length).toBeLessThanOrEqual(80);
  expect(lines.slice(1, 4).join(' ')).toMatch(/: 90° in [\d.]+ s, holds [\d.]+ m\/s from the side/);
  const rows = lines.filter((line) => /^[ *!] +-?\d\.\d{3} /.test(line));
  const { points, today } = studyOf(craft, { stations: 9 });
  expect(rows.map((line) => Number(line.slice(1).trim().split(/ +/)[0]))).toEqual(
    [...points, today].map(({ station }) => Number(station.toFixed(3))),
  );
  expect(rows.map((line) => line[0])).toEqual(
    [...points, today].map(({ best, strikes }) => (strikes ? '!' : best ? '*' : ' ')),
  );
  expect(out).toContain('Try a new place on a tether before free flight.');
});

test('--json has every point with the fields of the study, --throttle is heard', async () => {
  const { code, out } = await place(...COMMON, '--json', '--throttle', '0.5');
  expect(code).toBe(0);
  const read = JSON.parse(out).place;
  const { points } = studyOf(craft, { stations: 9, asked: { throttle: 0.5, vector: null, speed: null } });
  expect(read.points.map((point: { timeTo90: number }) => point.timeTo90)).toEqual(
    points.map(({ timeTo90 }) => timeTo90),
  );
  for (const key of [
    'station',
    'place',
    'ballast',
    'why',
    'wire',
    'wireChange',
    'arm',
    'timeTo90',
    'radius',
    'gustHeld',
    'inflowRatio',
    'perWatt',
    'cruisePitch',
    'cautions',
    'best',
  ]) {
    expect(read.points[0]).toHaveProperty(key);
  }
});

test('--csv has a line for each station under its heads', async () => {
  const { code, out } = await place(...COMMON, '--csv');
  expect(code).toBe(0);
  expect(out.split('\r\n')).toHaveLength(11);
  expect(out).toMatch(/^station m,ballast kg,wire kg,/);
});

test('61 stations unless told otherwise', () => {
  expect(commandOf(['place', 'a', '--part', 'p'])).toEqual({
    kind: 'place',
    file: 'a',
    json: false,
    csv: false,
    units: 'metric',
    part: 'p',
    stations: 61,
    throttle: 1,
  });
});

test.each([
  [['--part', 'battery'], '--part: found "battery"; allowed: thruster (Tail motor)'],
  [['--part', '__proto__'], '--part: found "__proto__"; allowed: thruster (Tail motor)'],
  [[], '--part: found none; allowed: thruster (Tail motor)'],
])('%j is exit 2 with the thrusters there are', async (options, said) => {
  expect(await place(...options)).toEqual({ code: 2, out: '', errors: [said] });
});

test('a part goes by its name too, capitals aside, when no other has it', async () => {
  const named = await place('--part', 'tail MOTOR', '--stations', '3');
  expect(named).toMatchObject({ code: 0, errors: [] });
  expect(named.out).toBe((await place('--part', 'thruster', '--stations', '3')).out);
  const twin = { ...craft.parts.byId.thruster!, id: 'twin' };
  const two = { ...craft, parts: keyed([...listed(craft.parts), twin]) };
  const { code, errors } = await heardLater(['place', 'it', '--part', 'Tail motor'], { it: serialize(two) });
  expect(code).toBe(2);
  expect(errors).toEqual(['--part: found "Tail motor"; allowed: thruster (Tail motor), twin (Tail motor)']);
});

test('a craft without thrust figures is exit 2, and so is a file that is none', async () => {
  const none = placingCraft({ part: { thruster: null } });
  const { code, errors } = await heardLater(['place', 'none', '--part', 'thruster'], {
    none: serialize(none),
  });
  expect({ code, errors }).toEqual({
    code: 2,
    errors: ['--part: found "thruster"; but no part of this craft has thrust figures'],
  });
  expect(await heardLater(['place', 'bad', '--part', 'p'], { bad: '{' })).toMatchObject({ code: 2, out: '' });
});

test('without any station that can be flown it is exit 1', async () => {
  const heavy = { ...craft, targets: { ...craft.targets, heaviness: { least: 900, most: 901 } } };
  const { code, out } = await heardLater(['place', 'it', ...COMMON], { it: serialize(heavy) });
  expect(code).toBe(1);
  expect(out).toContain('At no station is there both a ballast plan and room for the propeller.');
  expect(out).toContain('Where something is in the way');
});

test.each([
  [['--stations', '1'], /--stations: found "1"; allowed: a whole number from 2 to 1001/],
  [['--stations', '2.5'], /--stations: found "2.5"/],
  [['--stations', '1002'], /--stations: found "1002"/],
  [['--throttle', '0'], /--throttle: found "0"; allowed: a share above 0 and up to 1/],
  [['--json', '--csv'], /place gives --json or --csv, not both/],
  [['--line', 'keel'], /place takes no --line/],
])('%j is misuse', (options, said) => {
  const { code, errors } = heard(['place', 'a', '--part', 'p', ...options]);
  expect(code).toBe(2);
  expect(errors[0]).toMatch(said);
});
