/** What to mind of thrust and turning, and what is missing. In SI, for `inUnits`. */
import { type Outcome, valueOrNull } from '../../numeric/outcome.ts';
import { floatOf } from '../../physics/balance/float.ts';
import { heavinessOf } from '../../physics/balance/loading.ts';
import type { CraftState } from '../../physics/craftState.ts';
import { meantOf, strikesOf } from '../../physics/placing/strikes.ts';
import { pitchSpeedCautions } from '../../physics/thrust/speed.ts';
import type { Thruster } from '../../physics/thrust/thrusters.ts';
import type { Turn } from '../../physics/turning/turn.ts';
import { say } from '../../units/sentence.ts';
import { joined } from '../planWords.ts';
import { heavinessWords } from '../words.ts';
import { missingFigures } from './thrusterWords.ts';
import { runawayCautions } from './turnHeadline.ts';

export const TETHER =
  'Models leave things out. Try the craft, and every change to it, on a tether before it flies free.';

export function turnCautions(
  state: CraftState,
  thrusters: readonly Thruster[],
  turn: Outcome<Turn>,
): string[] {
  const told = turn.status === 'solved' ? turn.value : null;
  const own = thrusters.filter(({ copy }) => copy === 0);
  return [
    ...(told ? [...slantCautions(state), ...runawayCautions(told)] : []),
    ...missingFigures(state.craft),
    ...own.flatMap(({ part, name }) =>
      strikesOf(state, part, meantOf(state, part)).cautions.map((each) => `${name}: ${lower(each)}`),
    ),
    ...pitchSpeedCautions(state),
    ...(told?.cautions ?? []),
  ];
}

/** Beyond this the craft is not as the equations of turning take it: level, rad; and balanced, share of its mass. Our judgement, no source. */
const [SLANT, UNBALANCED] = [Math.PI / 12, 0.2];

function slantCautions({ loading }: CraftState): string[] {
  const attitude = valueOrNull(floatOf(loading));
  const heaviness = heavinessOf(loading);
  const angle = (value: number, [below, above]: readonly [string, string]) =>
    Math.abs(value) > SLANT ? [`floats ${say(Math.abs(value), 'angle')} ${value < 0 ? below : above}`] : [];
  const off = [
    ...(attitude ? angle(attitude.pitch, ['nose-down', 'nose-up']) : []),
    ...(attitude ? angle(attitude.heel, ['port down', 'starboard down']) : []),
    ...(Math.abs(heaviness) > UNBALANCED * loading.solid.mass ? [`is ${heavinessWords(heaviness)}`] : []),
  ];
  return off.length > 0
    ? [
        `These figures take the craft level and balanced; it ${joined(off)}. Choose the craft with its ballast plan (--planned in a terminal).`,
      ]
    : [];
}

const lower = (sentence: string): string => sentence.charAt(0).toLowerCase() + sentence.slice(1);
