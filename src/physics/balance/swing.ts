/**
 * The swing period of the free craft about level, which a builder can time with a watch.
 *
 *   T = 2π √( J / (W g h) ),   J = I_CB + I_gas + k′ I_air − (W h)² / (W + m_gas + k₁ m_air)
 *
 * W solid mass; h pendulum depth, m; I_CB pitch inertia of solid mass about the CB; I_gas of the gas, moving with the
 * hull; k′ I_air added inertia; m_air = ρ V; the last term because the craft drifts as it swings: it is not held at the
 * CB, and the motion splits into the swing about a moving point and a surge with added mass k₁ m_air.
 * Derived from Lagrange's equations for small angles with added mass after Lamb, Hydrodynamics (1932), §§ 114–124.
 * Still air, no damping; the gas is taken to turn as one with the hull.
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { STANDARD_GRAVITY } from '../../units/constants.ts';
import { say } from '../../units/sentence.ts';

export interface SwingTerms {
  readonly solidMass: number;
  readonly pendulumDepth: number;
  readonly solidInertia: number;
  readonly gasInertia: number;
  readonly airInertia: number;
  readonly gasMass: number;
  readonly airMass: number;
  /** Added mass in surge and added inertia in pitch, as shares of the displaced air's. */
  readonly surge: number;
  readonly pitch: number;
}

/** A pendulum shallower than this is none, m. */
const LEAST_DEPTH = 1e-9;

/** s */
export function swingPeriod(terms: SwingTerms): Outcome<number> {
  const { solidMass, pendulumDepth: h } = terms;
  if (!(solidMass > 0)) return infeasible('There is no mass to swing.');
  if (h < LEAST_DEPTH) {
    return infeasible(
      `The CG is not below the CB (by ${say(-h, 'smallLength')}), so the craft does not swing back.`,
      'Hang something lower.',
    );
  }
  const drifting = solidMass + terms.gasMass + terms.surge * terms.airMass;
  const inertia =
    terms.solidInertia + terms.gasInertia + terms.pitch * terms.airInertia - (solidMass * h) ** 2 / drifting;
  return solved(2 * Math.PI * Math.sqrt(inertia / (solidMass * STANDARD_GRAVITY * h)));
}
