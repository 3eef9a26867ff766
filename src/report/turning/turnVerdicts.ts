/** The verdicts on what the targets ask of turning: the time for the first 90° of yaw, and the side gust to be held. */
import type { Targets } from '../../craft/schema.ts';
import type { Outcome } from '../../numeric/outcome.ts';
import type { Need, Turn } from '../../physics/turning/turn.ts';
import { say } from '../../units/sentence.ts';
import type { Row } from '../row.ts';
import type { Rows } from '../rows.ts';
import type { Verdict } from '../verdict.ts';
import { marginWords, type PlainVerdict } from '../verdicts.ts';
import type { TurnKey } from './turnFigure.ts';
import { turnWorkingOf } from './turnWorkings.ts';

export type TurnVerdictKey = 'turnTime' | 'sideGust';

export interface TurnVerdict extends Omit<Verdict, 'key'> {
  readonly key: TurnVerdictKey;
  /** What the target takes and what there is, and what thrust, vectoring and arm would each have to become: one sentence each. */
  readonly need: readonly string[];
}

export type PlainTurnVerdict = Omit<TurnVerdict, 'figure' | 'side'> & Pick<PlainVerdict, 'sides'>;

/** One for each target that is set. */
export function turnVerdictsOf(targets: Targets, turn: Outcome<Turn>, rows: Rows): PlainTurnVerdict[] {
  const { turnTime, sideGust } = targets;
  const needs = turn.status === 'solved' ? turn.value.authority.need : null;
  const told = turn.status === 'solved';
  return [
    ...(turnTime === null ? [] : [timeVerdict(turnTime, told, rows, needs?.turnTime ?? null)]),
    ...(sideGust === null ? [] : [gustVerdict(sideGust, told, rows, needs?.sideGust ?? null)]),
  ];
}

function timeVerdict(most: number, told: boolean, rows: Rows, need: Need | null): PlainTurnVerdict {
  const row = rows['turn.timeTo90']!;
  const margin = row.value === null ? null : most - row.value;
  const short = row.value === null ? 'does not get there' : 'too slow';
  return {
    key: 'turnTime',
    title: 'Turns 90°',
    ...judged(row, margin, told, ['quick enough', short]),
    target: `within ${say(most, 'time')}`,
    need: needWords(need, rows, NEEDED),
    working: workingWith(rows, 'turn.timeTo90', NEEDED),
  };
}

function gustVerdict(least: number, told: boolean, rows: Rows, need: Need | null): PlainTurnVerdict {
  const row = rows['turn.gustHeld']!;
  const margin = row.value === null ? null : row.value - least;
  return {
    key: 'sideGust',
    title: 'Side gust',
    ...judged(row, margin, told, ['holds it', 'turned by it']),
    target: `at least ${say(least, 'speed')}`,
    need: needWords(need, rows, AGAINST_GUST),
    working: workingWith(rows, 'turn.gustHeld', AGAINST_GUST),
  };
}

/** What cannot be told is open; what is told to have no figure is missed. */
const judged = (row: Row, margin: number | null, told: boolean, [good, bad]: readonly [string, string]) => ({
  state: !told ? ('open' as const) : margin !== null && margin >= 0 ? ('met' as const) : ('missed' as const),
  word: !told ? 'cannot be told' : margin !== null && margin >= 0 ? good : bad,
  row,
  sides: ['', ''] as const,
  margin,
  marginWords: marginWords(margin, row.quantity),
});

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

function needWords(need: Need | null, rows: Rows, keys: NeedKeys): string[] {
  const moment = rows[keys.moment];
  if (!need || !moment) return [];
  const takes =
    moment.value === null
      ? moment.why
      : `It takes a yaw moment of ${say(moment.value, 'torque')}; there is ${say(need.available, 'torque')}.`;
  return [
    takes,
    ...aloneWords('Thrust', rows[keys.thrust]!, rows['thrust.static']?.value ?? null),
    ...aloneWords('Vectoring', rows[keys.vector]!, null),
    ...aloneWords('The arm', rows[keys.arm]!, Math.abs(rows['turn.arm']?.value ?? 0)),
  ];
}

/** "Thrust alone: 0.812 N instead of 0.400 N." */
function aloneWords(what: string, row: Row, now: number | null): string[] {
  if (row.value === null) return [`${what} alone: ${row.why.charAt(0).toLowerCase()}${row.why.slice(1)}`];
  const instead = now === null ? '' : ` instead of ${say(now, row.quantity)}`;
  return [`${what} alone: ${say(row.value, row.quantity)}${instead}.`];
}
