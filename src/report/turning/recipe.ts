/** How a figure comes about, before the figures that go in are looked up. */
import type { TurnKey } from './turnFigure.ts';

export interface Recipe {
  readonly formula: string;
  readonly from: readonly TurnKey[];
  readonly source: string;
}

export type Recipes<K extends TurnKey> = Readonly<Record<K, Recipe>>;

export const STATICS = 'Statics: each force times its lever.';
export const LAMB = 'H. Lamb, Hydrodynamics (1932), §§ 114–126.';
