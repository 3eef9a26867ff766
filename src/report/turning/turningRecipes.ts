/** How the figures of turning and gliding come about. */
import { LAMB, type Recipes, STATICS } from './recipe.ts';
import type { TurnKey } from './turnFigure.ts';

const MOTION =
  'M ν̇ + C(ν) ν = τ in the horizontal plane, after Kirchhoff (Lamb, Hydrodynamics, 1932, § 124); followed by Dormand and Prince’s method.';
const STEADY =
  'The motion in which nothing changes any more, by Newton’s method; held against the motion itself.';
const ALONE = 'The same craft with this one figure changed until the target is just met.';

type Turning = Extract<TurnKey, `turn.${string}` | `glide.${string}`>;

export const TURNING_RECIPES: Recipes<Turning> = {
  'turn.arm': {
    formula: 'Σ thrust × lever ÷ Σ thrust, of the thrusters that can yaw the craft',
    from: ['thrust.static'],
    source: STATICS,
  },
  'turn.yawMoment': {
    formula: 'Σ T cos ε (X sin δ − Y cos δ) about the CG, each thruster turned hardest to starboard',
    from: ['turn.arm', 'thrust.static', 'turn.shareVectoring'],
    source: STATICS,
  },
  'turn.virtualArm': {
    formula: 'the same about the point m X_G ÷ (m + k2 ρV) ahead of the CB',
    from: ['turn.arm', 'added.k2'],
    source: LAMB,
  },
  'turn.virtualMoment': {
    formula: 'Σ T cos ε (X sin δ − Y cos δ) about the virtual mass centre',
    from: ['turn.virtualArm', 'turn.yawMoment'],
    source: LAMB,
  },
  'turn.shareVectoring': {
    formula: 'yaw moment ÷ (Σ thrust × arm)',
    from: ['turn.yawMoment', 'turn.arm', 'thrust.static'],
    source: 'Definition: vectoring × arm × thrust make the moment.',
  },
  'turn.shareArm': {
    formula: 'arm ÷ the longest: from the CG to the farther end of the hull, or its own where that is longer',
    from: ['turn.arm'],
    source: 'Definition: vectoring × arm × thrust make the moment.',
  },
  'turn.shareThrust': {
    formula: 'throttle × thrust that can yaw the craft ÷ all static thrust',
    from: ['thrust.static'],
    source: 'Definition: vectoring × arm × thrust make the moment.',
  },
  'turn.timeTo90': {
    formula: 'M ν̇ + C(ν) ν = τ from rest until the heading is 90° off',
    from: ['turn.yawMoment', 'inertia.yaw', 'inertia.airYaw'],
    source: MOTION,
  },
  'turn.timeThere': {
    formula:
      's + time until r = 0, steered hardest the other way from s on; s so that the heading is 90° off then',
    from: ['turn.timeTo90', 'turn.yawMoment', 'inertia.yaw', 'inertia.airYaw'],
    source: `${MOTION} s by Brent’s method.`,
  },
  'turn.timeTo90Cruise': {
    formula: 'M ν̇ + C(ν) ν = τ from cruise until the heading is 90° off',
    from: ['turn.yawMoment', 'speed.cruise', 'inertia.yaw', 'inertia.airYaw', 'added.k1', 'added.k2'],
    source: MOTION,
  },
  'turn.stopTime': {
    formula: 'from the end of the 90° from cruise, hardest the other way, until r = 0',
    from: ['turn.timeTo90Cruise', 'turn.yawMoment'],
    source: MOTION,
  },
  'turn.stopAngle': {
    formula: '∫ r dt while the yaw is being stopped',
    from: ['turn.stopTime'],
    source: MOTION,
  },
  'turn.radius': {
    formula: '√(u² + v²) ÷ |r| where τ = C(ν) ν',
    from: ['turn.speed', 'turn.yawRate'],
    source: STEADY,
  },
  'turn.radiusLengths': { formula: 'radius ÷ hull length', from: ['turn.radius'], source: 'Definition.' },
  'turn.drift': {
    formula: 'atan2(−v, u) in a turn to starboard',
    from: ['turn.speed', 'turn.yawRate'],
    source: STEADY,
  },
  'turn.yawRate': {
    formula: 'r where τ = C(ν) ν',
    from: ['turn.vector', 'added.k1', 'added.k2'],
    source: STEADY,
  },
  'turn.speed': {
    formula: '√(u² + v²) where τ = C(ν) ν',
    from: ['turn.vector', 'speed.cruise'],
    source: STEADY,
  },
  'turn.vector': {
    formula: 'the angle asked for, or the one of the greatest yaw moment, within its limits',
    from: [],
    source: 'The craft as entered.',
  },
  'turn.widestRadius': {
    formula: 'greatest √(u² + v²) ÷ |r| of the steady turns that hold, from a little of the steering to all',
    from: ['turn.widestSpeed', 'turn.radius', 'glide.munk', 'glide.fins'],
    source: `${STEADY} That they hold after Routh and Hurwitz.`,
  },
  'turn.widestSpeed': {
    formula: '√(u² + v²) of that steady turn',
    from: ['turn.widestRadius', 'speed.cruise'],
    source: STEADY,
  },
  'turn.gustHeld': {
    formula:
      'the greatest side gust up to which the thrusters can make the moment about the virtual mass centre nil',
    from: ['turn.virtualMoment'],
    source: 'Cross-flow by strips; fins square to the air.',
  },
  'turn.gustHeldCruise': {
    formula: 'the same with way on, the Munk moment −(k2 − k1) ρV u v on top',
    from: ['turn.virtualMoment', 'speed.cruise', 'added.k1', 'added.k2'],
    source:
      'Munk, NACA TR 184 (1924); cross-flow by strips; fins after Helmbold (1942). A real hull has less of the Munk moment than flow without friction gives (from memory), so the figure errs low.',
  },
  'turn.neededMoment': {
    formula: 'moment there is × the factor on thrust with which the first 90° take just the time asked for',
    from: ['turn.timeTo90', 'turn.yawMoment'],
    source: ALONE,
  },
  'turn.neededThrust': {
    formula: 'static thrust × that factor',
    from: ['thrust.static', 'turn.neededMoment'],
    source: ALONE,
  },
  'turn.neededVector': {
    formula: 'limits of vectoring widened until the time is just kept',
    from: ['turn.shareVectoring', 'turn.neededMoment'],
    source: ALONE,
  },
  'turn.neededArm': {
    formula: 'levers lengthened until the time is just kept',
    from: ['turn.arm', 'turn.neededMoment'],
    source: ALONE,
  },
  'turn.gustMoment': {
    formula: 'what the air gives at worst, over all gusts up to the one asked for',
    from: ['turn.gustHeld', 'turn.virtualMoment'],
    source: ALONE,
  },
  'turn.gustThrust': {
    formula: 'static thrust × needed ÷ available',
    from: ['thrust.static', 'turn.gustMoment'],
    source: ALONE,
  },
  'turn.gustVector': {
    formula: 'limits of vectoring widened until the gust is just held',
    from: ['turn.shareVectoring', 'turn.gustMoment'],
    source: ALONE,
  },
  'turn.gustArm': {
    formula: 'levers lengthened until the gust is just held',
    from: ['turn.virtualArm', 'turn.gustMoment'],
    source: ALONE,
  },
  'glide.halving': {
    formula: 'M ν̇ + C(ν) ν = τ without thrust, until r is half',
    from: ['turn.timeTo90Cruise', 'inertia.yaw', 'inertia.airYaw'],
    source: MOTION,
  },
  'glide.time': {
    formula: 'M ν̇ + C(ν) ν = τ without thrust, until r is a tenth',
    from: ['turn.timeTo90Cruise', 'inertia.yaw', 'inertia.airYaw'],
    source: MOTION,
  },
  'glide.angle': { formula: '∫ r dt meanwhile', from: ['glide.time'], source: MOTION },
  'glide.munk': {
    formula: '−(k2 − k1) ρV u²',
    from: ['added.k1', 'added.k2', 'speed.cruise'],
    source: 'Munk, NACA TR 184 (1924).',
  },
  'glide.fins': {
    formula: '½ρ u² Σ S a cos²θ (x_fin − x_CB),  a = 2πA ÷ (2 + √(4 + A²))',
    from: ['speed.cruise'],
    source: 'Slope after Helmbold (1942).',
  },
};
