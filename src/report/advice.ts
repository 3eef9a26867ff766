/** What could be done about a craft, ready to be carried out: the lead, a slide of the battery, a load for the lift left. */
import { leadHardpoint, listed } from '../craft/craft.ts';
import type { Place } from '../craft/placeSchema.ts';
import type { Part } from '../craft/schema.ts';
import { stationOf, withStation } from '../craft/station.ts';
import { levellingStation } from '../physics/balance/slide.ts';
import type { CraftState } from '../physics/craftState.ts';
import type { Rows } from './rows.ts';

export type Advice =
  | {
      readonly kind: 'lead';
      readonly hardpoint: string;
      readonly name: string;
      /** kg */
      readonly mass: number;
      readonly place: Place;
    }
  | {
      readonly kind: 'slide';
      readonly part: string;
      readonly name: string;
      readonly place: Place;
      readonly forward: boolean;
    }
  | { readonly kind: 'load'; readonly mass: number; readonly place: Place };

/** Only what stands: no lead that the lift does not carry, no slide off the hull. */
export function adviceOf(state: CraftState, rows: Rows): Advice[] {
  const needed = rows['lead.massWithinTolerance']!.value !== 0;
  return [...(needed ? [...leadAdvice(state, rows), ...slideAdvice(state)] : []), ...loadAdvice(rows)];
}

function leadAdvice({ craft }: CraftState, rows: Rows): Advice[] {
  const { value, status } = rows['lead.mass']!;
  if (!value || status !== 'solved') return [];
  const { id, name, place, fill } = leadHardpoint(craft);
  // Lead in pieces is for the plan to choose.
  if (fill === 'pieces') return [];
  return [{ kind: 'lead', hardpoint: id, name, mass: value, place }];
}

/** The heaviest battery that may move, slid to where it levels the craft. */
function slideAdvice(state: CraftState): Advice[] {
  const battery = heaviestBattery(state);
  const station = battery && levellingStation(state, battery);
  if (!battery || station?.status !== 'solved') return [];
  const place = withStation(battery.place, Math.round(station.value * 1e4) / 1e4);
  const forward = station.value < stationOf(battery.place);
  return [{ kind: 'slide', part: battery.id, name: battery.name || 'battery', place, forward }];
}

function heaviestBattery({ craft, pieces }: CraftState): Part | null {
  const whole = (part: Part) => part.mass * pieces[part.id]!.length;
  const movable = listed(craft.parts).filter(({ kind, locked }) => kind === 'battery' && !locked);
  return movable.reduce<Part | null>(
    (best, part) => (best && whole(best) >= whole(part) ? best : part),
    null,
  );
}

/** The lift left, as one weight below the keel where it levels the craft too. */
function loadAdvice(rows: Rows): Advice[] {
  const [mass, station] = [rows['oneWeight.mass']!.value, rows['oneWeight.station']!.value];
  if (!mass || station === null) return [];
  return [
    { kind: 'load', mass, place: { kind: 'keel', station: Math.round(station * 1e4) / 1e4, drop: 0.02 } },
  ];
}
