/** How every figure of thrust and turning comes about. */
import type { Rows } from '../rows.ts';
import type { Working } from '../verdict.ts';
import { FLIGHT_RECIPES } from './flightRecipes.ts';
import type { Recipes } from './recipe.ts';
import type { TurnKey } from './turnFigure.ts';
import { TURNING_RECIPES } from './turningRecipes.ts';

const RECIPES: Recipes<TurnKey> = { ...TURNING_RECIPES, ...FLIGHT_RECIPES };

/** The working of the figure under that key, its inputs taken from the same report; null for a key that is none. */
export function turnWorkingOf(key: string, rows: Rows): Working | null {
  if (!Object.hasOwn(RECIPES, key)) return null;
  const { formula, from, source } = RECIPES[key as TurnKey];
  return { formula, inputs: from.flatMap((each) => rows[each] ?? []), source };
}
