/**
 * Older craft files step up, one version at a time. To add a version: raise VERSION in `schema.ts` and add here the
 * step from the one before, which takes and gives plain JSON and must not throw on rubbish.
 */
import { finOfBox } from './firstFigures.ts';
import type { Problem } from './problem.ts';
import { foundText } from './problem.ts';
import { VERSION } from './schema.ts';
import type { FinData } from './thrustSchema.ts';

type Json = Record<string, unknown>;
export type Step = (file: Json) => Json;

/** Version 0, from before the first release: lists were the same, but there was no support point. */
const from0: Step = (file) => ({ support: null, ...file, steelyard: 1 });

/** Version 1, from before the ballast plan: hardpoints had no limit, parts no slide, and there were no loads to choose from. */
const from1: Step = (file) => ({
  pieces: [],
  loads: [],
  wishes: ['usefulLoad', 'fewestMoved', 'leastWire'],
  ...file,
  parts: eachObject(file.parts, () => ({ slide: null })),
  hardpoints: eachObject(file.hardpoints, () => ({ limit: 10, fill: 'continuous' })),
  steelyard: 2,
});

/** Version 2, from before thrust and turning: a fin was known by its box alone, and of thrusters nothing but their mass. */
const from2: Step = (file) => ({
  ...file,
  parts: eachObject(file.parts, (part) => ({
    thruster: null,
    fin: part.kind === 'fin' ? boxedFin(part.size) : null,
    dragArea: null,
  })),
  targets: isObject(file.targets) ? { turnTime: null, sideGust: null, ...file.targets } : file.targets,
  steelyard: 3,
});

/** A fin as large as its box; null where the box is none. */
function boxedFin(size: unknown): FinData | null {
  if (!isObject(size)) return null;
  const { length, height } = size;
  return typeof length === 'number' && typeof height === 'number' ? finOfBox({ length, height }) : null;
}

const isObject = (value: unknown): value is Json =>
  value !== null && typeof value === 'object' && !Array.isArray(value);

/** Every object of a list with those fields, where it has none of its own; anything else as it is. */
const eachObject = (list: unknown, fields: (item: Json) => Json): unknown =>
  Array.isArray(list)
    ? list.map((item: unknown) => (isObject(item) ? { ...fields(item), ...item } : item))
    : list;

const STEPS: Readonly<Record<number, Step>> = { 0: from0, 1: from1, 2: from2 };

/** The file at today's version, or the problem with its version. */
export function stepUp(file: Json): { file: Json } | { problem: Problem } {
  const { steelyard } = file;
  if (typeof steelyard !== 'number' || !Number.isInteger(steelyard) || steelyard < 0 || steelyard > VERSION) {
    return { problem: versionProblem(steelyard) };
  }
  let current = file;
  for (let version = steelyard; version < VERSION; version++) current = STEPS[version]!(current);
  return { file: current };
}

const versionProblem = (version: unknown): Problem => ({
  path: 'steelyard',
  found: foundText(version),
  allowed:
    typeof version === 'number' && version > VERSION
      ? `a version up to ${VERSION}; this file comes from a newer Steelyard`
      : `the version of the craft file, a whole number from 0 to ${VERSION}`,
});
