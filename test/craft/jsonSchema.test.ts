import { readFileSync } from 'node:fs';
import Ajv2020 from 'ajv/dist/2020.js';
import { expect, test } from 'vitest';
import { craftJsonSchema, craftJsonSchemaText } from '../../src/craft/jsonSchema.ts';
import { craftFileSchema } from '../../src/craft/schema.ts';
import { samples, sampleText } from '../samples/readSamples.ts';
import { damagedJson, seeded } from './mutator.ts';

const file = new URL('../../src/craft/craft.schema.json', import.meta.url);

/** ajv is a JSON Schema validator of its own, so that the published schema is read by somebody else than zod. */
const ajv = new Ajv2020({ allErrors: false });
ajv.addKeyword('unit');
const accepts = ajv.compile(craftJsonSchema());

interface SchemaNode {
  readonly type?: string;
  readonly const?: unknown;
  readonly unit?: string;
  readonly description?: string;
  readonly additionalProperties?: unknown;
}

/** Every schema within the schema, with its path. */
function nodesOf(value: unknown, path = ''): { path: string; node: SchemaNode }[] {
  if (Array.isArray(value)) return value.flatMap((each, i) => nodesOf(each, `${path}[${i}]`));
  if (value === null || typeof value !== 'object') return [];
  return [
    { path, node: value },
    ...Object.entries(value).flatMap(([key, each]) => nodesOf(each, `${path}.${key}`)),
  ];
}
const nodes = nodesOf(craftJsonSchema());

test('the published file is what the code emits (after a change: npm run schema)', () => {
  expect(readFileSync(file, 'utf8')).toBe(craftJsonSchemaText());
});

test('every number has its unit, and its description says it', () => {
  const numbers = nodes.filter(
    ({ node }) => (node.type === 'number' || node.type === 'integer') && !('const' in node),
  );
  expect(numbers.length).toBeGreaterThan(50);
  for (const { path, node } of numbers) {
    expect(node.unit, path).toMatch(/^(1|m|kg|rad|K|Pa|kg\/m|kg\/m²|N|W|s|m\/s|m²|rad\/s)$/);
    expect(node.description, path).toContain(
      node.unit === '1' && node.type === 'integer' ? 'whole number' : `, ${node.unit}`,
    );
  }
});

test('every object is closed', () => {
  const objects = nodes.filter(({ node }) => node.type === 'object');
  expect(objects.length).toBeGreaterThan(20);
  for (const { path, node } of objects) expect(node.additionalProperties, path).toBe(false);
});

test.each(samples)('ajv accepts $name', ({ text }) => {
  accepts(JSON.parse(text));
  expect(accepts.errors).toBeNull();
});

test('ajv and the gate’s schema agree on 3,000 damaged files', () => {
  const random = seeded(20);
  let refused = 0;
  for (let i = 0; i < 3000; i++) {
    const { name } = samples[i % samples.length]!;
    const text = JSON.stringify(damagedJson(random, sampleText(name)));
    const json: unknown = JSON.parse(text);
    const byZod = craftFileSchema.safeParse(json).success;
    if (!byZod) refused++;
    expect(accepts(json), text).toBe(byZod);
  }
  expect(refused).toBeGreaterThan(300);
  expect(refused).toBeLessThan(2700);
});
