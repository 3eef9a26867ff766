// Holds the one-way layers of DEVELOPERS.md: reads every import in src/, types too, and checks it against this list.
import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative, resolve } from 'node:path';
import { expect, test } from 'vitest';

const SRC = resolve(import.meta.dirname, '../src');

const CORE = ['units', 'numeric', 'craft', 'catalogue', 'physics', 'report'];

/** For each layer the others it may import. */
const ALLOWED: Readonly<Record<string, readonly string[]>> = {
  units: [],
  numeric: [],
  craft: ['units'],
  catalogue: ['units', 'craft'],
  physics: ['units', 'numeric', 'craft', 'catalogue'],
  report: ['units', 'numeric', 'craft', 'catalogue', 'physics'],
  edit: ['units', 'craft'],
  scene: ['units', 'craft', 'report'],
  canvas: ['craft', 'edit', 'scene'],
  panels: ['units', 'craft', 'catalogue', 'report', 'edit'],
  worker: CORE,
  app: [...CORE, 'edit', 'scene', 'canvas', 'panels', 'worker'],
  cli: CORE,
};

/** Packages a layer may use; node: only where the terminal is. */
const PACKAGES: Readonly<Record<string, readonly string[]>> = {
  numeric: ['highs'],
  craft: ['zod'],
  catalogue: ['zod'],
  edit: ['immer'],
  canvas: ['react', 'konva', 'react-konva'],
  panels: ['react', 'react-dom', 'papaparse'],
  app: ['react', 'react-dom', 'idb'],
  cli: ['@sparticuz/chromium', 'vite'],
};

interface Import {
  readonly file: string;
  readonly layer: string;
  readonly target: string;
}

const files = readdirSync(SRC, { recursive: true, encoding: 'utf8' }).filter((name) =>
  /\.(tsx?|mjs)$/.test(name),
);

const imports: Import[] = files.flatMap((name) => {
  const text = readFileSync(join(SRC, name), 'utf8');
  const found = text.matchAll(
    /(?:^|\n|;)\s*(?:import|export)\b[^'";]*?from\s*['"]([^'"]+)['"]|\bimport\s*\(?\s*['"]([^'"]+)['"]/g,
  );
  return [...found].map(([, from, dynamic]) => ({
    file: name,
    layer: name.split('/')[0]!,
    target: (from ?? dynamic)!,
  }));
});

const layerOf = ({ file, target }: Import): string =>
  relative(SRC, resolve(SRC, dirname(file), target)).split('/')[0]!;

const isRelative = ({ target }: Import): boolean => target.startsWith('.');

test('every folder of src/ is a layer of the list', () => {
  const folders = readdirSync(SRC, { withFileTypes: true }).filter((entry) => entry.isDirectory());
  expect(Object.keys(ALLOWED)).toEqual(expect.arrayContaining(folders.map(({ name }) => name)));
});

test('the reader finds the imports', () => {
  expect(imports.length).toBeGreaterThan(files.length);
});

test('imports between layers go one way', () => {
  const wrong = imports.filter((each) => {
    if (!isRelative(each)) return false;
    const to = layerOf(each);
    if (to === each.layer) return false;
    // Starter catalogue and sample craft are data; they lie beside src/.
    if (to === '..') return !/^(\.\.\/)+(seeds|samples)\//.test(each.target);
    return !ALLOWED[each.layer]!.includes(to);
  });
  expect(wrong).toEqual([]);
});

test('packages are used only where they belong', () => {
  const wrong = imports.filter((each) => {
    if (isRelative(each)) return false;
    if (each.target.startsWith('node:')) return each.layer !== 'cli';
    const name = each.target
      .split('/')
      .slice(0, each.target.startsWith('@') ? 2 : 1)
      .join('/');
    return !(PACKAGES[each.layer] ?? []).includes(name);
  });
  expect(wrong).toEqual([]);
});

test('no file re-exports another whole: there are no barrels', () => {
  const barrels = files.filter((name) => /export \* from/.test(readFileSync(join(SRC, name), 'utf8')));
  expect(barrels).toEqual([]);
});

test('nothing is called by a name that says nothing', () => {
  expect(files.filter((name) => /(^|\/)(utils?|helpers?|common|manager|misc)\b/i.test(name))).toEqual([]);
});
