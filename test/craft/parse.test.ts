import { expect, test } from 'vitest';
import { parse } from '../../src/craft/parse.ts';
import { sampleJson, samples, sampleText } from '../samples/readSamples.ts';

const problemsIn = (text: string) => {
  const parsed = parse(text);
  return parsed.ok ? [] : parsed.problems;
};

/** A sample with a change, and the problems that come of it. */
// biome-ignore lint/suspicious/noExplicitAny: the change makes the file wrong on purpose
const problemsAfter = (change: (file: any) => void) => {
  const file = sampleJson('worked-example');
  change(file);
  return problemsIn(JSON.stringify(file));
};

/** A sample with one field's text replaced, for what JSON.stringify will not write. */
const problemsWithText = (from: string, to: string) => {
  const text = sampleText('worked-example');
  expect(text).toContain(from);
  return problemsIn(text.replace(from, to));
};

test.each(samples)('$name is a craft', ({ text }) => {
  expect(problemsIn(text)).toEqual([]);
});

test.each(['', ' ', '{', '[1, 2', 'nul', '{"steelyard": 1,}', '\u0000'])('%j is not JSON', (text) => {
  expect(problemsIn(text)).toEqual([
    { path: '', found: expect.stringMatching(/^text that is not JSON/), allowed: 'a craft file in JSON' },
  ]);
});

test.each([
  ['null', 'null'],
  ['[]', 'a list of 0'],
  ['7', '7'],
  ['"craft"', '"craft"'],
])('%s is JSON, but no object', (text, found) => {
  expect(problemsIn(text)).toEqual([
    { path: '', found, allowed: 'an object with the fields of a craft file' },
  ]);
});

test('an unknown field is named by its path, wherever it stands', () => {
  const problems = problemsAfter((file) => {
    file.colour = 'red';
    file.hull.shape.wings = 2;
    file.parts[1].place.tilt = 3;
  });
  expect(problems.map(({ path }) => path).sort()).toEqual([
    'colour',
    'hull.shape.wings',
    'parts[1].place.tilt',
  ]);
  expect(problems[0]!.found).toMatch(/^an unknown field/);
});

test('a field that is absent is found as nothing', () => {
  const problems = problemsAfter((file) => {
    delete file.parts[2].mass;
    delete file.targets;
  });
  expect(problems).toEqual([
    { name: 'Gondola', path: 'parts[2].mass', found: 'nothing', allowed: 'a finite number' },
    { path: 'targets', found: 'nothing', allowed: 'an object with its fields' },
  ]);
});

test('each wrong type is named with what was found and what is allowed', () => {
  const problems = problemsAfter((file) => {
    file.name = 7;
    file.parts[0].mass = '110 g';
    file.parts[0].locked = 'no';
    file.parts[1].size = null;
    file.wires = { run: 1 };
    file.hull.seams.count = 2.5;
  });
  expect(problems).toEqual([
    { path: 'name', found: '7', allowed: 'text' },
    { path: 'hull.seams.count', found: '2.5', allowed: 'a whole number' },
    { name: 'Tail thruster', path: 'parts[0].mass', found: '"110 g"', allowed: 'a finite number' },
    { name: 'Tail thruster', path: 'parts[0].locked', found: '"no"', allowed: 'true or false' },
    { name: 'Fins', path: 'parts[1].size', found: 'null', allowed: 'an object with its fields' },
    { path: 'wires', found: 'an object with run', allowed: 'a list' },
  ]);
});

test.each(['NaN', 'Infinity', '-Infinity', 'undefined', '01', '+1', '0x10'])(
  '%s is not even JSON',
  (token) => {
    expect(problemsWithText('"mass": 0.11', `"mass": ${token}`)[0]!.found).toMatch(/^text that is not JSON/);
  },
);

test.each(['1e999', '-1e999'])('%s, which JSON reads as infinite, is refused', (token) => {
  const [problem] = problemsWithText('"mass": 0.11', `"mass": ${token}`);
  expect(problem!.path).toBe('parts[0].mass');
  expect(problem!.found).toBe(token.startsWith('-') ? '-Infinity' : 'Infinity');
  expect(problem!.allowed).toMatch(/finite number|at most|at least/);
});

test('numbers out of range are named with the bound', () => {
  const problems = problemsAfter((file) => {
    file.hull.shape.length = 0.01;
    file.hull.shape.diameter = 51;
    file.parts[0].mass = -0.001;
    file.gas.purity = 1.5;
  });
  expect(problems.map(({ path, allowed }) => [path, allowed])).toEqual([
    ['hull.shape.length', 'at least 0.05'],
    ['hull.shape.diameter', 'at most 50'],
    ['gas.purity', 'at most 1'],
    ['parts[0].mass', 'at least 0'],
  ]);
});

test.each([
  [
    'hull.shape.kind',
    /spheroid.*twoSpheroid.*roundTwoSheet/,
    (file: Kinds) => (file.hull.shape.kind = 'egg'),
  ],
  ['day.kind', /measured, qnh, standard/, (file: Kinds) => (file.day.kind = 'rainy')],
  ['parts[0].place.kind', /skin, keel, axis, free/, (file: Kinds) => (file.parts[0]!.place.kind = 'floor')],
  ['parts[0].copies.kind', /together, pair, ring/, (file: Kinds) => (file.parts[0]!.copies.kind = 'many')],
])('an unknown %s is answered with the kinds there are', (path, allowed, change) => {
  const problems = problemsAfter(change);
  expect(problems).toHaveLength(1);
  expect(problems[0]!.path).toBe(path);
  expect(problems[0]!.allowed).toMatch(allowed);
});

interface Kinds {
  hull: { shape: { kind: string } };
  day: { kind: string };
  parts: { place: { kind: string }; copies: { kind: string } }[];
}

test('an id that stands twice is named with where it stood first', () => {
  const problems = problemsAfter((file) => {
    file.parts[3].id = file.parts[0].id;
    file.hardpoints.push({ ...file.hardpoints[0] });
  });
  expect(problems).toEqual([
    {
      name: 'Battery',
      path: 'parts[3].id',
      found: '"tail-thruster"',
      allowed: 'an id of its own (parts[0] has this one)',
    },
    {
      name: 'Nose',
      path: 'hardpoints[1].id',
      found: '"nose"',
      allowed: 'an id of its own (hardpoints[0] has this one)',
    },
  ]);
});

test('ids that nothing has are named with those there are', () => {
  const wire = {
    id: 'run',
    name: '',
    from: { kind: 'part', part: 'nobody' },
    to: { kind: 'part', part: 'battery' },
    path: { kind: 'straight' },
    massPerMetre: 0.01,
    conductors: 1,
    slack: 0,
    notes: '',
  };
  const problems = problemsAfter((file) => {
    file.wires = [wire];
    file.leadAt = 'chin';
  });
  expect(problems).toEqual([
    {
      path: 'wires[0].from.part',
      found: '"nobody"',
      allowed: 'the id of a part in this file (tail-thruster, fins, gondola, battery)',
    },
    { path: 'leadAt', found: '"chin"', allowed: 'the id of a hardpoint in this file (nose)' },
  ]);
});

test.each(['__proto__', 'Nose', '7up', '-', '', 'a b', 'é', 'x'.repeat(49)])('%j is no id', (id) => {
  const [problem] = problemsAfter((file) => {
    file.parts[0].id = id;
  });
  expect(problem!.path).toBe('parts[0].id');
  expect(problem!.allowed).toMatch(/^lower-case letters, digits and hyphens/);
});

test.each(['constructor', 'prototype', 'valueof', 'hasownproperty'])(
  '%s is an id like any other and takes nothing over',
  (id) => {
    const file = sampleJson('worked-example');
    file.parts[0].id = id;
    const parsed = parse(JSON.stringify(file));
    if (!parsed.ok) throw new Error(parsed.problems[0]!.path);
    expect(parsed.craft.parts.order[0]).toBe(id);
    expect(Object.hasOwn(parsed.craft.parts.byId, id)).toBe(true);
    expect(parsed.craft.parts.byId[id]!.mass).toBe(0.11);
  },
);

test.each(['constructor', 'tostring'])('a reference to %s, which no part has, dangles', (id) => {
  const [problem] = problemsAfter((file) => {
    file.leadAt = id;
  });
  expect(problem!.path).toBe('leadAt');
});

test('a field named __proto__ is an unknown field and changes no prototype', () => {
  const text = sampleText('worked-example').replace(
    '"notes":',
    '"__proto__": { "polluted": true }, "notes":',
  );
  const problems = problemsIn(text);
  expect(problems.map(({ path }) => path)).toEqual(['__proto__']);
  expect('polluted' in {}).toBe(false);
});

test('lists longer than the program goes are refused, and only a hundred problems are told', () => {
  const [problem] = problemsAfter((file) => {
    file.parts = Array.from({ length: 2001 }, (_, i) => ({ ...file.parts[0], id: `p${i}` }));
  });
  expect(problem).toEqual({ path: 'parts', found: 'a list of 2001', allowed: 'at most 2000 entries' });
  const many = problemsAfter((file) => {
    file.parts = Array.from({ length: 2000 }, () => ({ ...file.parts[0] }));
  });
  expect(many).toHaveLength(101);
  expect(many.at(-1)!.found).toBe('1899 more problems');
});

test('text past the greatest size is refused unread', () => {
  expect(problemsIn(' '.repeat(8_000_001))[0]!.found).toBe('8000001 characters');
});

test('lists nested past any stack are answered, not thrown at', () => {
  const depth = 100_000;
  expect(problemsIn('['.repeat(depth) + ']'.repeat(depth))).toHaveLength(1);
  expect(
    problemsWithText('"notes": "A', `"deep": ${'['.repeat(depth)}${']'.repeat(depth)}, "notes": "A`),
  ).toEqual([expect.objectContaining({ path: 'deep' })]);
});

test('a band of heaviness the wrong way round is named', () => {
  const [problem] = problemsAfter((file) => {
    file.targets.heaviness = { least: 0.1, most: -0.1 };
  });
  expect(problem).toEqual({
    path: 'targets.heaviness.least',
    found: '0.1 kg',
    allowed: 'at most targets.heaviness.most (-0.1 kg)',
  });
});

test('a field that is missing and may be null says so; one that may not does not', () => {
  const problems = problemsAfter((file) => {
    delete file.parts[0].thruster;
    delete file.parts[1].mass;
  });
  expect(problems.map(({ path, allowed }) => [path, allowed])).toEqual([
    ['parts[0].thruster', 'an object with its fields, or null'],
    ['parts[1].mass', 'a finite number'],
  ]);
});
