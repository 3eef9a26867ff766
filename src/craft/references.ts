/** What the shape of a file cannot say: ids stand once, and what is named exists. */
import { planningProblems } from './planningReferences.ts';
import { type Problem, unknownId } from './problem.ts';
import type { CraftFile, WireEnd } from './schema.ts';
import { thrustProblems } from './thrustReferences.ts';

export function referenceProblems(file: CraftFile): Problem[] {
  const partIds = new Set(file.parts.map((part) => part.id));
  const hardpointIds = new Set(file.hardpoints.map((hardpoint) => hardpoint.id));
  return [
    ...repeats('parts', file.parts),
    ...repeats('wires', file.wires),
    ...repeats('hardpoints', file.hardpoints),
    ...repeats('loads', file.loads),
    ...file.wires.flatMap((wire, i) => [
      ...danglingEnd(`wires[${i}].from`, wire.from, partIds),
      ...danglingEnd(`wires[${i}].to`, wire.to, partIds),
    ]),
    ...(hardpointIds.has(file.leadAt) ? [] : [unknownId('leadAt', file.leadAt, 'a hardpoint', hardpointIds)]),
    ...bandProblems(file),
    ...planningProblems(file),
    ...thrustProblems(file),
  ];
}

/** Ids that stand more than once in a list. */
export function repeats(list: string, items: readonly { id: string }[]): Problem[] {
  const seen = new Map<string, number>();
  return items.flatMap(({ id }, i) => {
    const first = seen.get(id);
    if (first === undefined) {
      seen.set(id, i);
      return [];
    }
    const allowed = `an id of its own (${list}[${first}] has this one)`;
    return [{ path: `${list}[${i}].id`, found: JSON.stringify(id), allowed }];
  });
}

const danglingEnd = (path: string, end: WireEnd, partIds: ReadonlySet<string>): Problem[] =>
  end.kind === 'loose' || partIds.has(end.part)
    ? []
    : [unknownId(`${path}.part`, end.part, 'a part', partIds)];

function bandProblems({ targets: { heaviness } }: CraftFile): Problem[] {
  if (heaviness.least <= heaviness.most) return [];
  return [
    {
      path: 'targets.heaviness.least',
      found: `${heaviness.least} kg`,
      allowed: `at most targets.heaviness.most (${heaviness.most} kg)`,
    },
  ];
}
