/** Thrust, drag, speed and power straight ahead. */
import { type Outcome, solved, valueOrNull } from '../../numeric/outcome.ts';
import type { CraftState } from '../../physics/craftState.ts';
import type { AheadHelm } from '../../physics/thrust/ahead.ts';
import { type Drag, dragOf } from '../../physics/thrust/drag.ts';
import { powerAt, steadySpeed, topSpeed } from '../../physics/thrust/speed.ts';
import { thrustersOf } from '../../physics/thrust/thrusters.ts';
import type { TurnAsked } from '../../physics/turning/asked.ts';
import type { Rows } from '../rows.ts';
import { handlingWords } from './handling.ts';
import { ifDriven } from './thrusterWords.ts';
import { rowsFrom } from './turnFigure.ts';

const FULL: AheadHelm = { throttle: 1, vector: null };

export function speedRows(state: CraftState, { throttle, speed }: TurnAsked): Rows {
  const driven = ifDriven(state, solved);
  const top = ifDriven(state, () => topSpeed(state));
  const cruise = speed === null ? ifDriven(state, () => steadySpeed(state, throttle)) : solved(speed);
  const drag = dragOf(state);
  const powers = (at: number) => powerAt(thrustersOf(state), FULL, at, state.air.density);
  return {
    ...rowsFrom(
      top,
      { 'speed.top': (at) => at },
      { 'speed.top': topWords(handlingWords(state, top), valueOrNull(top), drag) },
    ),
    ...rowsFrom(
      cruise,
      { 'speed.cruise': (at) => at },
      { 'speed.cruise': { why: speed === null ? 'The steady speed at that throttle.' : 'As asked.' } },
    ),
    ...rowsFrom(driven, {
      'speed.pitchSpeed': (thrusters) => Math.min(...thrusters.map(({ pitchSpeed }) => pitchSpeed)),
      'thrust.static': (thrusters) => thrusters.reduce((sum, { staticThrust }) => sum + staticThrust, 0),
    }),
    ...rowsFrom(top, {
      'drag.atTop': drag.at,
      'drag.hullShare': (at) => drag.hull(at) / drag.at(at),
      'drag.finShare': (at) => drag.fins(at) / drag.at(at),
      'drag.podShare': (at) => drag.pods(at) / drag.at(at),
      'power.atTop': (at) => powers(at).idealPower,
    }),
    ...rowsFrom(driven, { 'power.atRest': () => powers(0).idealPower }),
    ...shaftRows(driven, powers(0).shaftPower),
  };
}

function topWords(handling: readonly string[], top: number | null, drag: Drag) {
  const rough = top === null ? [] : drag.cautions(top);
  return {
    why: ['Level, in still air, at full throttle.', ...handling].join(' '),
    caution: rough.length > 0 ? [...rough, ...handling].join(' ') : null,
  };
}

/** The shaft's power is known only where a figure of merit is. */
const shaftRows = (driven: Outcome<unknown>, power: number | null): Rows =>
  power === null || driven.status === 'infeasible'
    ? {}
    : rowsFrom(solved(power), { 'power.shaftAtRest': (at) => at });
