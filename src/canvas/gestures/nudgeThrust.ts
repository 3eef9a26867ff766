/** The keys `,` and `.` as edits: they turn the thrust of what is selected by 1°, with Shift by 10°. */
import { type Craft, listed } from '../../craft/craft.ts';
import { type Edit, runOf } from '../../edit/edit.ts';
import { turnThrust, type Way } from '../../edit/edits/thrust.ts';
import { idsOf, type Selection } from '../../edit/selection.ts';
import type { Facing } from './nudge.ts';

const STEP = Math.PI / 180;

export interface ThrustNudge {
  readonly way: Way;
  /** rad, + up or to starboard */
  readonly by: number;
}

const WAYS: Readonly<Partial<Record<Facing, Way>>> = { side: 'pitch', above: 'yaw' };

/** Which way the two keys turn, by their places: with Shift they write other signs, and not the same on every keyboard. */
const PLACES: Readonly<Record<string, number>> = { Comma: -1, Period: 1 };
/** By what they write without Shift, for a keyboard that has those signs in other places. */
const SIGNS: Readonly<Record<string, number>> = { ',': -1, '.': 1 };

export function thrustNudgeFor(
  { key, code, shiftKey }: { key: string; code: string; shiftKey: boolean },
  facing: Facing,
): ThrustNudge | null {
  const way = WAYS[facing];
  const sense = PLACES[code] ?? (shiftKey ? 0 : (SIGNS[key] ?? 0));
  return way && sense !== 0 ? { way, by: sense * STEP * (shiftKey ? 10 : 1) } : null;
}

/** One edit for all thrusters with figures that are selected; why not, when none turns that way; null when there are none. */
export function thrustNudgeEdit(
  craft: Craft,
  selection: Selection,
  { way, by }: ThrustNudge,
): Edit | string | null {
  const ids = idsOf(selection, 'part');
  const thrusters = listed(craft.parts).filter(({ id, thruster }) => thruster && ids.includes(id));
  const turning = thrusters.filter(({ thruster }) => thruster![way].most > thruster![way].least);
  const [first, more] = turning.length ? turning : thrusters;
  if (!first) return null;
  const name = first.name || first.kind;
  if (turning.length === 0) return `${name} does not turn in ${way}. Its limits are under Selected.`;
  const label = `Turn the thrust of ${more ? `${turning.length} thrusters` : name}`;
  return runOf(`turn ${way} ${turning.map(({ id }) => id)}`, label, (draft) => {
    for (const { id, thruster } of turning) turnThrust(id, way, thruster![way].set + by)(draft);
  });
}
