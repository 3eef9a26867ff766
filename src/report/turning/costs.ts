/**
 * What the place of a thruster costs: the lead and the wire that the craft needs now, less what it would need with the
 * CG of that thruster at the CB station, the rest left alone. There it has no moment and calls for no lead of its own.
 *
 * Lead: what levels the craft exactly at the chosen hardpoint; none where only weight on the other side would level it.
 */
import type { Craft } from '../../craft/craft.ts';
import { stationOf, withStation } from '../../craft/station.ts';
import { valueOrNull } from '../../numeric/outcome.ts';
import { levellingWeight } from '../../physics/balance/counterweight.ts';
import { type CraftState, craftStateOf } from '../../physics/craftState.ts';
import { leadPosition } from '../leadRows.ts';

export interface PlaceCost {
  readonly part: string;
  readonly name: string;
  readonly station: number;
  /** Of the CB, m. */
  readonly cb: number;
  /** kg; negative when its place saves lead. */
  readonly lead: number;
  /** kg; negative when the runs would be longer at the CB. */
  readonly wire: number;
}

/** Of one thruster; null when the craft cannot be formed. */
export function placeCostOf(state: CraftState, part: string): PlaceCost | null {
  const { craft, loading } = state;
  const { name, kind, place, cgOffset } = craft.parts.byId[part]!;
  const central = valueOrNull(craftStateOf(withPartAt(craft, part, loading.cb[0] - cgOffset)));
  return (
    central && {
      part,
      name: name || kind,
      station: stationOf(place),
      cb: loading.cb[0],
      lead: leadOf(state) - leadOf(central),
      wire: wireOf(state) - wireOf(central),
    }
  );
}

function withPartAt(craft: Craft, id: string, station: number): Craft {
  const part = craft.parts.byId[id]!;
  const moved = { ...part, place: withStation(part.place, station) };
  return { ...craft, parts: { ...craft.parts, byId: { ...craft.parts.byId, [id]: moved } } };
}

const leadOf = (state: CraftState): number =>
  valueOrNull(levellingWeight(state.loading, leadPosition(state))) ?? 0;

const wireOf = ({ branches }: CraftState): number =>
  Object.values(branches)
    .flat()
    .reduce((sum, { mass }) => sum + mass, 0);
