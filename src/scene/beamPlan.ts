/** The beam with the plan carried out, under today's and to the same scale. px */
import { formatQuantity } from '../units/format.ts';
import { type UnitSystem, unitOf } from '../units/units.ts';
import { type Beam, beamOf, reachOf } from './beam.ts';
import { type BarOnPage, type BeamOnPage, layBeam } from './beamLayout.ts';
import type { Geometry } from './subject.ts';
import type { View } from './view.ts';
import { momentAmount } from './words.ts';

export interface TwoBeams {
  readonly today: BeamOnPage;
  readonly plan: { readonly beam: Beam; readonly page: BeamOnPage };
}

/** Both to the scale of the one that reaches farther. The moments of the plan are about the CB too, which it does not move. */
export function layTwo(today: Beam, then: Geometry, view: View): TwoBeams {
  const beam = beamOf(then.beam, null);
  const [a, b] = [layBeam(today, view), layBeam(beam, view)];
  const reach = Math.max(reachOf(today), reachOf(beam));
  const share = (own: Beam) => (reach > 0 ? reachOf(own) / reach : 1);
  return { today: scaled(a, share(today)), plan: { beam, page: scaled(b, share(beam)) } };
}

/** Shrunk about its middle. */
function scaled(page: BeamOnPage, by: number): BeamOnPage {
  if (by === 1) return page;
  const x = (at: number) => page.middle + (at - page.middle) * by;
  const spanned = <T extends { left: number; right: number }>(span: T): T => ({
    ...span,
    left: x(span.left),
    right: x(span.right),
  });
  const bar = (each: BarOnPage): BarOnPage => spanned(each);
  return {
    ...page,
    scale: page.scale * by,
    bars: page.bars.map(bar),
    lead: page.lead && bar(page.lead),
    gap: spanned(page.gap),
  };
}

/** "0.4 g·m tail-heavy", "balanced". */
export function planNetWords({ net }: Beam, units: UnitSystem): string {
  const { si, digits } = unitOf('momentMass', units);
  if (Math.abs(net / si) < 0.5 * 10 ** -digits) return 'balanced';
  return `${formatQuantity(Math.abs(net), 'momentMass', units)} ${net > 0 ? 'tail-heavy' : 'nose-heavy'}`;
}

/** The row of the plan, for those who do not see it. */
export const planBeamInWords = (beam: Beam, units: UnitSystem): string =>
  `With the plan: ${momentAmount(beam.fore, units)} forward, ${momentAmount(beam.aft, units)} aft; ${planNetWords(beam, units)}.`;
