/**
 * Speed across the layer, as a share f of the speed without it, η the share of the layer's thickness δ from the skin.
 *
 *   laminar f = 2η − 2η³ + η⁴ (Pohlhausen 1921);  turbulent f = η^{1/7} (Prandtl 1921);  f = 1 beyond
 *   momentum area round a skin of radius r:  Λ = 2π∫f(1 − f)(r + y)dy = 2π(I₀ r δ + I₁ δ²)
 *   I₀ = 37/315, I₁ = 5/126;  7/72, 7/240
 *
 * Thicknesses are measured square to the hull axis, m, so that a thick layer at the tail closes to a round wake.
 * Source: H. Schlichting, Boundary-Layer Theory (7th ed.), ch. X and XX (from memory); I₁ by elementary calculus.
 */

interface Profile {
  readonly share: (eta: number) => number;
  readonly flat: number;
  readonly round: number;
}

const laminar: Profile = {
  share: (eta) => eta * (2 + eta * eta * (eta - 2)),
  flat: 37 / 315,
  round: 5 / 126,
};
const turbulent: Profile = { share: (eta) => eta ** (1 / 7), flat: 7 / 72, round: 7 / 240 };

const profileOf = (isTurbulent: boolean): Profile => (isTurbulent ? turbulent : laminar);

/** δ of a layer with momentum area Λ round a skin of radius r, m. */
export function thicknessOf(area: number, radius: number, isTurbulent: boolean): number {
  const { flat, round } = profileOf(isTurbulent);
  const line = flat * radius;
  const wanted = area / (2 * Math.PI);
  const root = line + Math.sqrt(line * line + 4 * round * wanted);
  return root > 0 ? (2 * wanted) / root : 0;
}

/** f at a distance from the skin, m. */
export function shareOfSpeed(distance: number, thickness: number, isTurbulent: boolean): number {
  if (distance >= thickness) return 1;
  return distance > 0 ? profileOf(isTurbulent).share(distance / thickness) : 0;
}
