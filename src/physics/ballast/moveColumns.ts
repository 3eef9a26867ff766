/** What moves from where it is today, and how far: 1 or 0, and metres, for everything aboard that may move. */

import { stationOf } from '../../craft/station.ts';
import type { Term } from '../../numeric/linearProgram/problem.ts';
import type { Draft } from './draft.ts';
import type { LoadColumns } from './placeColumns.ts';
import type { LoadChoice, Setting } from './setting.ts';

export interface MoveColumns {
  /** 1 when it has moved. */
  readonly moved: readonly number[];
  /** m */
  readonly distances: readonly number[];
}

interface Stretch {
  readonly from: number;
  readonly to: number;
  readonly now: number;
}

export function moveColumns(
  draft: Draft,
  setting: Setting,
  slides: readonly number[],
  loads: readonly LoadColumns[],
): MoveColumns {
  const all = [
    ...setting.slides.map((slide, i) => stationMove(draft, slide.part.id, [[slides[i]!, 1]], slide)),
    ...setting.loads.map((choice, l) => loadMove(draft, choice, loads[l]!)),
  ];
  return {
    moved: all.flatMap(({ moved }) => moved),
    distances: all.flatMap(({ distances }) => distances),
  };
}

const STILL: MoveColumns = { moved: [], distances: [] };

/** A station, given as a sum of columns, against where it is now. */
function stationMove(
  draft: Draft,
  id: string,
  station: readonly Term[],
  { from, to, now }: Stretch,
): MoveColumns {
  if (from === to && from === now) return STILL;
  const back = station.map(([column, a]): Term => [column, -a]);
  const distance = draft.column(`distance of ${id}`, 0, Number.POSITIVE_INFINITY);
  draft.atMost(`${id} aft`, [...station, [distance, -1]], now);
  draft.atMost(`${id} forward`, [...back, [distance, -1]], -now);
  // Today it is outside its stretch: it moves whatever is decided.
  if (now < from || now > to) return { moved: [], distances: [distance] };
  const moved = draft.column(`moved ${id}`, 0, 1, true);
  draft.atMost(`${id} moved aft`, [...station, [moved, now - to]], now);
  draft.atMost(`${id} moved forward`, [...back, [moved, from - now]], -now);
  return { moved: [moved], distances: [distance] };
}

/** A load aboard moves when it leaves its place, or its station there. */
function loadMove(
  draft: Draft,
  { load, options, aboard, now }: LoadChoice,
  columns: LoadColumns,
): MoveColumns {
  if (!aboard || now === null) return STILL;
  const taken = columns.taken[now]!;
  const moves = slideMove(
    draft,
    load.id,
    options[now]!.slide,
    stationOf(aboard.place),
    taken,
    columns.stations[now]!,
  );
  const moved = moves.moved[0] ?? draft.column(`moved ${load.id}`, 0, 1, true);
  draft.row(
    `${load.id} left`,
    [
      [moved, 1],
      [taken, 1],
    ],
    1,
    Number.POSITIVE_INFINITY,
  );
  return { moved: [moved], distances: moves.distances };
}

/** Station less (1 when there) × today's station: 0 while it stays, and 0 when it leaves the slide, which `taken` tells. */
function slideMove(
  draft: Draft,
  id: string,
  slide: { readonly from: number; readonly to: number } | null,
  at: number,
  taken: number,
  station: number | null,
): MoveColumns {
  if (!slide || station === null) return STILL;
  const offset: Term[] = [
    [station, 1],
    [taken, -at],
  ];
  return stationMove(draft, id, offset, { from: slide.from - at, to: slide.to - at, now: 0 });
}
