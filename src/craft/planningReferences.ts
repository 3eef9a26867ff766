/** What the shape of a file cannot say of slides, pieces, loads and wishes. */
import type { Load, LoadOption, Slide } from './planningSchema.ts';
import { type Problem, unknownId } from './problem.ts';
import type { CraftFile } from './schema.ts';

export const planningProblems = (file: CraftFile): Problem[] => [
  ...file.parts.flatMap(({ slide }, i) => (slide ? backwards(`parts[${i}].slide`, slide) : [])),
  ...twice(
    file.pieces.map(({ mass }) => mass),
    (i) => `pieces[${i}].mass`,
    (first) => `a mass of its own (pieces[${first}] has this one)`,
  ),
  ...loadProblems(file),
  ...twice(
    file.wishes,
    (i) => `wishes[${i}]`,
    (first) => `each wish once (wishes[${first}] is this one)`,
  ),
];

const backwards = (path: string, { from, to }: Slide): Problem[] =>
  from <= to ? [] : [{ path: `${path}.from`, found: `${from} m`, allowed: `at most ${path}.to (${to} m)` }];

/** Values that stand more than once. */
function twice(
  values: readonly (string | number)[],
  path: (i: number) => string,
  allowed: (first: number) => string,
): Problem[] {
  return values.flatMap((value, i) => {
    const first = values.indexOf(value);
    return first === i ? [] : [{ path: path(i), found: JSON.stringify(value), allowed: allowed(first) }];
  });
}

function loadProblems({ loads, parts, hardpoints }: CraftFile): Problem[] {
  const kinds = new Map(parts.map(({ id, kind }) => [id, kind]));
  const known = new Set(hardpoints.map(({ id }) => id));
  return loads.flatMap((load, i) => [
    ...idProblems(`loads[${i}].id`, load, kinds.get(load.id)),
    ...load.options.flatMap((option, k) => optionProblems(`loads[${i}].options[${k}]`, option, known)),
    ...twice(
      load.options.map((option, k) => (option.kind === 'hardpoint' ? option.hardpoint : k)),
      (k) => `loads[${i}].options[${k}].hardpoint`,
      (first) => `each hardpoint once (options[${first}] names this one)`,
    ),
  ]);
}

/** A load is aboard when a part has its id; only a part of that kind can be one. */
const idProblems = (path: string, { id }: Load, kind: string | undefined): Problem[] =>
  kind === undefined || kind === 'load'
    ? []
    : [
        {
          path,
          found: JSON.stringify(id),
          allowed: `an id that no part has but the part of kind load that stands for it (this one is a ${kind})`,
        },
      ];

function optionProblems(path: string, option: LoadOption, known: ReadonlySet<string>): Problem[] {
  if (option.kind === 'slide') return backwards(path, option);
  return known.has(option.hardpoint)
    ? []
    : [unknownId(`${path}.hardpoint`, option.hardpoint, 'a hardpoint', known)];
}
