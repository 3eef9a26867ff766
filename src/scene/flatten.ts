/** Places in space as points of the side view, the front view and the view from above. */
import type { Vec3 } from '../report/assessment.ts';
import type { Line } from './grip.ts';
import type { Geometry } from './subject.ts';
import type { PlanePoint } from './view.ts';

export type Flatten = (at: Vec3) => PlanePoint;

/** Seen from port: the nose to the left. */
export const fromSide: Flatten = ([x, , z]) => ({ u: x, z });

/** Seen from astern: starboard to the right. */
export const fromAstern: Flatten = ([, y, z]) => ({ u: y, z });

/** Seen from above with the nose up: starboard to the right, as from astern. */
export const fromAbove: Flatten = ([x, y]) => ({ u: y, z: -x });

export const wireLines = (wires: Geometry['wires'], flatten: Flatten): Line[] =>
  wires.flatMap(({ wire, branches }) => branches.map((branch) => ({ id: wire, at: branch.map(flatten) })));

export const hardpointPoints = (
  { hardpoints }: Geometry,
  flatten: Flatten,
): { id: string; at: PlanePoint }[] =>
  hardpoints.map(({ hardpoint, at }) => ({ id: hardpoint, at: flatten(at) }));
