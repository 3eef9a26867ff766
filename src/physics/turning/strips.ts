/**
 * Cross-flow drag of the hull by strips:
 *
 *   Y = −½ρ · 1.2 · η ∫ D(x) w|w| dx,  N = −½ρ · 1.2 · η ∫ D(x) X w|w| dx,   w = v + X r
 *
 * D(x) height of the section, m; X ahead of the CB, m; w speed to starboard of the strip through the air, m/s; 1.2 of the
 * endless cylinder; η by how much less it is on one of finite length. Each strip as if the air flowed square across it.
 *
 * η from the drag of cylinders broadside, length over diameter 1, 2, 5, 10, 40: C_d 0.63, 0.68, 0.74, 0.82, 0.98 ÷ 1.20
 * (C. Matthews, Aeronautical Engineer's Data Book, p. 95, as in the table of the references); monotone between them over
 * diameter ÷ length, on which the endless cylinder is 0. Blunt cylinders at Reynolds numbers below 3e5: a hull with
 * pointed ends, or faster across, has less.
 *
 * Quadrature: X = X_end sin φ from the CB to either end, Gauss–Legendre over φ, so that round ends and a craft spinning on
 * the spot are met exactly.
 */
import { kept } from '../../numeric/kept.ts';
import { pchip } from '../../numeric/pchip.ts';
import { gaussLegendre } from '../../numeric/quadrature.ts';
import type { Hull } from '../hull/hull.ts';

const ENDLESS = 1.2;
const TABLE = pchip([0, 1 / 40, 1 / 10, 1 / 5, 1 / 2, 1], [1, 0.817, 0.683, 0.617, 0.567, 0.525]);
const NODES = 24;

/** η at a fineness length ÷ diameter > 0. */
export const finiteLength = (fineness: number): number => TABLE.at(1 / fineness);

export interface Strips {
  /** Ahead of the CB, m. */
  readonly ahead: Float64Array;
  /** Side force of each against w|w| in air of unit density, m². */
  readonly drag: Float64Array;
}

export const stripsOf: (hull: Hull) => Strips = kept((hull: Hull) => {
  const factor = 0.5 * ENDLESS * finiteLength(hull.length / hull.height);
  const halves = [hull.cbStation, hull.cbStation - hull.length].map((end) => halfOf(hull, end, factor));
  return {
    ahead: Float64Array.from(halves.flatMap(({ ahead }) => ahead)),
    drag: Float64Array.from(halves.flatMap(({ drag }) => drag)),
  };
});

/** From the CB to an end so far ahead of it. */
function halfOf({ radius, cbStation }: Hull, end: number, factor: number) {
  const { nodes, weights } = gaussLegendre(NODES);
  const angles = nodes.map((node) => (Math.PI / 4) * (1 + node));
  const ahead = angles.map((angle) => end * Math.sin(angle));
  const drag = angles.map((angle, i) => {
    const width = (Math.PI / 4) * weights[i]! * Math.abs(end) * Math.cos(angle);
    return factor * 2 * radius(cbStation - ahead[i]!, 0) * width;
  });
  return { ahead, drag };
}
