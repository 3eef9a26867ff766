/**
 * Tape distance ↔ station along one meridian, and the integrals of a stretch of it, from the panels' running integrals.
 * At a flat end face the station stands still while the tape goes on: a station there means the rim of the face, and
 * any tape distance on the face gives the station of the end.
 */
import type { SkinPath } from './hull.ts';
import { addIntegralsTo, integralTo, invertIntegral } from './legendreSeries.ts';
import { PATH_TERMS, type Panel } from './panels.ts';

/** A point of the meridian: panel and ξ in it. */
export interface Spot {
  readonly index: number;
  readonly xi: number;
}

export interface SkinTable {
  readonly length: number;
  readonly tapeLength: number;
  spotAtStation(station: number): Spot;
  spotAtTape(tape: number): Spot;
  stationOf(spot: Spot): number;
  tapeOf(spot: Spot): number;
  radiusOf(spot: Spot): number;
  pathBetween(a: Spot, b: Spot): SkinPath;
  /** The whole meridian with its faces. */
  readonly whole: SkinPath;
}

export function skinTable(panels: readonly Panel[]): SkinTable {
  const starts = cumulativePaths(panels);
  const tapes = starts.map((start) => start[0]!);
  const lateral = panels.map((_, i) => i).filter((i) => panels[i]!.x1 > panels[i]!.x0);
  const lateralStations = lateral.map((i) => panels[i]!.x0);
  const length = panels.at(-1)!.x1;
  const tapeLength = tapes.at(-1)!;
  const sumsAt = ({ index, xi }: Spot): Float64Array => {
    const sums = starts[index]!.slice();
    addIntegralsTo(panels[index]!.path, xi, sums);
    return sums;
  };
  return {
    length,
    tapeLength,
    spotAtStation(station) {
      const index = lateral[lastAtOrBelow(lateralStations, station, lateral.length)]!;
      const panel = panels[index]!;
      if (station >= panel.x1) return { index, xi: 1 };
      return { index, xi: invertIntegral(panel.station, station - panel.x0) };
    },
    spotAtTape(tape) {
      const index = lastAtOrBelow(tapes, tape, panels.length);
      return { index, xi: invertIntegral(panels[index]!.path[0]!, tape - tapes[index]!) };
    },
    stationOf: ({ index, xi }) => {
      const panel = panels[index]!;
      return clamp(panel.x0 + integralTo(panel.station, xi), length);
    },
    tapeOf: ({ index, xi }) => clamp(tapes[index]! + integralTo(panels[index]!.path[0]!, xi), tapeLength),
    radiusOf: ({ index, xi }) => {
      const { stretch, from, to } = panels[index]!;
      return stretch.at(from + ((to - from) * (1 + xi)) / 2).r;
    },
    pathBetween: (a, b) => difference(sumsAt(a), sumsAt(b)),
    whole: asPath(starts.at(-1)!),
  };
}

/** Rounding must not lead past the tips. */
const clamp = (value: number, whole: number): number => Math.min(Math.max(value, 0), whole);

/** The six path integrals from the nose tip to the start of each panel, and last to the tail tip. */
function cumulativePaths(panels: readonly Panel[]): Float64Array[] {
  const starts = [new Float64Array(PATH_TERMS.length)];
  for (const panel of panels) starts.push(starts.at(-1)!.map((sum, k) => sum + 2 * panel.path[k]![0]!));
  return starts;
}

/** Index of the last of the first `count` ascending values that is ≤ x, or 0. */
function lastAtOrBelow(values: readonly number[], x: number, count: number): number {
  let low = 0;
  let high = count;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (values[middle]! <= x) low = middle;
    else high = middle;
  }
  return low;
}

function difference(a: Float64Array, b: Float64Array): SkinPath {
  const sign = b[0]! >= a[0]! ? 1 : -1;
  return asPath(b.map((value, k) => sign * (value - a[k]!)));
}

const asPath = (sums: Float64Array): SkinPath => ({
  length: sums[0]!,
  x: sums[1]!,
  r: sums[2]!,
  xx: sums[3]!,
  xr: sums[4]!,
  rr: sums[5]!,
});
