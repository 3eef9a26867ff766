/** Asks the physics once and gives everything that panels, drawing and terminal show of how a craft turns and flies. */
import type { Craft } from '../../craft/craft.ts';
import { kept } from '../../numeric/kept.ts';
import { infeasible, type Outcome, solved, valueOrNull } from '../../numeric/outcome.ts';
import { type CraftState, craftStateOf } from '../../physics/craftState.ts';
import { type ClimbPoint, climbCurve } from '../../physics/cruise/climb.ts';
import { type SpeedPoint, speedCurve, topSpeed } from '../../physics/thrust/speed.ts';
import { type Thruster, thrustersOf } from '../../physics/thrust/thrusters.ts';
import {
  type SteadyPoint,
  steadyCurve,
  type Turn,
  type TurnAsked,
  turnOf,
} from '../../physics/turning/turn.ts';
import { inUnits } from '../../units/sentence.ts';
import type { UnitSystem } from '../../units/units.ts';
import { noRow, type Rows } from '../rows.ts';
import { figureText, readRow } from '../rowText.ts';
import { addedRows, hullAirRows } from './addedRows.ts';
import { arrowsOf, type ThrustArrow } from './arrows.ts';
import { authorityRows } from './authorityRows.ts';
import { type PlaceCost, placeCostOf } from './costs.ts';
import { handlingWords } from './handling.ts';
import { type HarderNeed, harderNeed } from './harderNeed.ts';
import { inflowRows, inflowsAt, type PropellerAir } from './inflows.ts';
import { MODEL_ERROR } from './modelError.ts';
import { CLIMB_POINTS, climbRows, hoverRows, pitchRows } from './pitchRows.ts';
import { type PropellerLine, propellerLines } from './propellers.ts';
import { speedRows } from './speedRows.ts';
import { ifDriven } from './thrusterWords.ts';
import { turnCautions } from './turnCautions.ts';
import { TURN_KEYS } from './turnFigure.ts';
import { costWords, turnHeadline } from './turnHeadline.ts';
import { turnRows } from './turnRows.ts';
import { type PlainTurnVerdict, type TurnVerdict, turnVerdictsOf } from './turnVerdicts.ts';
import { widestCircle, widestNotes, widestRows } from './widest.ts';

/** What is cheap enough to follow a drag. */
export interface TurnFigures {
  readonly rows: Rows;
  readonly arrows: readonly ThrustArrow[];
  /** What the place of each thruster costs, and the same in sentences. */
  readonly costs: readonly PlaceCost[];
  readonly costWords: readonly string[];
}

export interface TurnReport extends TurnFigures {
  /** One for each turning target that is set. */
  readonly verdicts: readonly TurnVerdict[];
  /** Whether every turning target that is set is met. */
  readonly met: boolean;
  /** What the targets ask the most of; null where they ask nothing. */
  readonly need: HarderNeed | null;
  readonly headline: string;
  /** How much it has to be steered, and up to which speed its pitch is held: stands with the headline. */
  readonly handling: readonly string[];
  /** What to know of how it flies; what is in `handling` first. */
  readonly notes: readonly string[];
  /** What to mind, and what is missing. */
  readonly cautions: readonly string[];
  /** Null without a thruster that gives thrust, or without mass. Its sentences are in SI; the rows have them in the units asked for. */
  readonly turn: Turn | null;
  /** Empty where there is none; sentences in SI. */
  readonly speedCurve: readonly SpeedPoint[];
  readonly steadyCurve: readonly SteadyPoint[];
  readonly climbCurve: readonly ClimbPoint[];
  readonly propellers: readonly PropellerLine[];
  readonly inflows: readonly PropellerAir[];
}

const stateOf = kept(craftStateOf);

/** Sentences come in the units asked for; values are SI always. */
export const turnFigures = (
  craft: Craft,
  { throttle, vector, speed }: TurnAsked,
  units: UnitSystem,
): TurnFigures => figuresKept(craft, throttle, vector, speed, units);

const figuresKept = kept(
  (
    craft: Craft,
    throttle: number,
    vector: number | null,
    speed: number | null,
    units: UnitSystem,
  ): TurnFigures => {
    const state = stateOf(craft);
    if (state.status === 'infeasible') return withoutHull(why(state), units);
    return readFigures(figuresOf(state.value, { throttle, vector, speed }), units);
  },
);

/** Everything, the simulated turns too: some tens of milliseconds, for a craft at rest on the screen. */
export const turnReport = (
  craft: Craft,
  { throttle, vector, speed }: TurnAsked,
  units: UnitSystem,
): TurnReport => reportKept(craft, throttle, vector, speed, units);

const reportKept = kept(
  (
    craft: Craft,
    throttle: number,
    vector: number | null,
    speed: number | null,
    units: UnitSystem,
  ): TurnReport => {
    const state = stateOf(craft);
    if (state.status === 'infeasible') return withoutHull(why(state), units);
    return readReport(reportOf(state.value, { throttle, vector, speed }), units);
  },
);

const why = (outcome: Outcome<unknown>): string =>
  outcome.status === 'solved' ? '' : [outcome.why, outcome.remedy].filter(Boolean).join(' ');

function withoutHull(sentence: string, units: UnitSystem): TurnReport {
  const said = inUnits(sentence, units);
  return {
    rows: { 'turn.arm': noRow('Arm about the CG', 'length', said) },
    arrows: [],
    costs: [],
    costWords: [],
    verdicts: [],
    met: false,
    need: null,
    headline: said,
    handling: [],
    notes: [],
    cautions: [],
    turn: null,
    speedCurve: [],
    steadyCurve: [],
    climbCurve: [],
    propellers: [],
    inflows: [],
  };
}

function figuresOf(state: CraftState, asked: TurnAsked): TurnFigures {
  const thrusters = thrustersOf(state);
  const costs = partsOf(thrusters).flatMap((part) => placeCostOf(state, part) ?? []);
  return {
    rows: {
      ...authorityRows(state, asked.throttle),
      ...speedRows(state, asked),
      ...pitchRows(state, asked),
      ...hoverRows(state),
      ...addedRows(state),
    },
    arrows: arrowsOf(state),
    costs,
    costWords: costWords(costs),
  };
}

const partsOf = (thrusters: readonly Thruster[]): string[] => [...new Set(thrusters.map(({ part }) => part))];

type PlainReport = Omit<TurnReport, 'verdicts'> & { readonly verdicts: readonly PlainTurnVerdict[] };

function reportOf(state: CraftState, asked: TurnAsked): PlainReport {
  const { craft } = state;
  const thrusters = thrustersOf(state);
  const figures = figuresOf(state, asked);
  const turn = ifDriven(state, () => turnOf(state, asked));
  const cruise = figures.rows['speed.cruise']!;
  const inflows =
    cruise.value === null ? infeasible(cruise.why) : inflowsAt(state, cruise.value, asked.throttle);
  const climbs = curveOf(ifDriven(state, () => solved(climbCurve(state, asked.throttle, CLIMB_POINTS))));
  const steadies = curveOf(ifDriven(state, () => steadyCurve(state, asked)));
  const widest = widestCircle(turn, steadies);
  const rows = inOrder({
    ...figures.rows,
    ...turnRows(turn, figures.rows['thrust.static']!.value ?? 0, figures.rows['speed.top']!.value),
    ...widestRows(widest),
    ...climbRows(state, asked.throttle, climbs),
    ...inflowRows(inflows, thrusters),
    ...hullAirRows(state),
  });
  const verdicts = turnVerdictsOf(craft.targets, thrusters, turn, rows);
  const handling = handlingWords(
    state,
    ifDriven(state, () => topSpeed(state)),
  );
  const headline = turnHeadline(craft, thrusters, turn, rows);
  return {
    ...figures,
    rows,
    verdicts,
    met: verdicts.every(({ state: each }) => each === 'met'),
    need: turn.status === 'solved' ? harderNeed(turn.value.authority) : null,
    headline,
    handling,
    notes: [
      ...handling,
      ...widestNotes(widest),
      ...(turn.status === 'solved' ? [...turn.value.glide.notes, MODEL_ERROR] : []),
    ],
    cautions: turnCautions(state, thrusters, turn).filter((each) => each !== headline),
    turn: valueOrNull(turn),
    speedCurve: curveOf(ifDriven(state, () => solved(speedCurve(state, { throttle: asked.throttle })))),
    steadyCurve: steadies,
    climbCurve: climbs,
    propellers: propellerLines(state),
    inflows: valueOrNull(inflows)?.each ?? [],
  };
}

const curveOf = <T>(curve: Outcome<readonly T[]>): readonly T[] => valueOrNull(curve) ?? [];

const inOrder = (rows: Rows): Rows =>
  Object.fromEntries(TURN_KEYS.flatMap((key) => (rows[key] ? [[key, rows[key]]] : [])));

const readFigures = <F extends TurnFigures>(figures: F, units: UnitSystem): F => ({
  ...figures,
  rows: Object.fromEntries(Object.entries(figures.rows).map(([key, row]) => [key, readRow(row, units)])),
  costWords: figures.costWords.map((sentence) => inUnits(sentence, units)),
});

function readReport(report: PlainReport, units: UnitSystem): TurnReport {
  const read = (sentence: string) => inUnits(sentence, units);
  const readVerdict = ({ sides, ...verdict }: PlainTurnVerdict): TurnVerdict => ({
    ...verdict,
    ...figureText(verdict.row, sides, units),
    row: readRow(verdict.row, units),
    target: read(verdict.target),
    marginWords: read(verdict.marginWords),
    need: verdict.need.map(read),
    working: { ...verdict.working, inputs: verdict.working.inputs.map((row) => readRow(row, units)) },
  });
  return {
    ...readFigures(report, units),
    verdicts: report.verdicts.map(readVerdict),
    headline: read(report.headline),
    handling: report.handling.map(read),
    notes: report.notes.map(read),
    cautions: report.cautions.map(read),
    propellers: report.propellers.map((line) => ({ ...line, name: read(line.name) })),
  };
}
