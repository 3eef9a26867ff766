/** The verdicts on what the targets ask of turning: the time for the first 90° of yaw, and the side gust to be held. */
import type { Targets } from '../../craft/schema.ts';
import type { Outcome } from '../../numeric/outcome.ts';
import type { Thruster } from '../../physics/thrust/thrusters.ts';
import { turnsInYaw } from '../../physics/turning/steer.ts';
import type { Need, Turn } from '../../physics/turning/turn.ts';
import { say } from '../../units/sentence.ts';
import type { Row } from '../row.ts';
import type { Rows } from '../rows.ts';
import type { Verdict } from '../verdict.ts';
import { marginWords, type PlainVerdict } from '../verdicts.ts';
import { WITHIN_ERROR, withinError } from './modelError.ts';
import type { TurnKey } from './turnFigure.ts';
import { turnWorkingOf } from './turnWorkings.ts';

export type TurnVerdictKey = 'turnTime' | 'sideGust';

export interface TurnVerdict extends Omit<Verdict, 'key'> {
  readonly key: TurnVerdictKey;
  /** Met by less than the model's error: about enough. */
  readonly close: boolean;
  /** What the target takes and what there is, and what thrust, vectoring and arm would each have to become: one sentence each. */
  readonly need: readonly string[];
}

export type PlainTurnVerdict = Omit<TurnVerdict, 'figure' | 'side'> & Pick<PlainVerdict, 'sides'>;

/** One for each target that is set. */
export function turnVerdictsOf(
  { turnTime, sideGust }: Targets,
  thrusters: readonly Thruster[],
  turn: Outcome<Turn>,
  rows: Rows,
): PlainTurnVerdict[] {
  const told = turn.status === 'solved';
  const needs = told ? turn.value.authority.need : null;
  const limit = Math.max(...thrusters.filter(turnsInYaw).map(({ yaw }) => Math.max(-yaw.least, yaw.most)), 0);
  const verdict = (key: TurnVerdictKey, asked: number) => {
    const { make, keys } =
      key === 'turnTime' ? { make: timeVerdict, keys: NEEDED } : { make: gustVerdict, keys: AGAINST_GUST };
    return { ...make(asked, told, rows), need: needWords(needs?.[key] ?? null, rows, keys, limit) };
  };
  return [
    ...(turnTime === null ? [] : [verdict('turnTime', turnTime)]),
    ...(sideGust === null ? [] : [verdict('sideGust', sideGust)]),
  ];
}

type Bare = Omit<PlainTurnVerdict, 'need'>;

function timeVerdict(most: number, told: boolean, rows: Rows): Bare {
  const row = rows['turn.timeTo90']!;
  const margin = row.value === null ? null : most - row.value;
  const short = row.value === null ? 'does not get there' : 'too slow';
  return {
    key: 'turnTime',
    title: 'Passes 90°',
    ...judged(row, margin, told, ['quick enough', short]),
    target: `within ${say(most, 'time')}`,
    working: workingWith(rows, 'turn.timeTo90', NEEDED),
  };
}

function gustVerdict(least: number, told: boolean, rows: Rows): Bare {
  const row = rows['turn.gustHeld']!;
  const margin = row.value === null ? null : row.value - least;
  return {
    key: 'sideGust',
    title: 'Side gust',
    ...judged(row, margin, told, ['keeps its heading', 'turned by it']),
    target: `at least ${say(least, 'speed')} at rest`,
    working: workingWith(rows, 'turn.gustHeld', AGAINST_GUST),
  };
}

/** What cannot be told is open; what is told to have no figure is missed. Met or missed goes by the bare target. */
function judged(row: Row, margin: number | null, told: boolean, [good, bad]: readonly [string, string]) {
  const met = margin !== null && margin >= 0;
  const unsure = margin !== null && withinError(margin, row.value!);
  const close = met && unsure;
  return {
    state: !told ? ('open' as const) : met ? ('met' as const) : ('missed' as const),
    close,
    word: !told ? 'cannot be told' : close ? 'about enough' : met ? good : bad,
    row,
    sides: ['', ''] as const,
    margin,
    marginWords: [marginWords(margin, row.quantity), ...(unsure ? [WITHIN_ERROR] : [])].join(', '),
  };
}

interface NeedKeys {
  readonly moment: TurnKey;
  readonly thrust: TurnKey;
  readonly vector: TurnKey;
  readonly arm: TurnKey;
}

const NEEDED: NeedKeys = {
  moment: 'turn.neededMoment',
  thrust: 'turn.neededThrust',
  vector: 'turn.neededVector',
  arm: 'turn.neededArm',
};
const AGAINST_GUST: NeedKeys = {
  moment: 'turn.gustMoment',
  thrust: 'turn.gustThrust',
  vector: 'turn.gustVector',
  arm: 'turn.gustArm',
};

function workingWith(rows: Rows, key: TurnKey, keys: NeedKeys) {
  const { inputs, ...working } = turnWorkingOf(key, rows)!;
  return {
    ...working,
    inputs: [...inputs, ...Object.values(keys).flatMap((each: TurnKey) => rows[each] ?? [])],
  };
}

/** `limit`: how far the thrusters turn in yaw today, rad. */
function needWords(need: Need | null, rows: Rows, keys: NeedKeys, limit: number): string[] {
  const moment = rows[keys.moment];
  if (!need || !moment) return [];
  return [
    ...(moment.value === null
      ? []
      : [
          `It takes a yaw moment of ${say(moment.value, 'torque')}; steered hardest there is ${say(need.available, 'torque')}.`,
        ]),
    aloneWords('Thrust', rows[keys.thrust]!, rows['thrust.static']!.value),
    aloneWords('Vectoring', rows[keys.vector]!, limit),
    aloneWords('The arm', rows[keys.arm]!, Math.abs(rows['turn.arm']?.value ?? 0)),
  ];
}

/** "Thrust alone: 0.812 N would do; it is 0.400 N." */
function aloneWords(what: string, { value, quantity, why }: Row, now: number | null): string {
  if (value === null) return `${what} alone: ${why.charAt(0).toLowerCase()}${why.slice(1)}`;
  return `${what} alone: ${say(value, quantity)} would do; it is ${say(now ?? 0, quantity)}.`;
}
