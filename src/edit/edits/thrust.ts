/** Edits of what parts do in the air: thrusters, fins, drag areas. */
import type { Recipe } from '../edit.ts';

export type Way = 'yaw' | 'pitch';

/** Turns the thrust of a part to an angle, held within what it can be turned to, rad. For drags and nudges: pass the recipe to `Drag.move`. */
export const turnThrust =
  (id: string, way: Way, angle: number): Recipe =>
  (craft) => {
    const vectoring = craft.parts.byId[id]?.thruster?.[way];
    if (vectoring) vectoring.set = Math.min(Math.max(angle, vectoring.least), vectoring.most);
  };
