import { expect, test } from 'vitest';
import type { Craft } from '../../../src/craft/craft.ts';
import type { ThrusterData } from '../../../src/craft/thrustSchema.ts';
import { type CraftState, craftStateOf } from '../../../src/physics/craftState.ts';
import { climbCurve } from '../../../src/physics/cruise/climb.ts';
import { TURN_KEYS } from '../../../src/report/turning/turnFigure.ts';
import { turnFigures, turnReport } from '../../../src/report/turning/turnReport.ts';
import type { TurnAsked } from '../../../src/report/turning/turns.ts';
import { turnWorkingOf } from '../../../src/report/turning/turnWorkings.ts';
import { partOf } from '../../edit/craftFixture.ts';
import { craftFrom, sampleCraft, samples } from '../../samples/readSamples.ts';
import {
  DEGREE,
  levelCraft,
  pairCraft,
  straightCraft,
  tailCraft,
  thrusterData,
  unknownCraft,
  upTo,
  withParts,
} from './turningCrafts.ts';

const FULL: TurnAsked = { throttle: 1, vector: null, speed: null };
const reportOf = (craft: Craft, asked = FULL) => turnReport(craft, asked, 'metric');
function stateFor(craft: Craft): CraftState {
  const state = craftStateOf(craft);
  if (state.status !== 'solved') throw new Error(state.why);
  return state.value;
}
const value = (craft: Craft, key: string, asked = FULL) => reportOf(craft, asked).rows[key]!.value!;

const every = [
  ...samples.map(({ name, text }) => ({ name, craft: craftFrom(text) })),
  ...Object.entries({
    tail: tailCraft(),
    pair: pairCraft(),
    straight: straightCraft(),
    unknown: unknownCraft(),
  }).map(([name, craft]) => ({ name, craft })),
];

test.each(every)(
  '$name: each figure is a finite number, or a sentence says why there is none',
  ({ craft }) => {
    for (const units of ['metric', 'imperial'] as const) {
      const { rows } = turnReport(craft, FULL, units);
      for (const [key, { value, status, why }] of Object.entries(rows)) {
        expect(status === 'infeasible' ? value === null : Number.isFinite(value), key).toBe(true);
        if (status === 'infeasible') expect(why, key).toMatch(/^[A-Z].*[.!]$/s);
        expect(why, key).not.toMatch(/[{}]|NaN|undefined/);
      }
    }
  },
);

test.each(every)('$name: nothing is said in SI or of nothing', ({ craft }) => {
  for (const units of ['metric', 'imperial'] as const) {
    const { headline, notes, cautions, costWords, verdicts, propellers } = turnReport(craft, FULL, units);
    const said = [
      headline,
      ...notes,
      ...cautions,
      ...costWords,
      ...verdicts.flatMap(({ need, target, marginWords, figure }) => [...need, target, marginWords, figure]),
      ...propellers.map(({ name }) => name),
    ];
    expect(headline).not.toBe('');
    for (const sentence of said) expect(sentence).not.toMatch(/[{}]|NaN|undefined|Infinity/);
  }
});

test.each(every)('$name: the quick figures are those of the whole report', ({ craft }) => {
  const { rows, arrows, costs } = turnFigures(craft, FULL, 'metric');
  expect(reportOf(craft)).toMatchObject({ rows, arrows, costs });
});

test('every figure opens into formula, figures of the same report and source', () => {
  const craft = tailCraft();
  const { rows } = reportOf({ ...craft, targets: { ...craft.targets, turnTime: 2, sideGust: 0.3 } });
  for (const key of TURN_KEYS) {
    const { formula, source, inputs } = turnWorkingOf(key, rows)!;
    expect(formula.length, key).toBeGreaterThan(2);
    expect(source.length, key).toBeGreaterThan(3);
    for (const input of inputs) expect(Object.values(rows), key).toContain(input);
  }
  expect(TURN_KEYS).toEqual(expect.arrayContaining(Object.keys(rows)));
  expect(turnWorkingOf('toString', rows)).toBeNull();
});

test('the tail thruster: moment is thrust times arm times the sine of its limit', () => {
  // Statics by hand: 0.4 N turned 60°, on the arm from the CG to 3.05 m.
  const { rows } = reportOf(tailCraft());
  const arm = rows['turn.arm']!.value!;
  expect(rows['turn.yawMoment']!.value).toBeCloseTo(0.4 * arm * Math.sin(60 * DEGREE), 12);
  expect(rows['turn.shareVectoring']!.value).toBeCloseTo(Math.sin(60 * DEGREE), 12);
});

test('turned to the other side it turns to the other side, as far and as fast', () => {
  const to = (degrees: number) => reportOf(tailCraft(), { ...FULL, vector: degrees * DEGREE }).rows;
  const [port, starboard] = [to(40), to(-40)];
  for (const key of [
    'turn.timeTo90',
    'turn.radius',
    'turn.speed',
    'turn.drift',
    'turn.stopTime',
    'turn.gustHeld',
  ]) {
    expect(port[key]!.value, key).toBeCloseTo(starboard[key]!.value!, 6);
  }
  expect(port['turn.yawRate']!.value).toBeCloseTo(-starboard['turn.yawRate']!.value!, 6);
});

test('less throttle turns slower, goes slower and leaves less moment', () => {
  const half = { ...FULL, throttle: 0.5 };
  expect(value(tailCraft(), 'turn.timeTo90', half)).toBeGreaterThan(value(tailCraft(), 'turn.timeTo90'));
  expect(value(tailCraft(), 'speed.cruise', half)).toBeLessThan(value(tailCraft(), 'speed.cruise'));
  expect(value(tailCraft(), 'turn.yawMoment', half)).toBeCloseTo(
    value(tailCraft(), 'turn.yawMoment') / 2,
    12,
  );
  expect(value(tailCraft(), 'speed.top', half)).toBe(value(tailCraft(), 'speed.top'));
});

test('shares of vectoring, arm and thrust make the moment', () => {
  const { rows } = reportOf(tailCraft(), { ...FULL, throttle: 0.7 });
  const share = (key: string) => rows[key]!.value!;
  const longest = share('turn.arm') / share('turn.shareArm');
  const whole = share('thrust.static') * longest;
  expect(
    share('turn.shareVectoring') * share('turn.shareArm') * share('turn.shareThrust') * whole,
  ).toBeCloseTo(share('turn.yawMoment'), 12);
});

test('a cruise pitch that only a trimmed craft flies level says by how much, and where what it does by itself is told', () => {
  const { rows } = reportOf(sampleCraft('museum-atrium'));
  const grams = (1000 * rows['cruise.rising']!.value!) / 9.80665;
  expect(rows['cruise.pitch']!.why).toMatch(`Level only if trimmed ${grams.toFixed(1)} g heavier`);
  expect(rows['cruise.pitch']!.why).toMatch(/Left to itself it flies as told under “Climbs”/);
  // Trimmed by what it says, at the CB so that the pitch stays, it flies level by itself.
  const slow = { ...FULL, speed: 0.3 };
  const { 'cruise.rising': rising } = reportOf(levelCraft(), slow).rows;
  const station = reportedCb(levelCraft());
  const weight = partOf('trim', {
    mass: rising!.value! / 9.80665,
    massTolerance: 0,
    place: { kind: 'axis', station },
  });
  const trimmed = reportOf(withParts(levelCraft(), weight), slow).rows;
  expect(Math.abs(trimmed['cruise.rising']!.value!)).toBeLessThan(0.02);
  expect(trimmed['cruise.pitch']!.why).not.toMatch(/Level only/);
});

const reportedCb = (craft: Craft): number => {
  const state = craftStateOf(craft);
  if (state.status !== 'solved') throw new Error(state.why);
  return state.value.loading.cb[0];
};

test('too fast for its nose to be held, the pitch at 80 % of the speed up to which it is stands instead', () => {
  const vault = sampleCraft('vault-inspector');
  const { rows } = reportOf(vault);
  expect(rows['cruise.pitch']!.value).toBeNull();
  const held = 0.8 * rows['cruise.criticalSpeed']!.value!;
  const slower = reportOf(vault, { ...FULL, speed: held }).rows;
  expect(rows['cruise.heldPitch']!.value).toBeCloseTo(slower['cruise.pitch']!.value!, 12);
  expect(slower).not.toHaveProperty('cruise.heldPitch');
});

test('the couples of cruise add up to nil', () => {
  const { rows } = reportOf(levelCraft(), { ...FULL, speed: 0.5 });
  const terms = Object.entries(rows).filter(([key]) => key.endsWith('Couple'));
  expect(terms.map(([, { status }]) => status)).toEqual(Array(6).fill('solved'));
  expect(terms.reduce((sum, [, { value }]) => sum + value!, 0)).toBeCloseTo(0, 9);
});

test('the headline names place, arm, time, radius and gusts', () => {
  expect(reportOf(tailCraft()).headline).toMatch(
    /^With the thruster at 3\.050 m the arm is \d\.\d+ m: turns 90° and stops in [\d.]+ s, almost on the spot, keeps its heading at rest in a [\d.]+ m\/s side gust \(drifting with it\)\.$/,
  );
  const slow = tailCraft({ thruster: thrusterData({ yaw: upTo(10) }) });
  expect(reportOf(slow).headline).toMatch(
    /, radius [\d.]+ m at [\d.]+ m\/s, keeps its heading at rest in a [\d.]+ m\/s side gust /,
  );
  expect(reportOf(pairCraft()).headline).toContain(
    'With the thrusters at 1.500 m the arm is 0.600 m to the side:',
  );
});

test('of several thrusters each that yaws it has its name, of the only one it needs none', () => {
  const pusher = partOf('pusher', { name: 'Pusher', thruster: thrusterData() });
  const spare = partOf('spare', { name: 'Spare', kind: 'thruster' });
  for (const other of [pusher, spare]) {
    expect(reportOf(withParts(tailCraft(), other)).headline).toMatch(
      /^With Tail thruster at 3\.050 m the arm is /,
    );
  }
});

test('the gust is held at rest; in cruise the Munk moment leaves far less, and the speed of it is said', () => {
  const rows = (speed: number | null) => reportOf(tailCraft(), { ...FULL, speed }).rows;
  const { 'turn.gustHeld': rest, 'turn.gustHeldCruise': cruise, 'speed.cruise': way } = rows(null);
  expect(cruise!.value!).toBeLessThan(rest!.value! / 4);
  expect(cruise!.why).toBe(`At ${way!.value!.toFixed(2)} m/s ahead, with the Munk moment on top.`);
  expect(rows(0)['turn.gustHeldCruise']!.value).toBe(rest!.value);
  expect(rows(0.5)['turn.gustHeld']!.value).toBe(rest!.value);
  expect(rows(0.5)['turn.gustHeldCruise']!.value!).toBeGreaterThan(cruise!.value!);
});

test('the target of the side gust is judged at rest', () => {
  const rest = value(tailCraft(), 'turn.gustHeld');
  const judged = (sideGust: number) => {
    const craft = tailCraft();
    return reportOf({ ...craft, targets: { ...craft.targets, sideGust } }).verdicts[0]!;
  };
  expect(judged(0.75 * rest)).toMatchObject({ key: 'sideGust', state: 'met', word: 'keeps its heading' });
  expect(judged(0.99 * rest)).toMatchObject({ state: 'met' });
  expect(judged(1.01 * rest)).toMatchObject({ state: 'missed', target: expect.stringMatching(/ at rest$/) });
});

test.each(['aviary-counter', 'school-cylinder', 'second-hand-hull', 'survey-6m'])(
  '%s: that it cannot be stopped is said first, among the cautions, and in plain words in the row',
  (name) => {
    const { headline, cautions, rows } = reportOf(sampleCraft(name));
    const first = 'Once turning from cruise it cannot be stopped by steering.';
    expect(headline.startsWith(`${first} With `)).toBe(true);
    expect(cautions[0]).toContain(`${first} Countering does not stop the yaw`);
    expect(rows['turn.stopTime']!.why).toContain('still turns on against it');
    expect(rows['turn.stopTime']!.why).not.toMatch(/600|\d{4}/);
  },
);

test('what can be stopped is not said to run away; what is stopped from cruise but not from rest has a caution', () => {
  const museum = reportOf(sampleCraft('museum-atrium'));
  expect([museum.headline, ...museum.cautions].join(' ')).not.toMatch(/stopped/);
  const gore = reportOf(sampleCraft('gore-trainer'));
  expect(gore.rows['turn.stopTime']!.status).toBe('solved');
  expect(gore.headline).toMatch(/: passes 90° from rest in /);
  expect(gore.cautions[0]).toBe(gore.rows['turn.timeThere']!.why);
});

test('how much it is to be steered stands with the headline and with the top speed, and first of the notes', () => {
  const { handling, notes, rows } = reportOf(tailCraft());
  expect(handling[0]).toBe(
    'It does not keep its heading by itself at any speed: it needs constant steering.',
  );
  expect(notes.slice(0, handling.length)).toEqual(handling);
  for (const each of handling) expect(rows['speed.top']!.why).toContain(each);
});

test('the speed up to which pitch is held is told where it is below the top speed, and only there', () => {
  for (const { craft } of every) {
    const { handling, rows } = reportOf(craft);
    const [top, held] = [rows['speed.top']!.value, rows['cruise.criticalSpeed']!.value];
    const lower = top !== null && held !== null && held < top;
    expect(handling.some((each) => each.startsWith('Its pitch is held up to'))).toBe(lower);
  }
});

test('a gust above the top speed: it drifts whichever way it is steered', () => {
  for (const { craft } of every) {
    const { 'turn.gustHeld': gust, 'speed.top': top } = reportOf(craft).rows;
    if (gust!.value === null) continue;
    expect(gust!.why.includes('above the top speed')).toBe(gust!.value > top!.value!);
  }
});

test('a craft far from level, or far from weighing nothing, is told so first; one that floats level is not', () => {
  const first = (craft: Craft) => reportOf(craft).cautions[0] ?? '';
  expect(first(tailCraft())).toMatch(
    /^These figures take the craft level and balanced; it floats [\d.]+° nose-up.*\. Choose the craft with its ballast plan/,
  );
  const { loading } = stateFor(sampleCraft('warehouse-stock'));
  const spare = sampleCraft('warehouse-stock');
  const heavy = withParts(
    spare,
    partOf('stone', {
      mass: 0.5 * loading.solid.mass,
      massTolerance: 0,
      place: { kind: 'free', x: loading.cb[0], y: 0, z: loading.cb[2] - 0.1 },
    }),
  );
  expect(first(spare)).not.toMatch(/level and balanced/);
  expect(first(heavy)).toMatch(/level and balanced; it is [\d.]+ k?g heavy\./);
});

test('a target met by less than the model’s error is about enough, and still met', () => {
  const craft = tailCraft();
  const time = value(craft, 'turn.timeTo90');
  const judged = (turnTime: number) => {
    const report = reportOf({ ...craft, targets: { ...craft.targets, turnTime } });
    return { met: report.met, ...report.verdicts[0]! };
  };
  const unsure = expect.stringContaining(', within the model’s error of 20–30 %');
  expect(judged(1.19 * time)).toMatchObject({
    met: true,
    close: true,
    word: 'about enough',
    marginWords: unsure,
  });
  expect(judged(1.21 * time)).toMatchObject({ met: true, close: false, word: 'quick enough' });
  expect(judged(0.9 * time)).toMatchObject({
    met: false,
    close: false,
    word: 'too slow',
    marginWords: unsure,
  });
  expect(judged(0.7 * time).marginWords).not.toContain('error');
});

test('what its place costs is told against the same thruster at the CB', () => {
  const { costWords, costs } = reportOf(tailCraft());
  expect(costs[0]!.cb).toBeCloseTo(1.5, 12);
  expect(costWords[0]).toMatch(
    /^The place of Tail thruster costs [\d.]+ g of lead and [\d.]+ g of wire, compared with the same thruster at the CB \(1\.500 m\)\.$/,
  );
});

test('the widest circle that holds, of a craft that does not keep its heading; of one that does there is none', () => {
  const { rows, steadyCurve, notes } = reportOf(tailCraft());
  const radii = steadyCurve.flatMap(({ turn }) => (turn.status === 'solved' ? [turn.value.radius] : []));
  const widest = rows['turn.widestRadius']!;
  expect(widest.value).toBe(Math.max(...radii));
  expect(widest.value!).toBeGreaterThan(rows['turn.radius']!.value!);
  expect(notes).toContain(
    `Circles wider than about ${widest.value!.toFixed(2)} m do not hold by themselves: those, and straight flight, have to be steered against the Munk moment.`,
  );
  const steady = withParts(
    tailCraft(),
    partOf('fins', {
      kind: 'fin',
      mass: 0.024,
      place: { kind: 'skin', station: 2.62, clock: Math.PI / 4, standoff: 0.1 },
      copies: { kind: 'ring', count: 4 },
      fin: { area: 0.8, aspectRatio: 1.2 },
    }),
  );
  const keeping = reportOf(steady);
  expect(keeping.turn!.glide.stability.keepsHeading).toBe(true);
  expect(keeping.rows['turn.widestRadius']).toMatchObject({
    value: null,
    why: expect.stringMatching(/keeps its heading/),
  });
  expect(keeping.notes.join(' ')).not.toMatch(/Circles wider/);
  expect(keeping.handling[0]).toMatch(/^It keeps its heading by itself/);
});

test.each(['museum-atrium', 'aviary-counter', 'vault-inspector', 'survey-6m'])(
  '%s: fastest climb and descent are those of a sweep in steps of a quarter of a degree, to 3 %',
  (name) => {
    const craft = sampleCraft(name);
    const state = craftStateOf(craft);
    if (state.status !== 'solved') throw new Error(state.why);
    const rates = climbCurve(state.value, 1, 401).flatMap(({ climb }) =>
      climb.status === 'solved' ? [climb.value.climbRate] : [],
    );
    const { rows } = reportOf(craft);
    const [most, least] = [Math.max(...rates), Math.min(...rates)];
    for (const [key, rate, way] of [
      ['climb.best', most, 1],
      ['climb.descent', least, -1],
    ] as const) {
      const { value, why } = rows[key]!;
      if (way * rate > 0) expect(Math.abs(value! / rate - 1), key).toBeLessThan(0.03);
      else
        expect([value, why], key).toEqual([null, expect.stringMatching(/^It cannot (climb|descend) under/)]);
    }
  },
);

test('what cannot be: no figures, no steering, no thruster, each with its sentence', () => {
  const unknown = reportOf(unknownCraft());
  expect(unknown.headline).toMatch(
    /^Tail thruster has no thrust figures: enter them under Selected on the page, or/,
  );
  expect(unknown.cautions).not.toContain(unknown.headline);
  expect(unknown.rows['turn.timeTo90']!.why).toBe(unknown.headline);
  expect(unknown.turn).toBeNull();
  const straight = reportOf(straightCraft());
  expect(straight.headline).toMatch(/^Tail thruster can only push straight/);
  expect(straight.rows['speed.top']!.status).toBe('solved');
  const bare = { ...tailCraft(), parts: { byId: {}, order: [] }, wires: { byId: {}, order: [] } };
  expect(reportOf(bare).headline).toMatch(/^The craft has no thruster/);
});

const thrusterWith = (change: Partial<ThrusterData>): Craft =>
  tailCraft({ thruster: thrusterData({ yaw: upTo(60), pitch: upTo(40), ...change }) });

test.each<{ name: string; craft: Craft; asked?: Partial<TurnAsked> }>([
  { name: 'no throttle', craft: tailCraft(), asked: { throttle: 0 } },
  { name: 'next to no throttle', craft: tailCraft(), asked: { throttle: 1e-6 } },
  { name: 'no way on', craft: tailCraft(), asked: { speed: 0 } },
  { name: 'faster than it can', craft: tailCraft(), asked: { speed: 50 } },
  { name: 'no thrust', craft: thrusterWith({ thrust: { kind: 'measured', staticThrust: 0 } }) },
  { name: 'far too much thrust', craft: thrusterWith({ thrust: { kind: 'measured', staticThrust: 1000 } }) },
  { name: 'next to no pitch speed', craft: thrusterWith({ pitchSpeed: { kind: 'given', speed: 0.1 } }) },
  { name: 'pushing backwards', craft: thrusterWith({ yaw: { least: 3, most: 3.1, set: 3, slew: 1 } }) },
  {
    name: 'pushing up',
    craft: thrusterWith({ pitch: { ...upTo(90), least: Math.PI / 2, set: Math.PI / 2 } }),
  },
  { name: 'a servo that never moves', craft: thrusterWith({ yaw: { ...upTo(60), slew: 0 } }) },
])('$name: finite figures or a sentence', ({ craft, asked }) => {
  const { rows, headline } = reportOf(craft, { ...FULL, ...asked });
  expect(headline).toMatch(/^[A-Z].*\.$/s);
  for (const [key, { value, status, why }] of Object.entries(rows)) {
    expect(status === 'infeasible' ? value === null : Number.isFinite(value), key).toBe(true);
    if (value === null) expect(why, key).toMatch(/^[A-Z].*[.!]$/s);
  }
});

test('one pitch speed below 5 m/s is too low for outdoors', () => {
  // Common practice, no source.
  const { thruster } = tailCraft().parts.byId.thruster!;
  const slow = tailCraft({ thruster: { ...thruster!, pitchSpeed: { kind: 'given', speed: 3 } } });
  const said = (craft: Craft) => reportOf(craft).cautions.some((each) => each.includes('to fly outdoors'));
  expect([said(slow), said(tailCraft())]).toEqual([true, false]);
});
