import Papa from 'papaparse';
import { expect, test } from 'vitest';
import { stowed } from '../../../src/craft/stowage.ts';
import { planOf } from '../../../src/physics/ballast/plan.ts';
import { heldAt } from '../../../src/physics/placing/moved.ts';
import type { PlacedPoint } from '../../../src/physics/placing/placedPoint.ts';
import type { PlacementStudy } from '../../../src/physics/placing/study.ts';
import { planSteps } from '../../../src/report/planWords.ts';
import { placeCsv } from '../../../src/report/turning/placeCsv.ts';
import { PLACE_FIGURES } from '../../../src/report/turning/placeFigures.ts';
import { placeJson } from '../../../src/report/turning/placeJson.ts';
import { placeReport } from '../../../src/report/turning/placeReport.ts';
import { bestOfRuns } from '../../../src/report/turning/placeRuns.ts';
import { stowageSteps } from '../../../src/report/turning/placeSteps.ts';
import { matterOf, stretchesOf, toldPlace } from '../../../src/report/turning/placeWords.ts';
import { inUnits } from '../../../src/units/sentence.ts';
import { placingCraft, solver, studyOf } from '../../physics/placing/placingCrafts.ts';

const craft = placingCraft({ part: { name: 'Tail motor' } });

const point = (station: number, change: Partial<PlacedPoint> = {}): PlacedPoint => ({
  station,
  place: { kind: 'axis', station },
  ballast: 0.1,
  ballastProven: true,
  stowage: { weights: [], slides: [], loads: [] },
  why: '',
  wire: 0.02,
  wireChange: 0,
  arm: 1,
  timeTo90: 4,
  radius: 0.5,
  gustHeld: 1,
  inflowRatio: 1,
  perWatt: 1,
  cruisePitch: 0,
  cautions: [],
  strikes: false,
  best: false,
  ...change,
});

const tail = point(3.9, { ballast: 0.196, wire: 0.028, timeTo90: 3.1, gustHeld: 2.4, best: true });
const middle = point(1.9, { timeTo90: 9 });
const studyWith = (points: readonly PlacedPoint[], today: PlacedPoint): PlacementStudy => ({
  part: 'thruster',
  points,
  today,
  complete: true,
});
const headline = (study: PlacementStudy, of = craft) => placeReport(of, study).headline;

test('the headline weighs the quickest of the best against where it is', () => {
  expect(headline(studyWith([middle, point(3, { best: true, timeTo90: 5 }), tail], middle))).toBe(
    'In the tail at 3.900 m: 90° in 3.1 s, holds 2.40 m/s from the side; costs 96.0 g of lead and 8.0 g of wire more than at 1.900 m, where it is now and takes 9.0 s.',
  );
  expect(headline(studyWith([middle, tail], { ...tail }))).toBe(
    'In the tail at 3.900 m, where it is now: 90° in 3.1 s, holds 2.40 m/s from the side.',
  );
  const cheap = point(2, { best: true, ballast: 0, wire: 0.008, timeTo90: 9 });
  expect(headline(studyWith([cheap, tail], { ...tail }))).toBe(
    'In the tail at 3.900 m, where it is now: 90° in 3.1 s, holds 2.40 m/s from the side; costs 196.0 g of lead and 20.0 g of wire more than at 2.000 m, where it takes 9.0 s.',
  );
});

test.each([
  [{ ballast: 0.05, wire: 0.01 }, 'costs 50.0 g of lead and 10.0 g of wire less than at 1.900 m'],
  [{ ballast: 0.13, wire: 0.01 }, 'costs 30.0 g of lead more and 10.0 g of wire less than at 1.900 m'],
  [{}, 'costs no lead or wire more than at 1.900 m'],
])('what it costs: %j', (change, words) => {
  const study = studyWith([point(0.2, { best: true, timeTo90: 3, ...change })], middle);
  expect(headline(study)).toContain(
    `In the nose at 0.200 m: 90° in 3.0 s, holds 1.00 m/s from the side; ${words}`,
  );
});

test('once it has been moved, that is where it was', () => {
  const told = (today: PlacedPoint) =>
    placeReport(craft, studyWith([middle, tail], today), 'metric', true).headline;
  expect(told(middle)).toMatch(/than at 1\.900 m, where it was and takes 9\.0 s\.$/);
  expect(told({ ...tail })).toMatch(/^In the tail at 3\.900 m, where it was: /);
});

test('where today is as good as the model can tell, staying leads', () => {
  const today = { ...tail, station: 3.8, ballast: 0.197, timeTo90: 3.17 };
  expect(headline(studyWith([middle, tail], today))).toBe(
    'Staying at 3.800 m is as good as moving to 3.900 m: 90° in 3.2 s, holds 2.40 m/s from the side.',
  );
  expect(toldPlace(studyWith([tail], today), craft.targets)).toBe(today);
  const slower = { ...today, timeTo90: 3.3 };
  expect(toldPlace(studyWith([tail], slower), craft.targets)).toBe(tail);
  expect(toldPlace(studyWith([tail], { ...today, strikes: true }), craft.targets)).toBe(tail);
  expect(headline(studyWith([middle], { ...today, best: true }))).toMatch(
    /^In the tail at 3.800 m, where it is now/,
  );
});

test('of neighbours that cannot be told apart a table has the best, and the one told of', () => {
  const at = (station: number, timeTo90: number, best = true) => point(station, { timeTo90, best });
  const points = [
    at(1, 4),
    at(1.1, 3.95),
    at(1.2, 4),
    at(1.3, 3.5),
    at(1.4, 3.5, false),
    at(1.5, 3.5),
    at(1.6, 3.45),
  ];
  const shown = (told: number | null, today = middle) =>
    bestOfRuns({ points, today }, told).map(({ station }) => station);
  expect(shown(null)).toEqual([1.1, 1.3, 1.6]);
  expect(shown(1.2)).toEqual([1.2, 1.3, 1.6]);
  expect(shown(null, at(1.3, 3.5))).toEqual([1.1, 1.6]);
  // A slope that falls by less than can be told from one to the next is no one run.
  const slope = Array.from({ length: 9 }, (_, i) => at(i, 4 * 0.98 ** i));
  expect(bestOfRuns({ points: slope, today: middle }, null).length).toBeGreaterThan(3);
});

test('what carrying a plan out changes is told in the words of the Plan tab', () => {
  const { points } = studyOf(craft, { stations: 2 });
  const { place, stowage } = points.at(-1)!;
  const plan = planOf(heldAt(craft, craft.parts.byId.thruster!, place), solver, { explain: false });
  if ('why' in plan) throw new Error(plan.why);
  const read = planSteps(craft, plan).map((each) => inUnits(each, 'metric'));
  expect(stowageSteps(craft, stowage!, 'metric')).toEqual(read);
  expect(read[0]).toMatch(/^hang [\d.]+ g at the nose$/);
  const done = stowed(craft, stowage!);
  expect(stowageSteps(done, stowage!, 'metric')).toEqual([]);
});

test('where today stands ill it says so', () => {
  const best = point(2, { best: true });
  expect(headline(studyWith([best], point(1.9, { ballast: null, why: 'None.' })))).toMatch(
    /side; at 1\.900 m, where it is now, no ballast plan can be made\.$/,
  );
  expect(headline(studyWith([best], point(1.9, { strikes: true })))).toMatch(
    /than at 1\.900 m, where it is now and the propeller has no room\.$/,
  );
  expect(headline(studyWith([middle], middle))).toBe(
    'At no station is there both a ballast plan and room for the propeller.',
  );
});

test('where turning targets are set, the cheapest of the best that meets them is told of, else the quickest', () => {
  const cheap = point(2, { best: true, ballast: 0, timeTo90: 6 });
  const between = point(3, { best: true, ballast: 0.1, timeTo90: 4 });
  const study = studyWith([cheap, between, tail], middle);
  const told = (turnTime: number | null, sideGust: number | null = null) =>
    toldPlace(study, { ...craft.targets, turnTime, sideGust });
  expect(told(null)).toBe(tail);
  expect(told(7)).toBe(cheap);
  expect(told(5)).toBe(between);
  expect(told(7, 2)).toBe(tail);
  expect(told(1)).toBe(tail);
  const straight = [tail, cheap].map((each) => ({ ...each, timeTo90: null }));
  expect(toldPlace(studyWith(straight, middle), craft.targets)).toBe(straight[1]);
});

test('obstacles are told by the stations where they are', () => {
  const skin = {
    strikes: true,
    cautions: ['The propeller would strike the skin: it reaches {0.1 length} into it.'],
  };
  const points = [point(0, skin), point(1, skin), point(2), point(3, skin), point(4, { why: 'No plan.' })];
  const stretches = stretchesOf(points, ({ cautions }) => cautions.map(matterOf));
  expect(stretches.map((each) => inUnits(each, 'metric'))).toEqual([
    'The propeller would strike the skin: 0.000 m to 1.000 m and at 3.000 m.',
  ]);
  const { obstacles } = placeReport(craft, studyWith(points, middle));
  expect(obstacles).toEqual(['No plan: at 4.000 m.', ...stretches.map((each) => inUnits(each, 'metric'))]);
  expect(placeReport(craft, studyWith(points, middle), 'imperial').obstacles[1]).toContain('39.37 in');
});

test('what is the matter is told without by how much, whatever the name of a part', () => {
  expect(matterOf('The propeller would strike the 1.5 V cell.')).toBe(
    'The propeller would strike the 1.5 V cell',
  );
  expect(matterOf('It stands beyond the tail: by {0.1 length}, on a mount.')).toBe(
    'It stands beyond the tail',
  );
});

const study = studyOf(craft, { stations: 9 });

test('JSON has every point with the fields of the study, in SI, and no quantities left unread', () => {
  const text = JSON.stringify(placeJson(craft, study));
  const { place } = JSON.parse(text);
  expect(place).toMatchObject({ part: 'thruster', name: 'Tail motor', complete: true });
  expect(place.points).toHaveLength(9);
  for (const [i, read] of place.points.entries()) {
    const { stowage: _, cautions: __, why: ___, ...figures } = study.points[i]!;
    expect(read).toMatchObject(figures);
  }
  expect(place.today.station).toBe(4.2);
  expect(text).not.toMatch(/\{-?[\d.]/);
});

test('CSV read back by a library has the same figures, units in the heads', () => {
  const { data, errors, meta } = Papa.parse<Record<string, string>>(placeCsv(study.points).trimEnd(), {
    header: true,
  });
  expect(errors).toEqual([]);
  expect(meta.fields).toEqual(
    expect.arrayContaining([
      'station m',
      'ballast kg',
      'timeTo90 s',
      'gustHeld m/s',
      'perWatt',
      'cruisePitch rad',
    ]),
  );
  expect(data).toHaveLength(9);
  data.forEach((row, i) => {
    const read = study.points[i]!;
    for (const { key } of PLACE_FIGURES) {
      const cell = row[meta.fields!.find((field) => field.split(' ')[0] === key)!]!;
      expect(cell === '' ? null : Number(cell)).toBe(read[key]);
    }
    expect(row.best).toBe(read.best ? 'yes' : 'no');
    expect(row.cautions).toBe(read.cautions.map((caution) => inUnits(caution, 'metric')).join(' '));
  });
});

test('the notes say what a station below the keel is, and that a study was stopped', () => {
  const { notes, cautions } = placeReport(craft, { ...study, complete: false });
  expect(notes[0]).toMatch(/stopped before the last station/);
  expect(notes.some((note) => note.includes('below the keel'))).toBe(true);
  expect(cautions.some((caution) => caution.includes('propeller'))).toBe(true);
});
