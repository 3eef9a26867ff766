/**
 * The layer of slowed air along a hull and the wake behind it.
 *
 * Its growth is that of layerGrowth.ts in the outer flow of hullFlow.ts, its profile that of layerProfile.ts. Where
 * it is turbulent its momentum area is Λ = Λ_U (u_e/U)^{−(H+2)}, Λ_U the area referred to the speed of the craft and
 * u_e the outer speed at its edge, found together with its thickness: at the tail the layer is thicker than the place
 * where frictionless air would stand still. Behind the tail the wake keeps Λ_U, and the profile without a skin; in
 * truth its middle fills up, which moves speed within the wake but hardly its mean.
 * Drag by friction and wake: D = ρU²Λ_U (Squire & Young 1938; A. D. Young, ARC R&M 1874, 1939: from memory).
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { pchip } from '../../numeric/pchip.ts';
import { say } from '../../units/sentence.ts';
import type { HullFlow, SurfaceMark } from './hullFlow.ts';
import { type EdgeMark, type Growth, growLayer, SHAPE_POWER, type Transition } from './layerGrowth.ts';
import { shareOfSpeed, thicknessOf } from './layerProfile.ts';

export interface BoundaryLayer {
  /** Along the skin, nose tip to tail tip. */
  readonly marks: readonly LayerMark[];
  /** Where the layer becomes turbulent, m, and why. */
  readonly transition: { readonly station: number; readonly cause: Transition };
  /** Where the turbulent layer is likely to leave the skin, m; null if it does not. */
  readonly separation: number | null;
  /** Momentum area of the wake referred to the speed of the craft, m²: ρU² times it is the drag. */
  readonly wakeArea: number;
  /** The layer cut square to the axis at any station. */
  sliceAt(station: number): LayerSlice;
  /** One sentence each; empty when there is nothing to say. */
  readonly cautions: readonly string[];
}

export interface LayerMark {
  readonly station: number;
  readonly tape: number;
  readonly radius: number;
  /** 2πrθ, in a thick layer its momentum area, m² */
  readonly momentumArea: number;
  /** Square to the axis, m. */
  readonly thickness: number;
  readonly turbulent: boolean;
}

export interface LayerSlice {
  /** Distance of the skin from the axis, m; 0 behind the tail. */
  readonly skin: number;
  /** m; 0 ahead of the nose. */
  readonly thickness: number;
  /** Axial speed ÷ U at a distance from the axis, with the layer; 0 inside the hull. */
  axialAt(rho: number): number;
}

export interface LayerOptions {
  /** Station of something that trips the layer: tape, a seam, the edge of a patch, m. */
  readonly trip?: number;
}

/** The layer at `speed` through still air, m/s, with air of kinematic viscosity `viscosity`, m²/s. */
export function boundaryLayerOf(
  flow: HullFlow,
  speed: number,
  viscosity: number,
  { trip }: LayerOptions = {},
): Outcome<BoundaryLayer> {
  if (!(speed > 0))
    return infeasible(
      'A craft that does not move has no layer of slowed air.',
      'Give a speed above nothing.',
    );
  const { fine, edge } = edgeOf(flow, speed);
  const stream = {
    speed,
    viscosity,
    trip: trip === undefined ? null : between(flow.surface, trip, ({ tape }) => tape),
  };
  const growth = growLayer(edge, stream);
  const wakeArea = growth.marks.at(-1)!.area;
  const marks = flow.surface.map((mark, i) => layerMark(flow, mark, growth.marks[i * STEPS]!));
  const transition = { station: fine[growth.transition]!.station, cause: growth.cause };
  const separation = growth.separation === null ? null : fine[growth.separation]!.station;
  return solved({
    marks,
    transition,
    separation,
    wakeArea,
    sliceAt: (station) => sliceAt(flow, marks, transition.station, wakeArea, station),
    cautions: cautionsOf(flow, growth, fine),
  });
}

/** Steps of the quadrature from one mark of the skin to the next. */
const STEPS = 4;
/** At a sharp edge air without friction would be endlessly fast; beyond this share of U it is taken as no faster. */
const FASTEST = 2;

type FinePlace = Pick<SurfaceMark, 'station' | 'tape'>;

/** Places along the skin and the speed outside the layer there, STEPS to each mark of the flow. */
function edgeOf({ surface }: HullFlow, speed: number): { fine: FinePlace[]; edge: EdgeMark[] } {
  const tapes = surface.map(({ tape }) => tape);
  const along = (figure: (mark: SurfaceMark) => number) => pchip(tapes, surface.map(figure));
  const ratio = along((mark) => Math.min(FASTEST, Math.max(0, mark.ratio)));
  const radius = along((mark) => mark.radius);
  const station = along((mark) => mark.station);
  const fineTapes = tapes.flatMap((tape, i) => {
    const step = ((tapes[i + 1] ?? tape) - tape) / STEPS;
    return i + 1 < tapes.length ? Array.from({ length: STEPS }, (_, k) => tape + k * step) : [tape];
  });
  return {
    fine: fineTapes.map((tape) => ({ tape, station: station.at(tape) })),
    edge: fineTapes.map((tape) => ({ tape, radius: radius.at(tape), speed: speed * ratio.at(tape) })),
  };
}

/** A figure of the marks at a station; it goes evenly from each mark to the next. */
function between<M extends FinePlace>(
  marks: readonly M[],
  station: number,
  figure: (mark: M) => number,
): number {
  const next = marks.findIndex((mark) => mark.station > station);
  if (next <= 0) return figure(marks.at(next)!);
  const [a, b] = [marks[next - 1]!, marks[next]!];
  return figure(a) + ((figure(b) - figure(a)) * (station - a.station)) / (b.station - a.station);
}

function layerMark(
  flow: HullFlow,
  { station, tape, radius }: SurfaceMark,
  grown: Growth['marks'][number],
): LayerMark {
  const { area, turbulent } = grown;
  const place = { station, tape, radius, turbulent };
  if (turbulent) return { ...place, ...thickLayer(flow, area, station, radius) };
  return { ...place, momentumArea: area, thickness: thicknessOf(area, radius, false) };
}

/** The outer speed is looked for no lower than this share of U. */
const SLOWEST = 0.2;
const MOST_ROUNDS = 8;
/** Share to which thickness and outer speed must agree. */
const AGREED = 1e-4;

/** Thickness and momentum area that agree with the outer speed at the edge; `area` is referred to U. By secants. */
function thickLayer(flow: HullFlow, area: number, station: number, radius: number) {
  const areaAt = (thickness: number): number => {
    const { axial, radial } = flow.velocityAt(station, radius + thickness);
    return area * Math.max(SLOWEST, Math.hypot(axial, radial)) ** -SHAPE_POWER;
  };
  let before = thicknessOf(area, radius, true);
  let excess = thicknessOf(areaAt(before), radius, true) - before;
  let thickness = before + excess / 2;
  let momentumArea = areaAt(thickness);
  for (let round = 0; round < MOST_ROUNDS; round += 1) {
    const left = thicknessOf(momentumArea, radius, true) - thickness;
    if (Math.abs(left) <= AGREED * thickness || left === excess) break;
    const next = thickness - (left * (thickness - before)) / (left - excess);
    [before, excess, thickness] = [thickness, left, next > 0 ? next : thickness / 2];
    momentumArea = areaAt(thickness);
  }
  return { thickness, momentumArea };
}

/** Distance from the axis to the skin of the round hull of equal section, m; 0 beyond the ends. */
export const skinAt = ({ hull }: HullFlow, station: number): number =>
  Math.sqrt(Math.max(0, hull.sectionArea(station)) / Math.PI);

function sliceAt(
  flow: HullFlow,
  marks: readonly LayerMark[],
  transition: number,
  wakeArea: number,
  station: number,
): LayerSlice {
  const outside = (rho: number): number => flow.velocityAt(station, rho).axial;
  if (station < 0) return { skin: 0, thickness: 0, axialAt: outside };
  const skin = skinAt(flow, station);
  const thickness =
    station > flow.hull.length
      ? thickLayer(flow, wakeArea, station, 0).thickness
      : between(marks, station, (mark) => mark.thickness);
  const atEdge = outside(skin + thickness);
  const within = (rho: number): number => atEdge * shareOfSpeed(rho - skin, thickness, station >= transition);
  return { skin, thickness, axialAt: (rho) => (rho < skin + thickness ? within(rho) : outside(rho)) };
}

/** The air leaving the skin matters where the section is still more than this share of the greatest. */
const BASE = 0.1;

function cautionsOf({ hull }: HullFlow, growth: Growth, fine: readonly FinePlace[]): string[] {
  const cautions: string[] = [];
  const leaving = growth.separation === null ? null : fine[growth.separation]!.station;
  if (growth.cause === 'leaves')
    cautions.push(
      `At this speed the layer of slowed air stays smooth as far as station ${say(fine[growth.transition]!.station, 'length')} and leaves the skin there; unless tape or a seam trips it earlier, the wake is wider than figured.`,
    );
  if (leaving !== null && hull.sectionArea(leaving) > BASE * hull.frontalArea)
    cautions.push(
      `The air is likely to leave the skin at station ${say(leaving, 'length')}, where the hull is still wide: from there on the wake is wider and the drag greater than figured.`,
    );
  return cautions;
}
