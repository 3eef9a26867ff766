/** Each sample does what its notes say: what is wrong with it, and that the cure named there cures it. */
import { expect, test } from 'vitest';
import type { Craft } from '../../src/craft/craft.ts';
import type { Place } from '../../src/craft/placeSchema.ts';
import type { Part } from '../../src/craft/schema.ts';
import { assess } from '../../src/report/assess.ts';
import { sampleCraft } from './readSamples.ts';

const degrees = 180 / Math.PI;
const value = (craft: Craft, key: string): number => assess(craft).rows[key]!.value!;
const missed = (craft: Craft): string[] =>
  assess(craft)
    .verdicts.filter(({ state }) => state === 'missed')
    .map(({ key }) => key);

const changed = (craft: Craft, id: string, change: Partial<Part>): Craft => ({
  ...craft,
  parts: { ...craft.parts, byId: { ...craft.parts.byId, [id]: { ...craft.parts.byId[id]!, ...change } } },
});

const moved = (craft: Craft, id: string, station: number): Craft => {
  const { place } = craft.parts.byId[id]!;
  return changed(craft, id, {
    place: place.kind === 'free' ? { ...place, x: station } : { ...place, station },
  });
};

const without = (craft: Craft, id: string): Craft => {
  const { [id]: _, ...byId } = craft.parts.byId;
  return { ...craft, parts: { byId, order: craft.parts.order.filter((each) => each !== id) } };
};

/** The craft with a weight at one of its hardpoints. */
function withLead(craft: Craft, mass: number, hardpoint: string): Craft {
  const lead: Part = {
    id: 'added-lead',
    kind: 'ballast',
    name: 'Lead',
    mass,
    massTolerance: 0,
    massSource: 'weighed',
    place: craft.hardpoints.byId[hardpoint]!.place,
    copies: { kind: 'together', count: 1 },
    size: { length: 0.02, width: 0.02, height: 0.01 },
    cgOffset: 0,
    locked: false,
    slide: null,
    thruster: null,
    fin: null,
    dragArea: null,
    notes: '',
  };
  return {
    ...craft,
    parts: { byId: { ...craft.parts.byId, [lead.id]: lead }, order: [...craft.parts.order, lead.id] },
  };
}

const keel = (station: number, drop: number): Place => ({ kind: 'keel', station, drop });

const museum = sampleCraft('museum-atrium');

test('the museum craft is tail-heavy by some degrees and light, and upright and even', () => {
  expect(missed(museum)).toEqual(['floats', 'level']);
  expect(value(museum, 'float.pitch') * degrees).toBeGreaterThan(10);
  expect(value(museum, 'float.pitch') * degrees).toBeLessThan(20);
});

test('some 150 g of lead at its nose level it and use up the lift left over', () => {
  const lead = value(museum, 'lead.mass');
  expect(lead).toBeGreaterThan(0.13);
  expect(lead).toBeLessThan(0.18);
  expect(lead).toBeLessThan(value(museum, 'lift.left'));
  const cured = withLead(museum, lead, 'nose');
  expect(Math.abs(value(cured, 'float.pitch'))).toBeLessThan(1e-9);
  expect(assess(cured).met).toBe(true);
});

test('or its battery slides forward, still on its rail', () => {
  const said = Number(/slide Battery forward to ([\d.]+) m/.exec(assess(museum).headline)![1]);
  const rail = museum.parts.byId['battery-rail']!;
  const fore = (rail.place as { station: number }).station - rail.size.length / 2;
  expect(said).toBeGreaterThan(fore);
  expect(Math.abs(value(moved(museum, 'battery', said), 'float.pitch') * degrees)).toBeLessThan(0.1);
});

const warehouse = sampleCraft('warehouse-stock');

test('the warehouse craft leans to starboard, where its reader looks, and nothing else is wrong with it', () => {
  expect(missed(warehouse)).toEqual(['even']);
  expect(value(warehouse, 'float.heel') * degrees).toBeGreaterThan(2);
  expect(value(changed(warehouse, 'reader', { mass: 0 }), 'float.heel') * degrees).toBeLessThan(1);
});

test('a little lead at its port side brings it even', () => {
  expect(assess(withLead(warehouse, 0.015, 'port')).met).toBe(true);
});

test('the battery to port does it without lead', () => {
  const { place } = warehouse.parts.byId.battery!;
  const station = (place as { station: number }).station;
  const port = changed(warehouse, 'battery', { place: { kind: 'free', x: station, y: -0.08, z: -0.45 } });
  expect(missed(port)).not.toContain('even');
});

const survey = sampleCraft('survey-6m');

test('the survey craft is too heavy for the warm day at its elevation, and in trim', () => {
  expect(missed(survey)).toEqual(['floats']);
  expect(value(survey, 'heaviness')).toBeGreaterThan(survey.targets.heaviness.most);
  expect(Math.abs(value(survey, 'float.pitch') * degrees)).toBeLessThan(2);
});

test('without its water bag it flies', () => {
  expect(assess(without(survey, 'water')).met).toBe(true);
});

test('on a cold morning of high pressure it carries the bag', () => {
  const cold: Craft = {
    ...survey,
    day: { kind: 'qnh', temperature: 281.15, qnh: 103_000, elevation: 480, humidity: 0.7 },
  };
  expect(value(cold, 'heaviness')).toBeLessThan(survey.targets.heaviness.most);
});

test('the micro craft weighs less than 100 g and meets all its targets', () => {
  const micro = sampleCraft('micro-round');
  expect(value(micro, 'mass.solid')).toBeLessThan(0.1);
  expect(assess(micro).met).toBe(true);
});

const trainer = sampleCraft('gore-trainer');

test('the training craft hangs its nose, and lead on the nose is refused with what would help', () => {
  expect(missed(trainer)).toEqual(['level', 'lead']);
  const row = assess(trainer).rows['lead.mass']!;
  expect(row.status).toBe('infeasible');
  expect(row.why).toMatch(/nose-heavy by .* forward of the CB/);
});

test('its battery moved aft to where the headline says cures it', () => {
  const said = Number(/slide Battery aft to ([\d.]+) m/.exec(assess(trainer).headline)![1]);
  expect(assess(moved(trainer, 'battery', said)).met).toBe(true);
});

test('so does lead at the tail', () => {
  const atTail: Craft = { ...trainer, leadAt: 'tail' };
  expect(assess(withLead(trainer, value(atTail, 'lead.mass'), 'tail')).met).toBe(true);
});

const advert = sampleCraft('two-sheet-advert');

test('the advertising craft is light on purpose and pulls up on its string', () => {
  expect(missed(advert)).toEqual(['level']);
  expect(value(advert, 'support.load')).toBeCloseTo(value(advert, 'heaviness'), 12);
  expect(value(advert, 'support.load')).toBeLessThan(-0.1);
});

test('a few grams at its tail level it untied', () => {
  const lead = value(advert, 'lead.mass');
  expect(lead).toBeLessThan(0.005);
  expect(assess(withLead(advert, lead, 'tail')).met).toBe(true);
});

const sampler = sampleCraft('glasshouse-sampler');

test('the glasshouse craft is tender: everything is met but the depth of its pendulum', () => {
  expect(missed(sampler)).toEqual(['upright']);
  expect(value(sampler, 'float.pendulumDepth')).toBeGreaterThan(0);
});

test('with the sampler under the keel instead of on the top it is not', () => {
  expect(missed(changed(sampler, 'sampler', { place: keel(1.22, 0.02) }))).toEqual([]);
});

test('the school craft meets all its targets, and taking its nose lead away undoes that', () => {
  const school = sampleCraft('school-cylinder');
  expect(assess(school).met).toBe(true);
  expect(missed(without(school, 'nose-lead'))).toEqual(expect.arrayContaining(['floats', 'level']));
});

const secondHand = sampleCraft('second-hand-hull');

test('the second-hand hull is too heavy for its stale helium, and somewhat tail-heavy', () => {
  expect(missed(secondHand)).toEqual(['floats', 'level', 'lead']);
  expect(value(secondHand, 'heaviness')).toBeGreaterThan(0);
});

test('fresh helium carries it, and the battery slid forward levels it', () => {
  const fresh: Craft = { ...secondHand, gas: { ...secondHand.gas, purity: 0.985 } };
  expect(missed(fresh)).not.toContain('floats');
  const said = Number(/slide Battery forward to ([\d.]+) m/.exec(assess(fresh).headline)![1]);
  expect(assess(moved(fresh, 'battery', said)).met).toBe(true);
});
