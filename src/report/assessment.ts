/** What one look at a craft gives: every figure, the verdicts, and where everything is, for drawing. */
import type { Infeasible } from '../numeric/outcome.ts';
import type { Vec3 } from '../numeric/vector.ts';
import type { Hull } from '../physics/hull/hull.ts';
import type { Advice } from './advice.ts';
import type { Row } from './row.ts';
import type { ThrustArrow } from './turning/arrows.ts';
import type { Verdict } from './verdict.ts';

export type { Hull, Vec3 };

/** One piece of a part where it is. Parts in pairs and rings have several. */
export interface PieceView {
  readonly part: string;
  readonly copy: number;
  /** Middle of the piece and its CG, m: x station, y side, z height. */
  readonly middle: Vec3;
  readonly cg: Vec3;
  /** Clock angle towards which its height points: 0 for parts that stand upright. */
  readonly roll: number;
}

/** The drawn path of a wire run, one line for each branch (a run to a pair has two). */
export interface WireView {
  readonly wire: string;
  readonly branches: readonly (readonly Vec3[])[];
  readonly mass: number;
  readonly length: number;
}

export interface HardpointView {
  readonly hardpoint: string;
  readonly at: Vec3;
}

/** One bar of the beam: a moment about the CB station. */
export interface BeamBar {
  readonly kind: 'part' | 'wire' | 'skin' | 'lead';
  /** Id of the part or wire run; 'film', 'seams', 'patches' for the skin; the hardpoint's for lead. */
  readonly id: string;
  readonly name: string;
  readonly mass: number;
  readonly station: number;
  /** mass × (station − CB station), kg·m; + tail-heavy. */
  readonly moment: number;
}

export interface Assessment {
  /** Keyed as in the terminal's JSON: `hull.volume`, `float.pitch`, … */
  readonly rows: Readonly<Record<string, Row>>;
  readonly verdicts: readonly Verdict[];
  /** Whether it meets its targets. */
  readonly met: boolean;
  /** The one sentence that says what is wrong, or that nothing is. */
  readonly headline: string;
  /** What could be done, ready to be carried out. */
  readonly advice: readonly Advice[];
  readonly geometry: Geometry | Infeasible;
  /** Things to mind that belong to no single row: a part beyond the hull, air outside the formula's range. */
  readonly cautions: readonly string[];
}

/** Where things are; there is none when the hull itself cannot be formed. */
export interface Geometry {
  readonly status: 'solved';
  readonly hull: Hull;
  readonly cb: Vec3;
  readonly cg: Vec3 | null;
  /** Attitude in which it floats, rad; null when it has none. */
  readonly attitude: { readonly pitch: number; readonly heel: number } | null;
  readonly pieces: readonly PieceView[];
  readonly wires: readonly WireView[];
  readonly hardpoints: readonly HardpointView[];
  readonly support: Vec3 | null;
  /** Thrust of each piece of a thruster with figures. */
  readonly thrust: readonly ThrustArrow[];
  readonly beam: readonly BeamBar[];
  /** The least lead as one more bar, where it can be had. */
  readonly lead: BeamBar | null;
}
