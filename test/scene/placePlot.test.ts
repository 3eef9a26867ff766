import fc from 'fast-check';
import { expect, test } from 'vitest';
import { CURVES, layPlace, NAME_LINE, namesAt, type StudySpot } from '../../src/scene/placePlot.ts';
import {
  besideWords,
  curveWords,
  headWords,
  matterWords,
  stationSentence,
} from '../../src/scene/placeWords.ts';
import { scaleOf } from '../../src/scene/roundScale.ts';
import { QUANTITIES, type Quantity } from '../../src/units/quantities.ts';

const spot = (station: number, more: Partial<StudySpot> = {}): StudySpot => ({
  station,
  ballast: 0.1,
  wire: 0.02,
  timeTo90: 3,
  gustHeld: 2,
  perWatt: 1.1,
  radius: 0.7,
  cruisePitch: -0.02,
  why: '',
  cautions: [],
  strikes: false,
  best: false,
  ...more,
});
const points = [
  spot(0, { strikes: true, cautions: ['The propeller reaches {0.03 smallLength} into the ground.'] }),
  spot(1, { timeTo90: 6, best: true }),
  spot(2, { ballast: null, timeTo90: null, why: 'No plan keeps every target.' }),
  spot(3, { strikes: true }),
  spot(4, { strikes: true, ballast: 0.38 }),
];
const study = { points, today: spot(2.5), complete: true };
const view = { scale: 100, originX: 50 };
const room = { top: 20, foot: 140 };
const page = layPlace(study, view, 4, room, 'metric');

test('stations lie where the side view has them; strips share the room from top to foot and do not touch', () => {
  expect(page.stations).toEqual([50, 150, 250, 350, 450]);
  expect([page.left, page.right, page.today]).toEqual([50, 450, 300]);
  expect(page.strips.map(({ curve }) => curve)).toEqual(CURVES);
  expect([page.strips[0]!.top, page.strips.at(-1)!.foot]).toEqual([20, 140]);
  page.strips.slice(1).forEach(({ top }, i) => {
    expect(top).toBeGreaterThan(page.strips[i]!.foot);
  });
});

test('lead and wire are one sum; its curve breaks where there is no plan, and goes on after', () => {
  const [strip] = page.strips;
  expect(strip!.runs.map((run) => run.map(({ x }) => x))).toEqual([
    [50, 150],
    [350, 450],
  ]);
  expect([strip!.low, strip!.high]).toEqual(['0', '400 g']);
  const share = (y: number) => (strip!.foot - y) / (strip!.foot - strip!.top);
  expect(share(strip!.heights[0]!)).toBeCloseTo(0.12 / 0.4, 12);
  expect(share(strip!.heights[4]!)).toBeCloseTo(1, 12);
  expect(strip!.heights[2]).toBeNull();
});

test('where the arm is nil the time has no end: it is drawn at the top, and the scale is of the rest', () => {
  const long = [3, 4, 900, 5, 3.5].map((timeTo90, i) => spot(i, { timeTo90 }));
  const [, strip] = layPlace({ ...study, points: long, today: null }, view, 4, room, 'metric').strips;
  expect([strip!.low, strip!.high]).toEqual(['0', '15 s +']);
  expect(strip!.heights[2]).toBe(strip!.top);
  expect(strip!.heights[3]!).toBeGreaterThan(strip!.top);
});

test('a propeller that strikes is hatched half-way to the stations where it does not', () => {
  expect(page.struck).toEqual([
    { left: 50, right: 100 },
    { left: 300, right: 450 },
  ]);
  expect(layPlace({ ...study, points: [spot(1)] }, view, 4, room, 'metric').struck).toEqual([]);
});

test('stations that nothing beats are told; what is not worked out yet is told apart from a gap', () => {
  expect(page.best).toEqual([1]);
  expect(page.waiting).toBeNull();
  const part = { points: points.slice(0, 2), today: null, complete: false };
  expect(layPlace(part, view, 4, room, 'metric')).toMatchObject({
    waiting: { left: 150, right: 450 },
    today: null,
  });
  expect(layPlace({ ...part, points: [] }, view, 4, room, 'metric').waiting).toEqual({
    left: 50,
    right: 450,
  });
});

test('whatever the values, a scale holds them all and its numbers are those of its ends', () => {
  const quantities = Object.keys(QUANTITIES) as Quantity[];
  fc.assert(
    fc.property(
      fc.array(fc.double({ min: -1e4, max: 1e4, noNaN: true }), { minLength: 1, maxLength: 8 }),
      fc.constantFrom(...quantities.filter((each) => each !== 'temperature')),
      fc.constantFrom('metric' as const, 'imperial' as const),
      (values, quantity, units) => {
        const { low, high, labels } = scaleOf(values, quantity, units);
        const slack = 1e-6 * (high - low);
        expect(high).toBeGreaterThan(low);
        expect(Math.min(...values)).toBeGreaterThanOrEqual(low - slack);
        expect(Math.max(...values)).toBeLessThanOrEqual(high + slack);
        expect(labels.low).not.toBe(labels.high.split(' ')[0]);
      },
    ),
  );
});

test.each([
  [[1, 2, 3], 'time', '0', '3 s'],
  [[1.02, 1.09], 'ratio', '1.00', '1.10'],
  [[0, 0], 'mass', '0.0', '0.5 g'],
  [[3.2], 'time', '3.0', '3.5 s'],
] as const)('%j as %s reads from %s to %s', (values, quantity, low, high) => {
  expect(scaleOf(values, quantity, 'metric').labels).toEqual({ low, high });
});

test('without a value a scale has no numbers', () => {
  expect(scaleOf([], 'time', 'metric').labels).toEqual({ low: '', high: 's' });
});

test('names stand fore of the nose and of every station where there is room, else above each curve', () => {
  expect(namesAt(study, { scale: 100, originX: 120 }, 90)).toBe('beside');
  expect(namesAt(study, { scale: 100, originX: 90 }, 90)).toBe('above');
  const ahead = { ...study, points: [spot(-0.5), ...points] };
  expect(namesAt(ahead, { scale: 100, originX: 120 }, 90)).toBe('above');
  const above = layPlace(study, view, 4, room, 'metric', 'above');
  above.strips.forEach(({ top, heights }, i) => {
    expect(top - NAME_LINE).toBeGreaterThanOrEqual(above.strips[i - 1]?.foot ?? room.top);
    for (const y of heights) if (y !== null) expect(y).toBeGreaterThanOrEqual(top);
  });
});

test('without a ballast plan every curve breaks, and a band of its own says so', () => {
  expect(page.unplanned).toEqual([{ left: 200, right: 300 }]);
  for (const { heights } of page.strips) expect(heights[2]).toBeNull();
  expect(layPlace({ ...study, points: [spot(1)] }, view, 4, room, 'metric').unplanned).toEqual([]);
});

test('a station in words: every figure, why there is none, and what the propeller strikes', () => {
  expect(curveWords(points[0]!, 'metric')).toEqual(['120.0 g', '3.0 s', '2.00 m/s', '1.100']);
  expect(besideWords(points[0]!, 'metric')).toBe('Station 0.000 m: radius 0.70 m, 1.1° nose-down in cruise.');
  expect(matterWords(points[0]!, 'metric')).toEqual(['The propeller reaches 30 mm into the ground.']);
  expect(stationSentence(points[2]!, 'metric')).toBe(
    'Station 2.000 m: radius 0.70 m, 1.1° nose-down in cruise. Lead and wire none, Time to 90° none, Side gust held 2.00 m/s, Thrust per watt 1.100. No plan keeps every target.',
  );
  expect(stationSentence(points[1]!, 'imperial')).toMatch(/4\.23 oz.*Nothing beats it\.$/);
});

test('with less room above the curves what is the matter stays longest', () => {
  const struck = spot(1, { cautions: ['It strikes the skin.', 'It strikes a mast.', 'It strikes a fin.'] });
  const choices = headWords(struck, 'Click moves it there.', 'metric');
  expect(choices[0]).toMatch(/radius.*skin.*mast.*fin.*Click/);
  expect(choices.at(-1)).toBe('Station 1.000 m. It strikes the skin. And 2 more.');
  const lengths = choices.map(({ length }) => length);
  expect(lengths).toEqual(lengths.toSorted((a, b) => b - a));
  expect(headWords(spot(1), '', 'metric').at(-1)).toBe(besideWords(spot(1), 'metric'));
});
