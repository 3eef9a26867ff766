import { expect, test } from 'vitest';
import { commandOf } from '../../src/cli/args.ts';
import type { Craft } from '../../src/craft/craft.ts';
import { serialize } from '../../src/craft/serialize.ts';
import { turnReport } from '../../src/report/turning/turnReport.ts';
import {
  levelCraft,
  pairCraft,
  straightCraft,
  tailCraft,
  unknownCraft,
} from '../report/turning/turningCrafts.ts';
import { sampleCraft, samples } from '../samples/readSamples.ts';
import { heard, heardLater } from './terminal.ts';

const DEGREE = Math.PI / 180;
const names = samples.map(({ name }) => ({ name }));
const files = Object.fromEntries(samples.map(({ name, text }) => [name, text]));
const turn = (name: string, ...options: string[]) => heard(['turn', name, ...options], files);
const turnOf = (craft: Craft, ...options: string[]) =>
  heard(['turn', 'it', ...options], { it: serialize(craft) });

/** The rows that scripts may count on. */
const KEYS = [
  'turn.arm',
  'turn.yawMoment',
  'turn.virtualArm',
  'turn.virtualMoment',
  'turn.timeTo90',
  'turn.timeThere',
  'turn.timeTo90Cruise',
  'turn.stopTime',
  'turn.stopAngle',
  'turn.radius',
  'turn.radiusLengths',
  'turn.drift',
  'turn.yawRate',
  'turn.speed',
  'turn.vector',
  'turn.gustHeld',
  'turn.gustHeldCruise',
  'turn.widestRadius',
  'turn.widestSpeed',
  'turn.shareVectoring',
  'turn.shareArm',
  'turn.shareThrust',
  'added.k1',
  'added.k2',
  'added.kPrime',
  'added.hullK1',
  'added.hullK2',
  'added.hullKPrime',
  'inertia.yaw',
  'inertia.airYaw',
  'speed.top',
  'speed.cruise',
  'speed.pitchSpeed',
  'drag.atTop',
  'thrust.static',
  'power.atRest',
  'power.atTop',
  'cruise.pitch',
  'cruise.criticalSpeed',
  'climb.rate',
  'hover.share',
  'inflow.ratio',
  'inflow.perWatt',
  'inflow.wakeShare',
];

test('left out, throttle is full, steering hardest to starboard, cruise as fast as it goes', () => {
  expect(commandOf(['turn', 'a.json'])).toEqual({
    kind: 'turn',
    file: 'a.json',
    json: false,
    units: 'metric',
    throttle: 1,
    vector: null,
    speed: null,
    planned: false,
    all: false,
  });
});

test('degrees as typed are radians inside; a negative angle may stand after a space', () => {
  const vectorOf = (...args: string[]) => {
    const command = commandOf(['turn', 'a.json', ...args]);
    return command.kind === 'turn' ? command.vector : command;
  };
  expect(vectorOf('--vector', '-30')).toBeCloseTo(-30 * DEGREE, 12);
  expect(vectorOf('--vector=-30')).toBeCloseTo(-30 * DEGREE, 12);
  expect(vectorOf('--vector', '12.5')).toBeCloseTo(12.5 * DEGREE, 12);
  expect(commandOf(['check', '--', '--vector', '-3'])).toEqual({ kind: 'check', files: ['--vector', '-3'] });
});

test.each([
  [['--throttle', '0'], /--throttle: found "0"; allowed: a share above 0 and up to 1/],
  [['--throttle', '1.1'], /--throttle: found "1.1"; allowed/],
  [['--throttle', '-0.5'], /--throttle: found "-0.5"; allowed/],
  [['--throttle', '80%'], /--throttle: found "80%"; allowed/],
  [['--throttle', ''], /--throttle: found ""; allowed/],
  [['--vector', '181'], /--vector: found "181"; allowed: degrees from -180 to 180/],
  [['--vector', 'port'], /--vector: found "port"; allowed/],
  [['--speed', '-1'], /--speed: found "-1"; allowed: m\/s from 0 to 50/],
  [['--speed', '51'], /--speed: found "51"; allowed/],
  [['--robust'], /turn takes no --robust/],
  [['--vector'], /--vector/],
])('%j is misuse: one line, exit 2', (options, said) => {
  const { code, out, errors } = turn('museum-atrium', ...options);
  expect({ code, out }).toEqual({ code: 2, out: '' });
  expect(errors).toHaveLength(1);
  expect(errors[0]).toMatch(said);
});

test('an angle no thruster can be turned to is exit 2, with the thruster and its limits', () => {
  const { code, out, errors } = turnOf(tailCraft(), '--vector', '75');
  expect({ code, out, errors }).toEqual({
    code: 2,
    out: '',
    errors: ['--vector: found 75.0°; allowed: -60.0° to 60.0°, the limits in yaw of Tail thruster'],
  });
  expect(turnOf(tailCraft(), '--vector', '60').code).toBe(0);
  expect(turnOf(pairCraft(), '--vector', '5').errors[0]).toMatch(/no thruster of this craft turns in yaw/);
});

test.each(names)('$name as JSON: one object of rows, in SI, as the report has them', ({ name }) => {
  const { out, errors } = turn(name, '--json', '--units', 'imperial');
  expect(errors).toEqual([]);
  const json = JSON.parse(out);
  expect(Object.keys(json)).toEqual(['rows']);
  expect(Object.keys(json.rows)).toEqual(expect.arrayContaining(KEYS));
  for (const { value, unit, status, why } of Object.values<Record<string, unknown>>(json.rows)) {
    expect(value === null).toBe(status === 'infeasible');
    expect(unit).not.toBe('');
    if (value === null) expect(why).not.toBe('');
  }
});

test.each(names)('$name to read: 80 columns, no stray spaces, minus as a hyphen, no NaN', ({ name }) => {
  for (const units of ['metric', 'imperial']) {
    const { out } = turn(name, '--all', '--units', units);
    for (const line of out.split('\n')) {
      expect([...line].length, line).toBeLessThanOrEqual(80);
      expect(line).toBe(line.trimEnd());
    }
    expect(out).not.toMatch(/\u2212|NaN|Infinity|undefined|null|[{}]/);
  }
});

test('throttle, angle and speed reach the physics', () => {
  const asked = { throttle: 0.6, vector: -20 * DEGREE, speed: 0.8 };
  const { rows } = turnReport(tailCraft(), asked, 'metric');
  const { out } = turnOf(tailCraft(), '--json', '--throttle', '0.6', '--vector', '-20', '--speed', '0.8');
  const json = JSON.parse(out).rows;
  for (const key of ['turn.timeTo90', 'turn.timeTo90Cruise', 'turn.radius', 'turn.vector', 'speed.cruise']) {
    expect(json[key].value, key).toBeCloseTo(rows[key]!.value!, 9);
  }
});

test('headline first, then verdicts, figures, propellers, notes and cautions with the hazards', () => {
  const { out } = turn('museum-atrium', '--all');
  const unfolded = out.replace(/\s+/g, ' ');
  expect(unfolded).toMatch(/^Museum atrium camera craft With the thruster at 4\.290 m the arm is /);
  const titles = ['Verdicts', 'Turning', 'Speed', 'Pitch', 'Inflow', 'Propellers', 'Notes', 'Cautions'];
  const places = titles.map((title) => out.search(new RegExp(`^${title}`, 'm')));
  expect(places.every((place) => place > 0)).toBe(true);
  expect(places).toEqual([...places].sort((a, b) => a - b));
  for (const caution of [
    'Helium displaces',
    'propeller cuts',
    'Lithium cells burn',
    'local aviation authority',
  ])
    expect(unfolded).toContain(caution);
});

test('without --all what one looks for first, and where the rest is; nothing is told as missing twice', () => {
  const { out } = turn('vault-inspector');
  for (const said of ['Top speed', 'Pitch in cruise', 'Cautions', 'A turning propeller cuts'])
    expect(out).toContain(said);
  for (const rest of ['Inflow', 'Propellers', 'Couple of the fins', 'Added mass', 'as above'])
    expect(out).not.toContain(rest);
  expect(out).toMatch(/More with --all: .*\n$/);
  const all = turn('vault-inspector', '--all').out;
  expect(all).not.toMatch(/More with --all|as above/);
  expect(all.match(/so no attitude near level is held/g)).toHaveLength(1);
  expect(all.split('\n').length).toBeGreaterThan(out.split('\n').length + 30);
});

test('a speed that it cannot fly is told, one that it can is not', () => {
  const caution = (speed: string) => turn('museum-atrium', '--speed', speed).out.replace(/\s+/g, ' ');
  expect(caution('30')).toMatch(/--speed: 30\.00 m\/s is faster than its top speed of 2\.69 m\/s/);
  expect(caution('1')).not.toContain('faster than its top speed');
});

const aimed = (craft: Craft, turnTime: number | null, sideGust: number | null): Craft => ({
  ...craft,
  targets: { ...craft.targets, turnTime, sideGust },
});

test('a turning target missed is exit 1, and says what it would take', () => {
  const { code, out } = turnOf(aimed(levelCraft(), 1, null));
  expect(code).toBe(1);
  expect(out).toMatch(/missed {2}Passes 90° +too slow +\d\.\d s\n +wanted within 1\.0 s: off by \d\.\d s\n/);
  expect(out).toMatch(/It takes a yaw moment of [\d.]+ N·m; steered\s+hardest there is [\d.]+\s+N·m\./);
  expect(out).toMatch(/Thrust alone: [\d.]+ N would do; it is 0\.400 N\./);
  expect(turnOf(aimed(levelCraft(), 30, null)).code).toBe(0);
  expect(turnOf(aimed(levelCraft(), 30, 5)).code).toBe(1);
  expect(turnOf(levelCraft()).code).toBe(0);
});

test('without a thruster of which anything is known: the whole report, exit 1', () => {
  const { code, out } = turnOf(unknownCraft());
  expect(code).toBe(1);
  expect(out.replace(/\s+/g, ' ')).toContain(
    'Tail thruster has no thrust figures: enter them under Selected on the page, or as “thruster” in the file.',
  );
  expect(out).toContain('Added mass ahead, k1');
  expect(turn('two-sheet-advert', '--json').code).toBe(1);
});

test('a craft that nothing steers says so, and still tells its speed', () => {
  const { code, out } = turnOf(aimed(straightCraft(), 10, null));
  expect(code).toBe(1);
  expect(out).toMatch(/Tail thruster can only push straight/);
  expect(out).toMatch(/missed {2}Passes 90° +does not get there/);
  expect(out).toMatch(/Top speed +\d/);
});

const planned = (name: string, ...options: string[]) =>
  heardLater(['turn', name, '--planned', ...options], files);

test('as planned: the figures of the craft that plan writes, and the lead that it has then', async () => {
  const kept: Record<string, string> = { ...files };
  const { out: plan } = await heardLater(['plan', 'museum-atrium', '--json', '--write', 'then'], kept);
  const { out } = await planned('museum-atrium', '--json');
  const json = JSON.parse(out);
  const then = JSON.parse(heard(['turn', 'then', '--json'], kept).out).rows;
  expect(json.plan).toEqual({ status: 'optimal', deadBallast: expect.any(Number) });
  expect(json.plan.deadBallast).toBeCloseTo(JSON.parse(plan).plan.deadBallast, 6);
  for (const key of KEYS) {
    // The file has rounded masses and places.
    if (then[key].value === null) expect(json.rows[key].value, key).toBeNull();
    else expect(json.rows[key].value, key).toBeCloseTo(then[key].value, 5);
  }
  const now = JSON.parse(turn('museum-atrium', '--json').out).rows;
  expect(json.rows['cruise.pitch'].value).toBeLessThan(now['cruise.pitch'].value - 5 * DEGREE);
});

test('as planned, to read: what was hung and moved stands first, in the units asked for', async () => {
  const { out } = await planned('museum-atrium');
  const unfolded = out.replace(/\s+/g, ' ');
  expect(unfolded).toMatch(
    /^Museum atrium camera craft With the ballast plan carried out, [\d.]+ g of dead ballast: slide Battery to /,
  );
  expect((await planned('museum-atrium', '--units', 'imperial')).out).toMatch(
    /carried out, [\d.]+ oz of dead\s+ballast/,
  );
  expect((await planned('school-cylinder')).out).toContain(
    'The ballast plan changes nothing: 30.0 g of dead ballast.',
  );
});

test('where no plan can be made: why, and exit 1', async () => {
  const { out, code, errors } = await planned('cave-mapper');
  expect({ code, errors }).toEqual({ code: 1, errors: [] });
  expect(out.replace(/\s+/g, ' ')).toMatch(
    /There is no ballast plan to carry out\. No ballast, slide or place of a load keeps every target at once\. The command plan/,
  );
  const json = await planned('cave-mapper', '--json');
  expect(json.code).toBe(1);
  expect(JSON.parse(json.out)).toEqual({
    plan: { status: 'infeasible', why: expect.stringContaining('No ballast') },
    rows: {},
  });
});

test('a turning target that only the craft as planned misses is exit 1', async () => {
  const museum = sampleCraft('museum-atrium');
  for (const [gust, code] of [
    [1, 0],
    [2.2, 1],
  ] as const) {
    const it = serialize(aimed(museum, null, gust));
    expect(heard(['turn', 'it'], { it }).code).toBe(0);
    expect((await heardLater(['turn', 'it', '--planned'], { it })).code).toBe(code);
  }
});

test('a broken file is exit 2', () => {
  expect(heard(['turn', 'bad'], { bad: '{' })).toMatchObject({ code: 2, out: '' });
});
