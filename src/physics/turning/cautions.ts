/** What to bear in mind about a turn, one sentence each. */
import type { Outcome } from '../../numeric/outcome.ts';
import { say } from '../../units/sentence.ts';
import type { TurnAsked } from './asked.ts';
import { LONGEST } from './sail.ts';
import type { Settled } from './steady.ts';
import { type Command, isStuck, momentOf, turnsInYaw } from './steer.ts';
import type { TurningCraft } from './turningCraft.ts';

export const turnCautions = (
  craft: TurningCraft,
  asked: TurnAsked,
  command: Command,
  steady: Outcome<Settled>,
): string[] => [
  // The pieces of a part say the same.
  ...new Set([...stuckCautions(craft), ...vectorCautions(craft, asked)]),
  ...(steady.status === 'solved' ? steadyCautions(craft, command, steady.value) : []),
];

const stuckCautions = ({ thrusters }: TurningCraft): string[] =>
  thrusters
    .filter(isStuck)
    .map(
      ({ name, yaw }) =>
        `${name} has a range of angles in yaw but no slew rate, so it stays at ${say(yaw.set, 'angle')}.`,
    );

function vectorCautions({ thrusters }: TurningCraft, { vector }: TurnAsked): string[] {
  if (vector === null) return [];
  const turning = thrusters.filter(turnsInYaw);
  if (turning.length === 0) return ['No thruster turns in yaw, so the vectoring asked for changes nothing.'];
  return turning.flatMap(({ name, yaw: { least, most } }) => {
    if (vector >= least && vector <= most) return [];
    const limit = vector < least ? least : most;
    return [`${name} turns to ${say(limit, 'angle')}, not to the ${say(vector, 'angle')} asked for.`];
  });
}

function steadyCautions(craft: TurningCraft, command: Command, { turn, reached }: Settled): string[] {
  const { yawRate, drift } = turn;
  const cautions: string[] = [];
  if (!reached) {
    cautions.push(
      `From cruise the craft does not come to a steady turn within ${say(LONGEST, 'time')}: the figures are of one that it may swing about without settling.`,
    );
  }
  if (yawRate * momentOf(craft, command) < 0) {
    cautions.push(
      `In the steady turn the craft yaws to ${yawRate > 0 ? 'starboard' : 'port'}, against the thrusters: the air turns it harder than they do.`,
    );
  }
  if (Math.abs(drift) > Math.PI / 2) {
    cautions.push('In the steady turn the craft spins almost on the spot and slides tail first.');
  }
  return cautions;
}
