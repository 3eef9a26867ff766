/** A craft with everything computed that more than one question needs: hull, air, where each mass is, how it loads. */
import { type Craft, listed } from '../craft/craft.ts';
import type { HullShape } from '../craft/hullSchema.ts';
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
import { onClock } from './mass/position.ts';
import { type Branch, branchesOf } from './mass/wirePath.ts';

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

/** Hulls by shape: edits leave an untouched shape the same object, so dragging a part computes no hull. */
const hulls = new WeakMap<HullShape, Outcome<Hull>>();

export function hullOfCraft({ hull: { shape } }: Craft): Outcome<Hull> {
  const known = hulls.get(shape);
  if (known) return known;
  const hull = hullOf(shape);
  hulls.set(shape, hull);
  return hull;
}

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
  const pieces = Object.fromEntries(parts.map((part) => [part.id, piecesOf(part, hull)]));
  const branches = Object.fromEntries(
    listed(craft.wires).map((wire) => [wire.id, branchesOf(wire, craft, pieces, hull)]),
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

const bodyOnAxis = ({ mass, station, inertia }: SkinMass['seams']): Body => ({
  mass,
  cg: [station, 0, 0],
  second: secondOfInertia(inertia),
});
