/**
 * A meridian cut into panels short enough that n Legendre terms describe it to rounding.
 *
 * A panel is halved until the last two coefficients of dx, ds and every skin-path integrand are under RESOLVED
 * times the size of the whole integral. Where an integrand has a root or a corner inside, the halving closes in on
 * it geometrically, and what is left at the last depth is too short to matter.
 */

import { apply, coefficientsOf, type LegendreRule } from './legendreSeries.ts';
import type { Stretch } from './meridian.ts';

/** Values at the nodes of a panel, all in terms of ξ in [−1, 1]. */
export interface PanelSample {
  readonly x: readonly number[];
  readonly r: readonly number[];
  readonly dx: readonly number[];
  readonly ds: readonly number[];
  /** Width of film round the section, m. */
  readonly film: readonly number[];
}

export interface Panel {
  readonly stretch: Stretch;
  readonly from: number;
  readonly to: number;
  readonly x0: number;
  readonly x1: number;
  /** Legendre coefficients of dx/dξ and of the skin-path integrands in the order of PATH_TERMS. */
  readonly station: readonly number[];
  readonly path: readonly (readonly number[])[];
  readonly sample: PanelSample;
}

/** Integrands of SkinPath times ds, with their dimension in station and in radius. */
export const PATH_TERMS: readonly { readonly x: number; readonly r: number }[] = [
  { x: 0, r: 0 },
  { x: 1, r: 0 },
  { x: 0, r: 1 },
  { x: 2, r: 0 },
  { x: 1, r: 1 },
  { x: 0, r: 2 },
];

const RESOLVED = 1e-13;
const DEEPEST = 44;

interface Scale {
  readonly tape: number;
  readonly radius: number;
}

/** All panels of a meridian, nose to tail, stations counted from 0. */
export function panelsOf(stretches: readonly Stretch[], radius: number, rule: LegendreRule): Panel[] {
  const scale = { tape: roughTape(stretches), radius };
  const panels: Panel[] = [];
  for (const stretch of stretches) divide(stretch, 0, 1, 0, scale, rule, panels);
  return panels;
}

/** Length of the skin to a few per cent; only sets the scale of the tolerance. */
function roughTape(stretches: readonly Stretch[]): number {
  let sum = 0;
  for (const stretch of stretches) {
    for (let i = 0; i < 8; i += 1) {
      const { dx, dr } = stretch.at((i + 0.5) / 8);
      sum += Math.hypot(dx, dr) / 8;
    }
  }
  return sum;
}

function divide(
  stretch: Stretch,
  from: number,
  to: number,
  depth: number,
  scale: Scale,
  rule: LegendreRule,
  panels: Panel[],
): void {
  const panel = samplePanel(stretch, from, to, panels.at(-1)?.x1 ?? 0, rule);
  if (depth >= DEEPEST || isResolved(panel, scale)) {
    panels.push(panel);
    return;
  }
  const middle = (from + to) / 2;
  divide(stretch, from, middle, depth + 1, scale, rule, panels);
  divide(stretch, middle, to, depth + 1, scale, rule, panels);
}

function samplePanel(stretch: Stretch, from: number, to: number, x0: number, rule: LegendreRule): Panel {
  const sample = sampleNodes(stretch, from, to, x0, rule);
  const station = coefficientsOf(rule, sample.dx);
  const path = pathIntegrands(sample).map((values) => coefficientsOf(rule, values));
  return { stretch, from, to, x0, x1: x0 + 2 * station[0]!, station, path, sample };
}

function sampleNodes(
  stretch: Stretch,
  from: number,
  to: number,
  x0: number,
  rule: LegendreRule,
): PanelSample {
  const half = (to - from) / 2;
  const sample = { x: [], r: [], dx: [], ds: [], film: [] } as Record<keyof PanelSample, number[]>;
  for (const node of rule.nodes) {
    const t = from + half * (1 + node);
    const { r, dx, dr } = stretch.at(t);
    sample.r.push(r);
    sample.dx.push(half * dx);
    sample.ds.push(half * Math.sqrt(dx * dx + dr * dr));
    sample.film.push(stretch.film ? stretch.film(t) : 2 * Math.PI * r);
  }
  for (let i = 0; i < rule.n; i += 1) sample.x.push(x0 + apply(rule.running, i, sample.dx));
  return sample;
}

/** In the order of PATH_TERMS; a plain loop over plain arrays, since all else is slower by half. */
function pathIntegrands({ x, r, ds }: PanelSample): (readonly number[])[] {
  const [xds, rds, xxds, xrds, rrds]: [number[], number[], number[], number[], number[]] = [
    [],
    [],
    [],
    [],
    [],
  ];
  for (let i = 0; i < ds.length; i += 1) {
    const moment = ds[i]! * x[i]!;
    const turned = ds[i]! * r[i]!;
    xds.push(moment);
    rds.push(turned);
    xxds.push(moment * x[i]!);
    xrds.push(moment * r[i]!);
    rrds.push(turned * r[i]!);
  }
  return [ds, xds, rds, xxds, xrds, rrds];
}

function isResolved(panel: Panel, scale: Scale): boolean {
  if (tail(panel.station) > RESOLVED * scale.tape) return false;
  return PATH_TERMS.every(
    (term, i) =>
      tail(panel.path[i]!) <= RESOLVED * scale.tape * scale.tape ** term.x * scale.radius ** term.r,
  );
}

const tail = (c: readonly number[]): number => Math.abs(c[c.length - 1]!) + Math.abs(c[c.length - 2]!);
