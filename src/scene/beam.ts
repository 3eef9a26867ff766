/**
 * The beam of moments: every part, wire run and the skin is a bar as long as its moment about the CB station. Bars
 * that pull the nose down are stacked forward of the CB (to the left, negative), those that pull the tail down aft of
 * it; the longest lies nearest the CB. The side that falls short shows the rest as a gap, and lead as a bar across it.
 * Positions along the beam are moments, kg·m.
 */
import type { BeamBar } from '../report/assessment.ts';
import { formatQuantity } from '../units/format.ts';
import { type UnitSystem, unitOf } from '../units/units.ts';

export interface PlacedBar extends BeamBar {
  /** From the end near the CB to the far end; both ≤ 0 forward of it, ≥ 0 aft. */
  readonly near: number;
  readonly far: number;
}

export interface Beam {
  readonly bars: readonly PlacedBar[];
  /** Sum of each side, kg·m: fore ≤ 0 ≤ aft. */
  readonly fore: number;
  readonly aft: number;
  /** fore + aft; + tail-heavy. */
  readonly net: number;
  /** Along the lighter side, from its end to where the sides would agree. */
  readonly gap: { readonly near: number; readonly far: number };
  /** The least lead across the gap; null where it cannot be had. */
  readonly lead: PlacedBar | null;
}

export function beamOf(bars: readonly BeamBar[], lead: BeamBar | null): Beam {
  const ordered = [...bars].sort((a, b) => Math.abs(b.moment) - Math.abs(a.moment));
  let fore = 0;
  let aft = 0;
  const placed = ordered.map((bar) => {
    const near = bar.moment < 0 ? fore : aft;
    const far = near + bar.moment;
    if (bar.moment < 0) fore = far;
    else aft = far;
    return { ...bar, near, far };
  });
  const net = fore + aft;
  const end = net > 0 ? fore : aft;
  const gap = { near: end, far: end - net };
  const start = lead && (lead.moment < 0 ? fore : aft);
  const placedLead = lead && start !== null ? { ...lead, near: start, far: start + lead.moment } : null;
  return { bars: placed, fore, aft, net, gap, lead: placedLead };
}

/** Farthest the beam reaches from the CB on either side, kg·m. */
export const reachOf = ({ fore, aft, gap, lead }: Beam): number =>
  Math.max(-fore, aft, Math.abs(gap.far), Math.abs(lead?.far ?? 0));

/** "38.0 g·m tail-heavy"; "balanced" when it rounds to nothing; of a craft that is level all the same, that it is. */
export function netWords(net: number, units: UnitSystem, level: boolean): string {
  if (roundsToNothing(net, units)) return 'balanced';
  const amount = `${formatQuantity(Math.abs(net), 'momentMass', units)} ${net > 0 ? 'tail-heavy' : 'nose-heavy'}`;
  return level ? `level within tolerance, ${amount}` : amount;
}

/** Less than half of the last digit shown: 0.005 g·m. */
export function roundsToNothing(net: number, units: UnitSystem): boolean {
  const { si, digits } = unitOf('momentMass', units);
  return Math.abs(net / si) < 0.5 * 10 ** -digits;
}
