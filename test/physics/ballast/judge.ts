/** Whether a craft keeps its targets, told from the figures of the report alone, and its dead ballast. */
import { type Craft, listed } from '../../../src/craft/craft.ts';
import { assess } from '../../../src/report/assess.ts';

/** By how much the craft misses its targets: rad, kg or m, whichever is the largest number; ≤ 0 when it keeps them. */
export function missedBy(craft: Craft): number {
  const { rows } = assess(craft);
  const { heaviness, pitchTolerance, heelTolerance, leastPendulumDepth } = craft.targets;
  const value = (key: string) => rows[key]?.value ?? Number.POSITIVE_INFINITY;
  return Math.max(
    Math.abs(value('float.pitch')) - pitchTolerance,
    Math.abs(value('float.heel')) - heelTolerance,
    leastPendulumDepth - value('float.pendulumDepth'),
    value('heaviness') - heaviness.most,
    heaviness.least - value('heaviness'),
  );
}

/** kg */
export const deadBallast = (craft: Craft): number =>
  listed(craft.parts)
    .filter(({ kind }) => kind === 'ballast')
    .reduce((sum, { mass, copies }) => sum + mass * (copies.kind === 'pair' ? 2 : copies.count), 0);
