import type { HullShape } from '../../../src/craft/hullSchema.ts';
import { flowAbout, type HullFlow } from '../../../src/physics/flow/hullFlow.ts';
import { built } from '../hull/built.ts';

/** The flow about a form that must be possible. */
export function flowOf(shape: HullShape, detail = 1): HullFlow {
  const flow = flowAbout(built(shape), detail);
  if (flow.status !== 'solved') throw new Error(flow.why);
  return flow.value;
}

/** The same hull flown tail first. */
export function reversed(shape: HullShape): HullShape {
  switch (shape.kind) {
    case 'twoSpheroid':
      return { ...shape, foreLength: shape.aftLength, aftLength: shape.foreLength };
    case 'series58':
      return {
        ...shape,
        widest: 1 - shape.widest,
        noseRadius: shape.tailRadius,
        tailRadius: shape.noseRadius,
      };
    case 'cylinder':
      return {
        ...shape,
        noseEnd: shape.tailEnd,
        noseLength: shape.tailLength,
        tailEnd: shape.noseEnd,
        tailLength: shape.noseLength,
      };
    default:
      throw new Error('no mirror image in the schema');
  }
}
