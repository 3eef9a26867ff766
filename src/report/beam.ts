/** The beam: every mass as a bar of moment about the CB station. */
import { leadHardpoint, listed } from '../craft/craft.ts';
import type { CraftState } from '../physics/craftState.ts';
import { type Body, sumsOf } from '../physics/mass/body.ts';
import type { BeamBar } from './assessment.ts';
import { leadPosition } from './leadRows.ts';
import type { Rows } from './rows.ts';

/** The bars sum to the moment that tilts the craft. Weightless things have none. */
export function beamOf(state: CraftState): BeamBar[] {
  const { craft, film, seams, patches, pieces, branches } = state;
  return [
    bar(state, 'skin', 'film', craft.film.name || 'Film', [film]),
    bar(state, 'skin', 'seams', 'Seams', [seams]),
    bar(state, 'skin', 'patches', 'Patches', patches),
    ...listed(craft.parts).map(({ id, name, kind }) => bar(state, 'part', id, name || kind, pieces[id]!)),
    ...listed(craft.wires).map(({ id, name }) => bar(state, 'wire', id, name || 'Wire run', branches[id]!)),
  ].filter(({ mass }) => mass > 0);
}

function bar(
  state: CraftState,
  kind: BeamBar['kind'],
  id: string,
  name: string,
  bodies: readonly Body[],
): BeamBar {
  const { mass, moment } = sumsOf(bodies);
  const station = mass > 0 ? moment[0] / mass : 0;
  return { kind, id, name, mass, station, moment: moment[0] - mass * state.hull.cbStation };
}

/** The lead that levels exactly, as a bar of its own; none where the craft is level within its tolerance. */
export function leadBar(state: CraftState, rows: Rows): BeamBar | null {
  const mass = rows['lead.mass']!.value;
  if (!mass || rows['lead.massWithinTolerance']!.value === 0) return null;
  const station = leadPosition(state)[0];
  const { id, name } = leadHardpoint(state.craft);
  return { kind: 'lead', id, name, mass, station, moment: mass * (station - state.hull.cbStation) };
}
