import { expect, test } from 'vitest';
import { assess } from '../../src/report/assess.ts';
import { sampleCraft, sampleJson, samples, sampleText } from '../samples/readSamples.ts';
import { heard } from './terminal.ts';

const files = Object.fromEntries(samples.map(({ name, text }) => [name, text]));
const balance = (name: string, ...options: string[]) => heard(['balance', name, ...options], files);
const names = samples.map(({ name }) => ({ name }));

/** The rows that scripts may count on. */
const KEYS = [
  'hull.volume',
  'hull.area',
  'hull.cbStation',
  'hull.skinMass',
  'air.density',
  'gas.density',
  'lift.gross',
  'mass.solid',
  'cg.station',
  'cg.side',
  'cg.height',
  'float.pitch',
  'float.heel',
  'float.pendulumDepth',
  'float.swingPeriod',
  'heaviness',
  'lead.mass',
  'lead.station',
  'lead.heavinessAfter',
  'oneWeight.mass',
  'oneWeight.station',
];

test.each(names)('$name as JSON: one object of rows, in SI, as the report has them', ({ name }) => {
  const { out, errors } = balance(name, '--json');
  expect(errors).toEqual([]);
  const json = JSON.parse(out);
  expect(Object.keys(json)).toEqual(['rows']);
  expect(Object.keys(json.rows)).toEqual(expect.arrayContaining(KEYS));
  const { rows } = assess(sampleCraft(name));
  for (const [key, row] of Object.entries(rows)) {
    const { value, unit, uncertainty, status, why, ...rest } = json.rows[key];
    expect(rest).toEqual({});
    expect({ value, unit, uncertainty, status, why }).toEqual({
      value: row.value === 0 ? 0 : row.value,
      unit: row.unit,
      uncertainty: row.uncertainty,
      status: row.status,
      why: row.why,
    });
  }
});

test.each(names)('$name exits 0 when it meets its targets, else 1', ({ name }) => {
  const expected = assess(sampleCraft(name)).met ? 0 : 1;
  expect(balance(name).code).toBe(expected);
  expect(balance(name, '--json').code).toBe(expected);
});

test.each(names)('$name to read: 80 columns, no stray spaces, minus as a hyphen, no NaN', ({ name }) => {
  for (const units of ['metric', 'imperial']) {
    const { out } = balance(name, '--units', units);
    for (const line of out.split('\n')) {
      expect([...line].length, line).toBeLessThanOrEqual(80);
      expect(line).toBe(line.trimEnd());
    }
    expect(out).not.toMatch(/\u2212|NaN|Infinity|undefined|null/);
  }
});

test('the report opens with name and headline and has verdicts, figures, beam and cautions', () => {
  const { out } = balance('museum-atrium');
  const unfolded = out.replace(/\s+/g, ' ');
  expect(out.startsWith('Museum atrium camera craft\nTail-heavy: floats')).toBe(true);
  expect(unfolded).toContain(assess(sampleCraft('museum-atrium')).headline);
  for (const title of [
    'Verdicts',
    'Hull',
    'Air, gas and mass',
    'Floating free',
    'Lead',
    'Beam: ',
    'Cautions',
  ]) {
    expect(out).toMatch(new RegExp(`^${title}`, 'm'));
  }
  expect(out).toMatch(/^ {2}missed {2}Level +tail-heavy +15\.\d+° ± 0\.\d+° nose-up$/m);
  expect(out).toMatch(/^ {2}Solid mass +3155 ± 50 g$/m);
});

test('every row of the report has its line', () => {
  const { out } = balance('museum-atrium');
  for (const { label } of Object.values(assess(sampleCraft('museum-atrium')).rows))
    expect(out).toContain(`  ${label} `);
});

test('the beam lists what weighs, the longest moment first, and its lead answers the sum', () => {
  const { out } = balance('worked-example');
  const table = out
    .split('\n\n')
    .find((block) => block.startsWith('Beam'))!
    .split('\n')
    .slice(2);
  expect(table.map((line) => line.slice(2, 27).trim())).toEqual([
    'Tail thruster',
    'Fins',
    'Battery',
    'Gondola',
    'Film 45 g/m²',
    'Sum',
    'Lead: Nose',
  ]);
  const moments = table.map((line) => Number(/(-?[\d.]+) g·m/.exec(line)![1]));
  expect(moments).toEqual([161.7, 107.52, -34.4, -7, 0, 227.82, -227.82]);
  expect(table[0]).toMatch(/\|#+$/);
  expect(table.at(-1)).toMatch(/#########\|$/);
});

test('imperial changes the figures shown', () => {
  const { out } = balance('worked-example', '--units', 'imperial');
  expect(out).toMatch(/Length +118\.11 in$/m);
  expect(out).toMatch(/Lead to level exactly +5\.54 oz$/m);
});

test('imperial with --json leaves every value in SI', () => {
  const plain = JSON.parse(balance('worked-example', '--json').out).rows;
  const imperial = JSON.parse(balance('worked-example', '--json', '--units', 'imperial').out).rows;
  for (const [key, row] of Object.entries<{ value: number }>(plain))
    expect(imperial[key].value).toBe(row.value);
});

test('cautions stand for what is on board', () => {
  const onBoard = balance('museum-atrium').out.replace(/\s+/g, ' ');
  for (const caution of ['Helium displaces', 'propeller cuts', 'Lithium cells burn'])
    expect(onBoard).toContain(caution);
  expect(balance('survey-6m').out.replace(/\s+/g, ' ')).toContain('in the sun gains pressure');
  const bare = {
    ...sampleJson('worked-example'),
    parts: [],
    gas: { lifting: 'hydrogen', purity: 0.99, superheat: 0, gaugePressure: 0 },
  };
  const { out } = heard(['balance', 'bare'], { bare: JSON.stringify(bare) });
  expect(out).toContain('Hydrogen burns');
  expect(out).not.toMatch(/Lithium|propeller|Helium/);
});

test('a sentence is told once: what fails for the same reason says so', () => {
  const { out } = balance('gore-trainer');
  const figures = out.slice(out.indexOf('\nHull\n')).replace(/\s+/g, ' ');
  expect(figures.match(/weight there makes it worse/g)).toHaveLength(1);
  expect(figures).toContain('Heaviness with the lead none, as above');
});

test('names cannot steer the terminal, break lines or widen the page', () => {
  const file = sampleJson('worked-example');
  file.name = `A\u001b[31m${'x'.repeat(100)}`;
  file.parts[0].name = `\u0007Two\nlines ${'y'.repeat(150)}`;
  const { out, errors } = heard(['balance', 'odd'], { odd: JSON.stringify(file) });
  expect(errors).toEqual([]);
  // biome-ignore lint/suspicious/noControlCharactersInRegex: that there are none is the point
  expect(out).not.toMatch(/[\u0000-\u0009\u000b-\u001f\u007f]/);
  for (const line of out.split('\n')) expect([...line].length).toBeLessThanOrEqual(80);
});

test('a broken file is exit 2, a line a problem, nothing on standard output', () => {
  const file = sampleJson('worked-example');
  file.parts[1].mass = 'heavy';
  file.gas.purity = 7;
  file['od\nd'] = 1;
  const { code, out, errors } = heard(['balance', 'bad.json', '--json'], {
    'bad.json': JSON.stringify(file),
  });
  expect({ code, out }).toEqual({ code: 2, out: '' });
  expect(errors).toEqual([
    'bad.json: gas.purity: found 7; allowed: at most 1',
    'bad.json: parts[1].mass (“Fins”): found "heavy"; allowed: a finite number',
    expect.stringMatching(/^bad\.json: od d: found an unknown field/),
  ]);
});

test('a hull that cannot be formed is exit 2 with the sentence that says why', () => {
  const file = sampleJson('second-hand-hull');
  file.hull.shape.rows[4].at = 0.1;
  const { code, out, errors } = heard(['balance', 'bad.json'], { 'bad.json': JSON.stringify(file) });
  expect({ code, out }).toEqual({ code: 2, out: '' });
  expect(errors).toHaveLength(1);
  expect(errors[0]).toMatch(
    /^bad\.json: hull\.shape: Row 5 stands at tape distance 0\.100 m, not beyond row 4/,
  );
});

test('"-" is standard input, and is called so', () => {
  expect(heard(['balance', '-'], { '-': sampleText('micro-round') }).code).toBe(0);
  expect(heard(['balance', '-'], { '-': '{' }).errors[0]).toMatch(
    /^standard input: file: found text that is not JSON/,
  );
});
