import { expect, test } from 'vitest';
import { BLANK_HARDPOINT } from '../../src/craft/blank.ts';
import { type Craft, keyed, listed } from '../../src/craft/craft.ts';
import { placePart } from '../../src/edit/edits/parts.ts';
import { run } from '../../src/edit/history.ts';
import { assess } from '../../src/report/assess.ts';
import type { VerdictKey } from '../../src/report/verdict.ts';
import { partOf } from '../edit/craftFixture.ts';
import { workedExample } from './workedExample.ts';

const verdict = (craft: Craft, key: VerdictKey) => assess(craft).verdicts.find((each) => each.key === key)!;

const withPart = (craft: Craft, id: string, change: Parameters<typeof partOf>[1]): Craft => ({
  ...craft,
  parts: keyed([...listed(craft.parts), partOf(id, { massTolerance: 0, ...change })]),
});

/** The worked example with its lead on, and what lift is left filled up at the CB station, low down. */
const trimmed = (): Craft => {
  const leaded = withPart(workedExample(), 'lead', {
    mass: 0.1571168,
    place: { kind: 'axis', station: 0.05 },
  });
  return withPart(leaded, 'load', { mass: 0.565, place: { kind: 'keel', station: 1.5, drop: 0.05 } });
};

test('as it is: tail-heavy and too light, upright and even, and lead would level it', () => {
  const { verdicts, met, headline } = assess(workedExample());
  expect(verdicts.map(({ key, state, word }) => [key, state, word])).toEqual([
    ['floats', 'missed', 'too light'],
    ['level', 'missed', 'tail-heavy'],
    ['upright', 'met', 'upright'],
    ['even', 'met', 'even'],
    ['lead', 'open', 'levels it'],
  ]);
  expect(met).toBe(false);
  expect(headline).toBe('Tail-heavy: floats 53.9° nose-up. 157.1 g of lead at the nose levels it.');
});

test('in imperial units the same sentence', () => {
  expect(assess(workedExample(), 'imperial').headline).toBe(
    'Tail-heavy: floats 53.9° nose-up. 5.54 oz of lead at the nose levels it.',
  );
});

test('advice can be carried out: the lead levels, the load fills the lift and levels', () => {
  const { advice } = assess(workedExample());
  const lead = advice.find((each) => each.kind === 'lead')!;
  const leaded = withPart(workedExample(), 'lead', { mass: lead.mass, place: lead.place });
  expect(verdict(leaded, 'level').state).toBe('met');
  const load = advice.find((each) => each.kind === 'load')!;
  const loaded = withPart(workedExample(), 'load', { mass: load.mass, place: load.place });
  expect(assess(loaded).met).toBe(true);
});

test('lead that its hardpoint cannot hold is not offered, and the sentence says so', () => {
  const { nose } = workedExample().hardpoints.byId;
  const weak = { ...workedExample(), hardpoints: keyed([{ ...nose!, limit: 0.05 }]) };
  expect(assess(weak).advice.map(({ kind }) => kind)).not.toContain('lead');
  expect(assess(weak).headline).toContain('The nose holds no more than 50.0 g');
  const pieces = { ...workedExample(), hardpoints: keyed([{ ...nose!, fill: 'pieces' as const }]) };
  expect(assess(pieces).advice.map(({ kind }) => kind)).not.toContain('lead');
});

test('a craft that needs nothing gets no lead and no slide offered', () => {
  expect(assess(trimmed()).advice.map(({ kind }) => kind)).toEqual(['load']);
});

test('a battery that can slide is offered, and sliding it there levels the craft', () => {
  const craft = workedExample();
  const battery = { ...craft.parts.byId.battery!, kind: 'battery' as const, name: 'Battery', mass: 0.3 };
  const heavier = {
    ...craft,
    parts: keyed(listed(craft.parts).map((each) => (each.id === 'battery' ? battery : each))),
  };
  const { headline } = assess(heavier);
  const station = Number(/slide Battery forward to ([\d.]+) m/.exec(headline)![1]);
  const slid = run(heavier, placePart('battery', { kind: 'keel', station, drop: 0.03 })).craft;
  expect(verdict(slid, 'level').state).toBe('met');
});

test('leaded and loaded it meets its targets', () => {
  const { met, headline, verdicts } = assess(trimmed());
  expect(met).toBe(true);
  expect(headline).toBe('Floats level and upright, 2.2 g light: within its targets.');
  expect(verdicts.every(({ state }) => state === 'met')).toBe(true);
});

test('margins: inside positive, outside negative, zero on the edge', () => {
  const level = verdict(workedExample(), 'level');
  expect(level.marginWords).toBe('off by 51.9°');
  expect(verdict(workedExample(), 'even').marginWords).toBe('2.0° to spare');
  expect(verdict(workedExample(), 'lead').marginWords).toBe('leaves 567.2 g of lift');
  expect(level.margin).toBeCloseTo(workedExample().targets.pitchTolerance - Math.abs(level.row.value!), 12);
  const edge: Craft = {
    ...trimmed(),
    targets: {
      ...trimmed().targets,
      leastPendulumDepth: assess(trimmed()).rows['float.pendulumDepth']!.value!,
    },
  };
  expect(verdict(edge, 'upright')).toMatchObject({ state: 'met', margin: 0 });
});

test('too heavy: says by how much and what hull would carry it', () => {
  const heavy = withPart(trimmed(), 'safe', { mass: 0.1, place: { kind: 'keel', station: 1.5, drop: 0 } });
  expect(verdict(heavy, 'floats')).toMatchObject({ state: 'missed', word: 'too heavy' });
  expect(assess(heavy).headline).toMatch(
    /^Too heavy: 97\.\d g heavy, and at most 20\.0 g heavy is wanted\. Take 77\.\d g out, or 0\.0\d+ m³ more hull would carry it\.$/,
  );
});

test('a hair over the limit is said to be just that', () => {
  const craft = trimmed();
  const { value } = assess(craft).rows.heaviness!;
  const band = { least: -1, most: value! - 1e-5 };
  const over = { ...craft, targets: { ...craft.targets, heaviness: band } };
  expect(verdict(over, 'floats')).toMatchObject({ state: 'missed', marginWords: 'just outside' });
  expect(assess(over).headline).toContain('A trace less would do.');
});

test('figures are said without signs', () => {
  expect(verdict(workedExample(), 'floats')).toMatchObject({ figure: '724.4 g', side: 'light' });
  expect(verdict(workedExample(), 'level')).toMatchObject({ figure: '53.9°', side: 'nose-up' });
  expect(verdict(workedExample(), 'even')).toMatchObject({ figure: '0.0°', side: '' });
  expect(verdict(workedExample(), 'floats').target).toBe('10.0 g light to 20.0 g heavy');
});

test('level within the tolerance on the far side: no lead, and why not more', () => {
  const nose = withPart(trimmed(), 'bell', { mass: 0.004, place: { kind: 'axis', station: 0.2 } });
  const { rows } = assess(nose);
  expect(rows['float.pitch']!.value).toBeLessThan(0);
  expect(rows['lead.mass']).toMatchObject({ value: 0, status: 'solved' });
  expect(rows['lead.mass']!.why).toContain('None is needed within the tolerance.');
  expect(verdict(nose, 'lead')).toMatchObject({ state: 'met', word: 'none needed' });
});

test('heeled: which side is low, and how much to bring over', () => {
  const heeled = withPart(trimmed(), 'lamp', {
    mass: 0.05,
    place: { kind: 'free', x: 1.5, y: 0.5, z: -0.2 },
  });
  const loose = { ...heeled, targets: { ...heeled.targets, heaviness: { least: -1, most: 1 } } };
  expect(verdict(loose, 'even')).toMatchObject({ state: 'missed', word: 'starboard low' });
  expect(assess(loose).headline).toMatch(/^Heels \d\.\d°, starboard low: bring 25\.00 g·m over to port\.$/);
});

test('a bare hull has no pendulum, and says so', () => {
  const bare: Craft = { ...workedExample(), parts: keyed([]) };
  expect(assess(bare).headline).toMatch(/^Without a pendulum/);
  expect(verdict(bare, 'upright').state).toBe('missed');
});

test('top-heavy: missed however little is asked for, and said before anything else', () => {
  const craft = workedExample();
  const top: Craft = {
    ...craft,
    parts: keyed(
      listed(craft.parts).map((each) => ({
        ...each,
        place: { kind: 'free' as const, x: 1.5, y: 0, z: 0.3 },
      })),
    ),
    targets: { ...craft.targets, leastPendulumDepth: 0 },
  };
  expect(verdict(top, 'upright')).toMatchObject({ state: 'missed', word: 'top-heavy' });
  expect(assess(top).headline).toMatch(/^Top-heavy: the CG stands \d+ mm above the CB/);
});

test('lead that no lift is left for: said, with what is short', () => {
  const tight: Craft = {
    ...trimmed(),
    hardpoints: keyed([
      { id: 'nose', name: 'Nose', place: { kind: 'axis', station: 1.4 }, ...BLANK_HARDPOINT },
    ]),
  };
  const tail = withPart(tight, 'camera', { mass: 0.02, place: { kind: 'axis', station: 2.9 } });
  const lead = verdict(tail, 'lead');
  expect(lead).toMatchObject({ state: 'missed', word: 'does not do it' });
  expect(lead.row.why).toContain('No lift is left for it');
  expect(lead.margin).toBeLessThan(0);
});

test('every verdict opens into a formula, its figures and a source', () => {
  for (const { working } of assess(workedExample()).verdicts) {
    expect(working.formula).toContain('=');
    expect(working.inputs.length).toBeGreaterThan(1);
    expect(working.source.length).toBeGreaterThan(10);
  }
});
