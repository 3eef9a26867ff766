/** Every figure of thrust and turning: its name, what kind of quantity it is, and what to know when reading it. */
import type { Outcome } from '../../numeric/outcome.ts';
import type { Quantity } from '../../units/units.ts';
import { noRow, type RowSpec, type Rows, row } from '../rows.ts';

interface Figure {
  readonly label: string;
  readonly quantity: Quantity;
  readonly why?: string;
}

const USED = 'Of the ellipsoid of equal length, breadth and height: what the motion is worked out with.';
const COMPARED = 'Of the hull as it is, by its own flow: to compare; the motion is not worked out with it.';
const ALONE = 'All else as it is, the masses too.';
const COUPLE = 'In cruise, about the CB, + nose-up.';

const FIGURES = {
  'turn.arm': { label: 'Arm about the CG', quantity: 'length' },
  'turn.yawMoment': { label: 'Yaw moment about the CG', quantity: 'torque', why: 'The greatest, at rest.' },
  'turn.virtualArm': {
    label: 'Arm about the virtual mass centre',
    quantity: 'length',
    why: 'Where a push to the side would not turn it, the air carried along counted.',
  },
  'turn.virtualMoment': { label: 'Yaw moment about that centre', quantity: 'torque' },
  'turn.shareVectoring': {
    label: 'Left by limits of vectoring, reverse',
    quantity: 'fraction',
    why: 'Of the yaw moment that the same thrust would give, all of it square to its arm.',
  },
  'turn.shareArm': {
    label: 'Left by the arm',
    quantity: 'fraction',
    why: 'Of the longest arm that the hull has room for, or of its own where that is longer.',
  },
  'turn.shareThrust': {
    label: 'Left by thrust and throttle',
    quantity: 'fraction',
    why: 'What can yaw the craft, of the thrust of all at full throttle.',
  },
  'turn.timeTo90': {
    label: 'Time to pass 90° from rest',
    quantity: 'time',
    why: 'The yaw goes on from there.',
  },
  'turn.timeThere': {
    label: 'Time to turn 90° and stop there',
    quantity: 'time',
    why: 'From rest, steered hardest the other way in time; the craft may still drift.',
  },
  'turn.timeTo90Cruise': { label: 'Time to pass 90° from cruise', quantity: 'time' },
  'turn.stopTime': {
    label: 'Time to stop the yaw',
    quantity: 'time',
    why: 'After the 90° from cruise, steering hard the other way.',
  },
  'turn.stopAngle': {
    label: 'Yawed on while stopping',
    quantity: 'angle',
    why: 'Over and above the 90°.',
  },
  'turn.radius': {
    label: 'Radius of the steady turn',
    quantity: 'pathLength',
    why: 'Of the path of the CB.',
  },
  'turn.radiusLengths': { label: 'Radius in hull lengths', quantity: 'factor' },
  'turn.drift': { label: 'Drift angle in the turn', quantity: 'angle', why: '+ nose inside the turn.' },
  'turn.yawRate': { label: 'Yaw rate in the turn', quantity: 'yawRate', why: '+ to starboard.' },
  'turn.speed': { label: 'Speed in the turn', quantity: 'speed', why: 'Along the path.' },
  'turn.vector': { label: 'Thrust turned in yaw by', quantity: 'angle', why: '+ thrust to starboard.' },
  'turn.widestRadius': {
    label: 'Widest circle that holds by itself',
    quantity: 'pathLength',
    why: 'Its radius, with a little steering; for anything wider it is steered against the Munk moment.',
  },
  'turn.widestSpeed': { label: 'Speed in that circle', quantity: 'speed', why: 'Along the path.' },
  'turn.gustHeld': {
    label: 'Keeps its heading in a side gust of',
    quantity: 'speed',
  },
  'turn.gustHeldCruise': { label: 'In cruise, in a side gust of', quantity: 'speed' },
  'turn.neededMoment': {
    label: 'Yaw moment needed for the turn time',
    quantity: 'torque',
    why: 'About the CG.',
  },
  'turn.neededThrust': { label: 'Thrust that alone would do it', quantity: 'force', why: ALONE },
  'turn.neededVector': { label: 'Vectoring that alone would do it', quantity: 'angle', why: ALONE },
  'turn.neededArm': { label: 'Arm that alone would do it', quantity: 'length', why: ALONE },
  'turn.gustMoment': {
    label: 'Yaw moment needed for the side gust',
    quantity: 'torque',
    why: 'About the virtual mass centre.',
  },
  'turn.gustThrust': { label: 'Thrust that alone would hold it', quantity: 'force', why: ALONE },
  'turn.gustVector': { label: 'Vectoring that alone would hold it', quantity: 'angle', why: ALONE },
  'turn.gustArm': { label: 'Arm that alone would hold it', quantity: 'length', why: ALONE },
  'glide.halving': {
    label: 'Yaw rate halves in',
    quantity: 'time',
    why: 'After the throttle is cut in the middle of a turn.',
  },
  'glide.time': { label: 'Yaw rate falls to a tenth in', quantity: 'time' },
  'glide.angle': { label: 'Yawed on meanwhile', quantity: 'angle' },
  'glide.munk': {
    label: 'Munk moment per slip, gliding',
    quantity: 'momentPerAngle',
    why: 'At cruise speed; − turns the nose away from the path.',
  },
  'glide.fins': {
    label: 'Fin moment per slip, gliding',
    quantity: 'momentPerAngle',
    why: 'At cruise speed; + brings the nose back to the path.',
  },
  'speed.top': { label: 'Top speed', quantity: 'speed' },
  'speed.cruise': { label: 'Cruise speed', quantity: 'speed' },
  'speed.pitchSpeed': {
    label: 'Pitch speed, the least',
    quantity: 'speed',
    why: 'At full throttle the thrust is nil there.',
  },
  'drag.atTop': { label: 'Drag at top speed', quantity: 'force' },
  'drag.hullShare': { label: 'of it the hull', quantity: 'fraction' },
  'drag.finShare': { label: 'of it the fins', quantity: 'fraction' },
  'drag.podShare': { label: 'of it what hangs outside', quantity: 'fraction' },
  'thrust.static': {
    label: 'Static thrust, all thrusters',
    quantity: 'force',
    why: 'At rest at full throttle, each along its own axis.',
  },
  'power.atRest': {
    label: 'Ideal power at rest',
    quantity: 'power',
    why: 'At full throttle; the shaft takes more, by the figure of merit.',
  },
  'power.atTop': {
    label: 'Ideal power at top speed',
    quantity: 'power',
    why: 'The shaft takes more, by the figure of merit.',
  },
  'power.shaftAtRest': { label: 'Shaft power at rest', quantity: 'power', why: 'At full throttle.' },
  'cruise.pitch': { label: 'Pitch in cruise', quantity: 'angle', why: '+ nose-up.' },
  'cruise.thrustCouple': { label: 'Couple of thrust', quantity: 'torque', why: COUPLE },
  'cruise.dragCouple': { label: 'Couple of drag outside', quantity: 'torque', why: COUPLE },
  'cruise.munkCouple': { label: 'Munk moment', quantity: 'torque', why: COUPLE },
  'cruise.finCouple': { label: 'Couple of the fins', quantity: 'torque', why: COUPLE },
  'cruise.crossFlowCouple': { label: 'Couple of air across the hull', quantity: 'torque', why: COUPLE },
  'cruise.pendulumCouple': { label: 'Couple of weight and lift', quantity: 'torque', why: COUPLE },
  'cruise.rising': {
    label: 'Force up in cruise',
    quantity: 'force',
    why: 'Left over of thrust, air and lift after the weight; + up. Without a hand on it the craft climbs or sinks by it.',
  },
  'cruise.criticalSpeed': {
    label: 'Speed up to which pitch is held',
    quantity: 'speed',
    why: 'From there on the Munk moment overcomes pendulum and fins, and the nose goes where it likes.',
  },
  'cruise.heldPitch': {
    label: 'Pitch at 80 % of that speed',
    quantity: 'angle',
    why: '+ nose-up. There the nose is held; at the cruise asked for it is not.',
  },
  'climb.rate': {
    label: 'Climbs, left to itself',
    quantity: 'speed',
    why: 'With thrust as set in pitch; + up.',
  },
  'climb.path': { label: 'Slope of that path', quantity: 'angle', why: '+ up.' },
  'climb.pitch': { label: 'Pitch on that path', quantity: 'angle', why: '+ nose-up.' },
  'climb.best': {
    label: 'Fastest climb by vectoring',
    quantity: 'speed',
    why: 'Of all angles in pitch that are within the limits.',
  },
  'climb.bestVector': { label: 'with thrust turned in pitch by', quantity: 'angle', why: '+ thrust up.' },
  'climb.descent': { label: 'Fastest descent by vectoring', quantity: 'speed', why: '+ up, so − is down.' },
  'climb.descentVector': { label: 'with the thrust turned by', quantity: 'angle', why: '+ thrust up.' },
  'hover.force': {
    label: 'Force up that holds its height',
    quantity: 'force',
    why: 'At rest; + carries a heavy craft, − holds a light one down.',
  },
  'hover.share': {
    label: 'Share of thrust for hovering',
    quantity: 'fraction',
    why: 'Of what the thrusters that can be turned so far give at rest.',
  },
  'hover.vector': {
    label: 'Thrust turned in pitch, hovering',
    quantity: 'angle',
    why: 'To the hull; + thrust up.',
  },
  'hover.pitch': { label: 'Pitch, hovering', quantity: 'angle', why: '+ nose-up.' },
  'inflow.ratio': {
    label: 'Air at the propeller over free air',
    quantity: 'factor',
    why: 'Speed of the air that reaches the discs, over the speed of the craft, in cruise.',
  },
  'inflow.perWatt': {
    label: 'Thrust per watt over that in free air',
    quantity: 'factor',
    why: 'By momentum theory, in cruise, at the same thrust.',
  },
  'inflow.wakeShare': {
    label: 'Share of the disc in slowed air',
    quantity: 'fraction',
    why: 'In the layer along the hull or its wake.',
  },
  'inflow.insideShare': {
    label: 'Share of the disc inside the hull',
    quantity: 'fraction',
  },
  'added.k1': { label: 'Added mass ahead, k1', quantity: 'ratio', why: USED },
  'added.k2': { label: 'Added mass sideways, k2', quantity: 'ratio', why: USED },
  'added.kPrime': { label: 'Added inertia in yaw, k′', quantity: 'ratio', why: USED },
  'added.hullK1': { label: 'Added mass ahead, true hull', quantity: 'ratio', why: COMPARED },
  'added.hullK2': { label: 'Added mass sideways, true hull', quantity: 'ratio', why: COMPARED },
  'added.hullKPrime': { label: 'Added inertia in yaw, true hull', quantity: 'ratio', why: COMPARED },
  'inertia.yaw': { label: 'Yaw inertia, solid and gas', quantity: 'inertia', why: 'About the CB.' },
  'inertia.airYaw': {
    label: 'Yaw inertia, air carried along',
    quantity: 'inertia',
    why: 'About the CB; it adds to that of solid and gas.',
  },
} as const satisfies Record<string, Figure>;

export type TurnKey = keyof typeof FIGURES;

export const TURN_KEYS = Object.keys(FIGURES) as TurnKey[];

type More = Pick<RowSpec, 'uncertainty' | 'caution' | 'why'>;

/** Rows of an answer, each figure taken from it; rows without a value where there is none. */
export function rowsFrom<T>(
  outcome: Outcome<T>,
  figures: { readonly [key in TurnKey]?: (value: T) => number },
  more: { readonly [key in TurnKey]?: More } = {},
): Rows {
  const rows = Object.entries(figures).map(([name, figure]) => {
    const key = name as TurnKey;
    const { label, quantity, why }: Figure = FIGURES[key];
    return [
      key,
      outcome.status === 'solved'
        ? row({ label, quantity, value: figure(outcome.value), ...(why && { why }), ...more[key] })
        : noRow(label, quantity, [outcome.why, outcome.remedy].filter(Boolean).join(' ')),
    ];
  });
  return Object.fromEntries(rows);
}
