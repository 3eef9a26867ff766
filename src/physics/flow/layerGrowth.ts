/**
 * How the layer of slowed air grows along a body of revolution, by its momentum equation.
 *
 *   d(rθ)/ds + (H + 2)(rθ)u′/u = r c_f/2,   θ momentum thickness, H = δ₁/θ (δ₁ displacement thickness), u outer speed, s along the skin
 *   laminar:    (rθ)² = 0.45 ν u⁻⁶ ∫r² u⁵ ds              (Thwaites 1949, with Mangler's transformation)
 *   turbulent:  (rθ)^{5/4} u^{17/4} = [same at transition] + 0.016 ν^{1/4} ∫r^{5/4} u⁴ ds
 *               from c_f/2 = 0.0128 (uθ/ν)^{−1/4} and H = 1.4  (Truckenbrodt 1952 in the form of Buri 1931)
 *
 * The turbulent layer is carried as 2πrθ (u/U)^{H+2}, m²: its momentum area referred to the speed U of the craft. It
 * grows by friction alone, so it stays finite where r and u go to nothing at the tail, and the wake keeps it.
 * Turbulent from where the first of these holds, s and u there:
 *   uθ/ν > 1.174 (1 + 22400/Re_s) Re_s^{0.46}, Re_s = us/ν    (Michel 1951, as fitted by Cebeci & Smith)
 *   Re_s > 500,000    tape, seams and gores trip the layer on a built hull, more often than not earlier
 *   θ²u′/ν < −0.09    the laminar layer leaves the skin (Thwaites); it is taken to come back turbulent
 *   a given tape distance of a trip
 * The turbulent layer is likely to leave the skin where (θu′/u)(uθ/ν)^{1/4} < −0.06 (Buri).
 * Constants from memory, after H. Schlichting, Boundary-Layer Theory (7th ed.), ch. X, XI, XVII, XXII.
 */

/** A place on the skin and the speed just outside the layer: m, m, m/s. Tape distances ascend. */
export interface EdgeMark {
  readonly tape: number;
  readonly radius: number;
  readonly speed: number;
}

export interface GrownMark {
  /** Laminar: 2πrθ; turbulent: that times (u/U)^{H+2}. m² */
  readonly area: number;
  /** θ, m: of a thin layer; without bound where r or u goes to nothing. */
  readonly momentumThickness: number;
  readonly turbulent: boolean;
}

export type Transition = 'michel' | 'length' | 'leaves' | 'trip' | 'none';

export interface Growth {
  readonly marks: readonly GrownMark[];
  /** Which mark is the first turbulent one, and why; the last mark counts as turbulent. */
  readonly transition: number;
  readonly cause: Transition;
  /** Which mark is the first at which the turbulent layer is likely to leave the skin; null for none. */
  readonly separation: number | null;
}

export interface Stream {
  /** Of the craft, m/s. */
  readonly speed: number;
  /** Kinematic, m²/s. */
  readonly viscosity: number;
  /** Tape distance at which something trips the layer, m; null for nothing. */
  readonly trip: number | null;
}

/** H + 2 of the turbulent layer. */
export const SHAPE_POWER = 3.4;
const LONGEST_LAMINAR = 5e5;
const LAMINAR_LEAVES = -0.09;
const TURBULENT_LEAVES = -0.06;

export function growLayer(edge: readonly EdgeMark[], stream: Stream): Growth {
  const laminar = laminarThickness(edge, stream.viscosity);
  const slopes = slopesOf(edge);
  const { index, cause } = transitionOf(edge, laminar, slopes, stream);
  const powers = turbulentPowers(edge, index, laminar[index]!, stream.viscosity);
  const marks = edge.map(({ radius, speed }, i) => {
    if (i < index)
      return { area: 2 * Math.PI * radius * laminar[i]!, momentumThickness: laminar[i]!, turbulent: false };
    const area = 2 * Math.PI * powers[i]! ** 0.8 * stream.speed ** -SHAPE_POWER;
    const momentumThickness = powers[i]! ** 0.8 / (radius * speed ** SHAPE_POWER);
    return { area, momentumThickness, turbulent: true };
  });
  return { marks, transition: index, cause, separation: separationOf(edge, marks, slopes, stream.viscosity) };
}

/** θ of the laminar layer, m, as far as it goes. */
function laminarThickness(edge: readonly EdgeMark[], viscosity: number): number[] {
  const sums = running(edge, ({ radius, speed }) => radius * radius * speed ** 5);
  return edge.map(({ radius, speed }, i) => {
    const scale = radius * speed ** 3;
    return scale > 0 ? Math.sqrt(0.45 * viscosity * sums[i]!) / scale : 0;
  });
}

/** (rθ)^{5/4} u^{17/4} from the mark of transition on. */
function turbulentPowers(
  edge: readonly EdgeMark[],
  from: number,
  thickness: number,
  viscosity: number,
): number[] {
  const sums = running(edge, ({ radius, speed }) => radius ** 1.25 * speed ** 4);
  const { radius, speed } = edge[from]!;
  const start = (radius * thickness) ** 1.25 * speed ** 4.25;
  return edge.map((_, i) => start + 0.016 * viscosity ** 0.25 * (sums[i]! - sums[from]!));
}

/** ∫f ds from the first mark to each, by trapezia. */
function running(edge: readonly EdgeMark[], f: (mark: EdgeMark) => number): number[] {
  let sum = 0;
  return edge.map((mark, i) => {
    if (i > 0) sum += ((f(edge[i - 1]!) + f(mark)) / 2) * (mark.tape - edge[i - 1]!.tape);
    return sum;
  });
}

/** du/ds by differences over both neighbours. */
const slopesOf = (edge: readonly EdgeMark[]): number[] =>
  edge.map((_, i) => {
    const [a, b] = [edge[Math.max(0, i - 1)]!, edge[Math.min(edge.length - 1, i + 1)]!];
    return (b.speed - a.speed) / (b.tape - a.tape);
  });

function transitionOf(
  edge: readonly EdgeMark[],
  thickness: readonly number[],
  slopes: readonly number[],
  { viscosity, trip }: Stream,
): { index: number; cause: Transition } {
  for (let i = 1; i + 1 < edge.length; i += 1) {
    const cause = causeAt(edge[i]!, thickness[i]!, slopes[i]!, viscosity, trip);
    if (cause) return { index: i, cause };
  }
  return { index: edge.length - 1, cause: 'none' };
}

function causeAt(
  { tape, speed }: EdgeMark,
  thickness: number,
  slope: number,
  viscosity: number,
  trip: number | null,
): Transition | null {
  const reynolds = (speed * tape) / viscosity;
  if (trip !== null && tape >= trip) return 'trip';
  if ((thickness * thickness * slope) / viscosity < LAMINAR_LEAVES) return 'leaves';
  if ((speed * thickness) / viscosity > 1.174 * (1 + 22_400 / reynolds) * reynolds ** 0.46) return 'michel';
  return reynolds > LONGEST_LAMINAR ? 'length' : null;
}

function separationOf(
  edge: readonly EdgeMark[],
  marks: readonly GrownMark[],
  slopes: readonly number[],
  viscosity: number,
): number | null {
  const index = edge.findIndex(({ speed }, i) => {
    const { turbulent, momentumThickness } = marks[i]!;
    const reynolds = (speed * momentumThickness) / viscosity;
    return turbulent && ((momentumThickness * slopes[i]!) / speed) * reynolds ** 0.25 < TURBULENT_LEAVES;
  });
  return index < 0 ? null : index;
}
