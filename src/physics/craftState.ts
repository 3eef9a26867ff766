/** A craft with everything computed that more than one question needs: hull, air, where each mass is, how it loads. */
import { type Craft, listed } from '../craft/craft.ts';
import type { Place } from '../craft/placeSchema.ts';
import type { Copies, WireEnd, WireRun } from '../craft/schema.ts';
import { kept } from '../numeric/kept.ts';
import { type Outcome, solved } from '../numeric/outcome.ts';
import { type Air, airOf } from './air/day.ts';
import { gasDensity } from './air/gas.ts';
import type { Loading } from './balance/loading.ts';
import { type Covariance, covarianceOf, standardOf, type UncertainMass } from './balance/spread.ts';
import type { Hull } from './hull/hull.ts';
import { hullOf } from './hull/hullOf.ts';
import { type SkinMass, skinMassOf } from './hull/skinMass.ts';
import { type Body, pointMass, sumsOf } from './mass/body.ts';
import { secondOfInertia } from './mass/inertia.ts';
import { type Piece, piecesOf } from './mass/pieces.ts';
import { onClock, positionOf } from './mass/position.ts';
import { type Branch, branchesOf, type RunEnd } from './mass/wirePath.ts';

export interface CraftState {
  readonly craft: Craft;
  readonly hull: Hull;
  readonly air: Air;
  /** kg/m³ */
  readonly gasDensity: number;
  readonly skin: SkinMass;
  readonly film: Body;
  readonly seams: Body;
  readonly patches: readonly Body[];
  readonly pieces: Readonly<Record<string, readonly Piece[]>>;
  readonly branches: Readonly<Record<string, readonly Branch[]>>;
  /** Every solid mass. */
  readonly bodies: readonly Body[];
  readonly loading: Loading;
  /** Of the solid mass sums, from the tolerances in the craft file. */
  readonly covariance: Covariance;
}

/** Edits leave what they do not touch the same object: dragging a part computes no hull and one part's pieces. */
const hullOfShape = kept(hullOf);
const piecesOfPart = kept(piecesOf);
const branchesOfRun = kept(branchesOf);
export const endOfPieces = kept(endAt);

export const hullOfCraft = ({ hull: { shape } }: Craft): Outcome<Hull> => hullOfShape(shape);

/** Infeasible only when the hull cannot be formed. The craft must not be changed in place afterwards. */
export function craftStateOf(craft: Craft): Outcome<CraftState> {
  const hull = hullOfCraft(craft);
  return hull.status === 'infeasible' ? hull : solved(stateOn(craft, hull.value));
}

function stateOn(craft: Craft, hull: Hull): CraftState {
  const air = airOf(craft.day);
  const gas = gasDensity(craft.gas, air);
  const skin = skinMassOf(craft.hull, hull, craft.film);
  const parts = listed(craft.parts);
  const pieces = Object.fromEntries(parts.map((part) => [part.id, piecesOfPart(part, hull)]));
  const branches = Object.fromEntries(
    listed(craft.wires).map((wire) => [wire.id, branchesBetween(craft, wire, pieces, hull)]),
  );
  const film = bodyOnAxis(skin.film);
  const seams = bodyOnAxis(skin.seams);
  const patches = craft.hull.patches.map(({ mass, station, clock }) =>
    pointMass(mass, onClock(station, hull.radius(station, clock), clock)),
  );
  const bodies = [
    film,
    seams,
    ...patches,
    ...Object.values(pieces).flat(),
    ...Object.values(branches).flat(),
  ];
  const uncertain: UncertainMass[] = [
    { u: skin.film.uncertainty, at: [film.cg] },
    ...parts.map(({ id, massTolerance }) => ({
      u: standardOf(massTolerance),
      at: pieces[id]!.map((piece) => piece.cg),
    })),
  ];
  return {
    craft,
    hull,
    air,
    gasDensity: gas,
    skin,
    film,
    seams,
    patches,
    pieces,
    branches,
    bodies,
    loading: {
      solid: sumsOf(bodies),
      cb: [hull.cbStation, 0, 0],
      grossLift: (air.density - gas) * hull.volume,
    },
    covariance: covarianceOf(uncertain),
  };
}

/** The branches of a run of the craft, its ends where the pieces are. */
export function branchesBetween(
  craft: Craft,
  wire: WireRun,
  pieces: CraftState['pieces'],
  hull: Hull,
): readonly Branch[] {
  const endOf = (end: WireEnd): RunEnd =>
    end.kind === 'part'
      ? endOfPieces(pieces[end.part]!, craft.parts.byId[end.part]!.copies.kind)
      : looseEnd(end.place, hull);
  return branchesOfRun(wire, endOf(wire.from), endOf(wire.to), hull);
}

/** A part of several pieces at one place is one end of a run; a pair or a ring has an end at each piece. */
function endAt(pieces: readonly Piece[], copies: Copies['kind']): RunEnd {
  const points = pieces.map(({ middle }) => middle);
  return { points: copies === 'together' ? points.slice(0, 1) : points, pair: copies === 'pair' };
}

export const looseEnd = kept(
  (place: Place, hull: Hull): RunEnd => ({ points: [positionOf(place, hull)], pair: false }),
);

const bodyOnAxis = ({ mass, station, inertia }: SkinMass['seams']): Body => ({
  mass,
  cg: [station, 0, 0],
  second: secondOfInertia(inertia),
});
