/** Asks the physics once and gives everything that panels, canvas and terminal show of a craft. */
import { type Craft, listed } from '../craft/craft.ts';
import { kept } from '../numeric/kept.ts';
import { floatOf } from '../physics/balance/float.ts';
import { cgOf } from '../physics/balance/loading.ts';
import { type CraftState, craftStateOf } from '../physics/craftState.ts';
import type { Hull } from '../physics/hull/hull.ts';
import type { Piece } from '../physics/mass/pieces.ts';
import { positionOf } from '../physics/mass/position.ts';
import { type Branch, drawnBranch } from '../physics/mass/wirePath.ts';
import { inUnits } from '../units/sentence.ts';
import type { UnitSystem } from '../units/units.ts';
import { adviceOf } from './advice.ts';
import type { Assessment, Geometry, PieceView } from './assessment.ts';
import { beamOf, leadBar } from './beam.ts';
import { cautionsOf } from './cautions.ts';
import { floatRows, supportRows } from './floatRows.ts';
import { headlineOf } from './headline.ts';
import { hullRows, massRows } from './hullRows.ts';
import { leadRows, oneWeightRows } from './leadRows.ts';
import { noRow, type Rows } from './rows.ts';
import { figureText, readRow } from './rowText.ts';
import { arrowsOf } from './turning/arrows.ts';
import type { Verdict } from './verdict.ts';
import { meetsTargets, type PlainVerdict, verdictsOf } from './verdicts.ts';

/** Sentences come in the units asked for; values are SI always. Never throws for a craft from the loading gate. */
export function assess(craft: Craft, units: UnitSystem = 'metric'): Assessment {
  const state = craftStateOf(craft);
  if (state.status === 'infeasible') {
    const sentence = inUnits([state.why, state.remedy].filter(Boolean).join(' '), units);
    return {
      rows: { 'hull.volume': noRow('Gas volume', 'volume', sentence) },
      verdicts: [],
      met: false,
      headline: sentence,
      advice: [],
      geometry: state,
      cautions: [],
    };
  }
  return assessState(state.value, units);
}

function assessState(state: CraftState, units: UnitSystem): Assessment {
  const rows: Rows = {
    ...hullRows(state),
    ...massRows(state),
    ...floatRows(state),
    ...leadRows(state),
    ...oneWeightRows(state),
    ...supportRows(state),
  };
  const verdicts = verdictsOf(state, rows);
  const advice = adviceOf(state, rows);
  const read = (sentence: string) => inUnits(sentence, units);
  const readVerdict = ({ sides, ...verdict }: PlainVerdict): Verdict => ({
    ...verdict,
    ...figureText(verdict.row, sides, units),
    row: readRow(verdict.row, units),
    target: read(verdict.target),
    marginWords: read(verdict.marginWords),
    working: { ...verdict.working, inputs: verdict.working.inputs.map((row) => readRow(row, units)) },
  });
  return {
    rows: Object.fromEntries(Object.entries(rows).map(([key, row]) => [key, readRow(row, units)])),
    verdicts: verdicts.map(readVerdict),
    met: meetsTargets(verdicts),
    headline: read(headlineOf(state, rows, verdicts, advice)),
    advice,
    geometry: geometryOf(state, rows),
    cautions: cautionsOf(state).map(read),
  };
}

const drawnBranches = kept((branches: readonly Branch[], hull: Hull) =>
  branches.map((branch) => drawnBranch(branch, hull)),
);

/** Of what did not move they are the same objects. */
const pieceViews = kept((pieces: readonly Piece[], part: string): PieceView[] =>
  pieces.map(({ middle, cg, roll }, copy) => ({ part, copy, middle, cg, roll })),
);

function geometryOf(state: CraftState, rows: Rows): Geometry {
  const { craft, hull, loading, pieces, branches } = state;
  const attitude = floatOf(loading);
  return {
    status: 'solved',
    hull,
    cb: loading.cb,
    cg: cgOf(loading),
    attitude: attitude.status === 'solved' ? attitude.value : null,
    pieces: craft.parts.order.flatMap((id) => pieceViews(pieces[id]!, id)),
    wires: listed(craft.wires).map(({ id }) => ({
      wire: id,
      branches: drawnBranches(branches[id]!, hull),
      mass: branches[id]!.reduce((sum, { mass }) => sum + mass, 0),
      length: branches[id]!.reduce((sum, { length }) => sum + length, 0),
    })),
    hardpoints: listed(craft.hardpoints).map(({ id, place }) => ({
      hardpoint: id,
      at: positionOf(place, hull),
    })),
    support: craft.support && positionOf(craft.support, hull),
    thrust: arrowsOf(state),
    beam: beamOf(state),
    lead: leadBar(state, rows),
  };
}
