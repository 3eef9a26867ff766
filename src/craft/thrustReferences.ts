/** What the shape of a file cannot say of thrusters: vectoring limits in order, the angle set within them. */
import type { Problem } from './problem.ts';
import type { CraftFile } from './schema.ts';
import type { Vectoring } from './thrustSchema.ts';

export const thrustProblems = ({ parts }: CraftFile): Problem[] =>
  parts.flatMap(({ thruster }, i) =>
    thruster
      ? (['yaw', 'pitch'] as const).flatMap((way) =>
          vectoringProblems(`parts[${i}].thruster.${way}`, thruster[way]),
        )
      : [],
  );

function vectoringProblems(path: string, { least, most, set }: Vectoring): Problem[] {
  if (least > most) {
    return [{ path: `${path}.least`, found: `${least} rad`, allowed: `at most ${path}.most (${most} rad)` }];
  }
  if (set >= least && set <= most) return [];
  return [{ path: `${path}.set`, found: `${set} rad`, allowed: `an angle from ${least} to ${most} rad` }];
}
