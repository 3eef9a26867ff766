/**
 * The limits that a builder could move: where each stands today, which way is more room, how far it may sensibly go, and
 * the steps in which a builder reads and moves it.
 */

import type { Slide } from '../../craft/planningSchema.ts';
import { LIMITS } from '../../craft/quantities.ts';
import type { Relaxation, TargetKey } from '../../craft/relaxation.ts';
import { type UnitSystem, unitOf } from '../../units/units.ts';
import { LEAST_DEPTH } from './limits.ts';
import { loadMass, type Setting } from './setting.ts';

export interface Candidate {
  /** The limit moved to a value. */
  readonly at: (to: number) => Relaxation;
  readonly now: number;
  /** As far as it may go; on the side of more room. */
  readonly furthest: number;
  /** What a builder reads and types: 0.1°, 1 mm, 0.1 g, one piece. */
  readonly digit: number;
  /** What its marginal value is told for: 1°, 10 mm, 1 g, one piece. */
  readonly step: number;
  /** Whether only whole steps make sense. */
  readonly whole: boolean;
}

type Scale = Pick<Candidate, 'digit' | 'step' | 'whole'>;

interface Scales {
  readonly angle: Scale;
  readonly length: Scale;
  readonly mass: Scale;
}

const COUNT: Scale = { digit: 1, step: 1, whole: true };
/** A tolerance wider than this is no attitude to fly in, rad. */
const WIDEST = (30 * Math.PI) / 180;

/** As many units a step: degrees, then millimetres and grams, or inches and ounces. */
const STEPS = {
  metric: { angle: 1, length: 0.01, mass: 1 },
  imperial: { angle: 1, length: 0.5, mass: 0.1 },
} as const;

const scaleOf = (quantity: keyof Scales, units: UnitSystem): Scale => {
  const { si, digits } = unitOf(quantity, units);
  return { digit: si * 10 ** -digits, step: si * STEPS[units][quantity], whole: false };
};

/** Steps and digits are those of the unit system. */
export function candidatesOf(setting: Setting, units: UnitSystem): Candidate[] {
  const scales: Scales = {
    angle: scaleOf('angle', units),
    length: scaleOf('length', units),
    mass: scaleOf('mass', units),
  };
  return [
    ...slideEnds(setting, scales),
    ...hardpoints(setting, scales),
    ...pieces(setting),
    ...targets(setting, scales),
    ...ashore(setting),
  ];
}

function targets({ craft, today }: Setting, { angle, length, mass }: Scales): Candidate[] {
  const { heaviness, pitchTolerance, heelTolerance, leastPendulumDepth } = craft.targets;
  const lift = Math.min(
    Math.max(Math.abs(today.loading.grossLift), today.loading.solid.mass),
    LIMITS.mass / 4,
  );
  const target = (kind: TargetKey) => (to: number) => ({ kind, to });
  const all: Candidate[] = [
    { at: target('heaviest'), now: heaviness.most, furthest: heaviness.most + lift, ...mass },
    { at: target('lightest'), now: heaviness.least, furthest: heaviness.least - lift, ...mass },
    { at: target('pitchTolerance'), now: pitchTolerance, furthest: WIDEST, ...angle },
    { at: target('heelTolerance'), now: heelTolerance, furthest: WIDEST, ...angle },
    { at: target('pendulumDepth'), now: leastPendulumDepth, furthest: 0, ...length },
  ];
  return all.filter(({ now, furthest }, i) => (i < 2 ? true : i < 4 ? furthest > now : now > LEAST_DEPTH));
}

/** As far as the hull reaches. */
function slideEnds(setting: Setting, scales: Scales): Candidate[] {
  const { length } = setting.today.hull;
  const ends = (slide: Slide, at: (end: keyof Slide) => Candidate['at']): Candidate[] => [
    ...(slide.from > 0 ? [{ at: at('from'), now: slide.from, furthest: 0, ...scales.length }] : []),
    ...(slide.to < length ? [{ at: at('to'), now: slide.to, furthest: length, ...scales.length }] : []),
  ];
  return [
    ...setting.slides.flatMap(({ part, from, to }) =>
      ends({ from, to }, (end) => (value) => ({ kind: 'slide', part: part.id, end, to: value })),
    ),
    ...setting.loads.flatMap(({ load, options }) =>
      options.flatMap(({ slide }, option) =>
        slide
          ? ends(slide, (end) => (value) => ({ kind: 'loadSlide', load: load.id, option, end, to: value }))
          : [],
      ),
    ),
  ];
}

const hardpoints = ({ hardpoints: all, today }: Setting, { mass }: Scales): Candidate[] =>
  all.map(({ id, limit }) => ({
    at: (to) => ({ kind: 'hardpoint', hardpoint: id, to }),
    now: limit,
    furthest: Math.min(
      limit + Math.max(Math.abs(today.loading.grossLift), today.loading.solid.mass),
      LIMITS.mass,
    ),
    ...mass,
  }));

const pieces = ({ craft, hardpoints: all }: Setting): Candidate[] =>
  all.some(({ fill }) => fill === 'pieces')
    ? craft.pieces.map(({ mass, count }) => ({
        at: (to) => ({ kind: 'pieces', mass, to }),
        now: count,
        furthest: Math.min(count + 64, LIMITS.leadPieces),
        ...COUNT,
      }))
    : [];

/** A load that must be carried is left ashore whole or not at all. */
const ashore = ({ loads }: Setting): Candidate[] =>
  loads
    .filter((choice) => choice.load.must && loadMass(choice) > 0)
    .map(({ load }) => ({
      at: () => ({ kind: 'ashore', load: load.id }),
      now: 0,
      furthest: 1,
      ...COUNT,
    }));

/** The value so many digits beyond where it stands, on the builder's scale, no further than it may go. */
export function valueAt({ now, furthest, digit }: Candidate, digits: number): number {
  const more = furthest > now;
  const mark = more ? Math.floor(now / digit + 1e-9) + digits : Math.ceil(now / digit - 1e-9) - digits;
  const to = Number((mark * digit).toPrecision(12));
  return more ? Math.min(to, furthest) : Math.max(to, furthest);
}

/** How many digits there are to go. */
export const digitsOf = ({ now, furthest, digit }: Candidate): number =>
  Math.ceil(Math.abs(furthest - now) / digit - 1e-9);
