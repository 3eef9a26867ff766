/** The widest circle that a craft which does not keep its heading holds by itself, and what that means for flying it. */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import type { SteadyPoint, SteadyTurn, Turn } from '../../physics/turning/turn.ts';
import { say } from '../../units/sentence.ts';
import type { Rows } from '../rows.ts';
import { rowsFrom } from './turnFigure.ts';

/** `curve`: the steady turns from a little of the steering asked for to all of it. */
export function widestCircle(turn: Outcome<Turn>, curve: readonly SteadyPoint[]): Outcome<SteadyTurn> {
  if (turn.status === 'infeasible') return turn;
  const { steady, glide } = turn.value;
  if (steady.status === 'infeasible') return steady;
  if (glide.stability.keepsHeading) {
    return infeasible('It keeps its heading: the less it is steered, the wider it turns, without end.');
  }
  const held = curve.flatMap((point) =>
    point.settles && point.turn.status === 'solved' ? [point.turn.value] : [],
  );
  return held.length > 0
    ? solved(held.reduce((widest, each) => (each.radius > widest.radius ? each : widest)))
    : infeasible('It settles in no circle.');
}

export const widestRows = (widest: Outcome<SteadyTurn>): Rows =>
  rowsFrom(widest, {
    'turn.widestRadius': ({ radius }) => radius,
    'turn.widestSpeed': ({ speed }) => speed,
  });

/** One sentence, or none where nothing limits how wide it turns. */
export const widestNotes = (widest: Outcome<SteadyTurn>): string[] =>
  widest.status === 'solved'
    ? [
        `Circles wider than about ${say(widest.value.radius, 'pathLength')} do not hold by themselves: those, and straight flight, have to be steered against the Munk moment.`,
      ]
    : [];
