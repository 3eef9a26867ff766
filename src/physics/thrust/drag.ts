/**
 * Drag of the craft moving straight ahead (or astern), against forward speed u.
 *
 *   hull   D = ½ρ V^(2/3) C_DV u|u|,  C_DV = Re^(−1/6) [0.172 (l/d)^(1/3) + 0.252 (d/l)^1.2 + 1.032 (d/l)^2.7],  Re = |u| l/ν
 *          so that D = k u|u|^(5/6)
 *   fins   plateDrag.ts, each by itself; a fin with a drag area of its own in the craft file is a pod instead
 *   pods   D = ½ρ u|u| Σ drag areas (pods.ts)
 *
 * N, + against forward motion; V gas volume, m³; l hull length, m; d diameter of the circle with the hull's frontal area, m
 * (for a body of revolution its greatest diameter; for a two-sheet balloon of any section that of equal frontal area);
 * ν kinematic viscosity, m²/s. Smooth hull, boundary layer turbulent from the nose; a wrinkled or seamed one has more.
 * Source: S. F. Hoerner, Fluid-Dynamic Drag, 1965, ch. 6, streamlined bodies by volume.
 */
import { say } from '../../units/sentence.ts';
import { kinematicViscosity } from '../air/viscosity.ts';
import type { CraftState } from '../craftState.ts';
import type { Hull } from '../hull/hull.ts';
import { type Fin, finsOf } from './fins.ts';
import { plateDrag } from './plateDrag.ts';
import { type Pod, podAreas } from './pods.ts';

/** Each in N at a forward speed in m/s, odd in it. */
export interface Drag {
  hull(u: number): number;
  fins(u: number): number;
  pods(u: number): number;
  /** All of it. */
  at(u: number): number;
  readonly finParts: readonly FinDrag[];
  readonly podParts: readonly Pod[];
  /** Σ of the drag areas of pods, m². */
  readonly podArea: number;
  /** On hull length, at a speed in m/s. */
  reynolds(u: number): number;
  /** What to think of these figures at a speed, one sentence each. */
  cautions(u: number): readonly string[];
}

export interface FinDrag {
  readonly fin: Fin;
  drag(u: number): number;
}

/** C_DV at a Reynolds number and a fineness l/d, both > 0. */
export const volumeDragCoefficient = (reynolds: number, fineness: number): number =>
  reynolds ** (-1 / 6) * shapeFactor(fineness);

const shapeFactor = (fineness: number): number =>
  0.172 * fineness ** (1 / 3) + 0.252 * fineness ** -1.2 + 1.032 * fineness ** -2.7;

/** l/d as the formula takes it. */
export const dragFineness = ({ length, frontalArea }: Hull): number =>
  length / Math.sqrt((4 * frontalArea) / Math.PI);

export function dragOf(state: CraftState): Drag {
  const { hull: form, air, craft } = state;
  const viscosity = kinematicViscosity(air);
  const fineness = dragFineness(form);
  const halfDensity = 0.5 * air.density;
  const perSpeed = form.length / viscosity;
  const hullFactor = halfDensity * form.volume ** (2 / 3) * volumeDragCoefficient(perSpeed, fineness);
  const finParts = finsOf(state)
    .filter(({ part }) => craft.parts.byId[part]!.dragArea === null)
    .map((fin) => ({ fin, drag: plateDrag(fin.area, fin.aspectRatio, air.density, viscosity) }));
  const podParts = podAreas(state);
  const podArea = podParts.reduce((sum, { area }) => sum + area, 0);
  const podFactor = halfDensity * podArea;

  const hull = (u: number): number => hullFactor * u * Math.abs(u) ** (5 / 6);
  const fins = (u: number): number => finParts.reduce((sum, { drag }) => sum + drag(u), 0);
  const pods = (u: number): number => podFactor * u * Math.abs(u);
  const reynolds = (u: number): number => perSpeed * Math.abs(u);
  return {
    hull,
    fins,
    pods,
    at: (u) => hull(u) + fins(u) + pods(u),
    finParts,
    podParts,
    podArea,
    reynolds,
    cautions: (u) => [...stubby(fineness), ...outOfRange(reynolds(u), u)],
  };
}

const LEAST_FINENESS = 2;
const REYNOLDS_RANGE = [1e5, 1e8] as const;

const stubby = (fineness: number): string[] =>
  fineness < LEAST_FINENESS
    ? [
        `The hull is ${say(fineness, 'ratio')} times as long as it is thick: below ${LEAST_FINENESS} the drag formula is a rough guess, and the flow may part from the hull.`,
      ]
    : [];

function outOfRange(reynolds: number, u: number): string[] {
  const [least, most] = REYNOLDS_RANGE;
  if (u === 0 || (reynolds >= least && reynolds <= most)) return [];
  const side = reynolds < least ? `below ${words(least)}` : `above ${words(most)}`;
  return [
    `At ${say(Math.abs(u), 'speed')} the Reynolds number on hull length is ${words(reynolds)}, ${side}: the drag formula is a rough guess there.`,
  ];
}

/** 8.4 × 10⁴ said plainly: to two digits, with thousands apart. */
const words = (reynolds: number): string => Number(reynolds.toPrecision(2)).toLocaleString('en-GB');
