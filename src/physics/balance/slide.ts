/**
 * Levelling by moving a part that is carried anyway.
 *
 * A first guess is the shift of weight, distance = −q_x / mass moved (FAA-H-8083-1). But wire runs that end at the part
 * follow it, so the station is found where the moment of the whole craft about the CB vanishes:
 *
 *   f(s) = q_x − (moment of the part and its runs now) + (their moment with the part at s) = 0,  0 ≤ s ≤ hull length.
 */
import { listed } from '../../craft/craft.ts';
import type { Part } from '../../craft/schema.ts';
import { withStation } from '../../craft/station.ts';
import { infeasible, type Outcome } from '../../numeric/outcome.ts';
import { findRoot } from '../../numeric/roots.ts';
import { say } from '../../units/sentence.ts';
import { branchesBetween, type CraftState } from '../craftState.ts';
import { momentAbout, sumsOf } from '../mass/body.ts';
import { piecesOf } from '../mass/pieces.ts';
import { hangOf } from './loading.ts';

/** The station within a hundredth of a millimetre, m. */
const NEARNESS = 1e-5;

/** The station on the hull at which the part levels the craft, its kind of place kept, m. */
export function levellingStation(state: CraftState, part: Part): Outcome<number> {
  const { hull, loading } = state;
  const momentAt = movedMoment(state, part);
  const rest = hangOf(loading)[0] - momentAt(null);
  const f = (station: number) => rest + momentAt(station);
  const [fore, aft] = [f(0), f(hull.length)];
  if (fore > 0 === aft > 0) {
    const nearest = Math.abs(fore) < Math.abs(aft) ? fore : aft;
    return infeasible(
      `Wherever it stands on the hull, the craft stays out of level by ${say(Math.abs(nearest), 'momentMass')} or more.`,
    );
  }
  return findRoot(f, 0, hull.length, NEARNESS);
}

/** Moment about the CB of the part and the runs that end at it, at a station; as it is for null. kg·m */
function movedMoment(
  { craft, hull, pieces, loading }: CraftState,
  part: Part,
): (station: number | null) => number {
  const runs = listed(craft.wires).filter(({ from, to }) =>
    [from, to].some((end) => end.kind === 'part' && end.part === part.id),
  );
  return (station) => {
    const moved = station === null ? part : { ...part, place: withStation(part.place, station) };
    const own = piecesOf(moved, hull);
    const branches = runs.flatMap((run) =>
      branchesBetween(craft, { ...run }, { ...pieces, [part.id]: own }, hull),
    );
    return momentAbout(sumsOf([...own, ...branches]), loading.cb)[0];
  };
}
