/** Why a craft cannot be driven or steered, in sentences. */
import { type Craft, listed } from '../../craft/craft.ts';
import { infeasible, type Outcome } from '../../numeric/outcome.ts';
import type { CraftState } from '../../physics/craftState.ts';
import { type Thruster, thrustersOf } from '../../physics/thrust/thrusters.ts';
import { yaws } from '../../physics/turning/leverage.ts';
import { joined } from '../planWords.ts';

const NO_THRUSTER =
  'The craft has no thruster: add a part of that kind and enter its thrust under Selected on the page, or as “thruster” in the file.';

/** One sentence for each thruster of which nothing is known. */
export const missingFigures = (craft: Craft): string[] =>
  listed(craft.parts)
    .filter(({ kind, thruster }) => kind === 'thruster' && thruster === null)
    .map(
      ({ name }) =>
        `${name || 'A thruster'} has no thrust figures: enter them under Selected on the page, or as “thruster” in the file.`,
    );

/** What the physics answers, or why nothing drives the craft. */
export function ifDriven<T>(
  state: CraftState,
  ask: (thrusters: readonly Thruster[]) => Outcome<T>,
): Outcome<T> {
  const thrusters = thrustersOf(state);
  const missing = withoutThrust(state.craft, thrusters);
  return missing ? infeasible(missing) : ask(thrusters);
}

/** Null when some thruster gives thrust. */
function withoutThrust(craft: Craft, thrusters: readonly Thruster[]): string | null {
  if (thrusters.some(({ staticThrust }) => staticThrust > 0)) return null;
  if (thrusters.length === 0) return missingFigures(craft)[0] ?? NO_THRUSTER;
  return `${namesOf(thrusters)} has a static thrust of nil: enter it under Selected on the page, or in “thruster” in the file.`;
}

/** Each once, in order: "Tail thruster", "Port and Starboard". */
export const namesOf = (thrusters: readonly Thruster[]): string =>
  joined([...new Set(thrusters.map(({ name }) => name))]);

export function cannotYaw(thrusters: readonly Thruster[]): string | null {
  if (thrusters.length === 0 || thrusters.some(yaws)) return null;
  return `${namesOf(thrusters)} can only push straight: nothing turns in yaw and nothing is throttled apart, so the craft cannot be steered. Let a thruster turn in yaw, or throttle a pair apart.`;
}
