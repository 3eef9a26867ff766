/**
 * The plan while something is dragged: where all is cut to measure, one linear program a frame, each begun from the
 * solution of the frame before. Wishes and the number of parts moved wait for the plan on release.
 */
import type { Craft } from '../../craft/craft.ts';
import type { LinearSolver, LiveModel } from '../../numeric/linearProgram/result.ts';
import type { SearchOptions } from './attempt.ts';
import { noPlan, type Plan, planFrom } from './plan.ts';
import { type Point, startOf } from './point.ts';
import { searchFrom } from './search.ts';
import { hasChoices, type Setting, settingOf } from './setting.ts';

/** Seconds a frame may take at most, should a problem be far larger than any craft needs. */
const FRAME_LIMIT = 0.5;

export class LivePlanner {
  readonly #model: LiveModel;
  #last: Point | null = null;

  constructor(solver: LinearSolver) {
    this.#model = solver.live();
  }

  /** Without what binds and what would help. Null when pieces or places are to be chosen: that waits for the release. */
  plan(craft: Craft, robust = false): Plan | null {
    const setting = settingOf(craft, robust);
    if (setting.status === 'infeasible') return noPlan('none', setting.why, robust);
    if (hasChoices(setting.value)) return null;
    const options: SearchOptions = { deadline: Date.now() + 1000 * FRAME_LIMIT, aim: 'follow' };
    const trying = { setting: setting.value, model: this.#model, options };
    const found = searchFrom(trying, nearTo(startOf(setting.value), this.#last, setting.value));
    if (found.status !== 'found') return noPlan(found.status, found.why, robust);
    this.#last = found.point;
    return planFrom(setting.value, found);
  }

  dispose(): void {
    this.#model.dispose();
  }
}

/** Slides as they were planned in the frame before, where there are as many: the plan has seldom gone far from there. */
function nearTo(start: Point, last: Point | null, { slides }: Setting): Point {
  if (last?.slides.length !== slides.length) return start;
  return {
    ...start,
    slides: slides.map(({ from, to }, i) => Math.min(Math.max(last.slides[i]!, from), to)),
  };
}
