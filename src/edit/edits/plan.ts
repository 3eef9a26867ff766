/** Carrying out a ballast plan. */
import { type Relaxation, relax } from '../../craft/relaxation.ts';
import { type Stowage, stow } from '../../craft/stowage.ts';
import { type Edit, step } from '../edit.ts';

/** Hangs the ballast, moves the slides and takes the loads aboard, all as one step. */
export const applyPlan = (stowage: Stowage): Edit =>
  step('Apply the ballast plan', (craft) => stow(craft, stowage));

/** Moves a limit as a plan that cannot be made advises. */
export const applyRelaxation = (relaxation: Relaxation): Edit =>
  step('Follow the advice', (craft) => relax(craft, relaxation));
