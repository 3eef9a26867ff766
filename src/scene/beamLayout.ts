/**
 * The beam on the page, px: its middle under the CB on the station scale of the side view, its bars to a scale of their own that
 * lets the longer side fit, and a line from each bar up to the station of what it stands for.
 */
import { type Beam, type PlacedBar, reachOf } from './beam.ts';
import type { View } from './view.ts';

export interface BarOnPage {
  readonly bar: PlacedBar;
  readonly left: number;
  readonly right: number;
  /** x of its station on the ruler above. */
  readonly stationX: number;
}

export interface BeamOnPage {
  /** x of the CB. */
  readonly middle: number;
  readonly bars: readonly BarOnPage[];
  readonly lead: BarOnPage | null;
  readonly gap: { readonly left: number; readonly right: number };
  /** px per kg·m. */
  readonly scale: number;
}

const MARGIN = 14;
/** Even when the CB is near an edge or out of sight the beam keeps this much of the width on its shorter side. */
const LEAST_SHARE = 0.2;

/** The beam shares the pan and the station scale of the side view. */
export function layBeam(beam: Beam, view: View): BeamOnPage {
  const stationX = (station: number) => view.originX + station * view.scale;
  const middle = stationX(view.pivot);
  const room = Math.min(middle, view.width - middle) - MARGIN;
  const width = Math.max(room, LEAST_SHARE * view.width);
  const reach = reachOf(beam);
  const scale = reach > 0 ? width / reach : 0;
  const place = (bar: PlacedBar): BarOnPage => ({
    bar,
    ...span(middle, scale, bar.near, bar.far),
    stationX: stationX(bar.station),
  });
  return {
    middle,
    scale,
    bars: beam.bars.map(place),
    lead: beam.lead && place(beam.lead),
    gap: span(middle, scale, beam.gap.near, beam.gap.far),
  };
}

const span = (middle: number, scale: number, near: number, far: number) => ({
  left: middle + scale * Math.min(near, far),
  right: middle + scale * Math.max(near, far),
});

/** The bar at an x of the page; the wider wins where bars are thinner than a pixel. */
export function barAt({ bars }: BeamOnPage, x: number, slop = 0): PlacedBar | null {
  const under = bars.filter(({ left, right }) => x >= left - slop && x <= right + slop);
  const distance = ({ left, right }: BarOnPage) => Math.max(left - x, x - right, 0);
  under.sort((a, b) => distance(a) - distance(b));
  return under[0]?.bar ?? null;
}
