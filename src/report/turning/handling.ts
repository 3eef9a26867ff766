/** How much a craft has to be steered, and up to which speed its pitch is held: what a top speed alone does not tell. In SI, for `inUnits`. */
import type { Outcome } from '../../numeric/outcome.ts';
import type { CraftState } from '../../physics/craftState.ts';
import { criticalSpeed } from '../../physics/cruise/critical.ts';
import { keepsHeading } from '../../physics/turning/glide.ts';
import { turningCraftOf } from '../../physics/turning/turningCraft.ts';
import { say } from '../../units/sentence.ts';

/** One sentence each; none of a craft without thrust. `top`: its top speed, m/s. */
export function handlingWords(state: CraftState, top: Outcome<number>): string[] {
  const craft = turningCraftOf(state);
  if (craft.status === 'infeasible' || top.status === 'infeasible') return [];
  return [
    keepsHeading(craft.value)
      ? 'It keeps its heading by itself: fins and damping outweigh the Munk moment.'
      : 'It does not keep its heading by itself at any speed: it needs constant steering.',
    ...pitchWords(state, top.value),
  ];
}

function pitchWords(state: CraftState, top: number): string[] {
  const critical = criticalSpeed(state);
  if (critical.status === 'infeasible') return [];
  const { speed } = critical.value;
  return speed === null || speed >= top
    ? []
    : [
        `Its pitch is held up to ${say(speed, 'speed')}, less than its top speed of ${say(top, 'speed')}: faster, the nose goes up or down as it likes.`,
      ];
}
