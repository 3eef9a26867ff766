/** How far the figures of turning may be off, and what that makes of a target that is met by less. */

/** Share of a figure, at the least: our judgement, no source. */
const LEAST_ERROR = 0.2;

export const MODEL_ERROR = 'Times, radii and gusts: expect them 20–30 % off (our judgement, no source).';

/** Whether the difference to a target tells nothing for certain; of one quantity both. */
export const withinError = (margin: number, figure: number): boolean =>
  Math.abs(margin) < LEAST_ERROR * Math.abs(figure);

export const WITHIN_ERROR = 'within the model’s error of 20–30 %';
