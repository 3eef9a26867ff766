/** Of what the targets of turning ask of the yaw moment, what asks the most of what is there for it. */
import { valueOrNull } from '../../numeric/outcome.ts';
import type { Authority } from '../../physics/turning/turn.ts';
import type { Row } from '../row.ts';
import { row } from '../rows.ts';

export interface HarderNeed {
  readonly target: 'turnTime' | 'sideGust';
  /** Yaw moments: what is there for it, and what it takes; about the CG for the time, about the virtual mass centre for the gust. */
  readonly there: Row;
  readonly needed: Row;
}

/** Null where nothing is asked, or no moment is known that would do. */
export function harderNeed({ need }: Authority): HarderNeed | null {
  const asked = (['turnTime', 'sideGust'] as const).flatMap((target) => {
    const each = need?.[target];
    const needed = each && valueOrNull(each.needed);
    return each && needed !== null && needed !== undefined
      ? [{ target, needed, there: each.available, share: needed / each.available }]
      : [];
  });
  const hardest = asked.toSorted((one, other) => other.share - one.share)[0];
  if (!hardest) return null;
  const { target, there, needed } = hardest;
  const moment = (label: string, value: number) => row({ label, quantity: 'torque', value });
  return { target, there: moment('Yaw moment', there), needed: moment('needed', needed) };
}
