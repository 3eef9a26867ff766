/** What to mind of thrust and turning, and what is missing. In SI, for `inUnits`. */
import type { Outcome } from '../../numeric/outcome.ts';
import type { CraftState } from '../../physics/craftState.ts';
import { strikesOf } from '../../physics/placing/strikes.ts';
import { pitchSpeedCautions } from '../../physics/thrust/speed.ts';
import type { Thruster } from '../../physics/thrust/thrusters.ts';
import type { Turn } from '../../physics/turning/turn.ts';
import { cannotYaw, missingFigures } from './thrusterWords.ts';

export function turnCautions(
  state: CraftState,
  thrusters: readonly Thruster[],
  turn: Outcome<Turn>,
): string[] {
  const own = thrusters.filter(({ copy }) => copy === 0);
  const yaw = cannotYaw(thrusters);
  return [
    ...missingFigures(state.craft),
    ...(yaw ? [yaw] : []),
    ...own.flatMap(({ part, name }) =>
      strikesOf(state, part).cautions.map((each) => `${name}: ${lower(each)}`),
    ),
    ...pitchSpeedCautions(state),
    ...(turn.status === 'solved' ? turn.value.cautions : []),
  ];
}

const lower = (sentence: string): string => sentence.charAt(0).toLowerCase() + sentence.slice(1);
