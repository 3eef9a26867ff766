/** One way to decide everything a plan may decide, as numbers; and the stowage it stands for. */
import type { LeadPiece } from '../../craft/planningSchema.ts';
import { stationOf } from '../../craft/station.ts';
import type { Stowage, StowedLoad } from '../../craft/stowage.ts';
import { type LoadSite, partAt, type Setting } from './setting.ts';

export interface Point {
  /** Ballast cut to measure, kg, one a hardpoint. */
  readonly weights: readonly number[];
  /** Pieces of each size, one list a hardpoint. */
  readonly counts: readonly (readonly number[])[];
  /** Stations, m. */
  readonly slides: readonly number[];
  /** Which option each load takes; null when it is left ashore. */
  readonly options: readonly (number | null)[];
  /** Where it would be on each option that is a slide, taken or not, m. */
  readonly stations: readonly (readonly number[])[];
  /** Mass of the load that is tried, kg. */
  readonly trial: number;
}

const within = (value: number, from: number, to: number): number => Math.min(Math.max(value, from), to);

/** Slides and loads as they are today, brought within their stretches; no ballast. */
export const startOf = (setting: Setting): Point => ({
  weights: setting.hardpoints.map(() => 0),
  counts: setting.hardpoints.map(() => setting.sizes.map(() => 0)),
  slides: setting.slides.map(({ now, from, to }) => within(now, from, to)),
  options: setting.loads.map(({ now }) => now),
  stations: setting.loads.map(({ options, now, aboard }) =>
    options.map((site, k) => {
      const place = k === now && aboard ? aboard.place : site.place;
      return site.slide ? within(stationOf(place), site.slide.from, site.slide.to) : stationOf(place);
    }),
  ),
  trial: 0,
});

export const stowageOf = (setting: Setting, point: Point): Stowage => ({
  weights: setting.hardpoints.flatMap(({ id }, h) => {
    const pieces = piecesAt(setting, point, h);
    return pieces.length > 0 ? [{ hardpoint: id, pieces }] : [];
  }),
  slides: setting.slides.map(({ part }, i) => ({ part: part.id, to: point.slides[i]! })),
  loads: setting.loads.flatMap((choice, l): StowedLoad[] => {
    const option = point.options[l]!;
    if (option === null) return [];
    const site: LoadSite = choice.options[option]!;
    const { place, slide } = partAt(setting, choice, site, point.stations[l]![option]!);
    return [{ load: choice.load.id, place, slide }];
  }),
});

function piecesAt({ sizes }: Setting, { weights, counts }: Point, h: number): LeadPiece[] {
  const cut = weights[h]! > 0 ? [{ mass: weights[h]!, count: 1 }] : [];
  const whole = sizes.flatMap(({ mass }, k) => (counts[h]![k]! > 0 ? [{ mass, count: counts[h]![k]! }] : []));
  return [...cut, ...whole];
}

/** Planned ballast, kg. */
export const ballastOf = ({ sizes }: Setting, { weights, counts }: Point): number =>
  weights.reduce((sum, mass) => sum + mass, 0) +
  counts.flat().reduce((sum, count, i) => sum + count * (sizes[i % sizes.length]?.mass ?? 0), 0);
