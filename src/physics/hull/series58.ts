/**
 * The polynomial bodies of revolution of Series 58.
 *
 *   y²/D² = q(X) = Σ aᵢ Xⁱ, i = 1 … 6, X = x/L, with
 *   q(1) = 0, q(m) = 1/4, q′(m) = 0, a₁ = 2 r₀, q′(1) = −2 r₁, ∫₀¹ q dX = Cp/4
 *
 * m station of the greatest diameter, r₀ and r₁ radii of curvature at nose and tail times L/D², Cp = V/(D² L π/4);
 * all dimensionless. Source: M. Gertler, David Taylor Model Basin Report C-297 (1950).
 *
 * The six conditions are met by writing q = X(1 − X) p(X) and
 *   p = p_m + p_m′ (X − m) + (X − m)² [c₂ + c₃ X + K X(1 − X)],
 * where K alone is left for Cp and enters linearly. So the Cp that keep 0 < q ≤ 1/4 form one interval, which is
 * what the sentence offers when the wanted one lies outside.
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { integrateFixed } from '../../numeric/quadrature.ts';
import { say } from '../../units/sentence.ts';
import type { Meridian, ShapeOf, Stretch } from './meridian.ts';

type Series58 = ShapeOf<'series58'>;

interface Form {
  readonly m: number;
  readonly pm: number;
  readonly slope: number;
  readonly c2: number;
  readonly c3: number;
}

export function series58(shape: Series58): Outcome<Meridian> {
  const form = formOf(shape);
  const { least, greatest } = allowedK(form);
  const k = (shape.prismatic / 4 - area(form, 0)) / areaPerK(form);
  if (!(k > least && k <= greatest)) return prismaticFault(shape, form, least, greatest, k);
  return solved({ stretches: [stretchOf(shape, form, k)], maxRadius: shape.diameter / 2 });
}

function formOf({ widest: m, noseRadius, tailRadius }: Series58): Form {
  const pm = 1 / (4 * m * (1 - m));
  const slope = ((2 * m - 1) * pm) / (m * (1 - m));
  const c2 = (2 * noseRadius - pm + slope * m) / m ** 2;
  const c3 = (2 * tailRadius - pm - slope * (1 - m)) / (1 - m) ** 2 - c2;
  return { m, pm, slope, c2, c3 };
}

const pAt = ({ m, pm, slope, c2, c3 }: Form, k: number, x: number): number =>
  pm + (x - m) * (slope + (x - m) * (c2 + c3 * x + k * x * (1 - x)));

/** dp/dX. */
function pSlopeAt({ m, slope, c2, c3 }: Form, k: number, x: number): number {
  const factor = c2 + c3 * x + k * x * (1 - x);
  return slope + 2 * (x - m) * factor + (x - m) ** 2 * (c3 + k * (1 - 2 * x));
}

/** ∫₀¹ q dX; a polynomial of degree 6, so 4 Gauss points are exact. */
const area = (form: Form, k: number): number => integrateFixed((x) => x * (1 - x) * pAt(form, k, x), 0, 1, 4);

const areaPerK = ({ m }: Form): number => integrateFixed((x) => (x * (1 - x) * (x - m)) ** 2, 0, 1, 4);

/** Places where the two bounds on K are looked at; between neighbours they change by less than the margin below. */
const PLACES = 1000;
const MARGIN = 1e-6;

/** K must keep q above 0 and at or under 1/4 everywhere between the ends. */
function allowedK(form: Form): { least: number; greatest: number } {
  let least = Number.NEGATIVE_INFINITY;
  let greatest = Number.POSITIVE_INFINITY;
  for (let i = 0; i < PLACES; i += 1) {
    const x = (i + 0.5) / PLACES;
    const perK = x * (1 - x) * (x - form.m) ** 2;
    if (perK < 1e-9) continue;
    const p = pAt(form, 0, x);
    least = Math.max(least, -p / perK);
    greatest = Math.min(greatest, (0.25 / (x * (1 - x)) - p) / perK);
  }
  const margin = MARGIN * (1 + Math.abs(least));
  return { least: least + margin, greatest };
}

function prismaticFault(
  { prismatic, widest }: Series58,
  form: Form,
  least: number,
  greatest: number,
  k: number,
) {
  const fault = k > least ? 'swells past the greatest diameter' : 'falls to nothing between its ends';
  const why = `With a prismatic coefficient of ${say(prismatic, 'ratio')} the outline ${fault}.`;
  if (!(greatest > least))
    return infeasible(
      why,
      `No prismatic coefficient fits the other three: bring the widest station nearer the middle than ${say(widest, 'ratio')}, or change the nose or tail radius.`,
    );
  const from = 4 * area(form, least);
  const to = 4 * area(form, greatest);
  return infeasible(
    why,
    `With this widest station and these end radii it may lie between ${say(from, 'ratio')} and ${say(to, 'ratio')}.`,
  );
}

/** X = (1 − cos πt)/2, so that √(X(1 − X)) = ½ sin πt and the blunt ends are smooth in t. */
function stretchOf({ length, diameter }: Series58, form: Form, k: number): Stretch {
  return {
    at: (t) => {
      const x = Math.sin((Math.PI / 2) * t) ** 2;
      const half = Math.sin(Math.PI * t) / 2;
      const dx = Math.PI * half;
      const root = Math.sqrt(Math.max(0, pAt(form, k, x)));
      const dRoot = root > 0 ? (pSlopeAt(form, k, x) * dx) / (2 * root) : 0;
      return {
        r: diameter * half * root,
        dx: length * dx,
        dr: diameter * ((Math.PI / 2) * Math.cos(Math.PI * t) * root + half * dRoot),
      };
    },
  };
}
