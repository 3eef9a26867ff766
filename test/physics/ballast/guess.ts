/** A rival that knows nothing: stowages at random, judged by the report. */
import { type Craft, listed } from '../../../src/craft/craft.ts';
import type { Place } from '../../../src/craft/placeSchema.ts';
import { withStation } from '../../../src/craft/station.ts';
import { type Stowage, stowed } from '../../../src/craft/stowage.ts';
import type { Random } from '../../craft/mutator.ts';

const between = (random: Random, from: number, to: number): number => {
  // The ends are likelier than chance, since that is where good plans lie.
  const draw = random();
  return draw < 0.15 ? from : draw > 0.85 ? to : from + (to - from) * random();
};

const pick = <T>(random: Random, from: readonly T[]): T => from[Math.floor(random() * from.length)]!;

/** A stowage within the limits of hardpoints, slides and stock; loads that must be carried are. Null when the guess does not fit. */
export function guess(craft: Craft, random: Random): Stowage | null {
  const loads = listed(craft.loads).flatMap((load) => {
    if (load.options.length === 0 || (!load.must && random() < 0.4)) return [];
    const option = pick(random, load.options);
    const place: Place =
      option.kind === 'slide'
        ? withStation(option.place, between(random, option.from, option.to))
        : craft.hardpoints.byId[option.hardpoint]!.place;
    const slide = option.kind === 'slide' ? { from: option.from, to: option.to } : null;
    return [
      { load: load.id, place, slide, hardpoint: option.kind === 'hardpoint' ? option.hardpoint : null },
    ];
  });
  if (listed(craft.loads).some(({ id, must }) => must && !loads.some(({ load }) => load === id))) return null;
  const stock = craft.pieces.map(({ count }) => count);
  const weights = listed(craft.hardpoints).flatMap(({ id, fill, limit }) => {
    const hung = loads
      .filter(({ hardpoint }) => hardpoint === id)
      .reduce((sum, { load }) => sum + craft.loads.byId[load]!.mass, 0);
    const room = limit - hung;
    if (room < 0) return [null];
    const pieces =
      fill === 'continuous'
        ? [{ mass: random() < 0.4 ? 0 : random() ** 2 * room, count: 1 }]
        : drawn(craft, stock, room, random);
    return [{ hardpoint: id, pieces: pieces.filter(({ mass, count }) => mass > 0 && count > 0) }];
  });
  const fitting = weights.flatMap((each) => each ?? []);
  if (fitting.length < weights.length) return null;
  const slides = listed(craft.parts).flatMap(({ id, slide }) =>
    slide ? [{ part: id, to: between(random, slide.from, slide.to) }] : [],
  );
  return { weights: fitting, slides, loads };
}

function drawn(craft: Craft, stock: number[], room: number, random: Random) {
  let left = room;
  return craft.pieces.map(({ mass }, k) => {
    const most = Math.min(stock[k]!, Math.floor(left / mass + 1e-9));
    const count = Math.floor(random() * (most + 1));
    stock[k]! -= count;
    left -= count * mass;
    return { mass, count };
  });
}

export const guessed = (craft: Craft, stowage: Stowage): Craft => stowed(craft, stowage);
