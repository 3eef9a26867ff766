/**
 * Drag of a thin plate edge-on to the stream, for fins.
 *
 *   D = ½ρ S (2 C_f + 0.003) u|u|,   Re = u c/ν,  c = √(S/A)
 *   C_f = 1.328/√Re                     laminar, Re < 5e5
 *   C_f = 0.074 Re^(−1/5) − 1742/Re     transition at 5e5, where the two meet
 *
 * S outline area, m²; A aspect ratio, so that c is the mean chord, m; u speed along the plate, m/s; ν kinematic
 * viscosity, m²/s. 0.003: thickness, for a sheet of 1.5 % of its chord with a rounded fore edge and a cut-off rear edge,
 * 0.2 on its thickness; a square fore edge costs several times as much. Gaps, hinges and the meeting with the hull are left out.
 * Source: Blasius; mixed friction as in H. Schlichting, Boundary-Layer Theory, ch. 21; base drag about 0.2 after
 * S. F. Hoerner, Fluid-Dynamic Drag, 1965, ch. 3 (all from memory).
 */

const TRANSITION = 5e5;
const THICKNESS = 0.003;

/** Friction coefficient of one side of a plate of that length, Re > 0. */
export const plateFriction = (reynolds: number): number =>
  reynolds < TRANSITION ? 1.328 / Math.sqrt(reynolds) : 0.074 * reynolds ** -0.2 - 1742 / reynolds;

/** Drag, N, against speed along the plate, m/s; odd in the speed. Area in m². */
export function plateDrag(
  area: number,
  aspectRatio: number,
  density: number,
  kinematicViscosity: number,
): (u: number) => number {
  const perSpeed = Math.sqrt(area / aspectRatio) / kinematicViscosity;
  const half = 0.5 * density * area;
  return (u) =>
    u === 0 || area === 0
      ? 0
      : half * (2 * plateFriction(Math.abs(u) * perSpeed) + THICKNESS) * u * Math.abs(u);
}
