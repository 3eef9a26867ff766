/**
 * The round balloon of two flat discs as a hull: its axis of symmetry lies athwart (standing: along y, seam in the
 * plane of symmetry, the outline from the side is a circle) or upright (lying: along z, seam level). It is a body of
 * revolution about that axis, not about the hull axis, so radius and tape distance depend on the clock angle.
 *
 *   section at ξ from the centre, W² = R² − ξ², w = W sin χ, ϱ² = ξ² + w² (both from χ = 0 to π/2):
 *   area = 4∫ϱw²/√(R² + ϱ²) dχ;  girth = 4∫√(W²cos²χ + ϱ²w²/(R² + ϱ²)) dχ
 *   volume about the axis of symmetry π∫_rim^pole ϱ⁴ dζ, across it half of that and 2π∫ζ²ϱ² dζ
 *   film, whose ring at σ from the rim has the flat radius a − σ: 4π∫ϱ²(a − σ)dσ, and half of that and 4π∫ζ²(a − σ)dσ
 *   seam, half the rim each: πR³ and πR³/2
 *
 * Shape and symbols: balloonProfile.ts (Paulsen 1994). The section integrals follow from dζ/dϱ = −ϱ²/√(R⁴ − ϱ⁴).
 */
import { integrateFixed } from '../../numeric/quadrature.ts';
import {
  FLAT_RADIUS,
  HALF_THICKNESS,
  overProfile,
  unitHeight,
  unitRise,
  unitRun,
  unitTape,
} from './balloonProfile.ts';
import { clockMeridian, type Direction, unitRadius } from './clockMeridian.ts';
import { drawStations } from './drawStations.ts';
import type { Hull, Triple } from './hull.ts';
import { legendreRule } from './legendreSeries.ts';
import type { ShapeOf } from './meridian.ts';
import { type Panel, panelsOf } from './panels.ts';
import { type SkinTable, type Spot, skinTable } from './skinTable.ts';

type Stance = ShapeOf<'roundTwoSheet'>['stance'];

export function roundTwoSheet({ flatDiameter, stance }: ShapeOf<'roundTwoSheet'>): Hull {
  const radius = flatDiameter / 2 / FLAT_RADIUS;
  return { ...figures(radius, stance), ...lookups(radius, stance) };
}

function figures(R: number, stance: Stance) {
  const thickness = 2 * HALF_THICKNESS * R;
  const broadside = sectionArea(R, 0);
  const standing = stance === 'standing';
  return {
    length: 2 * R,
    height: standing ? 2 * R : thickness,
    breadth: standing ? thickness : 2 * R,
    volume: R ** 3 * solid.volume,
    area: (Math.PI * R) ** 2,
    filmArea: 2 * Math.PI * (FLAT_RADIUS * R) ** 2,
    seamLength: Math.PI * R,
    frontalArea: broadside,
    planformArea: standing ? broadside : Math.PI * R * R,
    cbStation: R,
    skinStation: R,
    seamStation: R,
    volumeInertia: turned(R ** 5, solid.about, solid.about / 2 + solid.across, stance),
    skinInertia: turned(R ** 4, film.about, film.about / 2 + film.across, stance),
    seamInertia: turned(R ** 3, Math.PI, Math.PI / 2, stance),
  };
}

/** Integrals for R = 1; `about` the axis of symmetry, `across` from the plane of the rim. */
const rhoSquared = (phi: number): number => Math.cos(phi) ** 2;
const solid = {
  volume: 2 * Math.PI * overProfile((phi) => rhoSquared(phi) * unitRise(phi)),
  about: Math.PI * overProfile((phi) => rhoSquared(phi) ** 2 * unitRise(phi)),
  across: 2 * Math.PI * overProfile((phi) => unitHeight(phi) ** 2 * rhoSquared(phi) * unitRise(phi)),
};
const flatRing = (phi: number): number => (FLAT_RADIUS - unitTape(phi)) * unitRun(phi);
const film = {
  about: 4 * Math.PI * overProfile((phi) => rhoSquared(phi) * flatRing(phi)),
  across: 4 * Math.PI * overProfile((phi) => unitHeight(phi) ** 2 * flatRing(phi)),
};

function turned(scale: number, about: number, across: number, stance: Stance): Triple {
  const [a, c] = [scale * about, scale * across];
  return stance === 'standing' ? [c, a, c] : [c, c, a];
}

/** Panels toward the middle of the section get shorter: near the pole the profile is flat but not smooth. */
const PANEL_ENDS = [0, 1 / 27, 1 / 9, 1 / 3, 1];

function overSection(f: (sin: number, cos: number) => number): number {
  let sum = 0;
  for (let i = 1; i < PANEL_ENDS.length; i += 1)
    sum += integrateFixed(
      (chi) => f(Math.sin(chi), Math.cos(chi)),
      (PANEL_ENDS[i - 1]! * Math.PI) / 2,
      (PANEL_ENDS[i]! * Math.PI) / 2,
      16,
    );
  return sum;
}

function sectionArea(R: number, xi: number): number {
  const widthSquared = R * R - xi * xi;
  if (widthSquared <= 0) return 0;
  return overSection((sin) => {
    const w2 = widthSquared * sin * sin;
    const rho2 = xi * xi + w2;
    return 4 * w2 * Math.sqrt(rho2 / (R * R + rho2));
  });
}

function girth(R: number, xi: number): number {
  const widthSquared = R * R - xi * xi;
  if (widthSquared <= 0) return 0;
  return overSection((sin, cos) => {
    const w2 = widthSquared * sin * sin;
    const rho2 = xi * xi + w2;
    return 4 * Math.sqrt(widthSquared * cos * cos + (rho2 * w2) / (R * R + rho2));
  });
}

const TERMS = 16;
/** Clock angles whose tape tables are kept; a craft has fewer parts at different ones. */
const KEPT_TABLES = 256;

interface ClockTable {
  readonly panels: readonly Panel[];
  readonly table: SkinTable;
}

function lookups(R: number, stance: Stance) {
  const tables = new Map<number, ClockTable>();
  const tableAt = (clock: number): SkinTable => clockTable(clock).table;
  // The length of a table agrees with 2R to rounding only; the tail is its end.
  const spotAt = (table: SkinTable, station: number): Spot =>
    table.spotAtStation(station >= 2 * R ? table.length : station);
  const clockTable = (clock: number): ClockTable => {
    const direction = directionOf(clock, stance);
    const known = tables.get(direction.along);
    if (known) return known;
    const panels = panelsOf(clockMeridian(R, direction), R, legendreRule(TERMS));
    const made = { panels, table: skinTable(panels) };
    if (tables.size >= KEPT_TABLES) tables.clear();
    tables.set(direction.along, made);
    return made;
  };
  return {
    radius: (station: number, clock: number) => R * unitRadius(station / R - 1, directionOf(clock, stance)),
    sectionArea: (station: number) => sectionArea(R, station - R),
    girth: (station: number) => girth(R, station - R),
    tapeAt(station: number, clock: number) {
      const table = tableAt(clock);
      return table.tapeOf(spotAt(table, station));
    },
    stationAt(tape: number, clock: number) {
      const table = tableAt(clock);
      return table.stationOf(table.spotAtTape(tape));
    },
    skinPath(from: number, to: number, clock: number) {
      const table = tableAt(clock);
      return table.pathBetween(spotAt(table, from), spotAt(table, to));
    },
    drawStations: (count: number) => drawStations(clockTable(0).panels, count),
  };
}

/** Components of the clock angle's direction along and across the axis of symmetry; both ≥ 0 by symmetry. */
function directionOf(clock: number, stance: Stance): Direction {
  const sin = Math.abs(Math.sin(clock));
  const cos = Math.abs(Math.cos(clock));
  return stance === 'standing' ? { along: sin, across: cos } : { along: cos, across: sin };
}
