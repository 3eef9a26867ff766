/** Of neighbouring stations that the model cannot tell apart a table needs one. */
import { asGood, type PlacedPoint, worthOf } from '../../physics/placing/placedPoint.ts';
import { isAt, type Tried } from './placeWords.ts';

/** The stations that nothing beats, the best of each such run and always the one told of; not where the thruster was at first. */
export function bestOfRuns(
  { points, today }: Pick<Tried, 'points' | 'today'>,
  told: number | null,
): PlacedPoint[] {
  const runs: PlacedPoint[][] = [];
  points.forEach((point, i) => {
    if (!point.best || isAt(point, today)) return;
    const run = runs.at(-1);
    if (run && run.at(-1) === points[i - 1] && run.every((each) => asGood(each, point))) run.push(point);
    else runs.push([point]);
  });
  return runs.map((run) => run.find(({ station }) => station === told) ?? run.reduce(better));
}

const better = (a: PlacedPoint, b: PlacedPoint): PlacedPoint => (sumOf(b) < sumOf(a) ? b : a);

const sumOf = (point: PlacedPoint): number => worthOf(point).reduce((sum, each) => sum + each, 0);
