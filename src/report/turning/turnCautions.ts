/** What to mind of thrust and turning, and what is missing. In SI, for `inUnits`. */
import type { Outcome } from '../../numeric/outcome.ts';
import type { CraftState } from '../../physics/craftState.ts';
import { meantOf, strikesOf } from '../../physics/placing/strikes.ts';
import { pitchSpeedCautions } from '../../physics/thrust/speed.ts';
import type { Thruster } from '../../physics/thrust/thrusters.ts';
import type { Turn } from '../../physics/turning/turn.ts';
import { missingFigures } from './thrusterWords.ts';

export const TETHER =
  'Models leave things out. Try the craft, and every change to it, on a tether before it flies free.';

export function turnCautions(
  state: CraftState,
  thrusters: readonly Thruster[],
  turn: Outcome<Turn>,
): string[] {
  const own = thrusters.filter(({ copy }) => copy === 0);
  return [
    ...missingFigures(state.craft),
    ...own.flatMap(({ part, name }) =>
      strikesOf(state, part, meantOf(state, part)).cautions.map((each) => `${name}: ${lower(each)}`),
    ),
    ...pitchSpeedCautions(state),
    ...(turn.status === 'solved' ? turn.value.cautions : []),
  ];
}

const lower = (sentence: string): string => sentence.charAt(0).toLowerCase() + sentence.slice(1);
