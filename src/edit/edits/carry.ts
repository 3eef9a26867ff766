/** Hanging a useful load somewhere by hand. */
import type { Craft } from '../../craft/craft.ts';
import type { Place } from '../../craft/placeSchema.ts';
import type { LoadOption } from '../../craft/planningSchema.ts';
import { stationOf } from '../../craft/station.ts';
import { loadAsPart } from '../../craft/stowage.ts';
import { type Edit, step } from '../edit.ts';
import { placed } from '../place.ts';
import type { LoadCalled } from './loads.ts';

/** Takes a load aboard at a place, which becomes one of those where it may go, so that the next plan may leave it there. */
export const hangLoad = ({ id, name }: LoadCalled, place: Place): Edit =>
  step(`Hang ${name || 'load'}`, (craft) => {
    const load = craft.loads.byId[id]!;
    const aboard = craft.parts.byId[id];
    const there = aboard ? placed(aboard.place, place) : place;
    if (!load.options.some((option) => covers(craft, option, there))) {
      const at = stationOf(there);
      load.options.push({ kind: 'slide', place: { ...there }, from: at, to: at });
    }
    if (aboard && there === aboard.place && aboard.slide === null) return;
    if (!aboard) craft.parts.order.push(id);
    craft.parts.byId[id] = loadAsPart(craft, load, { ...there }, null);
  });

/** Whether a load may already go to that place. */
function covers({ hardpoints }: Craft, option: LoadOption, place: Place): boolean {
  const spot = option.kind === 'slide' ? option.place : hardpoints.byId[option.hardpoint]?.place;
  if (!spot) return false;
  const at = stationOf(place);
  const [from, to] = option.kind === 'slide' ? [option.from, option.to] : [stationOf(spot), stationOf(spot)];
  return from <= at && at <= to && sameBut(spot, place);
}

/** Whether two places differ in their station at most. */
const sameBut = (a: Place, b: Place): boolean =>
  JSON.stringify(stationless(a)) === JSON.stringify(stationless(b));

const stationless = (place: Place): Record<string, unknown> => ({ ...place, station: 0, x: 0 });
