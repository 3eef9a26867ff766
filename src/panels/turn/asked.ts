/** The builder's choices as the report takes them. */
import { type Craft, listed } from '../../craft/craft.ts';
import type { Part } from '../../craft/schema.ts';
import type { Vectoring } from '../../craft/thrustSchema.ts';
import type { TurnAsked } from '../../report/turning/turns.ts';
import type { TurningState } from './turning.ts';

/** The thruster by whose arrow one steers: the one turned last, else the first that turns in yaw; null when none does. */
export function steeringPart(craft: Craft, { turned }: Pick<TurningState, 'turned'>): Part | null {
  const able = listed(craft.parts).filter(({ thruster }) => thruster && turns(thruster.yaw));
  return able.find(({ id }) => id === turned) ?? able[0] ?? null;
}

const turns = ({ least, most }: Vectoring): boolean => most > least;

export const askedOf = (craft: Craft, turning: TurningState): TurnAsked => ({
  throttle: turning.throttle,
  vector: turning.steering === 'set' ? (steeringPart(craft, turning)?.thruster?.yaw.set ?? null) : null,
  speed: turning.speed,
});
