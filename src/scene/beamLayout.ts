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

/** A smaller moment than this is none, kg·m. */
const LEAST_REACH = 1e-12;

/** The beam shares the pan and the station scale of the side view. */
export function layBeam(beam: Beam, view: View): BeamOnPage {
  const stationX = (station: number) => view.originX + station * view.scale;
  const middle = stationX(view.pivot);
  const room = Math.min(middle, view.width - middle) - MARGIN;
  const width = Math.max(room, LEAST_SHARE * view.width);
  const reach = reachOf(beam);
  const scale = reach > LEAST_REACH ? width / reach : 0;
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

/** A bar too thin to point at answers over so many px, the next one after it. */
const LEAST_ZONE = 4;

export interface Zone {
  readonly bar: PlacedBar;
  readonly left: number;
  readonly right: number;
}

/** Where each bar answers to the pointer: itself, and slivers side by side from where they begin outward; then the lead. */
export function zonesOf({ bars, lead, middle }: BeamOnPage): Zone[] {
  const ends = { fore: middle, aft: middle };
  const zones = bars.map(({ bar, left, right }): Zone => {
    if (bar.moment < 0) {
      const end = Math.min(ends.fore, right);
      ends.fore = Math.min(left, end - LEAST_ZONE);
      return { bar, left: ends.fore, right: end };
    }
    const start = Math.max(ends.aft, left);
    ends.aft = Math.max(right, start + LEAST_ZONE);
    return { bar, left: start, right: ends.aft };
  });
  return lead ? [...zones, lead] : zones;
}

/** The bar at an x of the page, or the nearest within the slop, px. */
export function barAt(page: BeamOnPage, x: number, slop = 0): PlacedBar | null {
  const away = ({ left, right }: Zone) => Math.max(left - x, x - right, 0);
  let best: Zone | null = null;
  for (const zone of zonesOf(page)) {
    if (away(zone) <= slop && (!best || away(zone) < away(best))) best = zone;
  }
  return best?.bar ?? null;
}

/** From the top of the beam's pane down, px. */
export interface BeamRows {
  readonly top: number;
  readonly bar: number;
  /** Middle of the line of sums, and of the result under it; null when the result stands beside the sums. */
  readonly sums: number;
  readonly result: number | null;
  /** Whether there is room for the lines up to the stations. */
  readonly leaders: boolean;
}

const BAR = 38;
const LEAST_BAR = 14;
const LEADER_ROOM = 24;
const EDGE = 4;
const SUMS = 15;
const RESULT = 34;
const LINE = 11;

/** A low pane first drops the lines to the stations, then puts the result beside the sums, then thins the bars. */
export function beamRows(height: number): BeamRows {
  const whole = BAR + RESULT + LINE;
  const leaders = height >= LEADER_ROOM + whole;
  const two = height >= EDGE + whole;
  const bar = two ? BAR : Math.min(BAR, Math.max(LEAST_BAR, height - EDGE - SUMS - LINE));
  const top = leaders ? Math.max(LEADER_ROOM, Math.min(height - whole, 0.42 * height)) : EDGE;
  const bottom = top + bar;
  return { top, bar, leaders, sums: bottom + SUMS, result: two ? bottom + RESULT : null };
}
