/** Slides and loads in the linear program: a station, and 1 or 0 for each place where a load may go. */
import type { Draft } from './draft.ts';
import type { Line, Linear } from './linear.ts';
import type { LoadChoice, Setting } from './setting.ts';
import { plus } from './share.ts';

export interface LoadColumns {
  /** 1 where the load goes, one an option. */
  readonly taken: readonly number[];
  /** Station where it goes, 0 elsewhere; null for a place that is no slide. */
  readonly stations: readonly (number | null)[];
}

/** A station enters through mass × station: the value at the point and the slope from there. */
export const slideColumns = (draft: Draft, setting: Setting, linear: Linear, reach: number): number[] =>
  setting.slides.map(({ part, from, to }, i) => {
    const line = linear.slides[i]!;
    const column = draft.column(`station of ${part.id}`, ...around(line.at, from, to, reach));
    draft.addsAlways(plus(line.value, line.slope, -line.at));
    draft.adds(column, line.slope);
    return column;
  });

/** The stretch within reach of a station, as a share of the whole. */
function around(at: number, from: number, to: number, reach: number): [number, number] {
  if (reach >= 1) return [from, to];
  const half = reach * (to - from);
  return [Math.min(Math.max(from, at - half), to), Math.max(Math.min(to, at + half), from)];
}

export const loadColumns = (draft: Draft, setting: Setting, linear: Linear, reach: number): LoadColumns[] =>
  setting.loads.map((choice, l) => columnsOf(draft, choice, linear.loads[l]!, reach));

function columnsOf(draft: Draft, choice: LoadChoice, lines: readonly Line[], reach: number): LoadColumns {
  const { load, options } = choice;
  const sole = load.must && options.length === 1;
  const taken = options.map((_, k) => draft.column(`${load.id} at place ${k}`, sole ? 1 : 0, 1, true));
  draft.row(
    `place of ${load.id}`,
    taken.map((column) => [column, 1]),
    load.must ? 1 : 0,
    1,
  );
  const stations = options.map((_, k) => siteColumn(draft, choice, k, taken[k]!, lines[k]!, reach));
  return { taken, stations };
}

/** What the load adds there; the column of its station when there is a slide. */
function siteColumn(
  draft: Draft,
  { load, options }: LoadChoice,
  k: number,
  taken: number,
  line: Line,
  reach: number,
): number | null {
  const { slide } = options[k]!;
  if (!slide) {
    draft.adds(taken, line.value);
    return null;
  }
  const [lower, upper] = around(line.at, slide.from, slide.to, reach);
  const column = draft.column(`station of ${load.id} at place ${k}`, Math.min(0, lower), Math.max(0, upper));
  draft.adds(taken, plus(line.value, line.slope, -line.at));
  draft.adds(column, line.slope);
  draft.betweenWhen(`${load.id} at place ${k}`, column, taken, lower, upper);
  return column;
}
