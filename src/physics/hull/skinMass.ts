/**
 * Mass of the skin, without its patches.
 *
 *   film mass = σ A_film;  u = (half-width of σ) A_film/√3, σ lying anywhere in its band (JCGM 100:2008, 4.3.7)
 *   seam mass = n λ ℓ, n seams of length ℓ and mass λ per metre
 *
 * σ areal density, kg/m²; A_film film area, m²; λ, kg/m; ℓ, m. Inertia: diagonal, about the own centroid, axes of the
 * hull, kg·m²; seams as if spread evenly round the section (round two-sheet: along its rim).
 */
import type { HullSpec } from '../../craft/hullSchema.ts';
import type { Film } from '../../craft/schema.ts';
import type { Hull, Triple } from './hull.ts';

export interface SkinBody {
  /** kg */
  readonly mass: number;
  /** Centroid on the hull axis, m. */
  readonly station: number;
  /** About its own centroid and the axes x, y, z, kg·m². */
  readonly inertia: Triple;
}

export interface SkinMass {
  readonly film: SkinBody & { /** Standard uncertainty of the mass, kg. */ readonly uncertainty: number };
  readonly seams: SkinBody;
}

/** What is needed of a film; its tolerance is the half-width of the band, kg/m². */
export type FilmWeight = Pick<Film, 'arealDensity' | 'arealDensityTolerance'>;

export function skinMassOf(spec: HullSpec, hull: Hull, film: FilmWeight): SkinMass {
  const seamLine = seamCount(spec) * spec.seams.massPerMetre;
  return {
    film: {
      mass: film.arealDensity * hull.filmArea,
      station: hull.skinStation,
      inertia: scaled(hull.skinInertia, film.arealDensity),
      uncertainty: (film.arealDensityTolerance * hull.filmArea) / Math.sqrt(3),
    },
    seams: {
      mass: seamLine * hull.seamLength,
      station: hull.seamStation,
      inertia: scaled(hull.seamInertia, seamLine),
    },
  };
}

/** Meridional seams, nose to tail: as many as gores, two for two sheets, else what the file says. */
export function seamCount({ shape, seams }: HullSpec): number {
  switch (shape.kind) {
    case 'gores':
      return shape.count;
    case 'twoSheet':
    case 'roundTwoSheet':
      return 2;
    default:
      return seams.count;
  }
}

const scaled = ([x, y, z]: Triple, factor: number): Triple => [x * factor, y * factor, z * factor];
