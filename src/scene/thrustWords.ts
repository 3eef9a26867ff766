/** Thrust in words: which way it is turned and how far it can be, and what it does about the CG. */
import { listed } from '../craft/craft.ts';
import type { Part } from '../craft/schema.ts';
import type { Vectoring } from '../craft/thrustSchema.ts';
import { type YawAsSet, yawAsSet } from '../report/turning/yawAsSet.ts';
import { formatQuantity } from '../units/format.ts';
import type { UnitSystem } from '../units/units.ts';
import type { Readout } from './readout.ts';
import { type Geometry, geometryOf, type Subject } from './subject.ts';
import type { Way } from './thrustArrows.ts';

/** Below this an angle reads as nought, rad. */
const NAUGHT = (0.05 * Math.PI) / 180;

const WORDS: Readonly<Record<Way, { plus: string; minus: string; none: string }>> = {
  pitch: { plus: 'up', minus: 'down', none: 'level' },
  yaw: { plus: 'to starboard', minus: 'to port', none: 'straight ahead' },
};

/** "12.0° up", "20.0° to port", "straight ahead". */
export function turnedWords(way: Way, angle: number, units: UnitSystem): string {
  const { plus, minus, none } = WORDS[way];
  if (Math.abs(angle) < NAUGHT) return none;
  return `${formatQuantity(Math.abs(angle), 'angle', units)} ${angle > 0 ? plus : minus}`;
}

/** No more than the angle, for a small view. */
export function angleReadout({ craft, units }: Subject, id: string, way: Way): Readout | null {
  const vectoring = craft.parts.byId[id]?.thruster?.[way];
  return vectoring ? { title: turnedWords(way, vectoring.set, units).replace(' to ', ' '), lines: [] } : null;
}

/** What stands beside the hand, or beside the arrow under the pointer. */
export function thrustReadout({ craft, assessment, units }: Subject, id: string, way: Way): Readout | null {
  const part = craft.parts.byId[id];
  const geometry = geometryOf(assessment);
  const arrow = geometry?.thrust.find((each) => each.part === id);
  if (!part?.thruster || !geometry || !arrow) return null;
  const vectoring = part.thruster[way];
  return {
    title: part.name || part.kind,
    lines: [
      `thrust ${turnedWords(way, vectoring.set, units)}`,
      `limits ${limitWords(way, vectoring, units)}`,
      `${formatQuantity(arrow.thrust, 'force', units)} at full throttle`,
    ],
  };
}

/** "30.0° down, 45.0° up", "45.0° either way". */
const limitWords = (way: Way, { least, most }: Vectoring, units: UnitSystem): string =>
  Math.abs(least + most) < NAUGHT
    ? `${formatQuantity(most, 'angle', units)} either way`
    : `${turnedWords(way, least, units)}, ${turnedWords(way, most, units)}`;

/** About the CG, or about the CB of a craft without solid mass. */
export const yawOf = ({ thrust, cg, cb }: Geometry): YawAsSet => yawAsSet(thrust, cg ?? cb);

/** Thrust that passes the CG as near as this is not said to yaw the craft: no CG is known better. m */
const BESIDE = 0.005;

/** −1 to port, 1 to starboard, 0 for none. */
export const senseOf = ({ moment, thrust }: YawAsSet): -1 | 0 | 1 =>
  Math.abs(moment) <= BESIDE * thrust ? 0 : moment > 0 ? 1 : -1;

/** "yaws to starboard", "0.208 N·m"; nothing when it does not. */
export function yawWords(yaw: YawAsSet, units: UnitSystem): string[] {
  const sense = senseOf(yaw);
  if (sense === 0) return [];
  return [
    `yaws to ${sense > 0 ? 'starboard' : 'port'}`,
    formatQuantity(Math.abs(yaw.moment), 'torque', units),
  ];
}

/** Without its sign, "1.28 m". */
export const armLength = (arm: number, units: UnitSystem): string =>
  formatQuantity(Math.abs(arm), 'length', units, { uncertainty: TENTH });

/** To the centimetre: no CG of a craft so large is known better. m */
const TENTH = 0.1;

/** Every thruster with figures, as a view shows it: "Tail thruster 0.400 N, level."; empty without any. */
export function thrustInWords({ craft, assessment, units }: Subject, way: Way): string {
  const geometry = geometryOf(assessment);
  const said = listed(craft.parts).flatMap((part) => {
    const arrow = geometry?.thrust.find((each) => each.part === part.id);
    return part.thruster && arrow ? [oneInWords(part, arrow.thrust, way, units)] : [];
  });
  return said.length === 0 ? '' : `Thrust: ${said.join('; ')}.`;
}

const oneInWords = ({ name, kind, thruster }: Part, thrust: number, way: Way, units: UnitSystem): string =>
  `${name || kind} ${formatQuantity(thrust, 'force', units)}, ${turnedWords(way, thruster![way].set, units)}`;

/** Of the parts selected, after one was turned: "Tail thruster: thrust 12.0° up." */
export const turnStatus = ({ craft, units }: Subject, parts: readonly string[], way: Way): string =>
  parts
    .flatMap((id) => {
      const part = craft.parts.byId[id];
      return part?.thruster
        ? [`${part.name || part.kind}: thrust ${turnedWords(way, part.thruster[way].set, units)}.`]
        : [];
    })
    .join(' ');
