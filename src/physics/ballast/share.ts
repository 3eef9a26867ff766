/**
 * What something adds to the sums that decide how a craft floats: (Σm, Σm x, Σm y, Σm z), and to the mass of wire,
 * which is counted again by itself because a plan may be wished to have little of it.
 */
import type { Craft } from '../../craft/craft.ts';
import type { Part, WireEnd, WireRun } from '../../craft/schema.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import { type CraftState, endOfPieces, looseEnd } from '../craftState.ts';
import { type Body, sumsOf } from '../mass/body.ts';
import { type Piece, piecesOf } from '../mass/pieces.ts';
import { branchesOf, type RunEnd } from '../mass/wirePath.ts';

/** kg, kg·m (three of them, about the nose tip), kg of wire. */
export type Share = readonly [mass: number, x: number, y: number, z: number, wire: number];

export const NO_SHARE: Share = [0, 0, 0, 0, 0];

export const plus = (a: Share, b: Share, times = 1): Share => [
  a[0] + times * b[0],
  a[1] + times * b[1],
  a[2] + times * b[2],
  a[3] + times * b[3],
  a[4] + times * b[4],
];

export const times = (a: Share, factor: number): Share => plus(NO_SHARE, a, factor);

export function shareOfBodies(bodies: readonly Body[], wire = false): Share {
  const { mass, moment } = sumsOf(bodies);
  return [mass, ...moment, wire ? mass : 0];
}

/** The whole of a craft. */
export function shareOfCraft({ bodies, branches }: CraftState): Share {
  const [mass, x, y, z] = shareOfBodies(bodies);
  const wire = Object.values(branches).flat();
  return [mass, x, y, z, wire.reduce((sum, branch) => sum + branch.mass, 0)];
}

/** The wire runs of a craft that end at a part. */
export const runsAt = ({ wires }: Craft, part: string): WireRun[] =>
  wires.order
    .map((id) => wires.byId[id]!)
    .filter(({ from, to }) => [from, to].some((end) => end.kind === 'part' && end.part === part));

/** A craft as a plan would have it, and as it was given. */
export interface Planned {
  readonly given: Craft;
  readonly state: CraftState;
}

/** A part where it stands with the runs that end at it; their other ends are where the plan has them. */
export function shareOfPart(planned: Planned, part: Part, runs: readonly WireRun[]): Share {
  const pieces = piecesOf(part, planned.state.hull);
  const own = shareOfBodies(pieces);
  if (runs.length === 0) return own;
  return plus(own, shareOfRuns(planned, runs, part.id, endOfPieces(pieces, part.copies.kind)));
}

/** The runs of a part that is not aboard: their ends lie loose where it was given. */
export const shareWithout = (planned: Planned, part: Part, runs: readonly WireRun[]): Share =>
  runs.length === 0
    ? NO_SHARE
    : shareOfRuns(planned, runs, part.id, looseEnd(part.place, planned.state.hull));

function shareOfRuns(planned: Planned, runs: readonly WireRun[], part: string, here: RunEnd): Share {
  const endOf = (end: WireEnd): RunEnd =>
    end.kind === 'part' && end.part === part ? here : otherEnd(planned, end);
  return runs
    .map((run) => shareOfBodies(branchesOf(run, endOf(run.from), endOf(run.to), planned.state.hull), true))
    .reduce((sum, share) => plus(sum, share), NO_SHARE);
}

function otherEnd({ given, state }: Planned, end: WireEnd): RunEnd {
  if (end.kind === 'loose') return looseEnd(end.place, state.hull);
  const pieces = state.pieces[end.part];
  const part = (pieces ? state.craft : given).parts.byId[end.part]!;
  return pieces ? endOfPieces(pieces, part.copies.kind) : looseEnd(part.place, state.hull);
}

/** Σ (1, p) over the pieces: what one more kilogram in each of them would add. */
export const perKilogram = (pieces: readonly Piece[]): Share =>
  pieces.reduce<Share>((sum, { cg }) => plus(sum, [1, cg[0], cg[1], cg[2], 0]), NO_SHARE);

/** One kilogram of the load that is tried. */
export const trialShare = ({ trial }: { readonly trial: Vec3 | null }): Share =>
  trial ? [1, ...trial, 0] : NO_SHARE;
