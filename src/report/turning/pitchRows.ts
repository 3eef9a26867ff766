/** How the craft sits in cruise, how it climbs and hovers, and up to which speed its pitch is held. */
import { infeasible, type Outcome, solved, valueOrNull } from '../../numeric/outcome.ts';
import { heavinessOf, type Loading } from '../../physics/balance/loading.ts';
import type { CraftState } from '../../physics/craftState.ts';
import { type Climb, type ClimbPoint, steadyClimb } from '../../physics/cruise/climb.ts';
import { type Critical, criticalSpeed } from '../../physics/cruise/critical.ts';
import { type Cruise, cruisePitch } from '../../physics/cruise/cruise.ts';
import { hoverOf } from '../../physics/cruise/hover.ts';
import { thrustersOf } from '../../physics/thrust/thrusters.ts';
import type { TurnAsked } from '../../physics/turning/asked.ts';
import { STANDARD_GRAVITY } from '../../units/constants.ts';
import { say } from '../../units/sentence.ts';
import { spread } from '../floatRows.ts';
import type { Rows } from '../rows.ts';
import { ifDriven } from './thrusterWords.ts';
import { rowsFrom, type TurnKey } from './turnFigure.ts';

export function pitchRows(state: CraftState, { throttle, speed }: TurnAsked): Rows {
  const cruise = ifDriven(state, () => cruisePitch(state, speed === null ? { throttle } : { speed }));
  const critical = loosening(criticalSpeed(state));
  const caution = cruise.status === 'solved' ? cautionsOf(cruise.value, state, BY_ITSELF) : null;
  return {
    ...rowsFrom(
      cruise,
      {
        'cruise.pitch': ({ pitch }) => pitch,
        'cruise.thrustCouple': ({ terms }) => terms.thrust,
        'cruise.dragCouple': ({ terms }) => terms.podDrag + terms.finDrag,
        'cruise.munkCouple': ({ terms }) => terms.munk,
        'cruise.finCouple': ({ terms }) => terms.fins,
        'cruise.crossFlowCouple': ({ terms }) => terms.crossFlow,
        'cruise.pendulumCouple': ({ terms }) => terms.tailHeaviness + terms.depth,
        'cruise.rising': ({ rising }) => rising,
      },
      { 'cruise.pitch': { caution, why: LEVEL } },
    ),
    ...rowsFrom(critical, { 'cruise.criticalSpeed': (at) => at }),
    ...(cruise.status === 'solved' ? {} : heldRows(state, valueOrNull(critical))),
  };
}

/** Well below the speed up to which the nose is held. */
const HELD = 0.8;

/** Where cruise has no pitch, that of a speed at which there is one; no row where there is none either. */
function heldRows(state: CraftState, critical: number | null): Rows {
  if (critical === null) return {};
  const cruise = ifDriven(state, () => cruisePitch(state, { speed: HELD * critical }));
  if (cruise.status === 'infeasible') return {};
  const caution = cautionsOf(cruise.value, state);
  return rowsFrom(cruise, { 'cruise.heldPitch': ({ pitch }) => pitch }, { 'cruise.heldPitch': { caution } });
}

const LEVEL =
  '+ nose-up, in level flight, as if a hand held its height; left to itself it flies as told under “Climbs”.';

/** Less is lost in what trimming can do, N: about 2 g. */
const TRIMMED = 0.02;

const BY_ITSELF = 'Left to itself it flies as told under “Climbs”.';

/** `byItself`: where it is told how it flies untrimmed, if anywhere. */
function cautionsOf({ rising, cautions }: Cruise, state: CraftState, byItself?: string): string {
  if (Math.abs(rising) < TRIMMED) return cautions.join(' ');
  const trim = `${say(Math.abs(rising) / STANDARD_GRAVITY, 'mass')} ${rising > 0 ? 'heavier' : 'lighter'}`;
  const turns = thrustersOf(state).some(({ pitch }) => pitch.most > pitch.least);
  const orTurned = turns ? ', or held there by thrust turned in pitch, which changes this pitch too' : '';
  const level = `Level only if trimmed ${trim}${orTurned}.`;
  return [level, ...(byItself ? [byItself] : []), ...cautions].join(' ');
}

const loosening = (critical: Outcome<Critical>): Outcome<number> => {
  if (critical.status === 'infeasible') return critical;
  const { speed } = critical.value;
  return speed === null ? infeasible('There is none: the fins hold the nose at any speed.') : solved(speed);
};

/** Less lift, N. */
const weight = (loading: Loading): number => STANDARD_GRAVITY * heavinessOf(loading);

export function hoverRows(state: CraftState): Rows {
  const hover = ifDriven(state, () => hoverOf(state));
  const caution = hover.status === 'solved' ? hover.value.cautions.join(' ') : null;
  return {
    ...rowsFrom(
      solved(weight(state.loading)),
      { 'hover.force': (force) => force },
      { 'hover.force': { uncertainty: spread(state, weight) } },
    ),
    ...rowsFrom(
      hover,
      {
        'hover.share': ({ share }) => share,
        'hover.vector': ({ vector }) => vector,
        'hover.pitch': ({ pitch }) => pitch,
      },
      { 'hover.share': { caution } },
    ),
  };
}

/** Points of a climb curve: enough to draw it, and to find the best between them. */
export const CLIMB_POINTS = 13;

/** `curve`: climb over vectoring in pitch, at the same throttle. */
export function climbRows(state: CraftState, throttle: number, curve: readonly ClimbPoint[]): Rows {
  const asSet = ifDriven(state, () => steadyClimb(state, { throttle, vector: null }));
  const rateAt = (vector: number) => rateOf(vector, steadyClimb(state, { throttle, vector }));
  const extreme = (way: 1 | -1) => ifDriven(state, () => most(curve, way, rateAt));
  const caution = asSet.status === 'solved' ? asSet.value.cautions.join(' ') : null;
  return {
    ...rowsFrom(
      asSet,
      {
        'climb.rate': ({ climbRate }) => climbRate,
        'climb.path': ({ path }) => path,
        'climb.pitch': ({ pitch }) => pitch,
      },
      { 'climb.rate': { caution } },
    ),
    ...extremeRows(extreme(1), 'climb.best', 'climb.bestVector'),
    ...extremeRows(extreme(-1), 'climb.descent', 'climb.descentVector'),
  };
}

function extremeRows(rate: Outcome<Rate>, key: TurnKey, vectorKey: TurnKey): Rows {
  const found = rate.status === 'solved' ? rate.value : null;
  const why = found
    ? `+ thrust up; the craft then pitches to ${say(found.climb.pitch, 'angle')}, + nose-up.`
    : '';
  return rowsFrom(
    rate,
    { [key]: ({ rate: each }: Rate) => each, [vectorKey]: ({ vector }: Rate) => vector },
    { [key]: { caution: found?.climb.cautions.join(' ') ?? null }, [vectorKey]: { why } },
  );
}

interface Rate {
  readonly vector: number;
  /** m/s, + up */
  readonly rate: number;
  readonly climb: Climb;
}

const rateOf = (vector: number, climb: Outcome<Climb>): Rate | null =>
  climb.status === 'solved' ? { vector, rate: climb.value.climbRate, climb: climb.value } : null;

/** Not a descent when it climbs at every angle, nor a climb when it sinks. */
function goingThatWay(best: Rate, way: 1 | -1): Outcome<Rate> {
  if (way * best.rate > 0) return solved(best);
  const [cannot, goes] = way > 0 ? ['climb', 'sinks'] : ['descend', 'climbs'];
  return infeasible(
    `It cannot ${cannot} under this throttle: at every angle of thrust it ${goes}, slowest at ${say(best.vector, 'angle')} with ${say(Math.abs(best.rate), 'speed')}.`,
    way > 0 ? 'Make it lighter, or fit more thrust.' : 'Throttle back, or make it heavier.',
  );
}

/** Where it goes up fastest, or down fastest: the best of the points, and what lies better beside it. */
function most(
  curve: readonly ClimbPoint[],
  way: 1 | -1,
  rateAt: (vector: number) => Rate | null,
): Outcome<Rate> {
  if (curve.length < 2) return infeasible('No thruster turns in pitch.');
  const rates = curve.map(({ vector, climb }) => rateOf(vector, climb));
  const better = (a: Rate | null, b: Rate | null) => (b && (!a || way * b.rate > way * a.rate) ? b : a);
  const best = rates.reduce(better, null);
  if (!best) {
    const [{ climb }] = curve as [ClimbPoint];
    return climb.status === 'infeasible' ? climb : infeasible('No steady path was found.');
  }
  const i = rates.indexOf(best);
  const [before, after] = [rates[i - 1], rates[i + 1]];
  if (before && after) return goingThatWay(better(best, rateAt(topOf(before, best, after))) ?? best, way);
  const gap = [i - 1, i + 1].find((k) => rates[k] === null);
  return goingThatWay(gap === undefined ? best : towards(curve[gap]!.vector, best, better, rateAt), way);
}

/** Top of the parabola through three points at equal steps, the best in the middle. */
function topOf(before: Rate, best: Rate, after: Rate): number {
  const [rise, fall] = [best.rate - before.rate, best.rate - after.rate];
  return rise + fall === 0
    ? best.vector
    : best.vector + ((after.vector - best.vector) * (rise - fall)) / (2 * (rise + fall));
}

const HALVINGS = 4;

/** As far towards an angle without a steady path as it gets better. */
function towards(
  gap: number,
  from: Rate,
  better: (a: Rate, b: Rate | null) => Rate | null,
  rateAt: (vector: number) => Rate | null,
): Rate {
  let [best, far] = [from, gap];
  for (let i = 0; i < HALVINGS; i += 1) {
    const middle = (best.vector + far) / 2;
    const next = better(best, rateAt(middle)) ?? best;
    if (next === best) far = middle;
    best = next;
  }
  return best;
}
