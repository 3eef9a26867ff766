/** What carrying out the ballast plan of a station changes on the craft, one thing each. */
import type { Craft } from '../../craft/craft.ts';
import { stationOf } from '../../craft/station.ts';
import { looseLoads, type Stowage } from '../../craft/stowage.ts';
import type { PlannedLoad, PlannedSlide, PlannedWeight } from '../../physics/ballast/plan.ts';
import { inUnits } from '../../units/sentence.ts';
import type { UnitSystem } from '../../units/units.ts';
import { planSteps } from '../planWords.ts';

/** In the words of the Plan tab; empty when all hangs and stands as planned. */
export const stowageSteps = (craft: Craft, stowage: Stowage, units: UnitSystem): string[] =>
  planSteps(craft, {
    weights: weightsOf(craft, stowage),
    slides: slidesOf(craft, stowage),
    loads: loadsOf(craft, stowage),
  }).map((each) => inUnits(each, units));

const weightsOf = (craft: Craft, { weights }: Stowage): PlannedWeight[] =>
  weights.map(({ hardpoint, pieces }) => ({
    hardpoint,
    mass: pieces.reduce((sum, { mass, count }) => sum + mass * count, 0),
    pieces: craft.hardpoints.byId[hardpoint]?.fill === 'pieces' ? pieces : [],
  }));

const slidesOf = (craft: Craft, { slides }: Stowage): PlannedSlide[] =>
  slides.flatMap(({ part, to }) => {
    const now = craft.parts.byId[part];
    return now ? [{ part, from: stationOf(now.place), to }] : [];
  });

const loadsOf = (craft: Craft, { loads }: Stowage): PlannedLoad[] =>
  looseLoads(craft).map(({ id }) => {
    const stowed = loads.find(({ load }) => load === id);
    const spot = JSON.stringify(stowed?.place);
    const hangsAt = craft.hardpoints.order.find(
      (each) => JSON.stringify(craft.hardpoints.byId[each]!.place) === spot,
    );
    return {
      load: id,
      place: stowed?.place ?? null,
      hardpoint: hangsAt ?? null,
      placeToday: craft.parts.byId[id]?.place ?? null,
    };
  });
