/**
 * The hull made by turning a meridian r(x) about the axis.
 *
 *   V = π∫r² dx, x_CB = π∫x r² dx / V, planform area = 2∫r dx, greatest section area = π r_max²
 *   ∫(y² + z²)dV = π/2 ∫r⁴ dx;  ∫(z² + x′²)dV = π/4 ∫r⁴ dx + π∫x² r² dx − V x_CB²
 *   wetted area A = 2π∫r ds; film area = ∫g ds, g the width of film round the section (2πr unless it lies in folds)
 *   of the film: x_S = ∫x g ds / ∫g ds;  about x ∫r² g ds, about y and z ½∫r² g ds + ∫x² g ds − x_S² ∫g ds
 *   of a seam: length ∫ds, the same with g = 1
 *
 * x station, r distance from the axis, s tape distance, all m. Elementary calculus (Pappus); flat end faces are
 * stretches of the meridian, so they count in area, film, tape distance and seam.
 */
import { drawStations } from './drawStations.ts';
import type { Hull, SkinPath, Triple } from './hull.ts';
import { legendreRule } from './legendreSeries.ts';
import type { Meridian } from './meridian.ts';
import { type Panel, panelsOf } from './panels.ts';
import { type SkinTable, skinTable } from './skinTable.ts';

const TERMS = 16;

/** `terms`: Legendre terms a panel; the answer must not depend on it (tests double it). */
export function revolve(meridian: Meridian, terms = TERMS): Hull {
  const rule = legendreRule(terms);
  const panels = panelsOf(meridian.stretches, meridian.maxRadius, rule);
  const table = skinTable(panels);
  const sums = sectionSums(panels, rule.weights);
  return { ...solidFigures(meridian, sums), ...skinFigures(sums, table.whole), ...lookups(panels, table) };
}

interface SectionSums {
  /** ∫r dx, ∫r² dx, ∫x r² dx, ∫x² r² dx, ∫r⁴ dx. */
  r: number;
  rr: number;
  xrr: number;
  xxrr: number;
  rrrr: number;
  /** ∫g ds, ∫x g ds, ∫x² g ds, ∫r² g ds. */
  film: number;
  filmX: number;
  filmXX: number;
  filmRR: number;
}

function sectionSums(panels: readonly Panel[], weights: readonly number[]): SectionSums {
  const sums = { r: 0, rr: 0, xrr: 0, xxrr: 0, rrrr: 0, film: 0, filmX: 0, filmXX: 0, filmRR: 0 };
  for (const { sample } of panels) {
    for (let i = 0; i < weights.length; i += 1) {
      const x = sample.x[i]!;
      const r = sample.r[i]!;
      const dx = weights[i]! * sample.dx[i]!;
      const film = weights[i]! * sample.ds[i]! * sample.film[i]!;
      sums.r += r * dx;
      sums.rr += r * r * dx;
      sums.xrr += x * r * r * dx;
      sums.xxrr += x * x * r * r * dx;
      sums.rrrr += r * r * r * r * dx;
      sums.film += film;
      sums.filmX += x * film;
      sums.filmXX += x * x * film;
      sums.filmRR += r * r * film;
    }
  }
  return sums;
}

function solidFigures({ maxRadius }: Meridian, sums: SectionSums) {
  const cbStation = sums.xrr / sums.rr;
  const across = (Math.PI / 4) * sums.rrrr + Math.PI * (sums.xxrr - cbStation * sums.xrr);
  const volumeInertia: Triple = [(Math.PI / 2) * sums.rrrr, across, across];
  return {
    height: 2 * maxRadius,
    breadth: 2 * maxRadius,
    volume: Math.PI * sums.rr,
    frontalArea: Math.PI * maxRadius * maxRadius,
    planformArea: 2 * sums.r,
    cbStation,
    volumeInertia,
  };
}

function skinFigures(sums: SectionSums, seam: SkinPath) {
  return {
    area: 2 * Math.PI * seam.r,
    filmArea: sums.film,
    skinStation: sums.filmX / sums.film,
    skinInertia: shellInertia(sums.film, sums.filmX, sums.filmXX, sums.filmRR),
    seamLength: seam.length,
    seamStation: seam.x / seam.length,
    seamInertia: shellInertia(seam.length, seam.x, seam.xx, seam.rr),
  };
}

function shellInertia(whole: number, x: number, xx: number, rr: number): Triple {
  const across = rr / 2 + xx - (x * x) / whole;
  return [rr, across, across];
}

/** A station this share of the length past an end is still on it: lengths add up to rounding only. */
const ROUNDING = 1e-12;

function lookups(panels: readonly Panel[], table: SkinTable) {
  const { length } = table;
  const slack = ROUNDING * length;
  const radiusAt = (station: number): number =>
    station >= -slack && station <= length + slack ? table.radiusOf(table.spotAtStation(station)) : 0;
  // Walking round a section asks for one station many times.
  let last = { station: Number.NaN, radius: 0 };
  const radius = (station: number): number => {
    if (station !== last.station) last = { station, radius: radiusAt(station) };
    return last.radius;
  };
  return {
    length,
    radius,
    sectionArea: (station: number) => Math.PI * radius(station) ** 2,
    girth: (station: number) => 2 * Math.PI * radius(station),
    tapeAt: (station: number) => table.tapeOf(table.spotAtStation(station)),
    stationAt: (tape: number) => table.stationOf(table.spotAtTape(tape)),
    skinPath: (from: number, to: number) =>
      table.pathBetween(table.spotAtStation(from), table.spotAtStation(to)),
    drawStations: (count: number) => drawStations(panels, count),
  };
}
